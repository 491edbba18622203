import { addDays, dayIn } from '@shared/calendar/days';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { Refusal } from '@shared/contracts/problems';
import { type Credit, type readCredit as readCreditEndpoint } from '@shared/contracts/trade-accounts';
import { money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { type TradeAccountRow } from '../companies/company-store';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { availableMinor, type CreditState, exposureMinor } from './credit-check';

/** Credit of a trade account of one's own company, on either side of it. */
export function readCredit(
  actor: Member,
  { params }: Pick<Input<typeof readCreditEndpoint>, 'params'>,
  dependencies: Dependencies,
): AnswerOf<typeof readCreditEndpoint> {
  const account = dependencies.stores.companies.tradeAccountOf(actor.companyId, params.id);
  if (!account) throw new Refusal('not-found', 'There is no such trade account of yours.');
  return creditOnWire(account, dependencies);
}

/** What a credit check reads of an account now. `today` is the fabricator's day. */
export function creditStateOf(account: TradeAccountRow, today: string, { stores }: Pick<Dependencies, 'stores'>): CreditState {
  const { receivableMinor, reservedMinor, unappliedMinor } = stores.companies.balances(account.id);
  return {
    limitMinor: account.limitMinor,
    receivableMinor,
    reservedMinor,
    unappliedMinor,
    onHold: account.onHold,
    overdueBeyondGraceMinor: stores.invoices.overdueMinor(account.id, addDays(today, -account.graceDays)),
    countsFrom: account.countsFrom,
  };
}

export function creditOnWire(account: TradeAccountRow, { stores, clock }: Pick<Dependencies, 'stores' | 'clock'>): Credit {
  const today = dayIn(stores.companies.company(account.fabricatorId)?.timeZone ?? 'UTC', clock());
  const state = creditStateOf(account, today, { stores });
  const amount = (minor: number) => money(minor, account.currency);
  return {
    limit: amount(state.limitMinor),
    exposure: amount(exposureMinor(state)),
    available: amount(availableMinor(state)),
    receivable: amount(state.receivableMinor),
    reserved: amount(state.reservedMinor),
    unapplied: amount(state.unappliedMinor),
    overdue: amount(stores.invoices.overdueMinor(account.id, today)),
    onHold: account.onHold,
  };
}
