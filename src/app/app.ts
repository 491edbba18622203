import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { NavigationEnd, Router, RouterOutlet } from '@angular/router';
import { filter, map } from 'rxjs';
import { Header } from './header';

@Component({
  selector: 'app-root',
  imports: [RouterOutlet, Header],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <a class="skip" [href]="toContent()" (click)="content.focus(); $event.preventDefault()">To the content</a>
    <app-header />
    <main #content id="content" tabindex="-1"><router-outlet /></main>
  `,
  styles: `
    main:focus {
      outline: none;
    }
    .skip {
      position: absolute;
      left: 12px;
      top: -60px;
      padding: 8px 14px;
      background: var(--sy-sheet);
      z-index: 20;
    }
    .skip:focus {
      top: 8px;
    }
  `,
})
export class App {
  private readonly router = inject(Router);
  /** The whole address of this page: a bare fragment would be one of the base, which is the front page. */
  protected readonly toContent = toSignal(
    this.router.events.pipe(
      filter((event) => event instanceof NavigationEnd),
      map(() => `${this.router.url.replace(/#.*$/, '')}#content`),
    ),
    { initialValue: '#content' },
  );
}
