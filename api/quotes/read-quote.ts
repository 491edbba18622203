import { type QuoteItem, type Quote, type readQuote as readQuoteEndpoint } from '@shared/contracts/quotes';
import { money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { earliestDayOf } from '../orders/earliest-day';
import { type OutboxMail } from '../mail/outbox-store';
import { findQuote, stateOf, todayOf } from './quote-life';
import { type QuoteLineRow, type QuoteListRow } from './quote-store';
import { retailUnitMinor } from './retail';

/**
 * One quote of the caller's own company, with its lines, the sheets they were priced with, the
 * dealer's own prices and the mails that went out.
 *
 * @throws Refusal `not-found`, also for another company's
 */
export function readQuote(
  actor: Member,
  { params }: Pick<Input<typeof readQuoteEndpoint>, 'params'>,
  { stores, clock }: Pick<Dependencies, 'stores' | 'clock'>,
): Quote {
  const quote = findQuote(actor, params.id, stores);
  const version = stores.priceLists.version(quote.priceListVersionId);
  const lines = stores.quotes.linesOf(quote.id).map((line) => lineOnWire(line, quote));
  const retailGoodsMinor = lines.reduce((sum, line) => sum + line.retailMinor, 0);
  return {
    ...quoteOnWire({ ...quote, ...stores.quotes.namesOf(quote.id) }, todayOf(actor, clock())),
    revision: quote.revision,
    priceListVersion: version.version,
    priceList: { name: version.name, effectiveFrom: version.effectiveFrom },
    pricedAt: new Date(quote.pricedAt).toISOString(),
    shipTo: quote.shipToId,
    leadTimeDays: quote.leadTimeDays,
    earliestOn: earliestDayOf(quote.fabricatorId, quote.leadTimeClass, { stores, clock }),
    lines: lines.map(({ onWire }) => onWire),
    ...quote.totals,
    retailGoods: money(retailGoodsMinor, quote.currency),
    mails: stores.outbox.mailsAbout('quote', quote.id).map(mailOnWire),
  };
}

/** A quote as lists show it. `today` is a day of the dealer's. */
export function quoteOnWire(row: QuoteListRow, today: string): QuoteItem {
  return {
    id: row.id,
    number: row.number,
    state: stateOf(row, today),
    tradeAccount: row.tradeAccountId,
    fabricator: { id: row.fabricatorId, name: row.fabricatorName },
    currency: row.currency,
    customer: row.customer,
    markUpPercent: row.markUpPercent,
    notes: row.notes,
    validUntil: row.validUntil,
    createdAt: new Date(row.createdAt).toISOString(),
    updatedAt: new Date(row.updatedAt).toISOString(),
    createdBy: row.createdByName,
    units: row.units,
    total: money(row.totalMinor, row.currency),
    order: row.orderId !== null && row.orderNumber !== null ? { id: row.orderId, number: row.orderNumber } : null,
  };
}

function lineOnWire(row: QuoteLineRow, { currency, markUpPercent }: Pick<QuoteListRow, 'currency' | 'markUpPercent'>) {
  const unitMinor = retailUnitMinor(row.unitPriceMinor, markUpPercent);
  const retailMinor = unitMinor * row.quantity;
  const onWire: Quote['lines'][number] = {
    ...row.sheet,
    id: row.id,
    position: row.position,
    tag: row.tag,
    unit: row.unit,
    quantity: row.quantity,
    extras: row.extras,
    makeUp: row.makeUp,
    retail: { unitPrice: money(unitMinor, currency), linePrice: money(retailMinor, currency) },
  };
  return { onWire, retailMinor };
}

const mailOnWire = (mail: OutboxMail): Quote['mails'][number] => ({
  at: new Date(mail.createdAt).toISOString(),
  to: mail.to,
  prices: mail.attachments[0]?.prices ?? 'retail',
  state: mail.state,
});
