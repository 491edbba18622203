import { type Browser, type Page, type Route } from 'playwright-core';
import { type Product, START_TIMEOUT, startProduct } from './product';
import { launchBrowser, open, sitDown, type Sitting } from './sitting';

/** What the Bench shows while things change under it: the address, the price, the network. */
jest.setTimeout(60_000);

const example = '/bench?size=36.5x48.25in&units=6&make=clear-3:tempered,16:argon:stainless,clear-3:tempered:low-e-soft@3';

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

const width = (page: Page) => page.getByRole('textbox', { name: 'Width', exact: true });
const offers = (page: Page) => page.getByRole('region', { name: 'Offers' });
const northmere = (page: Page) => offers(page).getByRole('heading', { name: 'Northmere Sealed Units' });
const amounts = (text: string) => text.match(/[$€][\d,]+\.\d\d/g) ?? [];

describe('the address of the Bench', () => {
  let sitting: Sitting;
  beforeAll(async () => (sitting = await sitDown(browser, product.base, null)));
  afterAll(() => sitting.close());

  it('follows what is typed, and a reload brings the unit back', async () => {
    const { page } = sitting;
    await open(page, '/bench');
    await width(page).fill('27 3/8');
    await page.getByRole('textbox', { name: 'Height', exact: true }).fill('51 1/16');
    await page.getByLabel('How many').fill('4');
    await page.getByLabel('Tag').fill('Stair, “top” & left');
    await page.getByLabel('As you would write it').fill('4 temp / 12 krypton / 4 / 12 krypton / 4 temp low-e 5');
    await page.waitForURL(
      (url) => url.search.includes('27.375x51.0625in') && url.search.includes('krypton') && url.search.includes('units=4'),
    );
    const fields = () => page.getByRole('textbox').evaluateAll((all) => all.map((field) => (field as HTMLInputElement).value));
    const section = () => page.getByRole('img', { name: 'Section through the edge' }).locator('desc').textContent();
    const [typed, drawn] = [await fields(), await section()];
    await page.reload();
    await page.waitForFunction(() => document.querySelector('[ngh]') === null);
    expect(await fields()).toEqual(typed);
    expect(await section()).toBe(drawn);
    expect(typed.slice(0, 4)).toEqual(['27 3/8', '51 1/16', '4', 'Stair, “top” & left']);
  });

  it('brings a shared link to the same unit in another browser', async () => {
    const other = await sitDown(browser, product.base, null);
    await open(other.page, sitting.page.url());
    expect(await width(other.page).inputValue()).toBe('27 3/8');
    expect(await other.page.getByLabel('As you would write it').inputValue()).toBe(
      await sitting.page.getByLabel('As you would write it').inputValue(),
    );
    await other.close();
  });

  it('goes back over what was chosen, and keeps the unit on the way through another page', async () => {
    const { page } = sitting;
    await open(page, example);
    await page.getByRole('button', { name: /capillary tube/ }).click();
    const gas = page.getByLabel('Gas');
    await gas.selectOption({ label: 'Krypton' });
    await page.waitForURL(/krypton/);
    await page.goBack();
    await page.waitForURL(/argon/);
    await page.waitForFunction(
      (field) => (field as HTMLInputElement).value.includes('argon'),
      await page.getByLabel('As you would write it').elementHandle(),
    );

    await page.getByRole('link', { name: 'Catalogue' }).first().click();
    await page.waitForURL(/catalogue/);
    await page.goBack();
    await page.waitForURL(/argon/);
    expect(await width(page).inputValue()).toBe('36 1/2');
  });

  it('says what of a link it cannot use, and takes the rest', async () => {
    const { page } = sitting;
    await open(page, '/bench?size=20x30in&units=0&make=clear-3:tempered,16:helium:stainless,clear-3:tempered');
    await page.getByText(/Of the address this could not be used/).waitFor();
    expect(await width(page).inputValue()).toBe('20');
    expect(sitting.complaints).toEqual([]);
  });
});

describe('a slow line', () => {
  /** From now on, code of pages that were not seen yet takes its time. */
  const slow = (page: Page) =>
    page.route('**/*.js', async (route) => {
      await new Promise((resolve) => setTimeout(resolve, 1200));
      await route.continue();
    });

  it('lets one leave the Bench right after a key, and come back to the unit signed in', async () => {
    const { page, close } = await sitDown(browser, product.base, null);
    await open(page, '/bench');
    await width(page).fill('30 1/2');
    await slow(page);
    await page.getByRole('link', { name: 'Sign in to see prices on your terms' }).click();
    await page.getByLabel('E-mail').fill('buyer@ottery.example');
    await page.getByLabel('Password').fill('made-to-size');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL(/\/bench\?/);
    expect(await width(page).inputValue()).toBe('30 1/2');
    await close();
  });

  it('lets one open a thing right after typing a part of its number', async () => {
    const { page, close } = await sitDown(browser, product.base, 'buyer@ottery.example');
    await open(page, '/orders');
    const order = page.getByRole('table', { name: 'Orders' }).getByRole('link').first();
    const number = await order.innerText();
    await slow(page);
    await page.getByRole('searchbox').fill(number.slice(0, 4));
    await order.click();
    await page.getByRole('heading', { level: 1, name: `Order ${number}` }).waitFor();
    await close();
  });
});

describe('the price on the Bench', () => {
  let sitting: Sitting;
  beforeEach(async () => {
    sitting = await sitDown(browser, product.base, 'buyer@ottery.example');
    await open(sitting.page, example);
    await northmere(sitting.page).getByText('$184.23').waitFor();
  });
  afterEach(() => sitting.close());

  /** Keeps every text that the offers showed from now on. */
  const record = (page: Page) =>
    offers(page).evaluate((region) => {
      const shown: string[] = [];
      const note = () => shown.push((region as HTMLElement).innerText);
      new MutationObserver(note).observe(region, { subtree: true, childList: true, characterData: true, attributes: true });
      (window as unknown as { shown: string[] }).shown = shown;
    });
  const recorded = (page: Page) => page.evaluate(() => (window as unknown as { shown: string[] }).shown);

  it('is gone from the first key that makes it stale', async () => {
    const { page } = sitting;
    await page.route('**/api/prices', async (route: Route) => {
      await new Promise((resolve) => setTimeout(resolve, 1500));
      await route.continue();
    });
    await record(page);
    await width(page).press('ControlOrMeta+A');
    await width(page).pressSequentially('50');
    await offers(page).getByText('pricing…').first().waitFor();
    const meanwhile = await offers(page).innerText();
    // The credit line is not a price; everything above it is.
    expect(amounts(meanwhile.split('Credit at')[0]!)).toEqual([]);
    await northmere(page)
      .getByText(/^\$[\d,.]+$/)
      .waitFor();
    expect((await recorded(page)).filter((text) => text.includes('$184.23'))).toEqual([]);
  });

  it('is never that of a size typed over, however late it comes', async () => {
    const { page } = sitting;
    const asked: string[] = [];
    await page.route('**/api/prices', async (route: Route) => {
      const [line] = (route.request().postDataJSON() as { lines: { unit: { width: string } }[] }).lines;
      asked.push(line!.unit.width);
      if (asked.length === 1) await new Promise((resolve) => setTimeout(resolve, 1200));
      await route.continue().catch(() => undefined);
    });
    const price = async (size: string) => {
      const answer = await page.request.post('/api/prices', {
        headers: { 'X-XSRF-TOKEN': await token(page) },
        data: {
          lines: [
            {
              quantity: 6,
              unit: {
                width: size,
                height: '1225.55',
                lites: [
                  { glass: 'clear-3', treatment: 'tempered' },
                  { glass: 'clear-3', treatment: 'tempered', coating: { id: 'low-e-soft', surface: 3 } },
                ],
                cavities: [{ width: '16', gas: 'argon', spacer: 'stainless' }],
              },
            },
          ],
        },
      });
      const { offers } = (await answer.json()) as {
        offers: { fabricator: { name: string }; lines: { unitPrice: { amount: string } }[] }[];
      };
      return offers.find(({ fabricator }) => fabricator.name.startsWith('Northmere'))!.lines[0]!.unitPrice.amount;
    };
    const [first, second] = [await price('1016'), await price('1270')];
    expect(first).not.toBe(second);

    await record(page);
    await width(page).fill('40');
    await page.waitForTimeout(400);
    await width(page).fill('50');
    await northmere(page).getByText(`$${second}`).waitFor();
    await page.waitForTimeout(1200);
    expect(asked).toEqual(['1016', '1270']);
    expect(await northmere(page).innerText()).toContain(`$${second}`);
    expect((await recorded(page)).filter((text) => text.includes(`$${first}`))).toEqual([]);
  });

  it('says so when it cannot be had, and comes when tried again', async () => {
    const { page } = sitting;
    await page.route('**/api/prices', (route) =>
      route.fulfill({
        status: 503,
        contentType: 'application/problem+json',
        body: JSON.stringify({ type: 'about:blank', title: 'Busy', status: 503, detail: 'The prices are busy.' }),
      }),
    );
    await width(page).fill('38');
    const alert = offers(page).getByRole('alert');
    await alert.getByText('No price.').waitFor();
    expect(amounts((await offers(page).innerText()).split('Credit at')[0]!)).toEqual([]);
    await page.unroute('**/api/prices');
    await alert.getByRole('button', { name: 'Try again' }).click();
    await northmere(page)
      .getByText(/^\$[\d,.]+$/)
      .waitFor();
    await alert.waitFor({ state: 'detached' });
  });

  it('waits for the network and comes with it; the draft stays and is drawn all the same', async () => {
    const { page } = sitting;
    await page.context().setOffline(true);
    await width(page).fill('41 1/4');
    await page.getByRole('img', { name: 'Elevation' }).getByText('41 1/4 in', { exact: true }).waitFor();
    await offers(page).getByText('No price.').waitFor();

    await page.getByRole('button', { name: /^Add to quote/ }).click();
    await offers(page).getByText('The line was not added.').waitFor();
    expect(await width(page).inputValue()).toBe('41 1/4');
    expect(await page.getByLabel('How many').inputValue()).toBe('6');

    await page.context().setOffline(false);
    await northmere(page)
      .getByText(/^\$[\d,.]+$/)
      .waitFor();
    expect(await width(page).inputValue()).toBe('41 1/4');
  });
});

/** Value of the readable cookie that a state-changing call has to repeat. */
async function token(page: Page): Promise<string> {
  return (await page.context().cookies()).find(({ name }) => name === 'XSRF-TOKEN')?.value ?? '';
}
