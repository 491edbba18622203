import { type Quote, type rePriceQuote as rePriceQuoteEndpoint } from '@shared/contracts/quotes';
import { Refusal } from '@shared/contracts/problems';
import { type Currency } from '@shared/money/currencies';
import { minorOf, money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { demandNotOrdered, demandRevision, findQuote, todayOf, validityOf } from './quote-life';
import { rePrice } from './re-price';
import { readQuote } from './read-quote';

/**
 * Takes the prices in force now, at the total that was shown: any other total is refused with
 * both figures. The quote then holds the new version and terms, with a new validity. An expired
 * quote is open again.
 *
 * @throws Refusal `not-found`, `not-in-this-state` once ordered, `changed-meanwhile`, `price-changed`,
 *   `account-not-open`, `no-price-list`, `cannot-build`, or `invalid` at the field
 */
export function rePriceQuote(
  actor: Member,
  { params, body }: Pick<Input<typeof rePriceQuoteEndpoint>, 'params' | 'body'>,
  dependencies: Dependencies,
): Quote {
  const { database, stores, clock } = dependencies;
  database.immediately(() => {
    const quote = findQuote(actor, params.id, stores);
    demandNotOrdered(quote);
    demandRevision(quote, body.revision);
    const acceptedMinor = acceptedOf(body.accepted, quote.currency);
    const today = todayOf(actor, clock());
    const validUntil = validityOf(body.validUntil, today, today);
    const { holding, after, totals } = rePrice(quote, dependencies);
    const totalMinor = minorOf(totals.total.amount, quote.currency);
    if (totalMinor !== acceptedMinor) {
      throw new Refusal('price-changed', `The total is now ${totals.total.amount} ${quote.currency}, not ${body.accepted}.`, [], {
        shown: money(acceptedMinor, quote.currency),
        now: totals.total,
      });
    }
    stores.quotes.replaceLines(quote.id, after);
    stores.quotes.change(quote.id, {
      priceListVersionId: holding.version.version,
      terms: holding.terms,
      destination: holding.destination,
      leadTimeDays: holding.leadTimeDays,
      pricedAt: clock(),
      totals,
      totalMinor,
      validUntil,
      revision: quote.revision + 1,
      updatedAt: clock(),
    });
    stores.companies.recordChange({
      companyId: actor.companyId,
      personId: actor.personId,
      at: clock(),
      action: 'quote re-priced',
      subjectKind: 'quote',
      subjectId: quote.id,
      before: { priceListVersion: quote.priceListVersionId, totalMinor: quote.totalMinor },
      after: { priceListVersion: holding.version.version, totalMinor },
      reason: null,
    });
  });
  return readQuote(actor, { params }, dependencies);
}

/** @throws Refusal `invalid` at `/accepted` unless it is an amount of the currency */
function acceptedOf(accepted: string, currency: Currency): number {
  try {
    return minorOf(accepted, currency);
  } catch {
    const detail = `an amount in ${currency}, such as ${money(110538, currency).amount}`;
    throw new Refusal('invalid', `/accepted: ${detail}`, [{ pointer: '/accepted', detail }]);
  }
}
