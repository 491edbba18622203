import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';

/** Which makers work with an item, and within what limits. */
@Component({
  selector: 'app-offer-table',
  imports: [RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <dl>
      @for (offer of offers(); track offer.id) {
        <div>
          <dt>
            <a [routerLink]="['/catalogue/makers', offer.id]">{{ offer.name }}</a>
          </dt>
          <dd [class.not]="offer.words === null">{{ offer.words ?? 'does not offer it' }}</dd>
        </div>
      }
    </dl>
  `,
  styles: `
    dl {
      margin: 0;
      border-top: 1px solid var(--sy-line);
    }
    div {
      display: grid;
      grid-template-columns: 230px 1fr;
      gap: 2px 20px;
      padding: 9px 0;
      border-bottom: 1px solid var(--sy-line);
    }
    dd {
      margin: 0;
    }
    .not {
      color: var(--sy-soft);
    }
    @media (max-width: 700px) {
      div {
        grid-template-columns: 1fr;
      }
    }
  `,
})
export class OfferTable {
  readonly offers = input.required<readonly { id: string; name: string; words: string | null }[]>();
}
