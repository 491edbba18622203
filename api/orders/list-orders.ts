import { type AnswerOf } from '@shared/contracts/endpoint';
import { type listOrders as listOrdersEndpoint, type OrderItem } from '@shared/contracts/orders';
import { money } from '@shared/money/money';
import { type Member } from '../companies/actor';
import { readCursor, toPage } from '../database/cursor';
import { type Dependencies } from '../dependencies';
import { type Input } from '../http/serve';
import { type ListedOrder, type OrderFilter } from './order-list-store';

/**
 * Orders of one's own company, the newest first. With `q`, those whose order number begins with
 * it, then those whose PO number does, each the last first.
 */
export function listOrders(
  actor: Member,
  { query }: Pick<Input<typeof listOrdersEndpoint>, 'query'>,
  { stores }: Pick<Dependencies, 'stores'>,
): AnswerOf<typeof listOrdersEndpoint> {
  const { state, dealer, cursor, limit } = query;
  const q = query.q?.trim();
  const companyKind = actor.companyKind === 'dealer' ? 'dealer' : 'fabricator';
  if (companyKind === 'dealer' && dealer !== undefined && dealer !== actor.companyId) return { items: [], nextCursor: null };
  const filter: OrderFilter = {
    companyKind,
    companyId: actor.companyId,
    state,
    dealerId: companyKind === 'fabricator' ? dealer : undefined,
  };
  if (q) return search(filter, q, cursor, limit, stores);
  const rows = stores.orderLists.page(filter, readCursor(cursor, 'number'), limit + 1).all();
  return toPage(rows, limit, toItem, (row) => [row.placedAt, row.id]);
}

/** Numbers come before PO numbers; the cursor begins with `n` or `p` to say where a page ended. */
function search(filter: OrderFilter, q: string, cursor: string | undefined, limit: number, stores: Dependencies['stores']) {
  const [key, id] = readCursor(cursor, 'string') ?? ['n', ''];
  const after: [string, string] | undefined = id === '' ? undefined : [key.slice(1), id];
  const number = q.toUpperCase();
  const inPoNumbers = key.startsWith('p');
  const byNumber = inPoNumbers ? [] : stores.orderLists.byNumber(filter, number, after, limit + 1).all();
  const left = limit + 1 - byNumber.length;
  const byPo = left > 0 ? stores.orderLists.byPoNumber(filter, q, number, inPoNumbers ? after : undefined, left).all() : [];
  const rows = [...byNumber.map((row) => ({ row, key: `n${row.number}` })), ...byPo.map((row) => ({ row, key: `p${row.poNumber}` }))];
  return toPage(
    rows,
    limit,
    ({ row }) => toItem(row),
    (found) => [found.key, found.row.id],
  );
}

function toItem(row: ListedOrder): OrderItem {
  return {
    id: row.id,
    number: row.number,
    state: row.state,
    dealer: { id: row.dealerId, name: row.dealerName },
    fabricator: { id: row.fabricatorId, name: row.fabricatorName },
    tradeAccount: row.tradeAccountId,
    poNumber: row.poNumber,
    currency: row.currency,
    units: row.units,
    dispatchedUnits: row.dispatchedUnits,
    total: money(row.totalMinor, row.currency),
    placedAt: new Date(row.placedAt).toISOString(),
    requiredOn: row.requiredOn,
    promisedOn: row.promisedOn,
  };
}
