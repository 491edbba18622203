import { type Routes } from '@angular/router';

/** The clerk's places. */
export const receivablesRoutes: Routes = [
  {
    path: '',
    loadComponent: () => import('./receivables-frame').then((m) => m.ReceivablesFrame),
    children: [
      { path: '', pathMatch: 'full', redirectTo: 'invoices' },
      { path: 'invoices', title: 'Invoices', loadComponent: () => import('./invoices-page').then((m) => m.InvoicesPage) },
      { path: 'invoices/:id', title: 'Invoice', loadComponent: () => import('./invoice-page').then((m) => m.InvoicePage) },
      { path: 'receipts', title: 'Receipts', loadComponent: () => import('./receipts-page').then((m) => m.ReceiptsPage) },
      {
        path: 'receipts/new',
        title: 'Record a receipt',
        loadComponent: () => import('./record-receipt-page').then((m) => m.RecordReceiptPage),
      },
      { path: 'receipts/:id', title: 'Receipt', loadComponent: () => import('./receipt-page').then((m) => m.ReceiptPage) },
      { path: 'accounts', title: 'Trade accounts', loadComponent: () => import('./accounts-page').then((m) => m.AccountsPage) },
      { path: 'accounts/:id', title: 'Trade account', loadComponent: () => import('./account-page').then((m) => m.AccountPage) },
      {
        path: 'trial-balance',
        title: 'Trial balance',
        loadComponent: () => import('./trial-balance-page').then((m) => m.TrialBalancePage),
      },
    ],
  },
];
