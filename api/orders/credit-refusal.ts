import { Refusal } from '@shared/contracts/problems';
import { money } from '@shared/money/money';
import { type TradeAccountRow } from '../companies/company-store';
import { type CreditAnswer } from '../receivables/credit-check';

const why: Record<'account-on-hold' | 'overdue' | 'over-credit', string> = {
  'account-on-hold': 'The account is on hold.',
  overdue: 'Invoices of the account are overdue beyond the days of grace.',
  'over-credit': 'The order is above the credit available.',
};

/** A credit answer in words, as a reason in the order's history or a refusal. */
export function creditReason(answer: Extract<CreditAnswer, { ok: false }>): string {
  return why[answer.code];
}

/**
 * A credit answer as a refusal that says by how much the order is short, and what else can be done.
 *
 * @param ways what the caller can do about it, for the client to offer: `review` asks the maker to look at it
 */
export function creditRefusal(answer: Extract<CreditAnswer, { ok: false }>, account: TradeAccountRow, ways: readonly 'review'[]): Refusal {
  const amount = (minor: number) => money(minor, account.currency);
  const short = answer.shortByMinor > 0 ? ` It is short by ${amount(answer.shortByMinor).amount} ${account.currency}.` : '';
  return new Refusal(answer.code, `${creditReason(answer)}${short}`, [], {
    shortBy: amount(answer.shortByMinor),
    available: amount(answer.availableMinor),
    ways,
  });
}
