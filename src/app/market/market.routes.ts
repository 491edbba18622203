import { type Routes } from '@angular/router';

export const marketRoutes: Routes = [{ path: '', title: 'Market', loadComponent: async () => (await import('./market-page')).MarketPage }];
