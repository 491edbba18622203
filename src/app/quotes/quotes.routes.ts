import { type Routes } from '@angular/router';

export const quotesRoutes: Routes = [];
