import { dayIn } from '@shared/calendar/days';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { Refusal } from '@shared/contracts/problems';
import { type reverseReceipt as reverseReceiptEndpoint } from '@shared/contracts/receivables';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { readReceipt } from './read-receipt';
import { takeBack } from './reverse-allocation';
import { reverseEntries } from './reverse-entries';

/**
 * Takes a whole receipt back, its allocations first; its invoices are open again.
 *
 * @throws Refusal `not-found`, `not-in-this-state` when it has been taken back before
 */
export function reverseReceipt(
  actor: Member,
  { params, body }: Pick<Input<typeof reverseReceiptEndpoint>, 'params' | 'body'>,
  dependencies: Dependencies,
): AnswerOf<typeof reverseReceiptEndpoint> {
  const { stores, database, clock } = dependencies;
  database.immediately(() => {
    const receipt = stores.receipts.of(actor.companyId, params.id);
    if (!receipt) throw new Refusal('not-found', 'There is no such receipt of yours.');
    if (receipt.reversedAt !== null) throw new Refusal('not-in-this-state', `Receipt ${receipt.number} has been reversed before.`);
    for (const allocation of stores.receipts.livingAllocations(receipt.id)) takeBack(actor, allocation, body.reason, dependencies);
    stores.receipts.markReversed(receipt.id, clock(), body.reason);
    reverseEntries(actor, 'receipt', receipt.id, { reason: body.reason, on: dayIn(actor.timeZone, clock()) }, dependencies);
    stores.companies.recordChange({
      companyId: actor.companyId,
      personId: actor.personId,
      at: clock(),
      action: 'receipt reversed',
      subjectKind: 'receipt',
      subjectId: receipt.id,
      before: { amountMinor: receipt.amountMinor, unappliedMinor: receipt.unappliedMinor },
      after: null,
      reason: body.reason,
    });
  });
  return readReceipt(actor, { params }, dependencies);
}
