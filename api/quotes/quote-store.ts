import { and, asc, desc, eq, getTableColumns, gte, lt, or, sql, type SQL } from 'drizzle-orm';
import { type Db } from '../database/open-database';
import { companies, people } from '../database/schema/companies';
import { orders } from '../database/schema/orders';
import { quoteLines, quotes } from '../database/schema/quotes';

export type QuoteRow = typeof quotes.$inferSelect;
export type QuoteLineRow = typeof quoteLines.$inferSelect;

/** A row of the list: without what only the whole quote shows. */
export type QuoteListRow = Omit<QuoteRow, 'terms' | 'destination' | 'totals'> & QuoteNames;
interface QuoteNames {
  fabricatorName: string;
  createdByName: string;
  orderId: string | null;
  orderNumber: string | null;
}

export interface QuoteFilter {
  /** `open` and `expired` are told apart by `today`, a day of the dealer's */
  state?: 'open' | 'ordered' | 'expired';
  today: string;
  /** looked for in number, customer's name and tags */
  q?: string;
  tradeAccountId?: string;
}

/** Rows of quotes and their lines. A quote belongs to one dealer, and every look-up names it. */
export function quoteStore(db: Db) {
  const names = {
    fabricatorName: companies.name,
    createdByName: sql<string>`${people.name}`.as('created_by_name'),
    orderId: sql<string | null>`${orders.id}`.as('order_id'),
    orderNumber: sql<string | null>`${orders.number}`.as('order_number'),
  };
  const { terms: _terms, destination: _destination, totals: _totals, ...listed } = getTableColumns(quotes);
  const find = db
    .select()
    .from(quotes)
    .where(and(eq(quotes.id, sql.placeholder('id')), eq(quotes.dealerId, sql.placeholder('dealerId'))))
    .prepare();
  const namesOf = db
    .select(names)
    .from(quotes)
    .innerJoin(companies, eq(companies.id, quotes.fabricatorId))
    .innerJoin(people, eq(people.id, quotes.createdBy))
    .leftJoin(orders, eq(orders.quoteId, quotes.id))
    .where(eq(quotes.id, sql.placeholder('id')))
    .prepare();
  const markOrdered = db
    .update(quotes)
    .set({ state: 'ordered', updatedAt: sql`${sql.placeholder('at')}` })
    .where(eq(quotes.id, sql.placeholder('id')))
    .prepare();
  const linesOf = db
    .select()
    .from(quoteLines)
    .where(eq(quoteLines.quoteId, sql.placeholder('quoteId')))
    .orderBy(asc(quoteLines.position))
    .prepare();
  // Hundreds of lines at once: the statement is built for the first only.
  const insertLine = db
    .insert(quoteLines)
    .values(Object.fromEntries(Object.keys(getTableColumns(quoteLines)).map((name) => [name, sql.placeholder(name)])) as never)
    .prepare();
  const addLines = (rows: readonly QuoteLineRow[]): void => {
    for (const row of rows) insertLine.run({ ...row });
  };

  return {
    find: (dealerId: string, id: string): QuoteRow | undefined => find.get({ dealerId, id }),

    /** Names around a quote that exists. @throws Error when it does not */
    namesOf: (id: string): QuoteNames => {
      const found = namesOf.get({ id });
      if (!found) throw new Error(`no quote ${id}`);
      return found;
    },

    /** In their order; positions count from 1. */
    linesOf: (quoteId: string): QuoteLineRow[] => linesOf.all({ quoteId }),

    insert: (row: QuoteRow): void => {
      db.insert(quotes).values(row).run();
    },

    markOrdered: (id: string, at: number) => markOrdered.run({ id, at }),

    change: (id: string, change: Partial<QuoteRow>): void => {
      db.update(quotes).set(change).where(eq(quotes.id, id)).run();
    },

    addLines,

    /** Puts `rows` in the place of all lines of a quote. */
    replaceLines: (quoteId: string, rows: readonly QuoteLineRow[]): void => {
      db.delete(quoteLines).where(eq(quoteLines.quoteId, quoteId)).run();
      addLines(rows);
    },

    /** Up to `limit` quotes of a dealer, newest first, after (created at, id). */
    page: (dealerId: string, filter: QuoteFilter, after: [number, string] | undefined, limit: number) =>
      db
        .select({ ...listed, ...names })
        .from(quotes)
        .innerJoin(companies, eq(companies.id, quotes.fabricatorId))
        .innerJoin(people, eq(people.id, quotes.createdBy))
        .leftJoin(orders, eq(orders.quoteId, quotes.id))
        .where(
          and(
            eq(quotes.dealerId, dealerId),
            stateIs(filter),
            filter.q ? holds(filter.q) : undefined,
            filter.tradeAccountId ? eq(quotes.tradeAccountId, filter.tradeAccountId) : undefined,
            after ? sql`(${quotes.createdAt}, ${quotes.id}) < (${after[0]}, ${after[1]})` : undefined,
          ),
        )
        .orderBy(desc(quotes.createdAt), desc(quotes.id))
        .limit(limit),
  };
}

function stateIs({ state, today }: QuoteFilter): SQL | undefined {
  if (state === undefined) return undefined;
  if (state === 'ordered') return eq(quotes.state, 'ordered');
  return and(eq(quotes.state, 'open'), state === 'open' ? gte(quotes.validUntil, today) : lt(quotes.validUntil, today));
}

/** Text as it is written, anywhere in number, customer's name or a line's tag. */
function holds(q: string): SQL | undefined {
  const pattern = `%${q.replace(/[\\%_]/g, '\\$&')}%`;
  const like = (column: unknown) => sql`${column} like ${pattern} escape '\\'`;
  return or(
    like(quotes.number),
    like(quotes.customerName),
    sql`exists (select 1 from ${quoteLines} where ${quoteLines.quoteId} = ${quotes.id} and ${like(quoteLines.tag)})`,
  );
}
