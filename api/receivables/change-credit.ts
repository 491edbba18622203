import { type AnswerOf } from '@shared/contracts/endpoint';
import { Refusal } from '@shared/contracts/problems';
import { type changeCredit as changeCreditEndpoint } from '@shared/contracts/trade-accounts';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { amountAt } from './amount-at';
import { creditOnWire } from './read-credit';

/**
 * Changes limit, hold or way of counting of an account at the clerk's own company; the change
 * is kept with its author and reason. When the way of counting changes, what the orders of the
 * account reserve is made anew, so that exposure follows the new way at once.
 */
export function changeCredit(
  actor: Member,
  { params, body }: Pick<Input<typeof changeCreditEndpoint>, 'params' | 'body'>,
  dependencies: Dependencies,
): AnswerOf<typeof changeCreditEndpoint> {
  const { stores, database, clock } = dependencies;
  return database.immediately(() => {
    const before = stores.companies.tradeAccountOf(actor.companyId, params.id);
    if (!before) throw new Refusal('not-found', 'There is no such trade account of yours.');
    const change = {
      ...(body.limit === undefined ? {} : { limitMinor: amountAt('/limit', body.limit, before.currency) }),
      ...(body.onHold === undefined ? {} : { onHold: body.onHold }),
      ...(body.countsFrom === undefined ? {} : { countsFrom: body.countsFrom }),
    };
    if (Object.keys(change).length === 0) {
      throw new Refusal('invalid', 'Say what changes.', [{ pointer: '/', detail: 'needs limit, onHold or countsFrom' }]);
    }
    stores.companies.changeTradeAccount(before.id, change);
    const account = { ...before, ...change };
    if (account.countsFrom !== before.countsFrom) {
      const reserved = account.countsFrom === 'placement' ? stores.orders.notInvoicedMinor(account.id) : 0;
      stores.companies.addToBalances(account.id, { reservedMinor: reserved - stores.companies.balances(account.id).reservedMinor });
    }
    const kept = ({ limitMinor, onHold, countsFrom }: typeof account) => ({ limitMinor, onHold, countsFrom });
    stores.companies.recordChange({
      companyId: actor.companyId,
      personId: actor.personId,
      at: clock(),
      action: 'credit changed',
      subjectKind: 'trade account',
      subjectId: account.id,
      before: kept(before),
      after: kept(account),
      reason: body.reason,
    });
    return creditOnWire(account, dependencies);
  });
}
