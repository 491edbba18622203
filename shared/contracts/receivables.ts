import * as z from 'zod';
import { endpoint } from './endpoint';
import { currency, day, id, instant, line, moneySchema, named, pageOf, pageQuery, percent } from './primitives';
import { orderCharge, taxRow } from './prices';

/** Invoices, receipts and the ledger. */

const invoiceHead = {
  id,
  number: z.string(),
  reference: z.string().meta({ description: 'ISO 11649 creditor reference' }),
  dealer: named,
  fabricator: named,
  tradeAccount: id,
  issuedOn: day,
  dueOn: day,
  currency,
  total: moneySchema,
  open: moneySchema.meta({ description: 'total less the sum of allocations' }),
  state: z.enum(['open', 'paid']),
  overdueDays: z.int().meta({ description: '0 when not overdue' }),
};

export const invoiceItem = z.object(invoiceHead).meta({ id: 'InvoiceItem' });
export type InvoiceItem = z.infer<typeof invoiceItem>;

export const entrySchema = z.object({
  id,
  on: day,
  kind: z.string(),
  memo: z.string(),
  postings: z.array(z.object({ account: z.string(), debit: moneySchema, credit: moneySchema })),
  reverses: id.nullable(),
});

export const allocationSchema = z.object({
  id,
  receipt: z.object({ id, number: z.string(), receivedOn: day }),
  invoice: z.object({ id, number: z.string() }),
  amount: moneySchema,
  discount: moneySchema,
  at: instant,
  by: z.string(),
  reversedAt: instant.nullable(),
});

export const invoiceSchema = z
  .object({
    ...invoiceHead,
    order: z.object({ id, number: z.string(), poNumber: z.string() }),
    dispatch: z.object({ id, number: z.string() }),
    discount: z.object({ percent, until: day, amount: moneySchema }).nullable().meta({ description: 'early-payment discount' }),
    lines: z.array(
      z.object({
        position: z.int(),
        tag: z.string().nullable(),
        description: z.string(),
        quantity: z.int(),
        unitPrice: moneySchema,
        linePrice: moneySchema,
      }),
    ),
    goods: moneySchema,
    orderCharges: z.array(orderCharge),
    tax: z.array(taxRow),
    allocations: z.array(allocationSchema),
    entries: z.array(entrySchema).meta({ description: 'ledger entries; for the fabricator’s clerk alone, else empty' }),
  })
  .meta({ id: 'Invoice' });
export type Invoice = z.infer<typeof invoiceSchema>;

export const listInvoices = endpoint({
  id: 'invoices.list',
  method: 'GET',
  path: '/api/invoices',
  summary:
    'Invoices of one’s own company: open ones by the earliest due day, others by the latest; q is the beginning of number or reference',
  query: pageQuery.extend({ state: z.enum(['open', 'paid']).optional(), q: z.string().max(60).optional(), tradeAccount: id.optional() }),
  status: 200,
  answer: pageOf(invoiceItem),
});

export const readInvoice = endpoint({
  id: 'invoices.read',
  method: 'GET',
  path: '/api/invoices/:id',
  summary: 'One invoice',
  params: z.object({ id }),
  status: 200,
  answer: invoiceSchema,
});

export const invoicePdf = endpoint({
  id: 'invoices.pdf',
  method: 'GET',
  path: '/api/invoices/:id/pdf',
  summary: 'The invoice as PDF',
  params: z.object({ id }),
  status: 200,
  file: 'application/pdf',
});

const amount = z
  .string()
  .regex(/^\d{1,12}(\.\d{1,3})?$/, 'an amount such as 1105.38')
  .refine((value) => /[1-9]/.test(value), 'must be above zero');

/** A share of a receipt for one invoice; `discount` is the early-payment discount taken with it. */
export const allocationInput = z.strictObject({ invoice: id, amount, discount: amount.optional() });

export const receiptSchema = z
  .object({
    id,
    number: z.string(),
    tradeAccount: id,
    dealer: named,
    receivedOn: day,
    amount: moneySchema,
    unapplied: moneySchema,
    payerReference: z.string(),
    recordedAt: instant,
    recordedBy: z.string(),
    reversed: z.object({ at: instant, reason: z.string() }).nullable(),
    allocations: z.array(allocationSchema),
    entries: z.array(entrySchema),
  })
  .meta({ id: 'Receipt' });
export type Receipt = z.infer<typeof receiptSchema>;

export const recordReceipt = endpoint({
  id: 'receipts.record',
  method: 'POST',
  path: '/api/receipts',
  summary: 'Record money received by bank transfer; what is not allocated stays unapplied cash',
  body: z.strictObject({
    tradeAccount: id,
    receivedOn: day,
    amount,
    payerReference: line(140),
    allocations: z.array(allocationInput).max(200).default([]),
  }),
  status: 201,
  answer: receiptSchema,
  idempotent: true,
});

export const listReceipts = endpoint({
  id: 'receipts.list',
  method: 'GET',
  path: '/api/receipts',
  summary: 'Receipts, newest first',
  query: pageQuery.extend({ tradeAccount: id.optional(), unapplied: z.stringbool().optional() }),
  status: 200,
  answer: pageOf(receiptSchema.omit({ allocations: true, entries: true })),
});

export const readReceipt = endpoint({
  id: 'receipts.read',
  method: 'GET',
  path: '/api/receipts/:id',
  summary: 'One receipt',
  params: z.object({ id }),
  status: 200,
  answer: receiptSchema,
});

export const applyReceipt = endpoint({
  id: 'receipts.apply',
  method: 'POST',
  path: '/api/receipts/:id/allocations',
  summary: 'Apply unapplied cash of a receipt to invoices',
  params: z.object({ id }),
  body: z.strictObject({ allocations: z.array(allocationInput).min(1).max(200) }),
  status: 200,
  answer: receiptSchema,
  idempotent: true,
});

export const reverseAllocation = endpoint({
  id: 'receipts.reverse-allocation',
  method: 'POST',
  path: '/api/allocations/:id/reversal',
  summary: 'Take an allocation back by a reversing entry; the money is unapplied again',
  params: z.object({ id }),
  body: z.strictObject({ reason: line(300) }),
  status: 200,
  answer: receiptSchema,
});

export const reverseReceipt = endpoint({
  id: 'receipts.reverse',
  method: 'POST',
  path: '/api/receipts/:id/reversal',
  summary: 'Take a whole receipt back, its allocations first',
  params: z.object({ id }),
  body: z.strictObject({ reason: line(300) }),
  status: 200,
  answer: receiptSchema,
});

export const readTrialBalance = endpoint({
  id: 'ledger.trial-balance',
  method: 'GET',
  path: '/api/ledger/trial-balance',
  summary: 'Debits and credits of every account up to and including a day; the difference is zero',
  query: z.object({ at: day.optional() }),
  status: 200,
  answer: z.object({
    at: day,
    rows: z.array(z.object({ account: z.string(), debit: moneySchema, credit: moneySchema })),
    totals: z.object({ debit: moneySchema, credit: moneySchema }),
    difference: moneySchema,
  }),
});
