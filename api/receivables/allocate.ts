import { type z } from 'zod';
import { type allocationInput } from '@shared/contracts/receivables';
import { pointer, Refusal } from '@shared/contracts/problems';
import { amountOf } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { amountAt } from './amount-at';
import { judgeDiscount } from './discount';
import { type InvoiceRow } from './invoice-store';
import { cashApplied, discountTaken } from './ledger-events';
import { postEntry } from './post-entry';
import { type ReceiptRow } from './receipt-store';

export type AllocationInput = z.output<typeof allocationInput>;

/**
 * Applies unapplied cash of a receipt to invoices of the same account, one after the other:
 * each allocation lowers what the invoice still lacks and what the receipt has left, and posts
 * its entries. The entry stands on the later of `on` and the invoice's day, so that no day of
 * the ledger knows a payment before its invoice. Runs inside the caller's transaction.
 *
 * @param on the day in the books
 * @throws Refusal `invalid` at the field: an invoice that is not of this account, an amount above
 *   what is open or left, a discount outside the terms
 */
export function allocate(
  actor: Member,
  receipt: ReceiptRow,
  wanted: readonly AllocationInput[],
  on: string,
  dependencies: Pick<Dependencies, 'stores' | 'clock' | 'newId'>,
): void {
  let leftMinor = receipt.unappliedMinor;
  for (const [i, one] of wanted.entries()) {
    const invoice = invoiceAt(i, one, receipt, dependencies);
    const { amountMinor, discountMinor } = amountsAt(i, one, invoice, receipt, leftMinor, dependencies);
    leftMinor -= amountMinor;
    write(actor, receipt, invoice, { amountMinor, discountMinor, on }, dependencies);
  }
}

function refuse(i: number, field: keyof AllocationInput, detail: string): never {
  throw new Refusal('invalid', `Allocation ${i + 1}: ${detail}.`, [{ pointer: pointer('allocations', i, field), detail }]);
}

/** Read anew for each allocation: an earlier one may have gone to the same invoice. */
function invoiceAt(i: number, { invoice: id }: AllocationInput, receipt: ReceiptRow, { stores }: Pick<Dependencies, 'stores'>): InvoiceRow {
  const invoice = stores.invoices.byId(id);
  if (!invoice || invoice.tradeAccountId !== receipt.tradeAccountId || invoice.currency !== receipt.currency) {
    return refuse(i, 'invoice', 'is no invoice of this trade account');
  }
  return invoice;
}

function amountsAt(
  i: number,
  { amount, discount }: AllocationInput,
  invoice: InvoiceRow,
  receipt: ReceiptRow,
  leftMinor: number,
  { stores }: Pick<Dependencies, 'stores'>,
) {
  const { currency } = receipt;
  const amountMinor = amountAt(pointer('allocations', i, 'amount'), amount, currency);
  const discountMinor = discount === undefined ? 0 : amountAt(pointer('allocations', i, 'discount'), discount, currency);
  if (amountMinor > leftMinor) refuse(i, 'amount', `only ${amountOf(leftMinor, currency)} of the receipt is not yet applied`);
  if (amountMinor > invoice.openMinor) refuse(i, 'amount', `only ${amountOf(invoice.openMinor, currency)} is open on ${invoice.number}`);
  if (discountMinor > 0) {
    const takenBeforeMinor = stores.invoices.discountTakenMinor(invoice.id);
    const wrong = judgeDiscount(invoice, { discountMinor, amountMinor, takenBeforeMinor, receivedOn: receipt.receivedOn });
    if (wrong) refuse(i, 'discount', wrong);
    if (amountMinor + discountMinor > invoice.openMinor) {
      refuse(i, 'discount', `with the amount it is more than the ${amountOf(invoice.openMinor, currency)} open on ${invoice.number}`);
    }
  }
  return { amountMinor, discountMinor };
}

function write(
  actor: Member,
  receipt: ReceiptRow,
  invoice: InvoiceRow,
  { amountMinor, discountMinor, on }: { amountMinor: number; discountMinor: number; on: string },
  { stores, clock, newId }: Pick<Dependencies, 'stores' | 'clock' | 'newId'>,
): void {
  const id = newId();
  const at = clock();
  const { personId } = actor;
  stores.receipts.insertAllocation({
    id,
    receiptId: receipt.id,
    invoiceId: invoice.id,
    amountMinor,
    discountMinor,
    at,
    personId,
    reversedAt: null,
    reversedReason: null,
  });
  stores.receipts.addToUnapplied(receipt.id, -amountMinor);
  stores.invoices.addToOpen(invoice.id, -(amountMinor + discountMinor));
  const { fabricatorId, tradeAccountId, currency } = receipt;
  const day = on > invoice.issuedOn ? on : invoice.issuedOn;
  const context = { stores, newId, fabricatorId, tradeAccountId, currency, on: day, at, personId };
  postEntry(context, cashApplied({ id, amountMinor, receiptNumber: receipt.number, invoiceNumber: invoice.number }));
  postEntry(context, discountTaken({ id, discountMinor, invoiceNumber: invoice.number }));
}
