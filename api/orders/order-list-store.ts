import { and, desc, eq, getTableColumns, gte, lt, type SQL, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import { type OrderState } from '@shared/contracts/orders';
import { type Db } from '../database/open-database';
import { companies, tradeAccounts } from '../database/schema/companies';
import { orders } from '../database/schema/orders';

const dealers = alias(companies, 'dealers');
const makers = alias(companies, 'makers');

/** Which orders a list shows. */
export interface OrderFilter {
  companyKind: 'dealer' | 'fabricator';
  companyId: string;
  state?: OrderState | undefined;
  /** for a fabricator: of one dealer */
  dealerId?: string | undefined;
}

/** Sorts after every character that can follow. */
const LAST = '\u{10ffff}';
const poNumber = sql`${orders.poNumber} collate nocase`;

/** Pages of orders; each way of asking is served in order by an index, so no page is dearer than another. */
export function orderListStore(db: Db) {
  const { totals: _totals, shipTo: _shipTo, destination: _destination, ...listed } = getTableColumns(orders);
  const own = ({ companyKind, companyId }: OrderFilter) => eq(companyKind === 'dealer' ? orders.dealerId : orders.fabricatorId, companyId);
  const accountWith = ({ companyId, dealerId }: OrderFilter) =>
    sql`(select ${tradeAccounts.id} from ${tradeAccounts} where ${tradeAccounts.dealerId} = ${dealerId} and ${tradeAccounts.fabricatorId} = ${companyId})`;
  const list = (...conditions: (SQL | undefined)[]) =>
    db
      .select({ ...listed, dealerName: sql<string>`${dealers.name}`, fabricatorName: sql<string>`${makers.name}` })
      .from(orders)
      .innerJoin(dealers, eq(dealers.id, orders.dealerId))
      .innerJoin(makers, eq(makers.id, orders.fabricatorId))
      .where(and(...conditions));

  return {
    /** The newest first; those after (placed at, id). */
    page: (filter: OrderFilter, after: [number, string] | undefined, limit: number) =>
      list(
        filter.dealerId ? eq(orders.tradeAccountId, accountWith(filter)) : own(filter),
        filter.state ? eq(orders.state, filter.state) : undefined,
        after && sql`(${orders.placedAt}, ${orders.id}) < (${after[0]}, ${after[1]})`,
      )
        .orderBy(desc(orders.placedAt), desc(orders.id))
        .limit(limit),

    /** Orders whose number begins with a text, the last number first; those after (number, id). */
    byNumber: (filter: OrderFilter, beginning: string, after: [string, string] | undefined, limit: number) =>
      list(
        own(filter),
        ...others(filter),
        gte(orders.number, beginning),
        lt(orders.number, beginning + LAST),
        after && sql`(${orders.number}, ${orders.id}) < (${after[0]}, ${after[1]})`,
      )
        .orderBy(desc(orders.number), desc(orders.id))
        .limit(limit),

    /** Orders whose PO number begins with a text, whatever its case, and whose own number does not; those after (PO number, id). */
    byPoNumber: (filter: OrderFilter, beginning: string, notNumber: string, after: [string, string] | undefined, limit: number) =>
      list(
        own(filter),
        ...others(filter),
        sql`${poNumber} >= ${beginning}`,
        sql`${poNumber} < ${beginning + LAST}`,
        sql`not (+${orders.number} >= ${notNumber} and +${orders.number} < ${notNumber + LAST})`,
        after && sql`(${poNumber}, ${orders.id}) < (${after[0]}, ${after[1]})`,
      )
        .orderBy(desc(poNumber), desc(orders.id))
        .limit(limit),
  };
}
export type ListedOrder = ReturnType<ReturnType<ReturnType<typeof orderListStore>['page']>['all']>[number];

/** What else is asked, hidden from the planner by a unary plus so that it keeps to the index of the text. */
function others({ state, dealerId }: OrderFilter): (SQL | undefined)[] {
  return [state ? sql`+${orders.state} = ${state}` : undefined, dealerId ? sql`+${orders.dealerId} = ${dealerId}` : undefined];
}
