import { and, asc, desc, eq, getTableColumns, isNull, sql } from 'drizzle-orm';
import { type Db } from '../database/open-database';
import { companies, people, tradeAccounts } from '../database/schema/companies';
import { allocations, invoices, receipts } from '../database/schema/receivables';

export type ReceiptRow = typeof receipts.$inferSelect;
export type AllocationRow = typeof allocations.$inferSelect;

export interface ReceiptFilter {
  fabricatorId: string;
  tradeAccountId?: string | undefined;
  unapplied?: boolean | undefined;
}

// Written out, not bound: SQLite takes a partial index only where it can see its condition.
const isUnapplied = sql`${receipts.unappliedMinor} > 0`;

// Allocations of one call share their instant; the order of their rows is the order they were asked for in.
const asWritten = sql`${allocations}.rowid`;

/** Rows of receipts and of what was applied of them. */
export function receiptStore(db: Db) {
  const named = () =>
    db
      .select({ receipt: receipts, dealerId: companies.id, dealerName: companies.name, recordedByName: people.name })
      .from(receipts)
      .innerJoin(tradeAccounts, eq(tradeAccounts.id, receipts.tradeAccountId))
      .innerJoin(companies, eq(companies.id, tradeAccounts.dealerId))
      .innerJoin(people, eq(people.id, receipts.recordedBy));
  const allocated = () =>
    db
      .select({
        allocation: allocations,
        receiptNumber: receipts.number,
        receivedOn: receipts.receivedOn,
        invoiceNumber: invoices.number,
        currency: invoices.currency,
        byName: people.name,
      })
      .from(allocations)
      .innerJoin(receipts, eq(receipts.id, allocations.receiptId))
      .innerJoin(invoices, eq(invoices.id, allocations.invoiceId))
      .innerJoin(people, eq(people.id, allocations.personId));
  const addToUnapplied = db
    .update(receipts)
    .set({ unappliedMinor: sql`${receipts.unappliedMinor} + ${sql.placeholder('change')}` })
    .where(eq(receipts.id, sql.placeholder('id')))
    .prepare();

  const id = sql.placeholder('id');
  const insert = db.insert(receipts).values(placeholdersOf(receipts)).prepare();
  const insertAllocation = db.insert(allocations).values(placeholdersOf(allocations)).prepare();
  const read = named().where(eq(receipts.id, id)).prepare();
  const ofReceipt = allocated().where(eq(allocations.receiptId, id)).orderBy(asc(allocations.at), asWritten).prepare();
  const ofInvoice = allocated().where(eq(allocations.invoiceId, id)).orderBy(asc(allocations.at), asWritten).prepare();
  const ofFabricator = (fabricatorId: string, receiptId: string) => {
    const found = read.get({ id: receiptId });
    return found?.receipt.fabricatorId === fabricatorId ? found : undefined;
  };

  return {
    insert: (row: ReceiptRow) => insert.run({ ...row }),

    /** A receipt of this fabricator. */
    of: (fabricatorId: string, receiptId: string): ReceiptRow | undefined => ofFabricator(fabricatorId, receiptId)?.receipt,

    /** The same with the names that stand on it. */
    read: ofFabricator,

    /** The newest first; those after (recorded at, id). */
    page: (filter: ReceiptFilter, after: [number, string] | undefined, limit: number) =>
      named()
        .where(
          and(
            // With an account named, its index serves; the unary plus keeps the planner from taking the fabricator's instead.
            filter.tradeAccountId
              ? and(eq(receipts.tradeAccountId, filter.tradeAccountId), sql`+${receipts.fabricatorId} = ${filter.fabricatorId}`)
              : eq(receipts.fabricatorId, filter.fabricatorId),
            filter.unapplied ? isUnapplied : filter.unapplied === false ? sql`${receipts.unappliedMinor} = 0` : undefined,
            after && sql`(${receipts.recordedAt}, ${receipts.id}) < (${after[0]}, ${after[1]})`,
          ),
        )
        .orderBy(desc(receipts.recordedAt), desc(receipts.id))
        .limit(limit),

    /** Adds signed minor units to the unapplied rest; the database refuses to go below zero or above the amount. */
    addToUnapplied: (id: string, change: number) => addToUnapplied.run({ id, change }),

    markReversed: (id: string, reversedAt: number, reversedReason: string) =>
      db.update(receipts).set({ reversedAt, reversedReason, unappliedMinor: 0 }).where(eq(receipts.id, id)).run(),

    insertAllocation: (row: AllocationRow) => insertAllocation.run({ ...row }),

    /** An allocation of a receipt of this fabricator. */
    allocationOf: (fabricatorId: string, id: string): AllocationRow | undefined =>
      db
        .select({ allocation: allocations })
        .from(allocations)
        .innerJoin(receipts, eq(receipts.id, allocations.receiptId))
        .where(and(eq(allocations.id, id), eq(receipts.fabricatorId, fabricatorId)))
        .get()?.allocation,

    livingAllocations: (receiptId: string): AllocationRow[] =>
      db
        .select()
        .from(allocations)
        .where(and(eq(allocations.receiptId, receiptId), isNull(allocations.reversedAt)))
        .orderBy(asc(allocations.at), asWritten)
        .all(),

    markAllocationReversed: (id: string, reversedAt: number, reversedReason: string) =>
      db.update(allocations).set({ reversedAt, reversedReason }).where(eq(allocations.id, id)).run(),

    allocationsOfReceipt: (receiptId: string) => ofReceipt.all({ id: receiptId }),

    allocationsOfInvoice: (invoiceId: string) => ofInvoice.all({ id: invoiceId }),
  };
}
export type AllocatedRow = ReturnType<ReturnType<typeof receiptStore>['allocationsOfReceipt']>[number];

/** A placeholder for each column of a table, named as in code. */
function placeholdersOf<T extends typeof receipts | typeof allocations>(table: T) {
  return Object.fromEntries(
    Object.keys(getTableColumns(table)).map((name) => [name, sql.placeholder(name)]),
  ) as unknown as T['$inferInsert'];
}
