import { type Browser } from 'playwright-core';
import { type Catalogue } from '@shared/contracts/catalogue';
import { type Evaluation } from '@shared/contracts/evaluation';
import { publicPaths } from '@shared/contracts/catalogue-parts';
import { type Product, START_TIMEOUT, startProduct } from './product';
import { launchBrowser, sitDown, type Sitting } from './sitting';

/** What arrives before any script has run. */
jest.setTimeout(120_000);

let product: Product;
let browser: Browser;
beforeAll(async () => {
  product = await startProduct();
  browser = await launchBrowser();
}, START_TIMEOUT);
afterAll(async () => {
  await browser?.close();
  await product?.stop();
});

const text = (html: string) =>
  html
    .replace(/<(script|style)\b[^]*?<\/\1>/g, ' ')
    .replace(/<[^>]+>/g, ' ')
    .replace(/&nbsp;|\s+/g, ' ');

describe('public pages without scripts', () => {
  let sitting: Sitting;
  beforeAll(async () => (sitting = await sitDown(browser, product.base, null, { javaScriptEnabled: false })));
  afterAll(() => sitting.close());

  it('show their content, each under a title of its own', async () => {
    const catalogue = (await (await fetch(`${product.base}/api/catalogue`)).json()) as Catalogue;
    const paths = publicPaths(catalogue);
    expect(paths.length).toBeGreaterThan(40);
    const titles = new Map<string, string>();
    for (const path of paths) {
      const answer = await sitting.page.goto(path, { waitUntil: 'domcontentloaded' });
      expect({ path, status: answer?.status() }).toEqual({ path, status: 200 });
      const words = (await sitting.page.getByRole('main').innerText()).split(/\s+/).length;
      expect({ path, enough: words > 60, headings: await sitting.page.locator('main h1').count() }).toEqual({
        path,
        enough: true,
        headings: 1,
      });
      titles.set(await sitting.page.title(), path);
    }
    expect(titles.size).toBe(paths.length);
    expect(sitting.complaints).toEqual([]);
  });

  it('lead on by plain links', async () => {
    const { page } = sitting;
    await page.goto('/');
    await page
      .getByRole('link', { name: /how a unit is made/i })
      .first()
      .click();
    await page.getByRole('heading', { level: 1, name: 'How a sealed unit is made' }).waitFor();
    await page.getByRole('navigation', { name: 'Places' }).getByRole('link', { name: 'Bench' }).click();
    await page.getByRole('img', { name: 'Elevation' }).waitFor();
  });

  it('answer 404 where there is nothing, and say so', async () => {
    for (const path of ['/no-such-place', '/catalogue/glass/none-such', '/catalogue/none-such']) {
      const answer = await sitting.page.goto(path);
      expect({ path, status: answer?.status() }).toEqual({ path, status: 404 });
      await sitting.page.getByRole('heading', { level: 1 }).waitFor();
    }
  });
});

describe('the Bench as the server sends it', () => {
  const lites = [
    { glass: 'clear-6', treatment: 'tempered', coating: { id: 'low-e-soft', surface: 2 } },
    { glass: 'clear-4', treatment: 'annealed' },
  ];
  const address = (w: string, h: string) =>
    `/bench?size=${w}x${h}mm&units=3&make=clear-6:tempered:low-e-soft@2,16:krypton:stainless,clear-4:annealed`;

  it.each([
    ['1203', '1507'],
    ['3105', '2404'],
  ])('holds drawing and evaluation of the unit of the address, %s × %s mm', async (width, height) => {
    const html = await (await fetch(`${product.base}${address(width, height)}`)).text();
    const answer = await fetch(`${product.base}/api/units/evaluate`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({ unit: { width, height, lites, cavities: [{ width: '16', gas: 'krypton', spacer: 'stainless' }] } }),
    });
    const evaluation = (await answer.json()) as Evaluation;
    const words = text(html);
    // Visitors read inches until they choose: to the sixteenth, with the millimetres beside.
    const inches = (mm: string) => `${Math.floor(Math.round((Number(mm) / 25.4) * 16) / 16)}`;
    expect(html).toMatch(/<svg[^>]* role="img"/);
    expect(words).toContain(`${width} mm`);
    expect(words).toContain(`${height} mm`);
    expect(words).toMatch(new RegExp(`${inches(width)}( \\d+/\\d+)? in`));
    expect(words).toContain(evaluation.thermal.uEn673!.toFixed(2));
    expect(words).toContain(`${evaluation.weight.toFixed(1)} kg`);
    for (const { fabricator, canBuild } of evaluation.buildability) {
      expect(words).toMatch(new RegExp(`${fabricator.name} (can|cannot) build it`));
      expect(words.includes(`${fabricator.name} can build it`)).toBe(canBuild);
    }
    expect(words).not.toContain('Offers on your terms');
  });
});
