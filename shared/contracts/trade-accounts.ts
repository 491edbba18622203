import * as z from 'zod';
import { endpoint } from './endpoint';
import { currency, day, id, instant, line, moneySchema, named, pageOf, pageQuery, percent } from './primitives';

/** The tie between one dealer and one fabricator, its credit, and the dealer's ship-to book. */

export const terms = z
  .object({
    netDays: z.int().min(0).max(365),
    endOfMonth: z.boolean().meta({ description: 'net days count from the end of the invoice’s month' }),
    discountPercent: percent.nullable(),
    discountDays: z.int().min(0).max(365).nullable(),
  })
  .meta({ id: 'Terms' });
export type Terms = z.infer<typeof terms>;

export const tradeAccountSchema = z
  .object({
    id,
    dealer: named,
    fabricator: named,
    currency,
    state: z.enum(['open', 'closed']),
    tier: z.string(),
    terms,
    onHold: z.boolean(),
    countsFrom: z.enum(['placement', 'dispatch']).meta({ description: 'when an order begins to count against the limit' }),
    graceDays: z.int(),
  })
  .meta({ id: 'TradeAccount' });
export type TradeAccount = z.infer<typeof tradeAccountSchema>;

export const listTradeAccounts = endpoint({
  id: 'trade-accounts.list',
  method: 'GET',
  path: '/api/trade-accounts',
  summary: 'Trade accounts of one’s own company',
  query: pageQuery,
  status: 200,
  answer: pageOf(tradeAccountSchema),
});

export const creditSchema = z
  .object({
    limit: moneySchema,
    exposure: moneySchema,
    available: moneySchema,
    receivable: moneySchema.meta({ description: 'open receivables' }),
    reserved: moneySchema.meta({ description: 'orders on account, not yet invoiced' }),
    unapplied: moneySchema,
    overdue: moneySchema,
    onHold: z.boolean(),
  })
  .meta({ id: 'Credit' });
export type Credit = z.infer<typeof creditSchema>;

export const readCredit = endpoint({
  id: 'trade-accounts.credit',
  method: 'GET',
  path: '/api/trade-accounts/:id/credit',
  summary: 'Credit of a trade account: exposure = receivable + reserved − unapplied; available = limit − exposure',
  params: z.object({ id }),
  status: 200,
  answer: creditSchema,
});

/** One movement of an account: what was posted to receivable or unapplied cash for it. */
export const movementSchema = z.object({
  id,
  on: day,
  kind: z.string(),
  memo: z.string(),
  document: z.object({ kind: z.enum(['invoice', 'receipt', 'allocation']), id, number: z.string() }).nullable(),
  debit: moneySchema,
  credit: moneySchema,
  balance: moneySchema.meta({ description: 'receivable less unapplied cash, after this' }),
});

export const listMovements = endpoint({
  id: 'trade-accounts.movements',
  method: 'GET',
  path: '/api/trade-accounts/:id/movements',
  summary: 'Movements of a trade account, newest first, with running balance',
  params: z.object({ id }),
  query: pageQuery,
  status: 200,
  answer: pageOf(movementSchema),
});

export const changeCredit = endpoint({
  id: 'trade-accounts.change-credit',
  method: 'POST',
  path: '/api/trade-accounts/:id/credit-changes',
  summary: 'Change limit, hold or way of counting, with a reason',
  params: z.object({ id }),
  body: z.strictObject({
    limit: z
      .string()
      .regex(/^\d{1,12}(\.\d{1,3})?$/)
      .optional(),
    onHold: z.boolean().optional(),
    countsFrom: z.enum(['placement', 'dispatch']).optional(),
    reason: line(300),
  }),
  status: 200,
  answer: creditSchema,
});

export const addressSchema = z
  .object({
    id,
    label: z.string(),
    lines: z.array(z.string()),
    town: z.string(),
    region: z.string(),
    postcode: z.string(),
    country: z.string(),
    jurisdiction: z.string().meta({ description: 'tax jurisdiction' }),
    zone: z.string().meta({ description: 'delivery zone' }),
    altitude: z.number().nullable().meta({ description: 'm above sea level' }),
    exempt: z
      .object({ certificate: z.string(), until: day })
      .nullable()
      .meta({ description: 'exemption certificate in force for the jurisdiction' }),
  })
  .meta({ id: 'Address' });
export type Address = z.infer<typeof addressSchema>;

export const listAddresses = endpoint({
  id: 'addresses.list',
  method: 'GET',
  path: '/api/addresses',
  summary: 'The dealer’s ship-to book',
  query: pageQuery,
  status: 200,
  answer: pageOf(addressSchema),
});

export const listCompanies = endpoint({
  id: 'market.companies',
  method: 'GET',
  path: '/api/market/companies',
  summary: 'Companies of the market, without any business of theirs',
  query: pageQuery,
  status: 200,
  answer: pageOf(
    z.object({
      id,
      name: z.string(),
      kind: z.enum(['dealer', 'fabricator', 'market']),
      town: z.string(),
      people: z.int(),
      tradeAccounts: z.int(),
      since: instant,
    }),
  ),
});
