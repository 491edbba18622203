import { RenderMode, type ServerRoute } from '@angular/ssr';

/** Public pages arrive rendered; what needs a sign-in is rendered where the session is. */
export const serverRoutes: ServerRoute[] = [
  { path: '', renderMode: RenderMode.Server },
  { path: 'catalogue', renderMode: RenderMode.Server },
  { path: 'catalogue/**', renderMode: RenderMode.Server },
  { path: 'bench', renderMode: RenderMode.Server },
  { path: 'sign-in', renderMode: RenderMode.Server },
  { path: 'quotes/**', renderMode: RenderMode.Client },
  { path: 'orders/**', renderMode: RenderMode.Client },
  { path: 'money/**', renderMode: RenderMode.Client },
  { path: 'plant/**', renderMode: RenderMode.Client },
  { path: 'receivables/**', renderMode: RenderMode.Client },
  { path: 'market/**', renderMode: RenderMode.Client },
  { path: '**', renderMode: RenderMode.Server, status: 404 },
];
