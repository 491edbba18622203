import { exact } from '@shared/money/exact';
import { percentOf } from '@shared/money/money';

/** An invoice's early-payment terms. */
export interface DiscountTerms {
  totalMinor: number;
  discountPercent: string | null;
  discountUntil: string | null;
}

/** The early-payment discount on a whole invoice; 0 without such terms. */
export function wholeDiscountMinor({ totalMinor, discountPercent }: DiscountTerms): number {
  return discountPercent === null ? 0 : percentOf(totalMinor, exact(discountPercent));
}

/**
 * What is wrong with taking a discount, if anything. It must be in time on the day the money
 * came in, not above the terms' percent of what it settles together with the cash, and not above
 * what is left of the discount on the whole invoice.
 */
export function judgeDiscount(
  invoice: DiscountTerms,
  taken: { discountMinor: number; amountMinor: number; takenBeforeMinor: number; receivedOn: string },
): string | null {
  const { discountPercent, discountUntil } = invoice;
  if (discountPercent === null || discountUntil === null) return 'this invoice has no early-payment discount';
  if (taken.receivedOn > discountUntil) return `the discount could be taken until ${discountUntil}`;
  const share = percentOf(taken.amountMinor + taken.discountMinor, exact(discountPercent));
  const most = Math.min(share, wholeDiscountMinor(invoice) - taken.takenBeforeMinor);
  return taken.discountMinor > most ? `is more than ${discountPercent} % of what it settles` : null;
}
