import { daysBetween } from '@shared/calendar/days';
import { dueDates } from '@shared/calendar/terms';
import { type InvoiceItem } from '@shared/contracts/receivables';
import { type Terms } from '@shared/contracts/trade-accounts';

/** An early-payment discount that can still be taken. */
export interface EarlyPayment {
  percent: string;
  until: string;
  /** days left, 0 on the last one */
  daysLeft: number;
}

/**
 * The discount of an invoice nobody has paid anything of, by the terms of its account; null
 * where there is none or its day is past. The invoice's own page says how much it is.
 *
 * @param today a day of the reader's
 */
export function earlyPaymentOf(
  { state, issuedOn, total, open }: Pick<InvoiceItem, 'state' | 'issuedOn' | 'total' | 'open'>,
  terms: Terms,
  today: string,
): EarlyPayment | null {
  const { discountUntil } = dueDates(issuedOn, terms);
  if (state !== 'open' || open.amount !== total.amount || discountUntil === null || terms.discountPercent === null) return null;
  const daysLeft = daysBetween(today, discountUntil);
  return daysLeft < 0 ? null : { percent: terms.discountPercent, until: discountUntil, daysLeft };
}
