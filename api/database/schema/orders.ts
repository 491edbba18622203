import { sql } from 'drizzle-orm';
import { check, index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { type z } from 'zod';
import { orderStates } from '@shared/contracts/orders';
import { type Destination } from '@shared/contracts/price-lists';
import { type PricedLine, type Totals } from '@shared/contracts/prices';
import { type addressSchema } from '@shared/contracts/trade-accounts';
import { type Unit } from '@shared/contracts/units';
import { type Currency } from '@shared/money/currencies';
import { companies, people, tradeAccounts } from './companies';
import { day, id, instant, isCurrency, json, minor, notNegative, oneOf } from './columns';
import { priceListVersions } from './pricing';
import { quotes } from './quotes';

export type ShipTo = Omit<z.infer<typeof addressSchema>, 'exempt'>;

export const orders = sqliteTable(
  'orders',
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
    quoteId: text('quote_id').references(() => quotes.id),
    state: text('state', { enum: orderStates }).notNull(),
    poNumber: text('po_number').notNull(),
    payment: text('payment', { enum: ['account', 'card'] }).notNull(),
    currency: text('currency').$type<Currency>().notNull(),
    shipTo: json<ShipTo>('ship_to').notNull(),
    destination: json<Destination>('destination').notNull(),
    requiredOn: day('required_on'),
    promisedOn: day('promised_on'),
    priceListVersionId: text('price_list_version_id')
      .notNull()
      .references(() => priceListVersions.id),
    totals: json<Totals>('totals').notNull(),
    totalMinor: minor('total_minor').notNull(),
    /** what invoices have been made of so far */
    invoicedMinor: minor('invoiced_minor').notNull().default(0),
    units: integer('units').notNull(),
    dispatchedUnits: integer('dispatched_units').notNull().default(0),
    placedAt: instant('placed_at').notNull(),
    placedBy: text('placed_by')
      .notNull()
      .references(() => people.id),
  },
  (t) => [
    oneOf('orders_state', t.state, orderStates),
    oneOf('orders_payment', t.payment, ['account', 'card']),
    isCurrency('orders_currency', t.currency),
    notNegative('orders_total', t.totalMinor),
    check('orders_dispatched', sql`${t.dispatchedUnits} between 0 and ${t.units}`),
    uniqueIndex('orders_by_number').on(t.fabricatorId, t.number),
    index('orders_of_dealer_by_number').on(t.dealerId, t.number, t.id),
    index('orders_of_dealer').on(t.dealerId, t.placedAt, t.id),
    index('orders_of_fabricator').on(t.fabricatorId, t.placedAt, t.id),
    index('orders_of_dealer_by_state').on(t.dealerId, t.state, t.placedAt, t.id),
    index('orders_of_fabricator_by_state').on(t.fabricatorId, t.state, t.placedAt, t.id),
    index('orders_of_dealer_by_po').on(t.dealerId, sql`${t.poNumber} collate nocase`, t.id),
    index('orders_of_fabricator_by_po').on(t.fabricatorId, sql`${t.poNumber} collate nocase`, t.id),
    index('orders_of_account').on(t.tradeAccountId, t.placedAt, t.id),
    uniqueIndex('orders_by_quote').on(t.quoteId),
  ],
);

export const orderLines = sqliteTable(
  'order_lines',
  {
    id: id(),
    orderId: text('order_id')
      .notNull()
      .references(() => orders.id),
    position: integer('position').notNull(),
    tag: text('tag'),
    unit: json<Unit>('unit').notNull(),
    makeUp: text('make_up').notNull(),
    quantity: integer('quantity').notNull(),
    dispatched: integer('dispatched').notNull().default(0),
    unitPriceMinor: minor('unit_price_minor').notNull(),
    linePriceMinor: minor('line_price_minor').notNull(),
    sheet: json<PricedLine>('sheet').notNull(),
  },
  (t) => [
    index('order_lines_by_order').on(t.orderId, t.position),
    check('order_lines_dispatched', sql`${t.dispatched} between 0 and ${t.quantity}`),
  ],
);

/** Each move with who, when and why; append only (triggers). */
export const orderMoves = sqliteTable(
  'order_moves',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    orderId: text('order_id')
      .notNull()
      .references(() => orders.id),
    from: text('from_state', { enum: orderStates }),
    to: text('to_state', { enum: orderStates }).notNull(),
    at: instant('at').notNull(),
    personId: text('person_id').references(() => people.id),
    reason: text('reason'),
  },
  (t) => [index('order_moves_by_order').on(t.orderId, t.id)],
);

export const dispatches = sqliteTable(
  'dispatches',
  {
    id: id(),
    orderId: text('order_id')
      .notNull()
      .references(() => orders.id),
    number: text('number').notNull(),
    at: instant('at').notNull(),
    personId: text('person_id')
      .notNull()
      .references(() => people.id),
  },
  (t) => [index('dispatches_by_order').on(t.orderId, t.at)],
);

export const dispatchLines = sqliteTable(
  'dispatch_lines',
  {
    dispatchId: text('dispatch_id')
      .notNull()
      .references(() => dispatches.id),
    orderLineId: text('order_line_id')
      .notNull()
      .references(() => orderLines.id),
    quantity: integer('quantity').notNull(),
  },
  (t) => [primaryKey({ columns: [t.dispatchId, t.orderLineId] }), check('dispatch_lines_quantity', sql`${t.quantity} > 0`)],
);

/** One answer for each key: the same request again gets it back. */
export const idempotencyKeys = sqliteTable(
  'idempotency_keys',
  {
    personId: text('person_id').notNull(),
    key: text('key').notNull(),
    endpoint: text('endpoint').notNull(),
    requestHash: text('request_hash').notNull(),
    /** what was made; the answer is read from it */
    subjectId: text('subject_id').notNull(),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [primaryKey({ columns: [t.personId, t.key] })],
);
