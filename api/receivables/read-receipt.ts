import { type AnswerOf } from '@shared/contracts/endpoint';
import { Refusal } from '@shared/contracts/problems';
import {
  type listReceipts as listReceiptsEndpoint,
  type readReceipt as readReceiptEndpoint,
  type Receipt,
} from '@shared/contracts/receivables';
import { money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { readCursor, toPage } from '../database/cursor';
import { type Dependencies, type Stores } from '../dependencies';
import { type Input } from '../http/serve';
import { allocationOnWire, entryOnWire, isoInstant } from './on-wire';

/** One receipt of the clerk's company, with what was applied of it, taken back or not, and its ledger entries. */
export function readReceipt(
  actor: Member,
  { params }: Pick<Input<typeof readReceiptEndpoint>, 'params'>,
  { stores }: Pick<Dependencies, 'stores'>,
): AnswerOf<typeof readReceiptEndpoint> {
  const row = stores.receipts.read(actor.companyId, params.id);
  if (!row) throw new Refusal('not-found', 'There is no such receipt of yours.');
  const applied = stores.receipts.allocationsOfReceipt(params.id);
  const entries = [
    ...stores.ledger.entriesOf('receipt', [params.id]),
    ...stores.ledger.entriesOf(
      'allocation',
      applied.map(({ allocation }) => allocation.id),
    ),
  ].sort((a, b) => a.sequence - b.sequence);
  return { ...headOf(row), allocations: applied.map(allocationOnWire), entries: entries.map(entryOnWire) };
}

/** Receipts of the clerk's company, the newest first. */
export function listReceipts(
  actor: Member,
  { query }: Pick<Input<typeof listReceiptsEndpoint>, 'query'>,
  { stores }: Pick<Dependencies, 'stores'>,
): AnswerOf<typeof listReceiptsEndpoint> {
  const filter = { fabricatorId: actor.companyId, tradeAccountId: query.tradeAccount, unapplied: query.unapplied };
  const rows = stores.receipts.page(filter, readCursor(query.cursor, 'number'), query.limit + 1).all();
  return toPage(rows, query.limit, headOf, ({ receipt }) => [receipt.recordedAt, receipt.id]);
}

function headOf(row: NonNullable<ReturnType<Stores['receipts']['read']>>): Omit<Receipt, 'allocations' | 'entries'> {
  const { receipt } = row;
  return {
    id: receipt.id,
    number: receipt.number,
    tradeAccount: receipt.tradeAccountId,
    dealer: { id: row.dealerId, name: row.dealerName },
    receivedOn: receipt.receivedOn,
    amount: money(receipt.amountMinor, receipt.currency),
    unapplied: money(receipt.unappliedMinor, receipt.currency),
    payerReference: receipt.payerReference,
    recordedAt: isoInstant(receipt.recordedAt),
    recordedBy: row.recordedByName,
    reversed: receipt.reversedAt === null ? null : { at: isoInstant(receipt.reversedAt), reason: receipt.reversedReason ?? '' },
  };
}
