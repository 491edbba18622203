import { type Routes } from '@angular/router';

export const ordersRoutes: Routes = [];
