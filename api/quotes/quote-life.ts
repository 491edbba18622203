import { addDays, dayIn } from '@shared/calendar/days';
import { type FieldError, Refusal } from '@shared/contracts/problems';
import { type Member } from '../companies/actor';
import { type Stores } from '../dependencies';
import { type QuoteRow } from './quote-store';

/** Days that prices are held unless the dealer asks for fewer or more. */
export const DAYS_HELD = 30;
/** No quote holds its prices longer than this after it was priced. */
export const LONGEST_DAYS_HELD = 90;
/** Lines in one quote. */
export const MOST_LINES = 500;

type Held = Pick<QuoteRow, 'state' | 'validUntil'>;

/** Whether the held prices no longer bind on a day of the dealer's. An ordered quote does not expire. */
export const hasExpired = ({ state, validUntil }: Held, today: string): boolean => state === 'open' && validUntil < today;

export const stateOf = (quote: Held, today: string): 'open' | 'ordered' | 'expired' => (hasExpired(quote, today) ? 'expired' : quote.state);

/** The quote of the caller's own company. @throws Refusal `not-found`, also for another company's */
export function findQuote(actor: Member, id: string, { quotes }: Pick<Stores, 'quotes'>): QuoteRow {
  const quote = quotes.find(actor.companyId, id);
  if (!quote) throw new Refusal('not-found', 'There is no such quote of yours.');
  return quote;
}

/** @throws Refusal `not-in-this-state` once it is ordered */
export function demandNotOrdered(quote: QuoteRow): void {
  if (quote.state === 'ordered') throw new Refusal('not-in-this-state', `${quote.number} is ordered and no longer changes.`);
}

/** @throws Refusal `changed-meanwhile` unless the caller saw the newest state of the quote */
export function demandRevision(quote: QuoteRow, revision: number): void {
  if (quote.revision === revision) return;
  throw new Refusal('changed-meanwhile', `${quote.number} was changed meanwhile. Load it again.`, [], { revision: quote.revision });
}

/** @throws Refusal `quote-expired` when its prices no longer bind */
export function demandHeld(quote: Pick<QuoteRow, 'state' | 'validUntil' | 'number'>, today: string): void {
  if (!hasExpired(quote, today)) return;
  throw new Refusal('quote-expired', `${quote.number} was valid until ${quote.validUntil}. Re-price it first.`, [], {
    validUntil: quote.validUntil,
  });
}

/**
 * Until when a quote priced on `pricedOn` holds: the day asked for, or the usual number of days.
 *
 * @throws Refusal `invalid` at `/validUntil` for a day that is past or too far off
 */
export function validityOf(asked: string | undefined, pricedOn: string, today: string): string {
  if (asked === undefined) return addDays(pricedOn, DAYS_HELD);
  const latest = addDays(pricedOn, LONGEST_DAYS_HELD);
  const fault = (detail: string): FieldError[] => [{ pointer: '/validUntil', detail }];
  if (asked < today) throw new Refusal('invalid', '/validUntil: is past', fault('is past'));
  if (asked > latest) throw new Refusal('invalid', `/validUntil: prices are held until ${latest} at most`, fault(`${latest} at most`));
  return asked;
}

/** The day it is for a dealer. */
export const todayOf = (actor: Member, now: number): string => dayIn(actor.timeZone, now);
