import { type Browser, type Locator, type Page } from 'playwright-core';
import { type Product, START_TIMEOUT, startProduct } from './product';
import { launchBrowser, open, sitDown, type Sitting } from './sitting';

/** Nobody touches a pointer here: every step is a key, and one always sees where one is. */
jest.setTimeout(90_000);

let product: Product;
let browser: Browser;
let sitting: Sitting;
beforeAll(async () => {
  product = await startProduct();
  browser = await launchBrowser();
  sitting = await sitDown(browser, product.base, null);
}, START_TIMEOUT);
afterAll(async () => {
  await browser?.close();
  await product?.stop();
});

/** Presses Tab until the target has the focus; each stop on the way must show that it has it. */
async function tabTo(page: Page, target: Locator): Promise<void> {
  await target.waitFor();
  for (let stops = 0; stops < 120; stops++) {
    await page.keyboard.press('Tab');
    const unseen = await page.evaluate(() => {
      const element = document.activeElement;
      if (!element || element === document.body) return null;
      const shows = (each: Element) => {
        const { outlineStyle, outlineWidth } = getComputedStyle(each);
        return outlineStyle !== 'none' && parseFloat(outlineWidth) > 0;
      };
      // Fields of Material show it on the box around them, its checkboxes and buttons on a ring within.
      const box = element.closest('.mat-focused, .mat-mdc-checkbox, .mat-mdc-radio-button, .mdc-button, .mat-mdc-icon-button');
      return shows(element) || box ? null : element.outerHTML.slice(0, 120);
    });
    expect(unseen).toBeNull();
    if (await target.evaluate((element) => element === document.activeElement)) return;
  }
  throw new Error(`Tab does not reach ${target.toString()}`);
}

/** Types over whatever stands in the field that has the focus. */
async function typeOver(page: Page, text: string): Promise<void> {
  await page.keyboard.press('Control+A');
  await page.keyboard.type(text);
}

it('signs in', async () => {
  const { page } = sitting;
  await open(page, '/sign-in?then=/bench');
  await tabTo(page, page.getByLabel('E-mail'));
  await page.keyboard.type('buyer@ottery.example');
  await page.keyboard.press('Tab');
  await page.keyboard.type('made-to-size');
  await page.keyboard.press('Enter');
  await page.waitForURL(/\/bench/);
});

it('skips the head of the page', async () => {
  const { page } = sitting;
  await open(page, '/bench');
  await page.keyboard.press('Tab');
  await page.getByRole('link', { name: 'To the content' }).waitFor();
  await page.keyboard.press('Enter');
  expect(await page.evaluate(() => document.activeElement?.id)).toBe('content');
  expect(new URL(page.url()).pathname).toBe('/bench');
  await page.keyboard.press('Tab');
  expect(await page.getByRole('textbox', { name: 'Width', exact: true }).evaluate((field) => field === document.activeElement)).toBe(true);
});

it('goes from a size to a line of a quote', async () => {
  const { page } = sitting;
  await typeOver(page, '36 1/2');
  await page.keyboard.press('Tab');
  await typeOver(page, '48 1/4');
  await page.keyboard.press('Tab');
  await typeOver(page, '6');
  await page.keyboard.press('Tab');
  await page.keyboard.type('Bay, left');
  await tabTo(page, page.getByLabel('As you would write it'));
  await typeOver(page, '3 temp / 16 argon / 3 low-e 3');

  // The inner lite is tempered layer by layer: down to it, open it, to its treatment, choose.
  await page.keyboard.press('Tab');
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('Enter');
  const treatment = page.getByLabel('Treatment');
  await tabTo(page, treatment);
  await page.keyboard.type('Temp');
  expect(await page.getByLabel('As you would write it').inputValue()).toMatch(/^3 temp.* \/ 16 argon.* \/ 3 temp.* low-e 3$/);

  const offers = page.getByRole('region', { name: 'Offers' });
  await offers.getByRole('heading', { name: 'Northmere Sealed Units' }).getByText('$184.23').waitFor();
  const northmere = offers.getByRole('button', { name: /Northmere Sealed Units/ });
  await tabTo(page, northmere);
  if ((await northmere.getAttribute('aria-expanded')) === 'false') await page.keyboard.press('Enter');
  await page.keyboard.press('Control+Enter');
  await offers.getByText(/6 × 36 1\/2 × 48 1\/4.*line 1 of/).waitFor();

  expect(await page.getByRole('textbox', { name: 'Width', exact: true }).evaluate((field) => field === document.activeElement)).toBe(true);
  await typeOver(page, '24');
  await page.keyboard.press('Tab');
  await typeOver(page, '36');
  await page.keyboard.press('Enter');
  await offers.getByText(/6 × 24 × 36.*line 2 of/).waitFor();
});

it('steps a size by the arrows, and opens and leaves the list of keys', async () => {
  const { page } = sitting;
  const width = page.getByRole('textbox', { name: 'Width', exact: true });
  await width.focus();
  await typeOver(page, '24');
  const becomes = async (text: string) =>
    page.waitForFunction(([field, value]) => (field as HTMLInputElement).value === value, [await width.elementHandle(), text] as const);
  await page.keyboard.press('ArrowUp');
  await becomes('24 1/16');
  await page.keyboard.press('ArrowDown');
  await becomes('24');
  await page.keyboard.press('Shift+ArrowDown');
  await becomes('23');

  const keys = page.getByRole('button', { name: /^Keys/ });
  await tabTo(page, keys);
  await page.keyboard.press('?');
  await page.getByRole('dialog').waitFor();
  await page.keyboard.press('Escape');
  await page.getByRole('dialog').waitFor({ state: 'hidden' });
  expect(await keys.evaluate((button) => button === document.activeElement)).toBe(true);
});

it('changes a line where it stands and moves it', async () => {
  const { page } = sitting;
  const offers = page.getByRole('region', { name: 'Offers' });
  await tabTo(page, offers.getByRole('link', { name: /^Q-/ }));
  await page.keyboard.press('Enter');
  await page.getByRole('heading', { level: 1, name: /^Quote/ }).waitFor();

  const tag = page.getByLabel('Tag of Bay, left');
  await tabTo(page, tag);
  await typeOver(page, 'Bay, right');
  await page.keyboard.press('Enter');
  const renamed = page.getByLabel('Tag of Bay, right');
  await renamed.waitFor();
  const tags = () => page.getByLabel(/^Tag of/).evaluateAll((fields) => fields.map((field) => (field as HTMLInputElement).value));
  expect(await tags()).toEqual(['Bay, right', '']);
  await renamed.focus();
  await page.keyboard.press('Alt+ArrowDown');
  await page.waitForFunction(() => document.querySelector<HTMLInputElement>('[aria-label^="Tag of"]')?.value === '');
  expect(await tags()).toEqual(['', 'Bay, right']);
});

it('places the order', async () => {
  const { page } = sitting;
  await page.evaluate(() => (document.activeElement as HTMLElement).blur());
  await tabTo(page, page.getByRole('link', { name: 'Order', exact: true }).filter({ visible: true }));
  await page.keyboard.press('Enter');
  const po = page.getByLabel('Your PO number');
  await tabTo(page, po);
  await page.keyboard.type('By keys 12');
  await page.keyboard.press('Tab');
  await page.keyboard.type('Yard');
  await tabTo(page, page.getByRole('button', { name: 'Place the order' }));
  await page.keyboard.press('Enter');
  await page.getByText('The order is placed.').waitFor();
  await page.getByText('Yard, east gate').first().waitFor();
});

it('hears no complaint', () => {
  expect(sitting.complaints).toEqual([]);
});
