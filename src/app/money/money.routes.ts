import { type Routes } from '@angular/router';
import { mayUse } from '../session/may-use';

export const moneyRoutes: Routes = [
  { path: '', title: 'Money', loadComponent: async () => (await import('./money-page')).MoneyPage },
  { path: 'invoices/:id', title: 'Invoice', loadComponent: async () => (await import('./invoice-page')).InvoicePage },
  {
    path: 'accounts/:id',
    title: 'Account movements',
    canMatch: [mayUse('trade-accounts.movements')],
    loadComponent: async () => (await import('./movements-page')).MovementsPage,
  },
];
