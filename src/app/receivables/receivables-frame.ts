import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';

/** The clerk's places, side by side above what is open. */
@Component({
  selector: 'app-receivables-frame',
  imports: [RouterLink, RouterLinkActive, RouterOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <nav aria-label="Receivables" class="sy-no-print">
      @for (place of places; track place.path) {
        <a [routerLink]="place.path" routerLinkActive="here" ariaCurrentWhenActive="page">{{ place.name }}</a>
      }
    </nav>
    <router-outlet />
  `,
  styles: `
    nav {
      display: flex;
      gap: 22px;
      max-width: 1180px;
      margin: 0 auto;
      padding: 14px 24px 0;
      overflow-x: auto;
    }
    a {
      color: var(--sy-soft);
      text-decoration: none;
      white-space: nowrap;
      padding: 4px 2px;
      border-bottom: 2px solid transparent;
    }
    a:hover {
      color: var(--sy-ink);
    }
    a.here {
      color: var(--sy-ink);
      font-weight: 700;
      border-bottom-color: var(--sy-copper);
    }
    @media (max-width: 700px) {
      nav {
        padding: 10px 16px 0;
      }
    }
  `,
})
export class ReceivablesFrame {
  protected readonly places = [
    { path: 'invoices', name: 'Invoices' },
    { path: 'receipts', name: 'Receipts' },
    { path: 'accounts', name: 'Trade accounts' },
    { path: 'trial-balance', name: 'Trial balance' },
  ];
}
