import { type Totals } from '@shared/contracts/prices';
import { Refusal } from '@shared/contracts/problems';
import { type Dependencies } from '../dependencies';
import { type Holding, holdPrices } from './hold-prices';
import { totalsOfQuote } from './price-of-quote';
import { priceQuoteLines } from './price-quote-lines';
import { type QuoteLineRow, type QuoteRow } from './quote-store';

/** A quote as it would be under the list in force now. */
export interface RePriced {
  holding: Holding;
  before: QuoteLineRow[];
  /** the same lines, ids and order, with new prices */
  after: QuoteLineRow[];
  totals: Totals;
}

/**
 * Prices a quote's lines with the list in force now and the account's terms today.
 *
 * @throws Refusal `account-not-open`, `no-price-list`, or `cannot-build` when the maker no longer makes or prices a line
 */
export function rePrice(quote: QuoteRow, dependencies: Dependencies): RePriced {
  const { stores } = dependencies;
  const account = stores.companies.tradeAccount(quote.tradeAccountId);
  if (!account) throw new Error(`no trade account ${quote.tradeAccountId}`);
  if (account.state !== 'open') throw new Refusal('account-not-open', `The trade account with ${account.fabricatorName} is closed.`);
  const holding = holdPrices(account, { shipTo: quote.shipToId, leadTimeClass: quote.leadTimeClass }, dependencies);
  const before = stores.quotes.linesOf(quote.id);
  const asked = before.map(({ unit, quantity, extras, tag }, at) => ({ unit, quantity, extras, tag: tag ?? undefined, at }));
  const prices = priceQuoteLines(asked, quote.fabricatorId, holding, dependencies);
  const after = before.map((line, i) => ({ ...line, ...prices[i] }));
  const held = { ...quote, priceListVersionId: holding.version.version };
  return { holding, before, after, totals: totalsOfQuote(held, after, holding.destination, dependencies) };
}
