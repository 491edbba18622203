import { dayIn } from '@shared/calendar/days';
import { type changeQuote as changeQuoteEndpoint, type Quote } from '@shared/contracts/quotes';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { destinationOf } from '../pricing/destination-of';
import { nextState } from './next-state';
import { demandHeld, demandNotOrdered, demandRevision, findQuote, todayOf, validityOf } from './quote-life';
import { type QuoteRow } from './quote-store';
import { readQuote } from './read-quote';

type Change = Input<typeof changeQuoteEndpoint>['body'];

/**
 * Changes what stands around the lines. Agreed unit prices stay; with another ship-to, delivery
 * and tax follow it under the version that the quote holds. An expired quote gets a new validity
 * only by being re-priced.
 *
 * @throws Refusal `not-found`, `not-in-this-state` once ordered, `changed-meanwhile`, `quote-expired`, or
 *   `invalid` at the field
 */
export function changeQuote(
  actor: Member,
  { params, body }: Pick<Input<typeof changeQuoteEndpoint>, 'params' | 'body'>,
  dependencies: Dependencies,
): Quote {
  const { database, stores, clock } = dependencies;
  database.immediately(() => {
    const quote = findQuote(actor, params.id, stores);
    demandNotOrdered(quote);
    demandRevision(quote, body.revision);
    const { customer, markUpPercent, notes } = body;
    stores.quotes.change(quote.id, {
      revision: quote.revision + 1,
      updatedAt: clock(),
      ...(customer === undefined ? {} : { customer, customerName: customer?.name ?? '' }),
      ...(markUpPercent === undefined ? {} : { markUpPercent }),
      ...(notes === undefined ? {} : { notes }),
      ...validity(actor, quote, body, clock()),
      ...shipTo(actor, quote, body, dependencies),
    });
  });
  return readQuote(actor, { params }, dependencies);
}

function validity(actor: Member, quote: QuoteRow, { validUntil }: Change, now: number): Partial<QuoteRow> {
  if (validUntil === undefined || validUntil === quote.validUntil) return {};
  const today = todayOf(actor, now);
  demandHeld(quote, today);
  return { validUntil: validityOf(validUntil, dayIn(actor.timeZone, quote.pricedAt), today) };
}

function shipTo(actor: Member, quote: QuoteRow, change: Change, dependencies: Dependencies): Partial<QuoteRow> {
  if (change.shipTo === undefined || change.shipTo === quote.shipToId) return {};
  const { stores, clock } = dependencies;
  const maker = stores.companies.company(quote.fabricatorId);
  if (!maker) throw new Error(`no company ${quote.fabricatorId}`);
  const destination = destinationOf(actor.companyId, change.shipTo, dayIn(maker.timeZone, clock()), stores);
  return { shipToId: change.shipTo, ...nextState(quote, stores.quotes.linesOf(quote.id), destination, dependencies) };
}
