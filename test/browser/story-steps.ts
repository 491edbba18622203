import { type Page } from 'playwright-core';
import { cents } from './credit-shown';
import { open } from './sitting';

export interface Letter {
  text: string;
  attachments: Buffer[];
}

/** Opens the local mailbox in another tab until a mail with this subject is there, and reads it with what is attached. */
export async function readMail(beside: Page, subject: string): Promise<Letter> {
  const page = await beside.context().newPage();
  const link = page.getByRole('link', { name: subject });
  for (let tries = 0; ; tries++) {
    await page.goto('/local/mail');
    if ((await link.count()) > 0) break;
    if (tries >= 60) throw new Error(`no mail “${subject}” came in half a minute`);
    await page.waitForTimeout(500);
  }
  await link.click();
  await page.getByRole('heading', { name: subject }).waitFor();
  const addresses = await page
    .getByRole('list', { name: 'Attachments' })
    .getByRole('link')
    .evaluateAll((links) => links.map((each) => (each as HTMLAnchorElement).href));
  const attachments = await Promise.all(addresses.map(async (address) => (await page.request.get(address)).body()));
  const text = await page.getByRole('main').innerText();
  await page.close();
  return { text, attachments };
}

/** Plant finds an order, starts its production where that is still to do, packs and sends out. */
export async function dispatch(page: Page, orderNumber: string, what: { tag: string; units: string }[] | 'the rest'): Promise<void> {
  await open(page, '/plant');
  await page.getByLabel('Order, dealer or PO').fill(orderNumber);
  await page.getByRole('link', { name: orderNumber }).click();
  await page.getByRole('heading', { level: 1, name: orderNumber }).waitFor();
  const start = page.getByRole('button', { name: 'Start production' });
  if (await start.isVisible()) {
    await start.click();
    await start.waitFor({ state: 'detached' });
  }
  if (what === 'the rest') await page.getByRole('checkbox', { name: 'Tick all' }).check();
  else {
    for (const { tag, units } of what) {
      const line = page.getByRole('group', { name: tag });
      await line.getByRole('checkbox').check();
      await line.getByRole('textbox').fill(units);
    }
  }
  const go = /^Dispatch \d+ units?$/;
  await page.getByRole('button', { name: go }).click();
  await page.getByRole('dialog').getByRole('button', { name: go }).click();
  await page.getByText(/^Dispatched as/).waitFor();
}

/**
 * The clerk goes from the order to its open invoice, reads that its entry balances, and records
 * that all of it was paid. @returns what was paid, in minor units
 */
export async function recordReceipt(page: Page, orderNumber: string): Promise<number> {
  await open(page, '/orders');
  await page.getByRole('link', { name: orderNumber }).click();
  await page
    .getByRole('link', { name: /^Invoice / })
    .last()
    .click();
  await page.getByRole('heading', { level: 1, name: /^Invoice / }).waitFor();
  const invoice = new URL(page.url()).pathname;
  const entries = page.getByRole('region', { name: 'Ledger entries' });
  await entries.getByText('receivable').first().waitFor();
  // Debit and credit are the last two columns; an empty cell is nothing.
  const postings = await entries
    .locator('tbody tr')
    .evaluateAll((rows) => rows.map((row) => [...row.querySelectorAll('td')].slice(-2).map((cell) => cell.innerText.trim())));
  const sum = (column: 0 | 1) => postings.reduce((total, cells) => total + (cells[column] ? cents(cells[column]) : 0), 0);
  expect(sum(0)).toBe(sum(1));
  expect(sum(0)).toBeGreaterThan(0);

  await page.getByRole('link', { name: 'Record a receipt' }).click();
  const amount = page.getByLabel(/^Amount/);
  await page.waitForFunction((field) => (field as HTMLInputElement).value !== '', await amount.elementHandle());
  const paid = cents(await amount.inputValue());
  await page.getByRole('button', { name: 'Record receipt' }).click();
  await page.getByRole('heading', { level: 1, name: /^Receipt / }).waitFor();

  await open(page, invoice);
  await page.getByText('paid', { exact: true }).first().waitFor();
  return paid;
}
