import { type z } from 'zod';
import { daysBetween } from '@shared/calendar/days';
import { type allocationSchema, type entrySchema, type InvoiceItem } from '@shared/contracts/receivables';
import { money } from '@shared/money/money';
import { type ListedInvoice } from './invoice-store';
import { type Entry } from './ledger-store';
import { type AllocatedRow } from './receipt-store';

/** Rows of receivables as the contracts have them. */

export const isoInstant = (at: number): string => new Date(at).toISOString();

/** `today` is the reader's day, for how long the invoice is overdue. */
export function invoiceOnWire(row: ListedInvoice, today: string): InvoiceItem {
  return {
    id: row.id,
    number: row.number,
    reference: row.reference,
    dealer: { id: row.dealerId, name: row.dealerName },
    fabricator: { id: row.fabricatorId, name: row.fabricatorName },
    tradeAccount: row.tradeAccountId,
    issuedOn: row.issuedOn,
    dueOn: row.dueOn,
    currency: row.currency,
    total: money(row.totalMinor, row.currency),
    open: money(row.openMinor, row.currency),
    state: row.openMinor > 0 ? 'open' : 'paid',
    overdueDays: row.openMinor > 0 ? Math.max(0, daysBetween(row.dueOn, today)) : 0,
  };
}

export function allocationOnWire({ allocation, ...row }: AllocatedRow): z.output<typeof allocationSchema> {
  return {
    id: allocation.id,
    receipt: { id: allocation.receiptId, number: row.receiptNumber, receivedOn: row.receivedOn },
    invoice: { id: allocation.invoiceId, number: row.invoiceNumber },
    amount: money(allocation.amountMinor, row.currency),
    discount: money(allocation.discountMinor, row.currency),
    at: isoInstant(allocation.at),
    by: row.byName,
    reversedAt: allocation.reversedAt === null ? null : isoInstant(allocation.reversedAt),
  };
}

export function entryOnWire(entry: Entry): z.output<typeof entrySchema> {
  return {
    id: entry.id,
    on: entry.on,
    kind: entry.kind,
    memo: entry.memo,
    postings: entry.postings.map(({ account, currency, debitMinor, creditMinor }) => ({
      account,
      debit: money(debitMinor, currency),
      credit: money(creditMinor, currency),
    })),
    reverses: entry.reverses,
  };
}
