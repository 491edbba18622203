import { Router } from 'express';
import { type Dependencies } from '../dependencies';
import { robotsText, sitemapXml } from './sitemap';

/** `/sitemap.xml` and `/robots.txt`, from the catalogue as it stands. */
export function sitemapRoutes({ config, catalogue }: Pick<Dependencies, 'config' | 'catalogue'>): Router {
  const router = Router();
  router.get('/sitemap.xml', (_request, response) => {
    response.set('Cache-Control', 'public, max-age=3600').type('application/xml').send(sitemapXml(config.publicUrl, catalogue()));
  });
  router.get('/robots.txt', (_request, response) => {
    response.set('Cache-Control', 'public, max-age=3600').type('text/plain').send(robotsText(config.publicUrl));
  });
  return router;
}
