import { and, asc, eq, getTableColumns, inArray, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import { type OrderState } from '@shared/contracts/orders';
import { type Db } from '../database/open-database';
import { companies, fabricators, people } from '../database/schema/companies';
import { dispatches, dispatchLines, orderLines, orderMoves, orders } from '../database/schema/orders';
import { quoteLines, quotes } from '../database/schema/quotes';
import { invoices } from '../database/schema/receivables';
import { reservingStates } from './reservation';

const dealers = alias(companies, 'dealers');
const makers = alias(companies, 'makers');
const place = sql.placeholder;

export type OrderRow = typeof orders.$inferSelect;
export type OrderLineRow = typeof orderLines.$inferSelect;
type MoveRow = Omit<typeof orderMoves.$inferInsert, 'id'>;

/** Rows of orders, their lines, moves and dispatches. Lists are in order-list-store. */
export function orderStore(db: Db) {
  const maker = db
    .select({
      id: companies.id,
      name: companies.name,
      timeZone: companies.timeZone,
      locale: companies.locale,
      measureSystem: companies.measureSystem,
      letterhead: companies.letterhead,
      numberPrefix: fabricators.numberPrefix,
      calendar: fabricators.calendar,
      takesCards: fabricators.takesCards,
    })
    .from(fabricators)
    .innerJoin(companies, eq(companies.id, fabricators.companyId))
    .where(eq(fabricators.companyId, place('id')))
    .prepare();
  const insert = db.insert(orders).values(placeholdersOf(orders)).prepare();
  // Text is copied as it stands: the sheets of the order are those of the quote, byte for byte.
  const copyLines = db
    .insert(orderLines)
    .select(
      db
        .select({
          id: sql<string>`${place('orderId')} || '.' || ${quoteLines.position}`.as('id'),
          orderId: sql<string>`${place('orderId')}`.as('order_id'),
          position: quoteLines.position,
          tag: quoteLines.tag,
          unit: quoteLines.unit,
          makeUp: quoteLines.makeUp,
          quantity: quoteLines.quantity,
          dispatched: sql<number>`0`.as('dispatched'),
          unitPriceMinor: quoteLines.unitPriceMinor,
          linePriceMinor: quoteLines.linePriceMinor,
          sheet: quoteLines.sheet,
        })
        .from(quoteLines)
        .where(eq(quoteLines.quoteId, place('quoteId'))),
    )
    .prepare();
  const recordMove = db
    .insert(orderMoves)
    .values({
      orderId: place('orderId'),
      from: place('from'),
      to: place('to'),
      at: place('at'),
      personId: place('personId'),
      reason: place('reason'),
    })
    .prepare();
  const read = db
    .select({
      order: orders,
      dealerName: sql<string>`${dealers.name}`.as('dealer_name'),
      fabricatorName: sql<string>`${makers.name}`.as('fabricator_name'),
      placedByName: people.name,
      leadTimeClass: quotes.leadTimeClass,
    })
    .from(orders)
    .innerJoin(dealers, eq(dealers.id, orders.dealerId))
    .innerJoin(makers, eq(makers.id, orders.fabricatorId))
    .innerJoin(people, eq(people.id, orders.placedBy))
    .leftJoin(quotes, eq(quotes.id, orders.quoteId))
    .where(eq(orders.id, place('id')))
    .prepare();
  const linesOf = db
    .select()
    .from(orderLines)
    .where(eq(orderLines.orderId, place('id')))
    .orderBy(asc(orderLines.position))
    .prepare();
  const movesOf = db
    .select({ move: orderMoves, byName: people.name })
    .from(orderMoves)
    .leftJoin(people, eq(people.id, orderMoves.personId))
    .where(eq(orderMoves.orderId, place('id')))
    .orderBy(asc(orderMoves.id))
    .prepare();
  const dispatchesOf = db
    .select({ dispatch: dispatches, byName: people.name, invoiceId: invoices.id, invoiceNumber: invoices.number })
    .from(dispatches)
    .innerJoin(people, eq(people.id, dispatches.personId))
    .leftJoin(invoices, eq(invoices.dispatchId, dispatches.id))
    .where(eq(dispatches.orderId, place('id')))
    .orderBy(asc(dispatches.at), asc(dispatches.number))
    .prepare();
  const linesOfDispatch = db
    .select()
    .from(dispatchLines)
    .where(eq(dispatchLines.dispatchId, place('id')))
    .prepare();
  const save = db
    .update(orders)
    .set({
      state: sql`${place('state')}`,
      promisedOn: sql`${place('promisedOn')}`,
      dispatchedUnits: sql`${place('dispatchedUnits')}`,
      invoicedMinor: sql`${place('invoicedMinor')}`,
    })
    .where(eq(orders.id, place('id')))
    .prepare();
  const insertDispatch = db
    .insert(dispatches)
    .values({ id: place('id'), orderId: place('orderId'), number: place('number'), at: place('at'), personId: place('personId') })
    .prepare();
  const insertDispatchLine = db
    .insert(dispatchLines)
    .values({ dispatchId: place('dispatchId'), orderLineId: place('orderLineId'), quantity: place('quantity') })
    .prepare();
  const addDispatched = db
    .update(orderLines)
    .set({ dispatched: sql`${orderLines.dispatched} + ${place('quantity')}` })
    .where(eq(orderLines.id, place('id')))
    .prepare();

  return {
    /** What orders need to know of a fabricator. @throws Error when there is none: ids come from trade accounts */
    maker: (fabricatorId: string) => {
      const found = maker.get({ id: fabricatorId });
      if (!found) throw new Error(`no fabricator ${fabricatorId}`);
      return found;
    },

    insert: (row: OrderRow) => insert.run({ ...row }),

    copyLinesOfQuote: (orderId: string, quoteId: string) => copyLines.run({ orderId, quoteId }),

    recordMove: (row: MoveRow) => recordMove.run({ ...row }),

    /** An order that the company is a party of, with the names that stand on it. */
    read: (companyId: string, id: string) => {
      const found = read.get({ id });
      return found && (found.order.dealerId === companyId || found.order.fabricatorId === companyId) ? found : undefined;
    },

    linesOf: (orderId: string): OrderLineRow[] => linesOf.all({ id: orderId }),

    movesOf: (orderId: string) => movesOf.all({ id: orderId }),

    dispatchesOf: (orderId: string) =>
      dispatchesOf.all({ id: orderId }).map((row) => ({ ...row, lines: linesOfDispatch.all({ id: row.dispatch.id }) })),

    /** Keeps what moves and dispatches change of an order. */
    save: ({ id, state, promisedOn, dispatchedUnits, invoicedMinor }: OrderRow) =>
      save.run({ id, state, promisedOn, dispatchedUnits, invoicedMinor }),

    insertDispatch: (row: typeof dispatches.$inferInsert, lines: readonly { orderLineId: string; quantity: number }[]): void => {
      insertDispatch.run({ ...row });
      for (const { orderLineId, quantity } of lines) {
        insertDispatchLine.run({ dispatchId: row.id, orderLineId, quantity });
        addDispatched.run({ id: orderLineId, quantity });
      }
    },

    /** What the living orders of an account have not been invoiced for, whether it reserves or not. */
    notInvoicedMinor: (tradeAccountId: string): number =>
      db
        .select({ minor: sql<number>`coalesce(sum(${orders.totalMinor} - ${orders.invoicedMinor}), 0)` })
        .from(orders)
        .where(
          and(
            eq(orders.tradeAccountId, tradeAccountId),
            eq(orders.payment, 'account'),
            inArray(orders.state, [...reservingStates] satisfies OrderState[]),
          ),
        )
        .get()?.minor ?? 0,
  };
}
export type Maker = ReturnType<ReturnType<typeof orderStore>['maker']>;
export type ReadOrderRow = NonNullable<ReturnType<ReturnType<typeof orderStore>['read']>>;

/** A placeholder for each column of a table, named as in code. */
function placeholdersOf(table: typeof orders) {
  return Object.fromEntries(Object.keys(getTableColumns(table)).map((name) => [name, place(name)])) as unknown as OrderRow;
}
