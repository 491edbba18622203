import { dayIn } from '@shared/calendar/days';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { Refusal } from '@shared/contracts/problems';
import { type applyReceipt as applyReceiptEndpoint } from '@shared/contracts/receivables';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { doOnce } from '../orders/do-once';
import { allocate } from './allocate';
import { readReceipt } from './read-receipt';

/**
 * Applies unapplied cash of a receipt to invoices of the same account, today.
 *
 * @throws Refusal `not-found`, `not-in-this-state` for a receipt taken back, `invalid` at the field, `key-reused`
 */
export function applyReceipt(
  actor: Member,
  { params, body, idempotencyKey }: Pick<Input<typeof applyReceiptEndpoint>, 'params' | 'body' | 'idempotencyKey'>,
  dependencies: Dependencies,
): AnswerOf<typeof applyReceiptEndpoint> {
  const { stores, clock } = dependencies;
  const call = { endpoint: 'receipts.apply', key: idempotencyKey, request: { params, body } };
  doOnce(actor, call, dependencies, () => {
    const receipt = stores.receipts.of(actor.companyId, params.id);
    if (!receipt) throw new Refusal('not-found', 'There is no such receipt of yours.');
    if (receipt.reversedAt !== null) throw new Refusal('not-in-this-state', `Receipt ${receipt.number} has been reversed.`);
    allocate(actor, receipt, body.allocations, dayIn(actor.timeZone, clock()), dependencies);
    return receipt.id;
  });
  return readReceipt(actor, { params }, dependencies);
}
