import { sql } from 'drizzle-orm';
import { check, index, integer, primaryKey, sqliteTable, text, uniqueIndex, type AnySQLiteColumn } from 'drizzle-orm/sqlite-core';
import { type Totals } from '@shared/contracts/prices';
import { type Currency } from '@shared/money/currencies';
import { companies, people, tradeAccounts } from './companies';
import { day, flag, id, instant, isCurrency, isDay, json, minor, notNegative, oneOf } from './columns';
import { dispatches, orders } from './orders';

export const ledgerAccounts = [
  'receivable',
  'sales',
  'delivery and surcharges',
  'sales tax',
  'bank',
  'unapplied cash',
  'discounts allowed',
  'card clearing',
  'card fees',
  'customer deposits',
  'sales returns',
  'write-offs',
] as const;
export type LedgerAccount = (typeof ledgerAccounts)[number];

/** Next number of a gapless series, per fabricator and kind of document. */
export const numberSeries = sqliteTable(
  'number_series',
  {
    companyId: text('company_id')
      .notNull()
      .references(() => companies.id),
    kind: text('kind').notNull(),
    next: integer('next').notNull(),
  },
  (t) => [primaryKey({ columns: [t.companyId, t.kind] })],
);

/**
 * An entry is written open, its postings follow, then it is closed: a trigger refuses to
 * close what does not balance, and any change of a closed entry or its postings.
 */
export const ledgerEntries = sqliteTable(
  'ledger_entries',
  {
    id: id(),
    fabricatorId: text('fabricator_id')
      .notNull()
      .references(() => companies.id),
    /** the fabricator's entries in the order of posting, without gaps */
    sequence: integer('sequence').notNull().default(0),
    on: day('on_day').notNull(),
    at: instant('at').notNull(),
    kind: text('kind').notNull(),
    memo: text('memo').notNull(),
    tradeAccountId: text('trade_account_id').references(() => tradeAccounts.id),
    documentKind: text('document_kind', { enum: ['invoice', 'receipt', 'allocation'] }).notNull(),
    documentId: text('document_id').notNull(),
    reverses: text('reverses').references((): AnySQLiteColumn => ledgerEntries.id),
    personId: text('person_id').references(() => people.id),
    closed: flag('closed').notNull().default(false),
  },
  (t) => [
    isDay('ledger_entries_day', t.on),
    index('ledger_entries_by_document').on(t.documentKind, t.documentId),
    uniqueIndex('ledger_entries_by_sequence').on(t.fabricatorId, t.sequence),
    index('ledger_entries_by_account').on(t.tradeAccountId, t.sequence),
    index('ledger_entries_by_day').on(t.fabricatorId, t.on),
    uniqueIndex('ledger_entries_reversed_once').on(t.reverses),
  ],
);

export const postings = sqliteTable(
  'postings',
  {
    entryId: text('entry_id')
      .notNull()
      .references(() => ledgerEntries.id),
    position: integer('position').notNull(),
    account: text('account', { enum: ledgerAccounts }).notNull(),
    currency: text('currency').$type<Currency>().notNull(),
    debitMinor: minor('debit_minor').notNull(),
    creditMinor: minor('credit_minor').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.entryId, t.position] }),
    oneOf('postings_account', t.account, ledgerAccounts),
    isCurrency('postings_currency', t.currency),
    check('postings_one_side', sql`${t.debitMinor} >= 0 and ${t.creditMinor} >= 0 and (${t.debitMinor} = 0) <> (${t.creditMinor} = 0)`),
  ],
);

export interface InvoiceLine {
  position: number;
  tag: string | null;
  description: string;
  quantity: number;
  unitPriceMinor: number;
  linePriceMinor: number;
}

export const invoices = sqliteTable(
  'invoices',
  {
    id: id(),
    number: text('number').notNull(),
    sequence: integer('sequence').notNull(),
    reference: text('reference').notNull(),
    fabricatorId: text('fabricator_id')
      .notNull()
      .references(() => companies.id),
    dealerId: text('dealer_id')
      .notNull()
      .references(() => companies.id),
    tradeAccountId: text('trade_account_id')
      .notNull()
      .references(() => tradeAccounts.id),
    orderId: text('order_id')
      .notNull()
      .references(() => orders.id),
    dispatchId: text('dispatch_id')
      .notNull()
      .references(() => dispatches.id),
    issuedOn: day('issued_on').notNull(),
    issuedAt: instant('issued_at').notNull(),
    dueOn: day('due_on').notNull(),
    discountPercent: text('discount_percent'),
    discountUntil: day('discount_until'),
    currency: text('currency').$type<Currency>().notNull(),
    lines: json<InvoiceLine[]>('lines').notNull(),
    totals: json<Totals>('totals').notNull(),
    totalMinor: minor('total_minor').notNull(),
    /** total less the sum of allocations; kept in step, compared by verify:ledger */
    openMinor: minor('open_minor').notNull(),
  },
  (t) => [
    isCurrency('invoices_currency', t.currency),
    isDay('invoices_issued', t.issuedOn),
    isDay('invoices_due', t.dueOn),
    check('invoices_open', sql`${t.openMinor} between 0 and ${t.totalMinor}`),
    uniqueIndex('invoices_by_sequence').on(t.fabricatorId, t.sequence),
    uniqueIndex('invoices_by_number').on(t.fabricatorId, t.number),
    uniqueIndex('invoices_by_reference').on(t.fabricatorId, t.reference),
    uniqueIndex('invoices_by_dispatch').on(t.dispatchId),
    index('invoices_of_fabricator').on(t.fabricatorId, t.dueOn, t.id),
    index('invoices_of_dealer').on(t.dealerId, t.dueOn, t.id),
    index('invoices_open_of_fabricator')
      .on(t.fabricatorId, t.dueOn, t.id)
      .where(sql`open_minor > 0`),
    index('invoices_open_of_dealer')
      .on(t.dealerId, t.dueOn, t.id)
      .where(sql`open_minor > 0`),
    index('invoices_of_account').on(t.tradeAccountId, t.dueOn, t.id),
    index('invoices_of_dealer_by_number').on(t.dealerId, t.number, t.id),
    index('invoices_of_dealer_by_reference').on(t.dealerId, t.reference, t.id),
    index('invoices_open_of_account')
      .on(t.tradeAccountId, t.dueOn, t.id)
      .where(sql`open_minor > 0`),
    index('invoices_of_order').on(t.orderId),
  ],
);

export const receipts = sqliteTable(
  'receipts',
  {
    id: id(),
    number: text('number').notNull(),
    fabricatorId: text('fabricator_id')
      .notNull()
      .references(() => companies.id),
    tradeAccountId: text('trade_account_id')
      .notNull()
      .references(() => tradeAccounts.id),
    currency: text('currency').$type<Currency>().notNull(),
    receivedOn: day('received_on').notNull(),
    amountMinor: minor('amount_minor').notNull(),
    /** amount less allocations; kept in step, compared by verify:ledger */
    unappliedMinor: minor('unapplied_minor').notNull(),
    payerReference: text('payer_reference').notNull(),
    recordedAt: instant('recorded_at').notNull(),
    recordedBy: text('recorded_by')
      .notNull()
      .references(() => people.id),
    reversedAt: instant('reversed_at'),
    reversedReason: text('reversed_reason'),
  },
  (t) => [
    isCurrency('receipts_currency', t.currency),
    isDay('receipts_received', t.receivedOn),
    check('receipts_unapplied', sql`${t.unappliedMinor} between 0 and ${t.amountMinor}`),
    uniqueIndex('receipts_by_number').on(t.fabricatorId, t.number),
    index('receipts_newest').on(t.fabricatorId, t.recordedAt, t.id),
    index('receipts_unapplied')
      .on(t.fabricatorId, t.recordedAt, t.id)
      .where(sql`unapplied_minor > 0`),
    index('receipts_of_account').on(t.tradeAccountId, t.recordedAt, t.id),
  ],
);

export const allocations = sqliteTable(
  'allocations',
  {
    id: id(),
    receiptId: text('receipt_id')
      .notNull()
      .references(() => receipts.id),
    invoiceId: text('invoice_id')
      .notNull()
      .references(() => invoices.id),
    amountMinor: minor('amount_minor').notNull(),
    discountMinor: minor('discount_minor').notNull(),
    at: instant('at').notNull(),
    personId: text('person_id')
      .notNull()
      .references(() => people.id),
    reversedAt: instant('reversed_at'),
    reversedReason: text('reversed_reason'),
  },
  (t) => [
    notNegative('allocations_amount', t.amountMinor),
    notNegative('allocations_discount', t.discountMinor),
    index('allocations_by_invoice').on(t.invoiceId),
    index('allocations_by_receipt').on(t.receiptId),
  ],
);
