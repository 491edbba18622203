import { type Router } from '@angular/router';

/**
 * Whether the reader is on the way to another page. Writing to this page's address would then
 * call them back: on a slow line the other page takes longer than a pause in typing.
 */
export function isLeaving(router: Router): boolean {
  const next = router.currentNavigation();
  return next !== null && pathOf(router.serializeUrl(next.extractedUrl)) !== pathOf(router.url);
}

function pathOf(url: string): string {
  return url.replace(/[?#].*$/, '');
}
