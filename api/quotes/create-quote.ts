import { type createQuote as createQuoteEndpoint, type Quote } from '@shared/contracts/quotes';
import { minorOf } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { findOpenAccount } from '../pricing/find-open-account';
import { holdPrices } from './hold-prices';
import { totalsOfQuote } from './price-of-quote';
import { priceQuoteLines } from './price-quote-lines';
import { todayOf, validityOf } from './quote-life';
import { readQuote } from './read-quote';

/**
 * Makes a quote at one trade account with the list in force now. It keeps the version, terms,
 * destination and charge sheets; its prices hold until `validUntil`.
 *
 * @throws Refusal `not-found` for an account that is not the dealer's, `account-not-open`, `no-price-list`,
 *   `cannot-build` with the reasons, or `invalid` at the field
 */
export function createQuote(actor: Member, { body }: Pick<Input<typeof createQuoteEndpoint>, 'body'>, dependencies: Dependencies): Quote {
  const { database, stores, clock, newId } = dependencies;
  const id = newId();
  database.immediately(() => {
    const now = clock();
    const today = todayOf(actor, now);
    const account = findOpenAccount(actor, body.tradeAccount, stores);
    const validUntil = validityOf(body.validUntil, today, today);
    const holding = holdPrices(account, { shipTo: body.shipTo ?? null, leadTimeClass: null }, dependencies);
    const lines = priceQuoteLines(
      body.lines.map((line, at) => ({ ...line, at })),
      account.fabricatorId,
      holding,
      dependencies,
    );
    const held = { priceListVersionId: holding.version.version, leadTimeClass: null, currency: account.currency };
    const totals = totalsOfQuote(held, lines, holding.destination, dependencies);
    const year = today.slice(0, 4);
    const sequence = stores.numbers.next(actor.companyId, `quote ${year}`);

    stores.quotes.insert({
      ...held,
      id,
      number: `Q-${year}-${String(sequence).padStart(4, '0')}`,
      dealerId: actor.companyId,
      fabricatorId: account.fabricatorId,
      tradeAccountId: account.id,
      state: 'open',
      customer: body.customer ?? null,
      customerName: body.customer?.name ?? '',
      markUpPercent: body.markUpPercent ?? '0',
      notes: body.notes ?? '',
      validUntil,
      shipToId: body.shipTo ?? null,
      leadTimeDays: holding.leadTimeDays,
      terms: holding.terms,
      destination: holding.destination,
      pricedAt: now,
      totals,
      totalMinor: minorOf(totals.total.amount, account.currency),
      units: lines.reduce((sum, { quantity }) => sum + quantity, 0),
      revision: 1,
      createdAt: now,
      updatedAt: now,
      createdBy: actor.personId,
    });
    stores.quotes.addLines(lines.map((line, i) => ({ ...line, id: newId(), quoteId: id, position: i + 1 })));
  });
  return readQuote(actor, { params: { id } }, dependencies);
}
