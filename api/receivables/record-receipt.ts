import { dayIn } from '@shared/calendar/days';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { Refusal } from '@shared/contracts/problems';
import { type recordReceipt as recordReceiptEndpoint } from '@shared/contracts/receivables';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { documentNumber } from '../orders/document-number';
import { doOnce } from '../orders/do-once';
import { allocate } from './allocate';
import { amountAt } from './amount-at';
import { receiptRecorded } from './ledger-events';
import { postEntry } from './post-entry';
import { readReceipt } from './read-receipt';
import { type ReceiptRow } from './receipt-store';

/**
 * Records money received by bank transfer and applies it to invoices as asked; the rest stays
 * unapplied cash of the account. The books take it on the day it was received.
 *
 * @throws Refusal `not-found` for an account that is not theirs, `invalid` at the field, `key-reused`
 */
export function recordReceipt(
  actor: Member,
  { body, idempotencyKey }: Pick<Input<typeof recordReceiptEndpoint>, 'body' | 'idempotencyKey'>,
  dependencies: Dependencies,
): AnswerOf<typeof recordReceiptEndpoint> {
  const { stores, clock, newId } = dependencies;
  const call = { endpoint: 'receipts.record', key: idempotencyKey, request: body };
  const id = doOnce(actor, call, dependencies, () => {
    const account = stores.companies.tradeAccountOf(actor.companyId, body.tradeAccount);
    if (!account)
      throw new Refusal('not-found', 'There is no such trade account of yours.', [
        { pointer: '/tradeAccount', detail: 'is none of yours' },
      ]);
    const maker = stores.orders.maker(actor.companyId);
    const at = clock();
    if (body.receivedOn > dayIn(maker.timeZone, at)) {
      throw new Refusal('invalid', '/receivedOn: is still to come', [{ pointer: '/receivedOn', detail: 'is still to come' }]);
    }
    const amountMinor = amountAt('/amount', body.amount, account.currency);
    const receipt: ReceiptRow = {
      id: newId(),
      number: documentNumber(maker.numberPrefix, 'receipt', stores.numbers.next(maker.id, 'receipt')),
      fabricatorId: maker.id,
      tradeAccountId: account.id,
      currency: account.currency,
      receivedOn: body.receivedOn,
      amountMinor,
      unappliedMinor: amountMinor,
      payerReference: body.payerReference,
      recordedAt: at,
      recordedBy: actor.personId,
      reversedAt: null,
      reversedReason: null,
    };
    stores.receipts.insert(receipt);
    postEntry(
      {
        stores,
        newId,
        fabricatorId: maker.id,
        tradeAccountId: account.id,
        currency: account.currency,
        on: body.receivedOn,
        at,
        personId: actor.personId,
      },
      receiptRecorded(receipt),
    );
    allocate(actor, receipt, body.allocations, body.receivedOn, dependencies);
    return receipt.id;
  });
  return readReceipt(actor, { params: { id } }, dependencies);
}
