import { type Page } from 'playwright-core';
import { open } from './sitting';

/** A credit bar in figures, in minor units: what is used, what is on order, what is free. */
export interface CreditShown {
  used: number;
  onOrder: number;
  free: number;
}

/** `$1,105.38` in cents. @throws Error for text without an amount */
export function cents(text: string): number {
  const [found] = /-?[\d,]+\.\d\d/.exec(text) ?? [];
  if (found === undefined) throw new Error(`no amount in “${text}”`);
  return Number(found.replace(/[,.]/g, ''));
}

/** What the credit bar of a maker says on the dealer's Money page; held against what the API answers. */
export async function readCreditBar(page: Page, maker: string, tradeAccount: string): Promise<CreditShown> {
  await open(page, '/money');
  const account = page.getByRole('article').filter({ has: page.getByRole('heading', { name: maker }) });
  const figure = async (word: string) => cents(await account.getByRole('listitem').filter({ hasText: word }).innerText());
  const shown = { used: await figure('used'), onOrder: await figure('on order'), free: await figure('free') };
  const answer = await page.request.get(`/api/trade-accounts/${tradeAccount}/credit`);
  const credit = (await answer.json()) as Record<'receivable' | 'unapplied' | 'reserved' | 'available', { amount: string }>;
  expect(shown).toEqual({
    used: cents(credit.receivable.amount) - cents(credit.unapplied.amount),
    onOrder: cents(credit.reserved.amount),
    free: cents(credit.available.amount),
  });
  return shown;
}
