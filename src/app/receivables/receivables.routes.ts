import { type Routes } from '@angular/router';

export const receivablesRoutes: Routes = [];
