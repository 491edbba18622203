import { inject } from '@angular/core';
import { ActivatedRoute, Router } from '@angular/router';
import { isLeaving } from './is-leaving';

/**
 * Writes filters into the address, so that back, reload and a link keep them. An empty value
 * leaves the address. To be called in an injection context; the page reads the same names as inputs.
 */
export function filterAddress(): (filters: Record<string, string>) => Promise<boolean> {
  const router = inject(Router);
  const route = inject(ActivatedRoute);
  return async (filters) =>
    !isLeaving(router) &&
    router.navigate([], {
      relativeTo: route,
      queryParams: Object.fromEntries(Object.entries(filters).map(([name, value]) => [name, value === '' ? null : value])),
      queryParamsHandling: 'merge',
      // Filters are one place: back leaves the list instead of undoing letter by letter.
      replaceUrl: true,
    });
}
