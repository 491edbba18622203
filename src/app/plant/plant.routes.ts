import { type Routes } from '@angular/router';

export const plantRoutes: Routes = [];
