import * as z from 'zod';
import { endpoint } from './endpoint';
import { currency, day, id, instant, line, markUp, moneySchema, named, pageOf, pageQuery, quantity, text } from './primitives';
import { lineInput, pricedLine, totalsSchema } from './prices';
import { unitSchema } from './units';

/** Quotes: many lines, held prices, the dealer's own customer and mark-up. */

/** The dealer's own customer; never shown to a fabricator. */
export const customer = z.strictObject({
  name: line(120),
  email: z.email('an e-mail address').max(254).optional(),
  address: text(400).optional(),
});

export const quoteLine = pricedLine.extend({
  id,
  position: z.int(),
  tag: z.string().nullable(),
  unit: unitSchema,
  quantity: z.int(),
  extras: z.array(id),
  makeUp: z.string().meta({ description: 'as the trade writes it' }),
  retail: z.object({ unitPrice: moneySchema, linePrice: moneySchema }).meta({ description: 'with the dealer’s mark-up' }),
});

export const quoteState = z.enum(['open', 'ordered', 'expired']);

const quoteHead = {
  id,
  number: z.string(),
  state: quoteState,
  tradeAccount: id,
  fabricator: named,
  currency,
  customer: customer.nullable(),
  markUpPercent: z.string(),
  notes: z.string(),
  validUntil: day,
  createdAt: instant,
  updatedAt: instant,
  createdBy: z.string(),
  units: z.int(),
  total: moneySchema,
  order: z.object({ id, number: z.string() }).nullable(),
};

export const quoteItem = z.object(quoteHead).meta({ id: 'QuoteItem' });

export const quoteSchema = z
  .object({
    ...quoteHead,
    revision: z.int().meta({ description: 'send it back with a change, so that nobody overwrites another silently' }),
    priceListVersion: id,
    priceList: z.object({ name: z.string(), effectiveFrom: instant }),
    pricedAt: instant,
    shipTo: id.nullable(),
    leadTimeDays: z.int().nullable(),
    earliestOn: day.meta({ description: 'the first day on which an order placed now can be ready' }),
    lines: z.array(quoteLine),
    ...totalsSchema.shape,
    retailGoods: moneySchema,
    mails: z.array(
      z.object({ at: instant, to: z.string(), prices: z.enum(['wholesale', 'retail']), state: z.enum(['waiting', 'sent', 'failed']) }),
    ),
  })
  .meta({ id: 'Quote' });
export type Quote = z.infer<typeof quoteSchema>;
export type QuoteItem = z.infer<typeof quoteItem>;
export type QuoteLine = z.infer<typeof quoteLine>;

const quoteId = z.object({ id });

export const createQuote = endpoint({
  id: 'quotes.create',
  method: 'POST',
  path: '/api/quotes',
  summary: 'Make a quote at one trade account; prices are held until validUntil',
  body: z.strictObject({
    tradeAccount: id,
    lines: z.array(lineInput).min(1).max(500),
    customer: customer.optional(),
    markUpPercent: markUp.optional(),
    notes: text(2000).optional(),
    validUntil: day.optional(),
    shipTo: id.optional(),
  }),
  status: 201,
  answer: quoteSchema,
});

export const listQuotes = endpoint({
  id: 'quotes.list',
  method: 'GET',
  path: '/api/quotes',
  summary: 'The dealer’s quotes, newest first; q looks in number, customer and tags',
  query: pageQuery.extend({ state: quoteState.optional(), q: z.string().max(100).optional(), tradeAccount: id.optional() }),
  status: 200,
  answer: pageOf(quoteItem),
});

export const readQuote = endpoint({
  id: 'quotes.read',
  method: 'GET',
  path: '/api/quotes/:id',
  summary: 'One quote',
  params: quoteId,
  status: 200,
  answer: quoteSchema,
});

export const changeQuote = endpoint({
  id: 'quotes.change',
  method: 'PATCH',
  path: '/api/quotes/:id',
  summary: 'Change customer, mark-up, notes, validity or ship-to; agreed prices stay',
  params: quoteId,
  body: z.strictObject({
    revision: z.int(),
    customer: customer.nullable().optional(),
    markUpPercent: markUp.optional(),
    notes: text(2000).optional(),
    validUntil: day.optional(),
    shipTo: id.nullable().optional(),
  }),
  status: 200,
  answer: quoteSchema,
});

export const addQuoteLines = endpoint({
  id: 'quotes.add-lines',
  method: 'POST',
  path: '/api/quotes/:id/lines',
  summary: 'Append lines, priced with the version that the quote holds',
  params: quoteId,
  body: z.strictObject({ lines: z.array(lineInput).min(1).max(500) }),
  status: 200,
  answer: quoteSchema,
});

export const changeQuoteLines = endpoint({
  id: 'quotes.change-lines',
  method: 'PUT',
  path: '/api/quotes/:id/lines',
  summary: 'The whole list of lines in its new order: edit, copy, reorder, remove, put back',
  params: quoteId,
  body: z.strictObject({
    revision: z.int(),
    lines: z
      .array(
        z.strictObject({ id: id.optional(), unit: unitSchema, quantity, tag: line(80).optional(), extras: z.array(id).max(20).optional() }),
      )
      .max(500),
  }),
  status: 200,
  answer: quoteSchema,
});

const difference = z.object({ line: id, tag: z.string().nullable(), before: moneySchema, after: moneySchema });

export const previewRePrice = endpoint({
  id: 'quotes.preview-re-price',
  method: 'GET',
  path: '/api/quotes/:id/re-price',
  summary: 'What the quote would cost under the list in force now, line by line',
  params: quoteId,
  status: 200,
  answer: z.object({
    priceListVersion: id,
    priceList: z.object({ name: z.string(), effectiveFrom: instant }),
    differences: z.array(difference),
    before: moneySchema,
    after: moneySchema,
  }),
});

export const rePriceQuote = endpoint({
  id: 'quotes.re-price',
  method: 'POST',
  path: '/api/quotes/:id/re-price',
  summary: 'Take the new prices; `accepted` is the new total as it was shown',
  params: quoteId,
  body: z.strictObject({ revision: z.int(), accepted: z.string(), validUntil: day.optional() }),
  status: 200,
  answer: quoteSchema,
});

export const quotePdf = endpoint({
  id: 'quotes.pdf',
  method: 'GET',
  path: '/api/quotes/:id/pdf',
  summary: 'The quote as PDF with drawings, wholesale or retail',
  params: quoteId,
  query: z.object({ prices: z.enum(['wholesale', 'retail']).default('wholesale') }),
  status: 200,
  file: 'application/pdf',
});

export const mailQuote = endpoint({
  id: 'quotes.mail',
  method: 'POST',
  path: '/api/quotes/:id/mail',
  summary: 'Mail the PDF to the dealer’s customer',
  params: quoteId,
  body: z.strictObject({
    to: z.email('an e-mail address').max(254),
    subject: line(200),
    message: text(4000),
    prices: z.enum(['wholesale', 'retail']).default('retail'),
  }),
  status: 200,
  answer: quoteSchema,
  idempotent: true,
});
