import { type Routes } from '@angular/router';

export const ordersRoutes: Routes = [
  { path: '', title: 'Orders', loadComponent: async () => (await import('./orders-page')).OrdersPage },
  { path: ':id', title: 'Order', loadComponent: async () => (await import('./order-page')).OrderPage },
];
