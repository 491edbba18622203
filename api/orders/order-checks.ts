import { type Totals } from '@shared/contracts/prices';
import { Refusal } from '@shared/contracts/problems';
import { type Member } from '../companies/actor';
import { addressOnWire, type TradeAccountRow } from '../companies/company-store';
import { type ShipTo } from '../database/schema/orders';
import { type Dependencies } from '../dependencies';
import { checkUnits } from '../pricing/check-units';
import { demandHeld, demandNotOrdered, findQuote, todayOf } from '../quotes/quote-life';
import { type QuoteLineRow, type QuoteRow } from '../quotes/quote-store';
import { type Maker } from './order-store';

/** What must hold before a quote becomes an order; each refuses with what the dealer can act on. */

/** The dealer's own quote, open, in time and with lines. */
export function orderableQuote(actor: Member, id: string, { stores, clock }: Dependencies): QuoteRow {
  const quote = findQuote(actor, id, stores);
  demandNotOrdered(quote);
  demandHeld(quote, todayOf(actor, clock()));
  if (quote.units === 0) throw new Refusal('not-in-this-state', `${quote.number} has no lines.`);
  return quote;
}

/** The account of a quote or order, which refers to one that exists. */
export function accountOf(id: string, { stores }: Pick<Dependencies, 'stores'>): TradeAccountRow {
  const account = stores.companies.tradeAccount(id);
  if (!account) throw new Error(`no trade account ${id}`);
  return account;
}

export function openAccount(id: string, dependencies: Pick<Dependencies, 'stores'>): TradeAccountRow {
  const account = accountOf(id, dependencies);
  if (account.state !== 'open') throw new Refusal('account-not-open', `The trade account at ${account.fabricatorName} is closed.`);
  return account;
}

/** The address as the order keeps it. */
export function shipToOf(actor: Member, addressId: string, { stores }: Dependencies): ShipTo {
  const address = stores.companies.addressOf(actor.companyId, addressId);
  if (!address) {
    throw new Refusal('invalid', '/shipTo: is not in your ship-to book', [{ pointer: '/shipTo', detail: 'is not in your ship-to book' }]);
  }
  const { exempt: _exempt, ...shipTo } = addressOnWire(address, undefined);
  return shipTo;
}

/**
 * A price that differs from the one the dealer has seen is never slipped in: `accepted` is the
 * total as it was shown, without it the quote's.
 */
export function demandSamePrice(quote: QuoteRow, totals: Totals, accepted: string | undefined): void {
  const shown = { amount: accepted ?? quote.totals.total.amount, currency: quote.currency };
  if (shown.amount === totals.total.amount) return;
  throw new Refusal(
    'price-changed',
    `For this ship-to the total is ${totals.total.amount} ${quote.currency}, not ${shown.amount}. Accept it to order.`,
    [],
    { shown, now: totals.total, totals },
  );
}

/** The maker's limits may have changed since the quote; every reason names its line, from 0. */
export function demandBuildable(lines: readonly QuoteLineRow[], maker: Maker, { catalogue }: Pick<Dependencies, 'catalogue'>): void {
  const current = catalogue();
  const fabricator = current.fabricators.find(({ id }) => id === maker.id);
  if (!fabricator) throw new Error(`no fabricator ${maker.id} in the catalogue`);
  const checked = checkUnits(
    lines.map(({ unit }) => unit),
    current,
  );
  const reasons = checked.flatMap((unit, line) => unit.reasonsAt(fabricator).map((reason) => ({ line, ...reason })));
  const [first] = reasons;
  if (!first) return;
  throw new Refusal('cannot-build', `${maker.name} can no longer build line ${first.line + 1}: ${first.detail}`, [], { reasons });
}
