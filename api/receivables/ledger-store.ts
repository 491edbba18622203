import { and, desc, eq, inArray, lt, lte, sql } from 'drizzle-orm';
import { type Db } from '../database/open-database';
import { priceLists } from '../database/schema/pricing';
import { allocations, invoices, type LedgerAccount, ledgerEntries, postings, receipts } from '../database/schema/receivables';
import { tradeAccounts } from '../database/schema/companies';

type EntryRow = Omit<typeof ledgerEntries.$inferInsert, 'closed'>;
type PostingRow = typeof postings.$inferInsert;
export type Entry = typeof ledgerEntries.$inferSelect & { postings: (typeof postings.$inferSelect)[] };

/** Rows of the ledger. Only `postEntry` writes them. */
export function ledgerStore(db: Db) {
  const place = sql.placeholder;
  const open = db
    .insert(ledgerEntries)
    .values({
      id: place('id'),
      fabricatorId: place('fabricatorId'),
      sequence: place('sequence'),
      on: place('on'),
      at: place('at'),
      kind: place('kind'),
      memo: place('memo'),
      tradeAccountId: place('tradeAccountId'),
      documentKind: place('documentKind'),
      documentId: place('documentId'),
      reverses: place('reverses'),
      personId: place('personId'),
      closed: false,
    })
    .prepare();
  const post = db
    .insert(postings)
    .values({
      entryId: place('entryId'),
      position: place('position'),
      account: place('account'),
      currency: place('currency'),
      debitMinor: place('debitMinor'),
      creditMinor: place('creditMinor'),
    })
    .prepare();
  const close = db
    .update(ledgerEntries)
    .set({ closed: true })
    .where(eq(ledgerEntries.id, place('id')))
    .prepare();
  const entriesOf = db
    .select()
    .from(ledgerEntries)
    .where(and(eq(ledgerEntries.documentKind, place('documentKind')), eq(ledgerEntries.documentId, place('documentId'))))
    .prepare();
  const postingsOf = db
    .select()
    .from(postings)
    .where(eq(postings.entryId, place('id')))
    .orderBy(postings.position)
    .prepare();
  const net = sql<number>`coalesce(sum(${postings.debitMinor} - ${postings.creditMinor}), 0)`;

  return {
    /** Writes an entry open, its postings, then closes it; the database refuses to close what does not balance. */
    write: (entry: EntryRow, rows: readonly Omit<PostingRow, 'entryId' | 'position'>[]): void => {
      open.run({ ...entry });
      for (const [position, row] of rows.entries()) post.run({ ...row, entryId: entry.id, position });
      close.run({ id: entry.id });
    },

    /** Entries of documents of one kind in the order of posting. */
    entriesOf: (documentKind: Entry['documentKind'], documentIds: readonly string[]): Entry[] =>
      documentIds
        .flatMap((documentId) => entriesOf.all({ documentKind, documentId }))
        .map((entry) => ({ ...entry, postings: postingsOf.all({ id: entry.id }) }))
        .sort((one, other) => one.sequence - other.sequence),

    /** Entries of a trade account before a sequence number, the latest first. */
    entriesBefore: (tradeAccountId: string, before: number | undefined, limit: number): Entry[] =>
      db
        .select()
        .from(ledgerEntries)
        .where(and(eq(ledgerEntries.tradeAccountId, tradeAccountId), before === undefined ? undefined : lt(ledgerEntries.sequence, before)))
        .orderBy(desc(ledgerEntries.sequence))
        .limit(limit)
        .all()
        .map((entry) => ({ ...entry, postings: postingsOf.all({ id: entry.id }) })),

    /** Receivable less unapplied cash of a trade account after its entries up to this sequence number. */
    accountBalanceAt: (tradeAccountId: string, sequence: number): number =>
      db
        .select({ net })
        .from(ledgerEntries)
        .innerJoin(postings, eq(postings.entryId, ledgerEntries.id))
        .where(
          and(
            eq(ledgerEntries.tradeAccountId, tradeAccountId),
            lte(ledgerEntries.sequence, sequence),
            inArray(postings.account, ['receivable', 'unapplied cash']),
          ),
        )
        .get()?.net ?? 0,

    /** Numbers by document id: an invoice's or receipt's own, of an allocation that of the invoice it settles. */
    documentNumbers: (entries: readonly Entry[]): Map<string, string> => {
      const of = (kind: Entry['documentKind']) => entries.filter((entry) => entry.documentKind === kind).map((entry) => entry.documentId);
      const found = [
        ...db
          .select({ id: invoices.id, number: invoices.number })
          .from(invoices)
          .where(inArray(invoices.id, of('invoice')))
          .all(),
        ...db
          .select({ id: receipts.id, number: receipts.number })
          .from(receipts)
          .where(inArray(receipts.id, of('receipt')))
          .all(),
        ...db
          .select({ id: allocations.id, number: invoices.number })
          .from(allocations)
          .innerJoin(invoices, eq(invoices.id, allocations.invoiceId))
          .where(inArray(allocations.id, of('allocation')))
          .all(),
      ];
      return new Map(found.map(({ id, number }) => [id, number]));
    },

    /** Debits less credits by account over the entries up to and including a day. */
    balancesOf: (fabricatorId: string, at: string): { account: LedgerAccount; netMinor: number }[] =>
      db
        .select({ account: postings.account, netMinor: net })
        .from(ledgerEntries)
        .innerJoin(postings, eq(postings.entryId, ledgerEntries.id))
        .where(and(eq(ledgerEntries.fabricatorId, fabricatorId), lte(ledgerEntries.on, at)))
        .groupBy(postings.account)
        .all(),

    /** The currency a fabricator keeps its ledger in: that of its price list, or of its accounts. */
    currencyOf: (fabricatorId: string) =>
      db.select({ currency: priceLists.currency }).from(priceLists).where(eq(priceLists.fabricatorId, fabricatorId)).get()?.currency ??
      db.select({ currency: tradeAccounts.currency }).from(tradeAccounts).where(eq(tradeAccounts.fabricatorId, fabricatorId)).get()
        ?.currency,
  };
}
