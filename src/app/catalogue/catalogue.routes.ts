import { type Routes } from '@angular/router';

export const frontRoutes: Routes = [];
export const catalogueRoutes: Routes = [];
