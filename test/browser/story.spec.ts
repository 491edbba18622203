import { type Browser } from 'playwright-core';
import { cents, type CreditShown, readCreditBar } from './credit-shown';
import { type Product, START_TIMEOUT, startProduct } from './product';
import { DESK, launchBrowser, open, PHONE, sitDown, type Sitting } from './sitting';
import { dispatch, readMail, recordReceipt } from './story-steps';

/**
 * The main job from end to end, as the people do it: by what they read on the screen, once at a
 * desk and once on a phone. The chapters follow from each other.
 */
jest.setTimeout(120_000);

const MAKERS = ['Northmere Sealed Units', 'Kestrel Ford Glassworks', 'Aldersund Glas'];
const ACCOUNT = 'ottery.northmere';

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

describe.each([
  { where: 'at a desk', viewport: DESK, po: 'Desk 4471' },
  { where: 'on a phone', viewport: PHONE, po: 'Phone 4472' },
])('the main job, $where', ({ where, viewport, po }) => {
  const sittings: Sitting[] = [];
  let buyer: Sitting;
  let before: CreditShown;
  let total: number;
  let order: { address: string; number: string };

  const sit = async (email: string | null) => {
    const sitting = await sitDown(browser, product.base, email, { viewport });
    sittings.push(sitting);
    return sitting;
  };
  const credit = () => readCreditBar(buyer.page, MAKERS[0]!, ACCOUNT);

  /** Chapters follow from each other: after one that failed, the others have nothing to go on from. */
  let torn = false;
  const chapter = (name: string, happens: () => Promise<void>) =>
    it(name, async () => {
      if (torn) throw new Error('an earlier chapter failed');
      torn = true;
      try {
        await happens();
        torn = false;
      } finally {
        if (torn) await photograph(`${where}: ${name}`);
      }
    });

  const photograph = async (what: string) => {
    for (const [i, { page }] of sittings.entries()) {
      await page.screenshot({ path: `test-results/${what.replace(/\W+/g, '-')}-${i}.png`, fullPage: true }).catch(() => undefined);
    }
  };
  afterAll(() => Promise.all(sittings.map((sitting) => sitting.close())));

  chapter('a visitor reads how a unit is made and tries the Bench', async () => {
    buyer = await sit(null);
    const { page } = buyer;
    await open(page, '/');
    await page
      .getByRole('link', { name: /how a unit is made/i })
      .first()
      .click();
    await page.getByRole('heading', { level: 1, name: 'How a sealed unit is made' }).waitFor();
    const words = await page.getByRole('main').innerText();
    for (const word of ['spacer', 'desiccant', 'seal', 'argon', 'fog']) expect(words).toContain(word);

    await page.getByRole('navigation', { name: 'Places' }).getByRole('link', { name: 'Bench' }).click();
    await page.getByRole('textbox', { name: 'Width', exact: true }).fill('30 1/2');
    await page.getByRole('textbox', { name: 'Height', exact: true }).fill('45');
    const elevation = page.getByRole('img', { name: 'Elevation' });
    for (const side of ['30 1/2 in', '45 in']) await elevation.getByText(side, { exact: true }).waitFor();
    const offers = page.getByRole('region', { name: 'Offers' });
    for (const maker of MAKERS) await offers.getByText(maker).waitFor();
    expect(await page.getByRole('region', { name: 'Drawings and results' }).innerText()).toMatch(/U-value, EN 673\s+\d\.\d\d/);
  });

  chapter('the buyer signs in from there, and the unit stands as it was left', async () => {
    const { page } = buyer;
    await page.getByRole('link', { name: 'Sign in to see prices on your terms' }).click();
    await page.getByLabel('E-mail').fill('buyer@ottery.example');
    await page.getByLabel('Password').fill('made-to-size');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL(/\/bench\?/);
    expect(await page.getByRole('textbox', { name: 'Width', exact: true }).inputValue()).toBe('30 1/2');
  });

  chapter('types the unit and sees what each of three makers makes of it', async () => {
    const { page } = buyer;
    before = await credit();
    await open(page, '/bench');
    await page.getByRole('textbox', { name: 'Width', exact: true }).fill('36 1/2');
    await page.getByRole('textbox', { name: 'Height', exact: true }).fill('48 1/4');
    await page.getByLabel('How many').fill('6');
    const makeUp = page.getByRole('region', { name: 'Size and make-up' });
    for (const lite of ['lite 1', 'lite 2']) {
      await makeUp.getByRole('button', { name: new RegExp(lite) }).click();
      await page.getByLabel('Glass', { exact: true }).selectOption({ label: 'Clear 3 mm' });
      await page.getByLabel('Treatment').selectOption({ label: 'Tempered' });
    }
    await page.getByLabel('Coating').selectOption({ label: 'Soft low-e, surface 3' });
    await makeUp.getByRole('button', { name: /capillary tube/ }).click();
    await page.getByLabel('Gas').selectOption({ label: 'Argon' });

    const offers = page.getByRole('region', { name: 'Offers' });
    for (const maker of MAKERS) {
      const offer = offers.getByRole('heading', { name: maker });
      await offer
        .getByText(/\$\d|€\s?\d|cannot build it/)
        .first()
        .waitFor();
    }
    const northmere = offers.getByRole('heading', { name: MAKERS[0]! });
    await northmere.getByText('$184.23').waitFor();
    await northmere.getByText('6 for $1,105.38').waitFor();
  });

  chapter('opens the charge sheet and follows a row to its rule', async () => {
    const { page } = buyer;
    const offers = page.getByRole('region', { name: 'Offers' });
    const northmere = offers.getByRole('button', { name: new RegExp(MAKERS[0]!) });
    if ((await northmere.getAttribute('aria-expanded')) !== 'true') await northmere.click();
    const sheet = offers.getByRole('table', { name: /charges for each unit/i });
    // The rows of the worked example, after discount.
    const rows = await sheet.locator('tbody tr').allInnerTexts();
    const nets = rows.map((row) => row.trim().split(/\s+/).at(-1));
    expect(nets).toEqual(['24.38', '24.38', '22.64', '22.64', '15.67', '39.48', '9.09', '6.90', '10.61', '14.14', '−5.70']);

    await sheet.getByRole('button', { name: /argon/i }).click();
    await sheet.getByText(/Rule .+ of .+, in force from/).waitFor();
    await sheet.getByText(/Less 5 %/).waitFor();
  });

  chapter('adds the line by Enter, and two more sizes of the same make-up', async () => {
    const { page } = buyer;
    const offers = page.getByRole('region', { name: 'Offers' });
    const width = page.getByRole('textbox', { name: 'Width', exact: true });
    await page.getByLabel('Tag').fill('Bay, left');
    await page.getByLabel('Tag').press('Enter');
    await offers.getByText(/6 × 36 1\/2 × 48 1\/4.*line 1 of/).waitFor();
    for (const { w, h, many, line } of [
      { w: '24', h: '36', many: '2', line: 2 },
      { w: '30 1/4', h: '60', many: '1', line: 3 },
    ]) {
      await width.fill(w);
      await page.getByRole('textbox', { name: 'Height', exact: true }).fill(h);
      await page.getByLabel('How many').fill(many);
      await page.getByLabel('How many').press('Enter');
      await offers.getByText(new RegExp(`${many} × ${w} × ${h}.*line ${line} of`)).waitFor();
      expect(await width.evaluate((field) => field === document.activeElement)).toBe(true);
    }
  });

  chapter('gives the quote a customer and a mark-up, mails it retail and reads it in the local mailbox', async () => {
    const { page } = buyer;
    await page.getByRole('region', { name: 'Offers' }).getByRole('link', { name: /^Q-/ }).click();
    await page.getByRole('heading', { level: 1, name: /^Quote/ }).waitFor();
    const details = page.getByRole('form', { name: 'For your customer' });
    await details.getByLabel('Customer').fill('Wren Cottage');
    await details.getByLabel('E-mail').fill('wren@cottage.example');
    await details.getByLabel('Mark-up').fill('35');
    await details.getByRole('button', { name: 'Save' }).click();
    await details.getByText('Saved', { exact: false }).waitFor();
    // 184.23 and 35 % on it.
    await page.getByText('248.71').first().waitFor();

    await page.getByRole('button', { name: 'Mail' }).click();
    const dialog = page.getByRole('dialog');
    expect(await dialog.getByLabel('To').inputValue()).toBe('wren@cottage.example');
    expect(await dialog.getByLabel(/^retail/).isChecked()).toBe(true);
    const subject = `${await dialog.getByLabel('Subject').inputValue()}, ${po}`;
    await dialog.getByLabel('Subject').fill(subject);
    await dialog.getByRole('button', { name: 'Send', exact: true }).click();
    await dialog.waitFor({ state: 'hidden' });

    const letter = await readMail(page, subject);
    expect(letter.text).toContain('Wren Cottage');
    expect(letter.attachments).toHaveLength(1);
    expect(letter.attachments[0]!.subarray(0, 5).toString()).toBe('%PDF-');
    expect(letter.attachments[0]!.length).toBeGreaterThan(10_000);
  });

  chapter('orders it with a PO number, and the order is on the credit bar', async () => {
    const { page } = buyer;
    await page.getByRole('link', { name: 'Order', exact: true }).filter({ visible: true }).click();
    await page.getByLabel('Your PO number').fill(po);
    await page.getByLabel('Deliver to').selectOption({ label: 'Workshop, Ottery' });
    await page.getByRole('listitem').filter({ hasText: 'this order' }).waitFor();
    await page.getByRole('button', { name: 'Place the order' }).click();
    await page.getByText('The order is placed.').waitFor();
    const heading = await page.getByRole('heading', { level: 1 }).innerText();
    order = { address: new URL(page.url()).pathname, number: /Order (\S+)/.exec(heading)![1]! };
    total = cents(await page.getByRole('table', { name: 'Totals of the order' }).getByRole('row', { name: /total/i }).last().innerText());

    expect(await credit()).toEqual({ used: before.used, onOrder: before.onOrder + total, free: before.free - total });
  });

  chapter('sales accepts it', async () => {
    const { page } = await sit('sales@northmere.example');
    await page.getByRole('link', { name: order.number }).click();
    await page.getByText(po).first().waitFor();
    await page.getByRole('button', { name: 'Accept' }).click();
    await page.getByRole('button', { name: 'Accept' }).waitFor({ state: 'detached' });
    await open(buyer.page, order.address);
    await buyer.page.getByText('It can be cancelled until production starts.').waitFor();
    expect(await credit()).toEqual({ used: before.used, onOrder: before.onOrder + total, free: before.free - total });
  });

  chapter('plant makes it and dispatches a part', async () => {
    const { page } = await sit('plant@northmere.example');
    await dispatch(page, order.number, [{ tag: 'Bay, left', units: '4' }]);
    const now = await credit();
    expect(now.onOrder).toBeLessThan(before.onOrder + total);
    expect(now.onOrder).toBeGreaterThan(before.onOrder);
    expect(now.used).toBeGreaterThan(before.used);
    expect(now.used + now.onOrder).toBe(before.used + before.onOrder + total);
    expect(now.free).toBe(before.free - total);
  });

  chapter('the clerk sees the invoice with its entries and records the receipt, and the credit is free again', async () => {
    const dispatched = await credit();
    const { page } = await sit('accounts@northmere.example');
    const paid = await recordReceipt(page, order.number);
    expect(paid).toBe(dispatched.used - before.used);
    expect(await credit()).toEqual({ used: before.used, onOrder: dispatched.onOrder, free: dispatched.free + paid });
  });

  chapter('the rest goes out and is paid, and the credit bar is back where it was', async () => {
    const [, , plant, clerk] = [buyer, ...sittings.slice(1)];
    await dispatch(plant!.page, order.number, 'the rest');
    const dispatched = await credit();
    expect(dispatched.onOrder).toBe(before.onOrder);
    expect(dispatched.used).toBeGreaterThan(before.used);
    await recordReceipt(clerk!.page, order.number);
    expect(await credit()).toEqual(before);

    await open(buyer.page, order.address);
    await buyer.page.getByRole('button', { name: 'Confirm delivery' }).click();
    await buyer.page.getByText('The units are delivered.').waitFor();
  });

  it('no page complained', () => {
    expect(sittings.flatMap(({ complaints }) => complaints)).toEqual([]);
  });
});
