import { isDeepStrictEqual } from 'node:util';
import { type changeQuoteLines as changeQuoteLinesEndpoint, type Quote } from '@shared/contracts/quotes';
import { pointer, Refusal } from '@shared/contracts/problems';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { nextState } from './next-state';
import { type LineAsked, priceQuoteLines } from './price-quote-lines';
import { demandHeld, demandNotOrdered, demandRevision, findQuote, todayOf } from './quote-life';
import { type QuoteLineRow } from './quote-store';
import { readQuote } from './read-quote';

type Asked = Input<typeof changeQuoteLinesEndpoint>['body']['lines'];

/**
 * Puts the whole list of lines in its new order. A line that names its id and is the same in
 * unit, quantity and extras keeps its sheet to the letter; any other is priced with the version
 * and terms that the quote holds; so is a line put back, which gives the price it had.
 *
 * @throws Refusal `not-found`, `not-in-this-state` once ordered, `changed-meanwhile`, `quote-expired` when a
 *   line needs a price, `cannot-build`, or `invalid` at the field
 */
export function changeQuoteLines(
  actor: Member,
  { params, body }: Pick<Input<typeof changeQuoteLinesEndpoint>, 'params' | 'body'>,
  dependencies: Dependencies,
): Quote {
  const { database, stores, clock, newId } = dependencies;
  database.immediately(() => {
    const quote = findQuote(actor, params.id, stores);
    demandNotOrdered(quote);
    demandRevision(quote, body.revision);
    const had = new Map(stores.quotes.linesOf(quote.id).map((line) => [line.id, line]));
    demandOwnLines(body.lines, had);

    const toPrice: LineAsked[] = body.lines
      .map((line, at) => ({ ...line, at }))
      .filter((line) => !isUnchanged(line, had.get(line.id ?? '')));
    if (toPrice.length > 0) demandHeld(quote, todayOf(actor, clock()));
    const held = { version: stores.priceLists.version(quote.priceListVersionId), terms: quote.terms };
    const prices = priceQuoteLines(toPrice, quote.fabricatorId, held, dependencies);
    const priced = new Map(toPrice.map(({ at }, i) => [at, prices[i]]));

    const lines = body.lines.flatMap((line, i): QuoteLineRow[] => {
      const before = had.get(line.id ?? '');
      const content = priced.get(i) ?? before;
      return content ? [{ ...content, id: before?.id ?? newId(), quoteId: quote.id, position: i + 1, tag: line.tag ?? null }] : [];
    });
    stores.quotes.replaceLines(quote.id, lines);
    stores.quotes.change(quote.id, nextState(quote, lines, quote.destination, dependencies));
  });
  return readQuote(actor, { params }, dependencies);
}

function isUnchanged(asked: Asked[number], kept: QuoteLineRow | undefined): boolean {
  if (!kept) return false;
  return asked.quantity === kept.quantity && isDeepStrictEqual(asked.unit, kept.unit) && isDeepStrictEqual(asked.extras ?? [], kept.extras);
}

/** Each id names one line of the quote, once. */
function demandOwnLines(lines: Asked, had: ReadonlyMap<string, QuoteLineRow>): void {
  const seen = new Set<string>();
  const errors = lines.flatMap(({ id }, i) => {
    if (id === undefined) return [];
    const fault = seen.has(id) ? 'is named twice; leave it out for a copy' : had.has(id) ? null : 'is not a line of this quote';
    seen.add(id);
    return fault === null ? [] : [{ pointer: pointer('lines', i, 'id'), detail: fault }];
  });
  if (errors.length > 0) throw new Refusal('invalid', `${errors[0]?.pointer}: ${errors[0]?.detail}`, errors);
}
