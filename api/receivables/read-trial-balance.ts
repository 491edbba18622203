import { dayIn } from '@shared/calendar/days';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { type readTrialBalance as readTrialBalanceEndpoint } from '@shared/contracts/receivables';
import { money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { ledgerAccounts } from '../database/schema/receivables';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';

/**
 * The balance of every account of the fabricator's ledger that was ever posted to, over the
 * entries up to and including a day (today unless named), on its debit or credit side.
 */
export function readTrialBalance(
  actor: Member,
  { query }: Pick<Input<typeof readTrialBalanceEndpoint>, 'query'>,
  { stores, clock }: Pick<Dependencies, 'stores' | 'clock'>,
): AnswerOf<typeof readTrialBalanceEndpoint> {
  const at = query.at ?? dayIn(actor.timeZone, clock());
  const currency = stores.ledger.currencyOf(actor.companyId) ?? 'USD';
  const found = stores.ledger.balancesOf(actor.companyId, at);
  const rows = ledgerAccounts.flatMap((account) => {
    const net = found.find((row) => row.account === account)?.netMinor;
    return net === undefined ? [] : [{ account, debitMinor: Math.max(0, net), creditMinor: Math.max(0, -net) }];
  });
  const debit = rows.reduce((sum, row) => sum + row.debitMinor, 0);
  const credit = rows.reduce((sum, row) => sum + row.creditMinor, 0);
  return {
    at,
    rows: rows.map(({ account, debitMinor, creditMinor }) => ({
      account,
      debit: money(debitMinor, currency),
      credit: money(creditMinor, currency),
    })),
    totals: { debit: money(debit, currency), credit: money(credit, currency) },
    difference: money(debit - credit, currency),
  };
}
