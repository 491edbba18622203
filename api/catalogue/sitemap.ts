import { type Catalogue } from '@shared/contracts/catalogue';
import { publicPaths } from '@shared/contracts/catalogue-parts';

/** Every public page under its whole address, after sitemaps.org. */
export function sitemapXml(publicUrl: string, catalogue: Catalogue): string {
  const urls = publicPaths(catalogue).map((path) => `  <url><loc>${escapeXml(publicUrl + path)}</loc></url>`);
  return `<?xml version="1.0" encoding="UTF-8"?>\n<urlset xmlns="http://www.sitemaps.org/schemas/sitemap/0.9">\n${urls.join('\n')}\n</urlset>\n`;
}

/** Public pages may be read by anyone; what needs a sign-in has nothing to find, nor has the API. */
export function robotsText(publicUrl: string): string {
  const closed = ['/api/', '/sign-in', '/quotes', '/orders', '/money', '/plant', '/receivables', '/market'];
  return ['User-agent: *', ...closed.map((path) => `Disallow: ${path}`), '', `Sitemap: ${publicUrl}/sitemap.xml`, ''].join('\n');
}

function escapeXml(text: string): string {
  return text.replace(/[&<>"']/g, (letter) => `&#${letter.charCodeAt(0)};`);
}
