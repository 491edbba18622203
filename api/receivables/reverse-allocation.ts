import { dayIn } from '@shared/calendar/days';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { Refusal } from '@shared/contracts/problems';
import { type reverseAllocation as reverseAllocationEndpoint } from '@shared/contracts/receivables';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { readReceipt } from './read-receipt';
import { type AllocationRow } from './receipt-store';
import { reverseEntries } from './reverse-entries';

/**
 * Takes an allocation back: the invoice is open again by amount and discount, the cash is
 * unapplied again, and reversing entries are posted today.
 *
 * @throws Refusal `not-found`, `not-in-this-state` when it has been taken back before
 */
export function reverseAllocation(
  actor: Member,
  { params, body }: Pick<Input<typeof reverseAllocationEndpoint>, 'params' | 'body'>,
  dependencies: Dependencies,
): AnswerOf<typeof reverseAllocationEndpoint> {
  const { stores, database } = dependencies;
  const receiptId = database.immediately(() => {
    const allocation = stores.receipts.allocationOf(actor.companyId, params.id);
    if (!allocation) throw new Refusal('not-found', 'There is no such allocation of yours.');
    if (allocation.reversedAt !== null) throw new Refusal('not-in-this-state', 'This allocation has been reversed before.');
    takeBack(actor, allocation, body.reason, dependencies);
    return allocation.receiptId;
  });
  return readReceipt(actor, { params: { id: receiptId } }, dependencies);
}

/** Reverses one living allocation inside the caller's transaction. */
export function takeBack(actor: Member, allocation: AllocationRow, reason: string, dependencies: Dependencies): void {
  const { stores, clock } = dependencies;
  const { id, receiptId, invoiceId, amountMinor, discountMinor } = allocation;
  stores.receipts.markAllocationReversed(id, clock(), reason);
  stores.receipts.addToUnapplied(receiptId, amountMinor);
  stores.invoices.addToOpen(invoiceId, amountMinor + discountMinor);
  reverseEntries(actor, 'allocation', id, { reason, on: dayIn(actor.timeZone, clock()) }, dependencies);
  stores.companies.recordChange({
    companyId: actor.companyId,
    personId: actor.personId,
    at: clock(),
    action: 'allocation reversed',
    subjectKind: 'allocation',
    subjectId: id,
    before: { receiptId, invoiceId, amountMinor, discountMinor },
    after: null,
    reason,
  });
}
