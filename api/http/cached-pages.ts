import { createHash } from 'node:crypto';
import { brotliCompressSync, constants, gzipSync } from 'node:zlib';
import { type RequestHandler } from 'express';
import { LRUCache } from 'lru-cache';

interface Page {
  etag: string;
  plain: Buffer;
  gzip: Buffer;
  brotli: Buffer;
}

/** Renders a public page for a visitor; null when the page is not to be kept (an error, a redirect). */
export type RenderPage = (request: Parameters<RequestHandler>[0]) => Promise<string | null>;

/**
 * Keeps rendered public pages, compressed once, until what they are made from changes.
 *
 * @param isPublic which addresses are the same for everybody
 * @param version what the pages are made from; a new one empties the cache
 */
export function cachedPages(isPublic: (path: string) => boolean, version: () => number, render: RenderPage): RequestHandler {
  const pages = new LRUCache<string, Page>({ max: 400 });
  let madeFrom = version();
  return async (request, response, next) => {
    if ((request.method !== 'GET' && request.method !== 'HEAD') || !isPublic(request.path)) return next();
    if (version() !== madeFrom) {
      pages.clear();
      madeFrom = version();
    }
    const key = `${request.hostname}${request.url}`;
    let page = pages.get(key);
    if (!page) {
      const html = await render(request);
      if (html === null) return next();
      page = compress(html);
      pages.set(key, page);
    }
    response.set({ 'Content-Type': 'text/html; charset=utf-8', 'Cache-Control': 'no-cache', ETag: page.etag, Vary: 'Accept-Encoding' });
    if (request.fresh) return void response.status(304).end();
    const encoding = request.acceptsEncodings('br', 'gzip', 'identity');
    const body = encoding === 'br' ? page.brotli : encoding === 'gzip' ? page.gzip : page.plain;
    if (encoding === 'br' || encoding === 'gzip') response.set('Content-Encoding', encoding);
    response.set('Content-Length', String(body.length));
    response.end(request.method === 'HEAD' ? undefined : body);
  };
}

function compress(html: string): Page {
  const plain = Buffer.from(html);
  return {
    etag: `"${createHash('sha256').update(plain).digest('base64url').slice(0, 22)}"`,
    plain,
    gzip: gzipSync(plain),
    brotli: brotliCompressSync(plain, { params: { [constants.BROTLI_PARAM_QUALITY]: 6 } }),
  };
}
