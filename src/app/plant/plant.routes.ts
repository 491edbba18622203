import { type Routes } from '@angular/router';
import { asksBeforeLeaving } from '../ui/asks-before-leaving';

export const plantRoutes: Routes = [
  { path: '', title: 'Plant', loadComponent: async () => (await import('./plant-page')).PlantPage },
  {
    path: 'orders/:id',
    title: 'Dispatch',
    loadComponent: async () => (await import('./dispatch-page')).DispatchPage,
    canDeactivate: [asksBeforeLeaving],
  },
];
