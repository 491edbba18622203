import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { Router, RouterLink, RouterLinkActive } from '@angular/router';
import { mayCall } from '@shared/contracts/who-may-call';
import { type EndpointId } from '@shared/contracts/endpoints';
import { Session } from './session/session';
import { Scheme } from './ui/scheme';
import { Icon } from './ui/icon';

interface Place {
  path: string;
  name: string;
  /** offered to whoever may call this; absent: to everybody */
  needs?: EndpointId;
  /** offered on this side of the market only */
  side?: 'dealer' | 'fabricator';
}

const places: Place[] = [
  { path: '/catalogue', name: 'Catalogue' },
  { path: '/bench', name: 'Bench' },
  { path: '/quotes', name: 'Quotes', needs: 'quotes.list' },
  { path: '/orders', name: 'Orders', needs: 'orders.list' },
  { path: '/money', name: 'Money', needs: 'invoices.list', side: 'dealer' },
  { path: '/plant', name: 'Plant', needs: 'orders.dispatch' },
  { path: '/receivables', name: 'Receivables', needs: 'receipts.list' },
  { path: '/market', name: 'Market', needs: 'market.companies' },
];

/** The head of every page: our mark, the places one may use, and who is signed in. */
@Component({
  selector: 'app-header',
  imports: [RouterLink, RouterLinkActive, Icon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './header.html',
  styleUrl: './header.scss',
})
export class Header {
  protected readonly session = inject(Session);
  protected readonly scheme = inject(Scheme);
  private readonly router = inject(Router);

  protected readonly places = computed(() => {
    const user = this.session.user();
    return places.filter(
      ({ needs, side }) =>
        (needs === undefined || mayCall(needs, user?.roles ?? [])) && (side === undefined || side === user?.company.kind),
    );
  });

  protected async signOut(): Promise<void> {
    await this.session.signOut();
    await this.router.navigateByUrl('/');
  }
}
