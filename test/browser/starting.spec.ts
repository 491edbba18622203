import { existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import Sqlite from 'better-sqlite3';
import { startInVain, startServer } from './server-process';

jest.setTimeout(180_000);

const DATABASE = 'sealyard.db';

/** How many companies, orders and ledger entries a data folder holds. */
function countMarket(data: string) {
  const database = new Sqlite(join(data, DATABASE), { fileMustExist: true });
  const count = (table: string) => (database.prepare(`select count(*) as n from ${table}`).get() as { n: number }).n;
  const counts = { companies: count('companies'), orders: count('orders'), entries: count('ledger_entries') };
  database.close();
  return counts;
}

describe('starting the built product', () => {
  let data: string;
  let first: { said: string; code: number | null; leaves: string[] };
  let seeded: ReturnType<typeof countMarket>;

  beforeAll(async () => {
    data = mkdtempSync(join(tmpdir(), 'sealyard-'));
    const server = await startServer(data);
    const code = await server.stop();
    first = { said: server.said(), code, leaves: readdirSync(data) };
    seeded = countMarket(data);
  });
  afterAll(() => rmSync(data, { recursive: true, force: true }));

  it('loads the demo market into an empty folder and says where to go and who signs in', () => {
    expect(seeded.companies).toBeGreaterThan(18);
    expect(seeded.orders).toBeGreaterThan(1000);
    expect(seeded.entries).toBeGreaterThan(seeded.orders);
    expect(first.said).toMatch(/Sealyard is at http:\/\/localhost:\d+/);
    expect(first.said).toContain('made-to-size');
    for (const email of ['buyer@ottery.example', 'sales@northmere.example', 'operator@sealyard.example'])
      expect(first.said).toContain(email);
  });

  it('ends with code 0 on SIGTERM and folds the log into the file', () => {
    expect(first.code).toBe(0);
    expect(first.leaves).toContain(DATABASE);
    expect(first.leaves.filter((name) => /-(wal|shm)$/.test(name))).toEqual([]);
  });

  it('starts quickly the second time, loads nothing, and ends as cleanly', async () => {
    const started = Date.now();
    const server = await startServer(data);
    const seconds = (Date.now() - started) / 1000;
    expect(await server.stop()).toBe(0);
    expect(existsSync(join(data, `${DATABASE}-wal`))).toBe(false);
    expect(seconds).toBeLessThan(6);
    expect(countMarket(data)).toEqual(seeded);
  });

  it('finishes a request that is under way when it is asked to end', async () => {
    const server = await startServer(data);
    const answers = Array.from({ length: 6 }, () => fetch(`${server.base}/bench`));
    // The first byte of one answer: by then all of them have arrived.
    await Promise.race(answers);
    const [code, ...statuses] = await Promise.all([server.stop(), ...answers.map(async (answer) => (await answer).status)]);
    expect(statuses).toEqual(answers.map(() => 200));
    expect(code).toBe(0);
  });

  it('refuses a database from a newer version and leaves it as it is', async () => {
    const database = new Sqlite(join(data, DATABASE));
    const next = Date.UTC(2100, 0, 1);
    database.prepare('insert into __drizzle_migrations (hash, created_at) values (?, ?)').run('of-a-later-version', next);
    database.close();
    const before = countMarket(data);

    const { code, said } = await startInVain({ DATA_DIR: data });

    expect(code).toBe(1);
    expect(said).toContain('written by a newer version of Sealyard');
    expect(said).not.toMatch(/^\s+at /m);
    expect(countMarket(data)).toEqual(before);
  });
});

describe('starting in production', () => {
  let data: string;
  beforeEach(() => (data = mkdtempSync(join(tmpdir(), 'sealyard-'))));
  afterEach(() => rmSync(data, { recursive: true, force: true }));

  const asked = {
    NODE_ENV: 'production',
    PUBLIC_URL: 'https://sealyard.example',
    SESSION_SECRET: 'a secret of the installation, long enough for anybody',
    SMTP_URL: 'smtp://mail.example:25',
  };

  it('refuses demo secret and local mailbox, and names what is missing', async () => {
    const { code, said } = await startInVain({ NODE_ENV: 'production', DATA_DIR: data });
    expect(code).toBe(1);
    for (const name of ['SESSION_SECRET', 'SMTP_URL', 'PUBLIC_URL']) expect(said).toContain(`${name}: `);
    expect(readdirSync(data)).toEqual([]);
  });

  it('names every wrong value at once', async () => {
    const { code, said } = await startInVain({ ...asked, DATA_DIR: data, TRUST_PROXY: 'many', LOG_LEVEL: 'loud' });
    expect(code).toBe(1);
    expect(said).toContain('TRUST_PROXY: ');
    expect(said).toContain('LOG_LEVEL: ');
  });

  it('loads no demo market and offers no mailbox to read', async () => {
    const server = await startServer(data, asked);
    const mailbox = await fetch(`${server.base}/local/mail`);
    const catalogue = (await (await fetch(`${server.base}/api/catalogue`)).json()) as { glasses: unknown[]; fabricators: unknown[] };
    const said = server.said();
    expect(await server.stop()).toBe(0);
    expect(mailbox.status).toBe(404);
    expect(catalogue.fabricators).toEqual([]);
    expect(catalogue.glasses.length).toBeGreaterThan(0);
    expect(said).not.toContain('made-to-size');
    expect(countMarket(data)).toEqual({ companies: 0, orders: 0, entries: 0 });
  });
});
