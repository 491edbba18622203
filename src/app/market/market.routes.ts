import { type Routes } from '@angular/router';

export const marketRoutes: Routes = [];
