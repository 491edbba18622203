import { type Routes } from '@angular/router';

export const benchRoutes: Routes = [];
