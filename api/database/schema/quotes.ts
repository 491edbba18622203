import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { type z } from 'zod';
import { type customer } from '@shared/contracts/quotes';
import { type Destination, type PriceTerms } from '@shared/contracts/price-lists';
import { type PricedLine, type Totals } from '@shared/contracts/prices';
import { type Unit } from '@shared/contracts/units';
import { type Currency } from '@shared/money/currencies';
import { companies, people, tradeAccounts, addresses } from './companies';
import { day, id, instant, isCurrency, isDay, json, minor, oneOf } from './columns';
import { priceListVersions } from './pricing';

/**
 * Held prices: the version, the terms, the destination and the sheets it was priced with.
 * Whether an open quote has expired follows from `validUntil` and the day.
 */
export const quotes = sqliteTable(
  'quotes',
  {
    id: id(),
    number: text('number').notNull(),
    dealerId: text('dealer_id')
      .notNull()
      .references(() => companies.id),
    fabricatorId: text('fabricator_id')
      .notNull()
      .references(() => companies.id),
    tradeAccountId: text('trade_account_id')
      .notNull()
      .references(() => tradeAccounts.id),
    state: text('state', { enum: ['open', 'ordered'] }).notNull(),
    currency: text('currency').$type<Currency>().notNull(),
    customer: json<z.infer<typeof customer>>('customer'),
    customerName: text('customer_name').notNull().default(''),
    markUpPercent: text('mark_up_percent').notNull(),
    notes: text('notes').notNull(),
    validUntil: day('valid_until').notNull(),
    shipToId: text('ship_to_id').references(() => addresses.id),
    leadTimeClass: text('lead_time_class'),
    leadTimeDays: integer('lead_time_days'),
    priceListVersionId: text('price_list_version_id')
      .notNull()
      .references(() => priceListVersions.id),
    terms: json<PriceTerms>('terms').notNull(),
    destination: json<Destination>('destination').notNull(),
    pricedAt: instant('priced_at').notNull(),
    totals: json<Totals>('totals').notNull(),
    totalMinor: minor('total_minor').notNull(),
    units: integer('units').notNull(),
    revision: integer('revision').notNull(),
    createdAt: instant('created_at').notNull(),
    updatedAt: instant('updated_at').notNull(),
    createdBy: text('created_by')
      .notNull()
      .references(() => people.id),
  },
  (t) => [
    oneOf('quotes_state', t.state, ['open', 'ordered']),
    isCurrency('quotes_currency', t.currency),
    isDay('quotes_valid_until', t.validUntil),
    uniqueIndex('quotes_by_number').on(t.dealerId, t.number),
    index('quotes_newest').on(t.dealerId, t.createdAt, t.id),
    index('quotes_by_state').on(t.dealerId, t.state, t.createdAt, t.id),
  ],
);

export const quoteLines = sqliteTable(
  'quote_lines',
  {
    id: id(),
    quoteId: text('quote_id')
      .notNull()
      .references(() => quotes.id, { onDelete: 'cascade' }),
    position: integer('position').notNull(),
    tag: text('tag'),
    unit: json<Unit>('unit').notNull(),
    quantity: integer('quantity').notNull(),
    extras: json<string[]>('extras').notNull(),
    makeUp: text('make_up').notNull(),
    unitPriceMinor: minor('unit_price_minor').notNull(),
    linePriceMinor: minor('line_price_minor').notNull(),
    sheet: json<PricedLine>('sheet').notNull(),
  },
  (t) => [index('quote_lines_by_quote').on(t.quoteId, t.position)],
);
