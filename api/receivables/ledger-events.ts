import { type LedgerAccount } from '../database/schema/receivables';

/** What happened, as a ledger entry: whole minor units, debit above zero, credit below. */
export interface LedgerEvent {
  kind: EventKind;
  memo: string;
  document: { kind: 'invoice' | 'receipt' | 'allocation'; id: string };
  /** signed minor units by account; zeros are left out, the sum is zero */
  amounts: readonly (readonly [LedgerAccount, number])[];
}

export const eventKinds = ['invoice issued', 'receipt recorded', 'cash applied', 'discount taken', 'reversal'] as const;
export type EventKind = (typeof eventKinds)[number];

/** An invoice on dispatch: receivable gross, against sales, delivery and surcharges, and sales tax. */
export function invoiceIssued(invoice: {
  id: string;
  number: string;
  goodsMinor: number;
  chargesMinor: number;
  taxMinor: number;
}): LedgerEvent {
  const { goodsMinor, chargesMinor, taxMinor } = invoice;
  return {
    kind: 'invoice issued',
    memo: `Invoice ${invoice.number}`,
    document: { kind: 'invoice', id: invoice.id },
    amounts: [
      ['receivable', goodsMinor + chargesMinor + taxMinor],
      ['sales', -goodsMinor],
      ['delivery and surcharges', -chargesMinor],
      ['sales tax', -taxMinor],
    ],
  };
}

/** Money in the bank, not yet applied. What is applied at once follows as `cashApplied`. */
export function receiptRecorded(receipt: { id: string; number: string; amountMinor: number; payerReference: string }): LedgerEvent {
  return {
    kind: 'receipt recorded',
    memo: `Receipt ${receipt.number}, ${receipt.payerReference}`,
    document: { kind: 'receipt', id: receipt.id },
    amounts: [
      ['bank', receipt.amountMinor],
      ['unapplied cash', -receipt.amountMinor],
    ],
  };
}

/** Unapplied cash settles a receivable. */
export function cashApplied(allocation: { id: string; amountMinor: number; receiptNumber: string; invoiceNumber: string }): LedgerEvent {
  return {
    kind: 'cash applied',
    memo: `Receipt ${allocation.receiptNumber} applied to invoice ${allocation.invoiceNumber}`,
    document: { kind: 'allocation', id: allocation.id },
    amounts: [
      ['unapplied cash', allocation.amountMinor],
      ['receivable', -allocation.amountMinor],
    ],
  };
}

/** The early-payment discount that came with an allocation, taken within terms. */
export function discountTaken(allocation: { id: string; discountMinor: number; invoiceNumber: string }): LedgerEvent {
  return {
    kind: 'discount taken',
    memo: `Early-payment discount on invoice ${allocation.invoiceNumber}`,
    document: { kind: 'allocation', id: allocation.id },
    amounts: [
      ['discounts allowed', allocation.discountMinor],
      ['receivable', -allocation.discountMinor],
    ],
  };
}

/** The mirror of an entry: each debit a credit, each credit a debit. */
export function reversalOf(
  entry: {
    memo: string;
    document: LedgerEvent['document'];
    postings: readonly { account: LedgerAccount; debitMinor: number; creditMinor: number }[];
  },
  reason: string,
): LedgerEvent {
  return {
    kind: 'reversal',
    memo: `Reversal: ${entry.memo} (${reason})`,
    document: entry.document,
    amounts: entry.postings.map(({ account, debitMinor, creditMinor }) => [account, creditMinor - debitMinor] as const),
  };
}
