import lighthouse from 'lighthouse';
import { type Browser, type Page } from 'playwright-core';
import { findingsOn } from '../browser/findings';
import { startProduct } from '../browser/product';
import { people, type Person, screensToCheck } from '../browser/screens';
import { freePort } from '../browser/server-process';
import { launchBrowser, open, sitDown } from '../browser/sitting';
import { type Measure, median } from './measure';

/** The typing pause of the Bench before it asks for a price, ms. */
const PAUSE = 150;
const KEYS = 20;
const RUNS = 3;
const example = '/bench?size=36.5x48.25in&units=6&make=clear-3:tempered,16:argon:stainless,clear-3:tempered:low-e-soft@3';

/** What only a browser can tell: how quick a price follows a key, Lighthouse, and what axe finds. */
export async function measureBrowser(): Promise<Measure[]> {
  const product = await startProduct();
  try {
    return [
      await keyToPrice(product.base),
      await scores(product.base, '/catalogue'),
      await scores(product.base, '/bench'),
      await axe(product.base),
    ];
  } finally {
    await product.stop();
  }
}

async function inBrowser<T>(use: (browser: Browser) => Promise<T>, flags: string[] = []): Promise<T> {
  const browser = await launchBrowser(flags);
  try {
    return await use(browser);
  } finally {
    await browser.close();
  }
}

/** From the key's own time stamp to the frame after the one in which all offers are current again. */
async function keyToPrice(base: string): Promise<Measure> {
  return inBrowser(async (browser) => {
    const { page } = await sitDown(browser, base, 'buyer@ottery.example');
    await open(page, example);
    await page.getByRole('region', { name: 'Offers' }).getByText('$184.23').waitFor();
    const width = page.getByRole('textbox', { name: 'Width', exact: true });
    await width.press('End');
    const times: number[] = [];
    for (let key = 0; key < KEYS; key++) {
      const priced = nextPrice(page);
      await width.press('ArrowUp');
      times.push(await priced);
      await page.waitForTimeout(300);
    }
    const beyond = median(times) - PAUSE;
    return {
      measure: 'key to new price in the browser, beyond the typing pause',
      ratio: `${beyond.toFixed(0)} ms`,
      toReach: '≤ 100 ms',
      reached: beyond <= 100,
      detail: `median of ${KEYS} keys on the Bench as a buyer with three makers, from the key to the frame with the new prices, less the pause of ${PAUSE} ms; longest ${(Math.max(...times) - PAUSE).toFixed(0)} ms`,
    };
  });
}

/** Milliseconds from the next key to the next time that the offers have been busy and are so no longer. */
function nextPrice(page: Page): Promise<number> {
  return page.evaluate(
    () =>
      new Promise<number>((resolve) => {
        let pressed = 0;
        let busy = false;
        addEventListener('keydown', ({ timeStamp }) => (pressed = timeStamp), { capture: true, once: true });
        const offers = document.querySelector('section[aria-label="Offers"] [aria-busy]')!;
        const watch = new MutationObserver(() => {
          const now = offers.getAttribute('aria-busy') === 'true';
          if (busy && !now) {
            watch.disconnect();
            requestAnimationFrame(() => requestAnimationFrame(() => resolve(performance.now() - pressed)));
          }
          busy ||= now;
        });
        watch.observe(offers, { attributes: true, attributeFilter: ['aria-busy'] });
      }),
  );
}

const categories = ['performance', 'accessibility', 'best-practices', 'seo'] as const;

/** Lighthouse with its own defaults: a mid-range phone on slow 4G, simulated. */
async function scores(base: string, path: string): Promise<Measure> {
  const port = await freePort();
  return inBrowser(async () => {
    const found = categories.map(() => [] as number[]);
    let version = '';
    for (let run = 0; run < RUNS; run++) {
      const result = await lighthouse(base + path, { port, output: 'json', logLevel: 'error', onlyCategories: [...categories] });
      if (!result) throw new Error(`Lighthouse has no result for ${path}`);
      version = result.lhr.lighthouseVersion;
      categories.forEach((category, i) => found[i]!.push(Math.round((result.lhr.categories[category]?.score ?? 0) * 100)));
    }
    const middles = found.map(median);
    return {
      measure: `Lighthouse on ${path}: ${categories.join(' / ')}`,
      ratio: middles.join(' / '),
      toReach: 'each ≥ 95',
      reached: middles.every((score) => score >= 95),
      detail: `median of ${RUNS} runs of Lighthouse ${version} with its defaults, a phone on slow 4G, against the built product`,
    };
  }, [`--remote-debugging-port=${port}`]);
}

async function axe(base: string): Promise<Measure> {
  return inBrowser(async (browser) => {
    const found: string[] = [];
    let seen = 0;
    for (const person of Object.keys(people) as Person[]) {
      const { page, close } = await sitDown(browser, base, people[person]);
      for (const screen of screensToCheck(person)) {
        seen += 1;
        found.push(...(await findingsOn(page, screen)).map((finding) => `${screen.name} as ${person}: ${finding}`));
      }
      await close();
    }
    for (const finding of found) console.error(finding);
    return {
      measure: 'axe on every screen, light and dark, desk and phone',
      ratio: `${found.length} findings`,
      toReach: 'no finding',
      reached: found.length === 0,
      detail: `${seen} screens as the people who see them; WCAG 2.2 A and AA; pages wider than 320 or 390 px count as findings`,
    };
  });
}
