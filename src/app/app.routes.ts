import { type Routes } from '@angular/router';
import { mayUse } from './session/may-use';

/** The places of `header.ts`; a guard mirrors the table of who may call what. */
export const routes: Routes = [
  { path: '', loadChildren: () => import('./catalogue/catalogue.routes').then((m) => m.frontRoutes), pathMatch: 'full' },
  { path: 'catalogue', loadChildren: () => import('./catalogue/catalogue.routes').then((m) => m.catalogueRoutes) },
  { path: 'bench', loadChildren: () => import('./bench/bench.routes').then((m) => m.benchRoutes) },
  { path: 'sign-in', title: 'Sign in', loadComponent: () => import('./session/sign-in-page').then((m) => m.SignInPage) },
  { path: 'quotes', canMatch: [mayUse('quotes.list')], loadChildren: () => import('./quotes/quotes.routes').then((m) => m.quotesRoutes) },
  { path: 'orders', canMatch: [mayUse('orders.list')], loadChildren: () => import('./orders/orders.routes').then((m) => m.ordersRoutes) },
  { path: 'money', canMatch: [mayUse('invoices.list')], loadChildren: () => import('./money/money.routes').then((m) => m.moneyRoutes) },
  { path: 'plant', canMatch: [mayUse('orders.dispatch')], loadChildren: () => import('./plant/plant.routes').then((m) => m.plantRoutes) },
  {
    path: 'receivables',
    canMatch: [mayUse('receipts.list')],
    loadChildren: () => import('./receivables/receivables.routes').then((m) => m.receivablesRoutes),
  },
  {
    path: 'market',
    canMatch: [mayUse('market.companies')],
    loadChildren: () => import('./market/market.routes').then((m) => m.marketRoutes),
  },
  { path: '**', title: 'Not found', loadComponent: () => import('./not-found-page').then((m) => m.NotFoundPage) },
];
