import { readdirSync } from 'node:fs';
import autocannon from 'autocannon';
import { type Browser } from 'playwright-core';
import { startProduct } from '../browser/product';
import { launchBrowser } from '../browser/sitting';
import { type Measure, median } from './measure';

const ROUNDS = 5;
const SECONDS = 2;
const CONNECTIONS = 8;
const page = '/catalogue/gases';
/** One of each kind of page of the catalogue; the heaviest counts. */
const pages = [
  '/',
  '/catalogue',
  page,
  '/catalogue/gases/argon',
  '/catalogue/how-a-unit-is-made',
  '/catalogue/sizes',
  '/catalogue/makers/northmere',
];

/** What public pages cost: on the server once they are kept, and in scripts at the first load. */
export async function measurePages(): Promise<Measure[]> {
  const product = await startProduct();
  try {
    const browser = await launchBrowser();
    try {
      return [await cachedPage(product.base), ...(await firstLoads(browser, product.base))];
    } finally {
      await browser.close();
    }
  } finally {
    await product.stop();
  }
}

/**
 * Requests a second of a kept page against those of a script of the build of about the same size,
 * compressed as browsers ask for it and plain, by turns; the worse of the two counts.
 */
async function cachedPage(base: string): Promise<Measure> {
  const found = [];
  for (const encoding of ['br', 'identity']) {
    const size = await sizeOf(base + page, encoding);
    const file = await fileLike(base, size, encoding);
    const ratios: number[] = [];
    for (let round = 0; round < ROUNDS; round++) {
      const ofPage = await requestsASecond(base + page, encoding);
      ratios.push((await requestsASecond(base + file.path, encoding)) / ofPage);
    }
    found.push({
      encoding,
      ratio: median(ratios),
      words: `${encoding}: page of ${kilobytes(size)}, file of ${kilobytes(file.size)}, ${median(ratios).toFixed(2)}`,
    });
  }
  const worst = Math.max(...found.map(({ ratio }) => ratio));
  return {
    measure: 'time of a cached catalogue page ÷ static file through the same Express',
    ratio: worst.toFixed(2),
    toReach: '≤ 1.5',
    reached: worst <= 1.5,
    detail: `${page} against the script of the build nearest in size, ${CONNECTIONS} connections, median of ${ROUNDS} rounds of ${SECONDS} s by turns; ${found.map(({ words }) => words).join('; ')}`,
  };
}

async function requestsASecond(url: string, encoding: string): Promise<number> {
  const { requests, non2xx, errors } = await autocannon({
    url,
    connections: CONNECTIONS,
    duration: SECONDS,
    headers: { 'accept-encoding': encoding },
  });
  if (non2xx > 0 || errors > 0) throw new Error(`${url} did not answer every request`);
  return requests.average;
}

async function fileLike(base: string, size: number, encoding: string): Promise<{ path: string; size: number }> {
  const files = [];
  for (const name of readdirSync('dist/sealyard/browser').filter((each) => each.endsWith('.js'))) {
    files.push({ path: `/${name}`, size: await sizeOf(`${base}/${name}`, encoding) });
  }
  files.sort((a, b) => Math.abs(a.size - size) - Math.abs(b.size - size));
  const [nearest] = files;
  if (!nearest) throw new Error('the build holds no script');
  return nearest;
}

/** Bytes of the body as it is sent; fetch would unpack it. */
async function sizeOf(url: string, encoding: string): Promise<number> {
  const answer = await fetch(url, { headers: { 'accept-encoding': encoding } });
  const sent = answer.headers.get('content-length');
  await answer.arrayBuffer();
  if (sent === null) throw new Error(`${url} does not say how long it is`);
  return Number(sent);
}

/** Scripts that a browser with an empty cache fetches, as they are sent, until the page is at rest. */
async function firstLoads(browser: Browser, base: string): Promise<Measure[]> {
  const loads: { path: string; bytes: number; files: number }[] = [];
  for (const path of [...pages, '/bench']) loads.push({ path, ...(await scriptsOf(browser, base + path)) });
  const row = (measure: string, of: typeof loads, most: number): Measure => {
    const heaviest = of.reduce((most, each) => (each.bytes > most.bytes ? each : most));
    return {
      measure,
      ratio: kilobytes(heaviest.bytes),
      toReach: `≤ ${most} kB`,
      reached: heaviest.bytes <= most * 1000,
      detail: `bodies of all scripts as sent to Chromium (brotli), until the network rests; ${of.map(({ path, bytes, files }) => `${path} ${kilobytes(bytes)} in ${files}`).join(', ')}`,
    };
  };
  return [
    row('first load, compressed JavaScript: catalogue', loads.slice(0, -1), 170),
    row('first load, compressed JavaScript: Bench', loads.slice(-1), 300),
  ];
}

async function scriptsOf(browser: Browser, url: string): Promise<{ bytes: number; files: number }> {
  const context = await browser.newContext();
  const opened = await context.newPage();
  const sizes: Promise<number>[] = [];
  opened.on('requestfinished', (request) => {
    if (request.resourceType() === 'script') sizes.push(request.sizes().then(({ responseBodySize }) => responseBodySize));
  });
  await opened.goto(url, { waitUntil: 'networkidle' });
  const bytes = (await Promise.all(sizes)).reduce((sum, each) => sum + each, 0);
  await context.close();
  if (sizes.length === 0) throw new Error(`${url} loaded no script`);
  return { bytes, files: sizes.length };
}

const kilobytes = (bytes: number) => `${(bytes / 1000).toFixed(1)} kB`;
