import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { Session } from '../session/session';
import { BenchAddress } from './bench-address';
import { MakerList } from './maker-list';

/** For those without prices: who can build the unit, and the way to prices of one's own. */
@Component({
  selector: 'app-visitor-panel',
  imports: [MakerList, MatButton, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2>Who can build it</h2>
    <app-maker-list />
    @if (session.user()) {
      <p class="sy-soft">Prices are for dealers, on the terms of their own trade accounts.</p>
    } @else {
      <div class="way">
        <p>Dealers see each maker’s price here, row by row, on their own terms.</p>
        <a matButton="filled" routerLink="/sign-in" [queryParams]="{ then: here() }">Sign in to see prices on your terms</a>
      </div>
    }
  `,
  styleUrl: './section-head.scss',
  styles: `
    :host {
      display: block;
    }
    .way,
    p {
      margin-top: 18px;
    }
    .way p {
      margin: 0 0 12px;
      color: var(--sy-soft);
    }
    a {
      width: 100%;
    }
    @media (max-width: 700px) {
      .way a {
        position: fixed;
        inset: auto 16px calc(10px + env(safe-area-inset-bottom));
        z-index: 5;
        width: auto;
        box-shadow: 0 2px 14px rgb(0 0 0 / 25%);
      }
    }
  `,
})
export class VisitorPanel {
  protected readonly session = inject(Session);
  /** The Bench as it stands, to come back to. */
  protected readonly here = inject(BenchAddress).here;
}
