import { type Credit } from '@shared/contracts/trade-accounts';
import { Exact, exact } from '@shared/money/exact';
import { type Money, money, minorOf } from '@shared/money/money';

/** How a limit is taken up; the shares are percentages of the bar's length and sum to 100. */
export interface CreditShares {
  /** open receivables less unapplied cash, not below nothing */
  used: Money;
  /** orders placed and not yet invoiced */
  reserved: Money;
  /** limit less exposure less what is to be added; below zero when over the limit */
  free: Money;
  over: boolean;
  share: { used: string; reserved: string; adding: string; free: string };
}

/**
 * The parts of a credit bar. Unapplied cash lessens what is used, and what is left of it lessens
 * what is reserved. Where everything together passes the limit, the bar is as long as the whole.
 *
 * @param adding an order that is about to be placed, in the same currency
 */
export function creditShares(credit: Credit, adding?: Money): CreditShares {
  const { currency } = credit.limit;
  const minor = ({ amount }: Money) => minorOf(amount, currency);
  const owed = minor(credit.receivable) - minor(credit.unapplied);
  const used = Math.max(0, owed);
  const reserved = Math.max(0, minor(credit.reserved) + Math.min(0, owed));
  const added = adding ? minor(adding) : 0;
  const free = minor(credit.available) - added;
  const whole = Math.max(minor(credit.limit), used + reserved + added, 1);
  const percent = (part: number) => new Exact(part).times(100).dividedBy(whole).toDecimalPlaces(2);
  const parts = [used, reserved, added].map(percent) as [Exact, Exact, Exact];
  const rest = Exact.max(
    0,
    parts.reduce((left, part) => left.minus(part), exact('100')),
  );
  return {
    used: money(used, currency),
    reserved: money(reserved, currency),
    free: money(free, currency),
    over: free < 0,
    share: { used: parts[0].toFixed(), reserved: parts[1].toFixed(), adding: parts[2].toFixed(), free: rest.toFixed() },
  };
}
