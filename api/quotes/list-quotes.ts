import { type AnswerOf } from '@shared/contracts/endpoint';
import { type listQuotes as listQuotesEndpoint } from '@shared/contracts/quotes';
import { type Member } from '../companies/actor';
import { readCursor, toPage } from '../database/cursor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { todayOf } from './quote-life';
import { quoteOnWire } from './read-quote';

/**
 * Quotes of the caller's company, newest first. An open quote shows as expired from the day
 * after `validUntil` in the dealer's time zone.
 *
 * @throws Refusal `invalid` at `/cursor`
 */
export function listQuotes(
  actor: Member,
  { query }: Pick<Input<typeof listQuotesEndpoint>, 'query'>,
  { stores, clock }: Pick<Dependencies, 'stores' | 'clock'>,
): AnswerOf<typeof listQuotesEndpoint> {
  const today = todayOf(actor, clock());
  const filter = { state: query.state, today, q: query.q?.trim(), tradeAccountId: query.tradeAccount };
  const rows = stores.quotes.page(actor.companyId, filter, readCursor(query.cursor, 'number'), query.limit + 1).all();
  return toPage(
    rows,
    query.limit,
    (row) => quoteOnWire(row, today),
    (row) => [row.createdAt, row.id],
  );
}
