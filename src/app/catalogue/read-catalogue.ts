import { inject } from '@angular/core';
import { RedirectCommand, type ResolveFn, Router } from '@angular/router';
import { catchError, of } from 'rxjs';
import { type Catalogue } from '@shared/contracts/catalogue';
import { CatalogueReader } from '../api-client/catalogue-reader';

/** Reads the catalogue before a page opens; where it cannot be had, a page that says so opens under the same address. */
export const readCatalogue: ResolveFn<Catalogue> = () => {
  const router = inject(Router);
  return inject(CatalogueReader)
    .read()
    .pipe(
      catchError((error: unknown) => {
        console.error(error);
        return of(new RedirectCommand(router.parseUrl('/catalogue/out-of-reach'), { skipLocationChange: true }));
      }),
    );
};
