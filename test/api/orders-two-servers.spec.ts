import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import { type Member } from '@api/companies/actor';
import { openDatabase } from '@api/database/open-database';
import { createQuote } from '@api/quotes/create-quote';
import { verifyLedger } from '@api/receivables/verify-ledger';
import { unitFactory } from '../factories/catalogue-factory';
import { MARKET_DAY, marketFactory } from '../factories/market-factory';
import { memberFactory } from '../factories/order-factory';

jest.setTimeout(120_000);

/** A process of its own that orders quotes when told to go. */
function startServer(dataDir: string, work: { quotes: string[]; actor: Member; at: number }) {
  const server = spawn('node', ['--import', 'tsx', 'test/api/workers/place-orders.ts', JSON.stringify(work)], {
    env: { ...process.env, DATA_DIR: dataDir, NODE_ENV: 'test', LOG_LEVEL: 'silent' },
    stdio: ['pipe', 'pipe', 'inherit'],
  });
  const lines = createInterface({ input: server.stdout })[Symbol.asyncIterator]();
  const ready = lines.next();
  return {
    ready,
    go: () => server.stdin.write('go'),
    answers: ready.then(async () => JSON.parse(String((await lines.next()).value)) as string[]),
  };
}

describe('two servers on one database', () => {
  let folder: string;
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), 'sealyard-'));
  });
  afterAll(() => rmSync(folder, { recursive: true }));

  it('never let orders placed at the same moment pass the limit together, nor make two of one key', async () => {
    const file = join(folder, 'sealyard.db');
    const market = await marketFactory({}, openDatabase(file, join(process.cwd(), 'api/database/migrations')));
    const { dependencies } = market;
    const actor = memberFactory(market, 'buyer.ottery');
    const quotes = Array.from({ length: 40 }, () =>
      createQuote(actor, { body: { tradeAccount: 'ottery.northmere', lines: [{ unit: unitFactory(), quantity: 6 }] } }, dependencies),
    );
    const totalMinor = Number(quotes[0]!.total.amount.replace('.', ''));
    dependencies.stores.companies.changeTradeAccount('ottery.northmere', { limitMinor: Math.floor(totalMinor * 15.5) });
    market.close();

    const ids = quotes.map(({ id }) => id);
    // Each of the two takes its own twenty, then the ten that both press at the same moment with the same key.
    const shared = ids.slice(0, 10);
    const work = [
      [...shared, ...ids.slice(10, 25)],
      [...shared, ...ids.slice(25, 40)],
    ];
    const servers = work.map((own) => startServer(folder, { quotes: own, actor, at: MARKET_DAY }));
    await Promise.all(servers.map(({ ready }) => ready));
    for (const { go } of servers) go();
    const [one, other] = (await Promise.all(servers.map(({ answers }) => answers))) as [string[], string[]];
    const database = openDatabase(file, join(process.cwd(), 'api/database/migrations'));
    const placed = database.db.all<{ quote_id: string }>('select quote_id from orders');
    expect(verifyLedger(database.db)).toEqual([]);
    database.close();
    expect(placed).toHaveLength(15);
    expect([...one, ...other].every((answer) => answer === 'submitted' || answer === 'over-credit')).toBe(true);
    // What one of them got for a shared key, the other got too, unless it came before there was room no more.
    shared.forEach((id, i) => {
      const made = placed.some(({ quote_id }) => quote_id === id);
      expect([one[i], other[i]].includes('submitted')).toBe(made);
    });
  });
});
