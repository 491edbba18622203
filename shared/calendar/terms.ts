import { type Terms } from '../contracts/trade-accounts';
import { addDays, endOfMonth } from './days';

/**
 * When an invoice of a day is due: net days from the invoice, or from the end of its month.
 * Discount days always count from the invoice.
 */
export function dueDates(issuedOn: string, terms: Terms): { dueOn: string; discountUntil: string | null } {
  return {
    dueOn: addDays(terms.endOfMonth ? endOfMonth(issuedOn) : issuedOn, terms.netDays),
    discountUntil: terms.discountPercent !== null && terms.discountDays !== null ? addDays(issuedOn, terms.discountDays) : null,
  };
}

/** Terms as the trade says them: `net 30`, `2 % 10 net 30`, `net 30 end of month`. */
export function termsText(terms: Terms): string {
  const discount = terms.discountPercent !== null && terms.discountDays !== null ? `${terms.discountPercent} % ${terms.discountDays} ` : '';
  return `${discount}net ${terms.netDays}${terms.endOfMonth ? ' end of month' : ''}`;
}
