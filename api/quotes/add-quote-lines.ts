import { type addQuoteLines as addQuoteLinesEndpoint, type Quote } from '@shared/contracts/quotes';
import { Refusal } from '@shared/contracts/problems';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { nextState } from './next-state';
import { priceQuoteLines } from './price-quote-lines';
import { demandHeld, demandNotOrdered, findQuote, MOST_LINES, todayOf } from './quote-life';
import { readQuote } from './read-quote';

/**
 * Appends lines, priced with the version and terms that the quote holds. Two people adding at
 * once both succeed: nothing of the other's is touched.
 *
 * @throws Refusal `not-found`, `not-in-this-state` once ordered, `quote-expired`, `cannot-build`, or
 *   `invalid` at the field
 */
export function addQuoteLines(
  actor: Member,
  { params, body }: Pick<Input<typeof addQuoteLinesEndpoint>, 'params' | 'body'>,
  dependencies: Dependencies,
): Quote {
  const { database, stores, clock, newId } = dependencies;
  database.immediately(() => {
    const quote = findQuote(actor, params.id, stores);
    demandNotOrdered(quote);
    demandHeld(quote, todayOf(actor, clock()));
    const kept = stores.quotes.linesOf(quote.id);
    if (kept.length + body.lines.length > MOST_LINES) {
      const detail = `a quote has at most ${MOST_LINES} lines, and this one has ${kept.length}`;
      throw new Refusal('invalid', `/lines: ${detail}`, [{ pointer: '/lines', detail }]);
    }
    const held = { version: stores.priceLists.version(quote.priceListVersionId), terms: quote.terms };
    const added = priceQuoteLines(
      body.lines.map((line, at) => ({ ...line, at })),
      quote.fabricatorId,
      held,
      dependencies,
    ).map((line, i) => ({ ...line, id: newId(), quoteId: quote.id, position: kept.length + i + 1 }));
    stores.quotes.addLines(added);
    stores.quotes.change(quote.id, nextState(quote, [...kept, ...added], quote.destination, dependencies));
  });
  return readQuote(actor, { params }, dependencies);
}
