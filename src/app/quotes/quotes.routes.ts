import { type Routes } from '@angular/router';
import { asksBeforeLeaving } from '../ui/asks-before-leaving';

export const quotesRoutes: Routes = [
  { path: '', title: 'Quotes', loadComponent: async () => (await import('./quotes-page')).QuotesPage },
  {
    path: ':id',
    title: 'Quote',
    loadComponent: async () => (await import('./quote-page')).QuotePage,
    canDeactivate: [asksBeforeLeaving],
  },
  { path: ':id/order', title: 'Order a quote', loadComponent: async () => (await import('./place-order-page')).PlaceOrderPage },
];
