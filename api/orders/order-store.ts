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

    dispatchesOf: (orderId: string) => {
      const found = dispatchesOf.all({ id: orderId });
      const lines =
        found.length === 0
          ? []
          : db
              .select()
              .from(dispatchLines)
              .where(
                inArray(
                  dispatchLines.dispatchId,
                  found.map(({ dispatch }) => dispatch.id),
                ),
              )
              .all();
      return found.map((row) => ({ ...row, lines: lines.filter(({ dispatchId }) => dispatchId === row.dispatch.id) }));
    },

    change: (id: string, change: Partial<Pick<OrderRow, 'state' | 'promisedOn' | 'dispatchedUnits' | 'invoicedMinor'>>) =>
      db.update(orders).set(change).where(eq(orders.id, id)).run(),

    insertDispatch: (row: typeof dispatches.$inferInsert, lines: readonly { orderLineId: string; quantity: number }[]): void => {
      db.insert(dispatches).values(row).run();
      db.insert(dispatchLines)
        .values(lines.map((line) => ({ ...line, dispatchId: row.id })))
        .run();
      for (const { orderLineId, quantity } of lines) addDispatched.run({ id: orderLineId, quantity });
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
