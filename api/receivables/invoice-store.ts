import { and, asc, desc, eq, getTableColumns, gte, isNull, lt, type SQL, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import { type Db } from '../database/open-database';
import { companies } from '../database/schema/companies';
import { dispatches, orders } from '../database/schema/orders';
import { allocations, invoices } from '../database/schema/receivables';

const dealers = alias(companies, 'dealers');
const makers = alias(companies, 'makers');

export type InvoiceRow = typeof invoices.$inferSelect;
export type ListedInvoice = Omit<InvoiceRow, 'lines' | 'totals'> & { dealerName: string; fabricatorName: string };

/** Which invoices a list shows. */
export interface InvoiceFilter {
  companyKind: 'dealer' | 'fabricator';
  companyId: string;
  state?: 'open' | 'paid' | undefined;
  tradeAccountId?: string | undefined;
}

// Written out, not bound: SQLite takes a partial index only where it can see its condition.
const isOpen = sql`${invoices.openMinor} > 0`;
const isPaid = sql`${invoices.openMinor} = 0`;
/** Sorts after every character that can follow. */
const LAST = '\u{10ffff}';

/** Rows of invoices and what they still lack. */
export function invoiceStore(db: Db) {
  const { lines: _lines, totals: _totals, ...listed } = getTableColumns(invoices);
  const names = { dealerName: sql<string>`${dealers.name}`, fabricatorName: sql<string>`${makers.name}` };
  const own = ({ companyKind, companyId }: Pick<InvoiceFilter, 'companyKind' | 'companyId'>) =>
    eq(companyKind === 'dealer' ? invoices.dealerId : invoices.fabricatorId, companyId);
  // With an account named, its index serves; the unary plus keeps the planner from taking the company's instead.
  const ofAccount = (filter: InvoiceFilter) =>
    filter.tradeAccountId
      ? and(
          eq(invoices.tradeAccountId, filter.tradeAccountId),
          sql`+${filter.companyKind === 'dealer' ? invoices.dealerId : invoices.fabricatorId} = ${filter.companyId}`,
        )
      : own(filter);
  const list = (filter: InvoiceFilter, ...also: (SQL | undefined)[]) =>
    db
      .select({ ...listed, ...names })
      .from(invoices)
      .innerJoin(dealers, eq(dealers.id, invoices.dealerId))
      .innerJoin(makers, eq(makers.id, invoices.fabricatorId))
      .where(and(ofAccount(filter), filter.state === 'open' ? isOpen : filter.state === 'paid' ? isPaid : undefined, ...also));
  const addToOpen = db
    .update(invoices)
    .set({ openMinor: sql`${invoices.openMinor} + ${sql.placeholder('change')}` })
    .where(eq(invoices.id, sql.placeholder('id')))
    .prepare();
  const overdue = db
    .select({ minor: sql<number>`coalesce(sum(${invoices.openMinor}), 0)` })
    .from(invoices)
    .where(and(eq(invoices.tradeAccountId, sql.placeholder('account')), lt(invoices.dueOn, sql.placeholder('day')), isOpen))
    .prepare();
  const id = sql.placeholder('id');
  const byId = db.select().from(invoices).where(eq(invoices.id, id)).prepare();
  const row = Object.fromEntries(Object.keys(getTableColumns(invoices)).map((name) => [name, sql.placeholder(name)]));
  const insert = db
    .insert(invoices)
    .values(row as unknown as InvoiceRow)
    .prepare();
  const ofOrder = db.select().from(invoices).where(eq(invoices.orderId, id)).orderBy(asc(invoices.sequence)).prepare();
  const newestOfOrder = db
    .select({ id: invoices.id })
    .from(invoices)
    .where(eq(invoices.orderId, id))
    .orderBy(desc(invoices.sequence))
    .limit(1)
    .prepare();
  const discountTaken = db
    .select({ minor: sql<number>`coalesce(sum(${allocations.discountMinor}), 0)` })
    .from(allocations)
    .where(and(eq(allocations.invoiceId, id), isNull(allocations.reversedAt)))
    .prepare();
  const read = db
    .select({
      invoice: invoices,
      ...names,
      orderNumber: orders.number,
      poNumber: orders.poNumber,
      shipTo: orders.shipTo,
      dispatchNumber: dispatches.number,
    })
    .from(invoices)
    .innerJoin(dealers, eq(dealers.id, invoices.dealerId))
    .innerJoin(makers, eq(makers.id, invoices.fabricatorId))
    .innerJoin(orders, eq(orders.id, invoices.orderId))
    .innerJoin(dispatches, eq(dispatches.id, invoices.dispatchId))
    .where(eq(invoices.id, id))
    .prepare();

  return {
    insert: (row: InvoiceRow) => insert.run({ ...row }),

    byId: (id: string): InvoiceRow | undefined => byId.get({ id }),

    /** Invoices of an order in the order of issue. */
    ofOrder: (orderId: string): InvoiceRow[] => ofOrder.all({ id: orderId }),

    newestOfOrder: (orderId: string): string | undefined => newestOfOrder.get({ id: orderId })?.id,

    /** Adds signed minor units to what is open; the database refuses to go below zero or above the total. */
    addToOpen: (id: string, change: number) => addToOpen.run({ id, change }),

    /** Open on the invoices of an account that were due before a day. */
    overdueMinor: (tradeAccountId: string, day: string): number => overdue.get({ account: tradeAccountId, day })?.minor ?? 0,

    /** Early-payment discount taken on an invoice by allocations that stand. */
    discountTakenMinor: (invoiceId: string): number => discountTaken.get({ id: invoiceId })?.minor ?? 0,

    /** An invoice that the company is a party of, with what it stands on. */
    read: (companyId: string, id: string) => {
      const found = read.get({ id });
      return found && (found.invoice.dealerId === companyId || found.invoice.fabricatorId === companyId) ? found : undefined;
    },

    /** Open ones by the earliest due day, others by the latest; those after (due day, id). */
    page: (filter: InvoiceFilter, after: [string, string] | undefined, limit: number) => {
      const openOnly = filter.state === 'open';
      const way = openOnly ? asc : desc;
      const beyond = after && sql`(${invoices.dueOn}, ${invoices.id}) ${sql.raw(openOnly ? '>' : '<')} (${after[0]}, ${after[1]})`;
      return list(filter, beyond).orderBy(way(invoices.dueOn), way(invoices.id)).limit(limit);
    },

    /** Invoices whose number (or reference) begins with a text, the last first; those after (that text, id). */
    search: (filter: InvoiceFilter, by: 'number' | 'reference', beginning: string, after: [string, string] | undefined, limit: number) => {
      const column = invoices[by];
      return list(
        { ...filter, tradeAccountId: undefined },
        filter.tradeAccountId ? sql`+${invoices.tradeAccountId} = ${filter.tradeAccountId}` : undefined,
        gte(column, beginning),
        lt(column, beginning + LAST),
        after && sql`(${column}, ${invoices.id}) < (${after[0]}, ${after[1]})`,
      )
        .orderBy(desc(column), desc(invoices.id))
        .limit(limit);
    },
  };
}
