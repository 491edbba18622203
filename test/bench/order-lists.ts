import { join } from 'node:path';
import { sql } from 'drizzle-orm';
import { openDatabase } from '@api/database/open-database';
import { type Dependencies } from '@api/dependencies';
import { listOrders } from '@api/orders/list-orders';
import { placeOrder } from '@api/orders/place-order';
import { createQuote } from '@api/quotes/create-quote';
import { unitFactory } from '../factories/catalogue-factory';
import { type Market, marketFactory } from '../factories/market-factory';
import { memberFactory } from '../factories/order-factory';
import { type Measure, median } from './measure';

const SIZES = [1_000, 100_000, 1_000_000];
const ROUNDS = 400;

/** Who asks how. Half of the orders match each but the first, so that a thousand orders make a hundred pages of each. */
const lists: [name: string, who: string, query: { state?: 'submitted'; q?: string; limit: number }][] = [
  ['all of a maker', 'sales.northmere', { limit: 10 }],
  ['all of a dealer', 'buyer.ottery', { limit: 5 }],
  ['one state at a maker', 'sales.northmere', { limit: 5, state: 'submitted' }],
  ['the beginning of a PO number at a maker', 'sales.northmere', { limit: 5, q: 'job 1' }],
];

/**
 * The first and the hundredth page of the order list in databases of a thousand, a hundred
 * thousand and a million orders: how much dearer the dearest size is than the cheapest, list by
 * list. The sizes take turns call by call, so that whatever else the machine does hits them alike.
 */
export async function measureOrderLists(folder: string): Promise<Measure[]> {
  const markets: Market[] = [];
  for (const size of SIZES) markets.push(await marketOf(size, folder));
  const found = lists.flatMap(([name, who, asked]) => {
    const pages = markets.map((market) => {
      const actor = memberFactory(market, who);
      const page = (cursor?: string) => listOrders(actor, { query: { ...asked, cursor } }, market.dependencies);
      let cursor: string | undefined;
      for (let i = 1; i < 100; i++) cursor = page(cursor).nextCursor ?? undefined;
      if (cursor === undefined) throw new Error(`${name} has no hundred pages`);
      return { first: () => page(), hundredth: () => page(cursor) };
    });
    return (['first', 'hundredth'] as const).map((which) => {
      const times = timesOf(pages.map((page) => page[which]));
      return { name: `${name}, ${which} page`, times, growth: Math.max(...times) / Math.min(...times) - 1 };
    });
  });
  markets.forEach((market) => market.close());
  found.sort((a, b) => b.growth - a.growth);
  const growth = found[0]?.growth ?? 0;
  return [
    {
      measure: `order list, first and hundredth page, at ${SIZES.map((size) => size.toLocaleString('en')).join(', ')} orders`,
      ratio: `within ${Math.round(growth * 100)} %`,
      toReach: 'flat within 50 %',
      reached: growth <= 0.5,
      detail: `pages of 10 and 5, median of ${ROUNDS}, µs at each size; ${found
        .map(({ name, times }) => `${name}: ${times.map((time) => Math.round(time)).join(' / ')}`)
        .join('; ')}`,
    },
  ];
}

async function marketOf(size: number, folder: string): Promise<Market> {
  const market = await marketFactory({}, openDatabase(join(folder, `lists-${size}.db`), join(process.cwd(), 'api/database/migrations')));
  const { dependencies } = market;
  const buyer = memberFactory(market, 'buyer.ottery');
  const body = { tradeAccount: 'ottery.northmere', lines: [{ unit: unitFactory(), quantity: 6 }] };
  const { id } = createQuote(buyer, { body }, dependencies);
  const order = { poNumber: 'Job 0', shipTo: 'ottery.place-1', payment: 'account' as const };
  placeOrder(buyer, { params: { id }, body: order, idempotencyKey: 'bench-first' }, dependencies);
  addOrders(dependencies, size - 1);
  return market;
}

/** Copies of the first order with ids, numbers, dealers, states and PO numbers of their own. */
function addOrders({ database }: Dependencies, count: number): void {
  const columns = database.db.all<{ name: string }>(sql`select name from pragma_table_info('orders') order by cid`);
  const own: Record<string, string> = {
    id: 'lower(hex(randomblob(16)))',
    number: "printf('NM-%06d', series.n)",
    dealer_id: "case series.n % 2 when 0 then 'ottery' else 'perrin' end",
    trade_account_id: "case series.n % 2 when 0 then 'ottery.northmere' else 'perrin.northmere' end",
    quote_id: 'null',
    state: "case (series.n / 2) % 2 when 0 then 'submitted' else 'closed' end",
    po_number: "printf('Job %d%d', 1 + (series.n / 4) % 2, series.n)",
    placed_at: 'first.placed_at + series.n * 1000',
  };
  const values = columns.map(({ name }) => own[name] ?? `first.${name}`).join(', ');
  database.db.run(
    sql`with recursive series (n) as (
        select (select count(*) from orders) + 1 union all select n + 1 from series where n < (select count(*) from orders) + ${count}
      ), first as (select * from orders where po_number = 'Job 0')
      insert into orders select ${sql.raw(values)} from series, first`,
  );
}

/** Median µs of each call, the calls taking turns. */
function timesOf(calls: readonly (() => unknown)[]): number[] {
  const times = calls.map((): number[] => []);
  for (let round = -100; round < ROUNDS; round++) {
    calls.forEach((call, i) => {
      const from = process.hrtime.bigint();
      call();
      if (round >= 0) times[i]?.push(Number(process.hrtime.bigint() - from) / 1e3);
    });
  }
  return times.map(median);
}
