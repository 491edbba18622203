import { type Routes } from '@angular/router';

export const moneyRoutes: Routes = [];
