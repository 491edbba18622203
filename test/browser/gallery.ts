import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { type Browser, type Page } from 'playwright-core';
import { startProduct } from './product';
import { people, type Person, type Screen, screens } from './screens';
import { startServer } from './server-process';
import { DESK, launchBrowser, PHONE, sitDown } from './sitting';
import { visit } from './visit';

/**
 * `npm run gallery`: a picture of every screen as each role that sees it, at a desk and on a
 * phone, light and dark, with much data and with none, and a page that shows them all. For
 * looking at the whole product at a glance; nothing is compared.
 */
const folder = 'gallery';
const widths = [DESK, PHONE];
const schemes = ['light', 'dark'] as const;

interface Picture {
  screen: string;
  person: Person;
  file: string;
}

async function photograph(page: Page, screen: Screen, person: Person, data: 'much' | 'none'): Promise<Picture[]> {
  const pictures: Picture[] = [];
  for (const viewport of widths) {
    await page.setViewportSize(viewport);
    await page.emulateMedia({ colorScheme: 'light' });
    await visit(page, screen);
    for (const colorScheme of schemes) {
      await page.emulateMedia({ colorScheme });
      const file = `${screen.name}/${data}-${person.replace(' ', '-')}-${viewport.width}-${colorScheme}.png`;
      mkdirSync(dirname(join(folder, file)), { recursive: true });
      await page.screenshot({ path: join(folder, file), fullPage: true });
      pictures.push({ screen: screen.name, person, file });
    }
  }
  return pictures;
}

/** Every list of the API is empty, as in a market that has just begun. */
async function emptyLists(page: Page): Promise<void> {
  await page.route(/\/api\/(?!auth|catalogue)/, async (route) => {
    if (route.request().method() === 'POST' && route.request().url().endsWith('/api/prices')) {
      return route.fulfill({ json: { offers: [], pricedAt: new Date().toISOString() } });
    }
    const answer = await route.fetch();
    const body = (await answer.json()) as Record<string, unknown>;
    if ('items' in body) return route.fulfill({ response: answer, json: { items: [], nextCursor: null } });
    if ('rows' in body) return route.fulfill({ response: answer, json: { ...body, rows: [] } });
    return route.fulfill({ response: answer });
  });
}

async function walk(
  browser: Browser,
  base: string,
  person: Person,
  data: 'much' | 'none',
  which: (screen: Screen) => boolean,
): Promise<Picture[]> {
  const { page, complaints, close } = await sitDown(browser, base, people[person]);
  if (data === 'none' && person !== 'visitor') await emptyLists(page);
  const pictures: Picture[] = [];
  for (const screen of screens) {
    if (!screen.seenBy.includes(person) || !which(screen)) continue;
    try {
      pictures.push(...(await photograph(page, screen, person, data)));
    } catch (error) {
      console.error(`${screen.name} as ${person}, ${data}: ${String(error).split('\n')[0]}`);
      process.exitCode = 1;
    }
  }
  for (const complaint of complaints) console.error(`${person}: ${complaint}`);
  await close();
  console.log(`${person}, ${data} data: ${pictures.length} pictures`);
  return pictures;
}

/** One page with all pictures, a row a screen. */
function index(pictures: readonly Picture[]): string {
  const rows = screens.map(({ name }) => {
    const own = pictures.filter(({ screen }) => screen === name);
    const figures = own.map(
      ({ file }) =>
        `<figure><a href="${file}"><img src="${file}" alt="" loading="lazy"></a><figcaption>${file.split('/')[1]!.replace('.png', '')}</figcaption></figure>`,
    );
    return `<section id="${name}"><h2>${name}</h2><div>${figures.join('')}</div></section>`;
  });
  const links = screens.map(({ name }) => `<a href="#${name}">${name}</a>`);
  return `<!doctype html><html lang="en"><meta charset="utf-8"><title>Sealyard, every screen</title>
<style>
body { font: 14px/1.4 sans-serif; margin: 16px; }
nav { display: flex; flex-wrap: wrap; gap: 4px 12px; }
div { display: flex; gap: 12px; overflow-x: auto; align-items: flex-start; }
figure { margin: 0; } img { height: 320px; border: 1px solid #bbb; object-fit: cover; object-position: top; max-width: 480px; }
figcaption { font-size: 12px; }
</style><h1>${pictures.length} pictures</h1><nav>${links.join('')}</nav>${rows.join('\n')}</html>
`;
}

rmSync(folder, { recursive: true, force: true });
mkdirSync(folder);
const browser = await launchBrowser();
const pictures: Picture[] = [];

const product = await startProduct();
for (const person of Object.keys(people) as Person[]) {
  pictures.push(...(await walk(browser, product.base, person, 'much', () => true)));
  if (person !== 'visitor')
    pictures.push(
      ...(await walk(browser, product.base, person, 'none', ({ hasNone, isPublic, name }) => !!hasNone && (!isPublic || name === 'bench'))),
    );
}
await product.stop();

// What a visitor sees of a market in which there is no maker yet.
const data = mkdtempSync(join(tmpdir(), 'sealyard-'));
const bare = await startServer(data, { DEMO_MARKET: 'no' });
pictures.push(...(await walk(browser, bare.base, 'visitor', 'none', ({ hasNone, isPublic }) => !!hasNone && !!isPublic)));
await bare.stop();
rmSync(data, { recursive: true, force: true });

await browser.close();
writeFileSync(join(folder, 'index.html'), index(pictures));
console.log(`${pictures.length} pictures, to be seen in ${folder}/index.html`);
