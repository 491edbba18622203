import { join } from 'node:path';
import Sqlite from 'better-sqlite3';
import { sql } from 'drizzle-orm';
import { Refusal } from '@shared/contracts/problems';
import { type Quote } from '@shared/contracts/quotes';
import { type Member } from '@api/companies/actor';
import { openDatabase } from '@api/database/open-database';
import { type Dependencies } from '@api/dependencies';
import { placeOrder } from '@api/orders/place-order';
import { createQuote } from '@api/quotes/create-quote';
import { type Chance, chance } from '@seeds/demo/chance';
import { linesFor } from '@seeds/demo/demand';
import { marketFactory } from '../factories/market-factory';
import { memberFactory } from '../factories/order-factory';
import { type Measure, median } from './measure';

const BATCH = 40;
const BATCHES = 15;
const MIGRATIONS = join(process.cwd(), 'api/database/migrations');

type Row = Record<string, string | number | null>;

/**
 * Orders placed a second by the use case, from the key to the whole order read back, beside bare
 * better-sqlite3 transactions that write the very rows that these orders wrote into a copy of
 * the same database, prepared, immediate, and as durable. The two take turns, batch by batch.
 */
export async function measurePlacing(folder: string): Promise<Measure[]> {
  const file = join(folder, 'placing.db');
  const market = await marketFactory({}, openDatabase(file, MIGRATIONS));
  const { dependencies } = market;
  const by = chance(7);
  const buyer = memberFactory(market, 'buyer.ottery');
  dependencies.stores.companies.changeTradeAccount('ottery.northmere', { limitMinor: 100_000_000_000 });
  const quotes = Array.from({ length: BATCH * (BATCHES + 2) }, () => quoteOf(buyer, by, dependencies));
  dependencies.database.db.run(sql`vacuum into ${join(folder, 'bare.db')}`);

  const reader = openBare(file);
  const bare = openBare(join(folder, 'bare.db'));
  const writeBare = bareWriter(bare);
  const ratios: number[] = [];
  let ours = 0;
  let units = 0;
  for (let batch = 0; batch < BATCHES + 2; batch++) {
    const warm = batch >= 2;
    const now = quotes.slice(batch * BATCH, (batch + 1) * BATCH);
    const placing = seconds(() => {
      for (const { id } of now) {
        const body = { poNumber: `PO ${id.slice(0, 8)}`, shipTo: 'ottery.place-1', payment: 'account' as const };
        const order = placeOrder(buyer, { params: { id }, body, idempotencyKey: `bench-${id}` }, dependencies);
        if (warm) units += order.units;
      }
    });
    const written = now.map(({ id }) => rowsOf(reader, id));
    const writing = seconds(() => written.forEach(writeBare));
    if (!warm) continue;
    ratios.push(writing / placing);
    ours += placing;
  }
  market.close();
  reader.close();
  bare.close();
  const orders = BATCH * BATCHES;
  const ratio = median(ratios);
  const unitsASecond = units / ours;
  return [
    {
      measure: 'orders placed a second ÷ bare better-sqlite3 transactions writing the same rows with the same durability',
      ratio: ratio.toFixed(2),
      toReach: '≥ 0.5',
      reached: ratio >= 0.5,
      detail: `${orders} orders of ${(units / orders).toFixed(1)} units on the average: ${Math.round(orders / ours)} orders a second, read back whole; median of ${BATCHES} batches of ${BATCH}, the two in turn`,
    },
    {
      measure: 'units ordered a second',
      ratio: String(Math.round(unitsASecond)),
      toReach: '≥ 100',
      reached: unitsASecond >= 100,
      detail: 'the same orders',
    },
  ];
}

/** A quote as dealers of the demo market ask for; what nobody can build is drawn again. */
function quoteOf(buyer: Member, by: Chance, dependencies: Dependencies): Quote {
  for (;;) {
    const body = { tradeAccount: 'ottery.northmere', lines: linesFor('northmere', by), shipTo: 'ottery.place-1' };
    try {
      return createQuote(buyer, { body }, dependencies);
    } catch (error) {
      if (!(error instanceof Refusal && error.code === 'cannot-build')) throw error;
    }
  }
}

function openBare(file: string): Sqlite.Database {
  const database = new Sqlite(file);
  for (const pragma of ['journal_mode = WAL', 'synchronous = FULL', 'foreign_keys = ON', 'temp_store = MEMORY', 'cache_size = -65536']) {
    database.pragma(pragma);
  }
  return database;
}

/** Every row that the order of a quote wrote or changed. */
function rowsOf(database: Sqlite.Database, quoteId: string) {
  const all = (text: string, ...of: string[]) => database.prepare(text).all(...of) as Row[];
  const [order] = all('select * from orders where quote_id = ?', quoteId);
  const id = String(order?.['id']);
  return {
    orders: [order!],
    order_lines: all('select * from order_lines where order_id = ?', id),
    order_moves: all('select * from order_moves where order_id = ?', id),
    audit_rows: all('select * from audit_rows where subject_id = ?', id),
    outbox_mails: all('select * from outbox_mails where subject_id = ?', id),
    idempotency_keys: all('select * from idempotency_keys where subject_id = ?', id),
  };
}

/** Writes the rows of one order, and the balance, the number and the quote that changed with it, in one transaction. */
function bareWriter(database: Sqlite.Database): (rows: ReturnType<typeof rowsOf>) => void {
  const tables = ['orders', 'order_lines', 'order_moves', 'audit_rows', 'outbox_mails', 'idempotency_keys'] as const;
  const inserts = Object.fromEntries(
    tables.map((table) => {
      const columns = (database.pragma(`table_info(${table})`) as { name: string }[]).map(({ name }) => name);
      return [table, { columns, insert: database.prepare(`insert into ${table} values (${columns.map(() => '?').join(', ')})`) }];
    }),
  );
  const reserve = database.prepare('update account_balances set reserved_minor = reserved_minor + ? where trade_account_id = ?');
  const number = database.prepare("update number_series set next = next + 1 where company_id = ? and kind = 'order'");
  const ordered = database.prepare("update quotes set state = 'ordered', updated_at = ? where id = ?");
  const write = database.transaction((rows: ReturnType<typeof rowsOf>) => {
    for (const table of tables) {
      const { columns, insert } = inserts[table]!;
      for (const row of rows[table]) insert.run(columns.map((column) => row[column] ?? null));
    }
    const [order] = rows.orders;
    reserve.run(order!['total_minor'], order!['trade_account_id']);
    number.run(order!['fabricator_id']);
    ordered.run(order!['placed_at'], order!['quote_id']);
  });
  return (rows) => write.immediate(rows);
}

function seconds(work: () => void): number {
  const from = process.hrtime.bigint();
  work();
  return Number(process.hrtime.bigint() - from) / 1e9;
}
