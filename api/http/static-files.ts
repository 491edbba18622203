import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants } from 'node:zlib';
import express, { type RequestHandler } from 'express';
import { LRUCache } from 'lru-cache';

/** A name with a hash of its content, or a folder with a version, never stands for anything else. */
const LASTING = /-[A-Z0-9]{8}\.(js|css)$|[\\/]fonts[\\/]/;
const PACKED = /^\/[\w.-]+-[A-Z0-9]{8}\.(js|css)$/;
const YEAR = 'public, max-age=31536000, immutable';

const compress = promisify(brotliCompress);

/**
 * The files of the build. Those whose name never changes its meaning are kept by browsers for a
 * year, the others for an hour. Scripts and styles are compressed as far as it goes, once.
 */
export function staticFiles(folder: string): RequestHandler[] {
  const packed = new LRUCache<string, Promise<Buffer | null>>({ max: 500 });

  const sendPacked: RequestHandler = async (request, response, next) => {
    if (request.method !== 'GET' || !PACKED.test(request.path) || request.acceptsEncodings('br', 'gzip') !== 'br') return next();
    let found = packed.get(request.path);
    if (!found) packed.set(request.path, (found = pack(join(folder, request.path))));
    const body = await found;
    if (body === null) return next();
    response.set({ 'Cache-Control': YEAR, 'Content-Encoding': 'br', 'Content-Length': String(body.length), Vary: 'Accept-Encoding' });
    response.type(request.path.endsWith('.js') ? 'text/javascript' : 'text/css').end(body);
  };
  return [
    sendPacked,
    express.static(folder, {
      index: false,
      redirect: false,
      setHeaders: (response, path) => response.setHeader('Cache-Control', LASTING.test(path) ? YEAR : 'public, max-age=3600'),
    }),
  ];
}

/** The file compressed; null where there is none. */
async function pack(file: string): Promise<Buffer | null> {
  const plain = await readFile(file).catch((error: NodeJS.ErrnoException) => {
    if (error.code === 'ENOENT') return null;
    throw error;
  });
  return plain && compress(plain, { params: { [constants.BROTLI_PARAM_SIZE_HINT]: plain.length } });
}
