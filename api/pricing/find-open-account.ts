import { Refusal } from '@shared/contracts/problems';
import { type Member } from '../companies/actor';
import { type TradeAccountRow } from '../companies/company-store';
import { type Stores } from '../dependencies';

/**
 * The dealer's trade account that a request names at `/tradeAccount`.
 *
 * @throws Refusal `not-found` at the field unless it is the dealer's, `account-not-open` when it is closed
 */
export function findOpenAccount(actor: Member, accountId: string, { companies }: Pick<Stores, 'companies'>): TradeAccountRow {
  const account = companies.tradeAccountOf(actor.companyId, accountId);
  if (!account) {
    throw new Refusal('not-found', 'There is no such trade account of yours.', [
      { pointer: '/tradeAccount', detail: 'is not a trade account of yours' },
    ]);
  }
  if (account.state !== 'open') {
    throw new Refusal('account-not-open', `The trade account with ${account.fabricatorName} is closed.`, [
      { pointer: '/tradeAccount', detail: 'is closed' },
    ]);
  }
  return account;
}
