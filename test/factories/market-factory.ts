import { join } from 'node:path';
import { type Express } from 'express';
import { pino } from 'pino';
import request from 'supertest';
import { createApi } from '@api/api';
import { hashPassword } from '@api/companies/passwords';
import { readConfig } from '@api/config';
import { type Database, openDatabase } from '@api/database/open-database';
import { createDependencies, type Dependencies } from '@api/dependencies';
import { DEMO_PASSWORD, loadCompanies } from '@seeds/demo/load-companies';
import { loadPriceLists } from '@seeds/demo/load-price-lists';
import { loadReference } from '@seeds/reference/load-reference';

/** A market to test against: the demo companies and lists in memory, no orders, a clock that stands still. */
export interface Market {
  app: Express;
  dependencies: Dependencies;
  /** UTC epoch ms; assign to move time */
  clock: { now: number };
  /** Calls the API as someone, with cookies and XSRF header. */
  as(email: string): Promise<Caller>;
  visitor: Caller;
  close(): void;
}

export interface Answer {
  status: number;
  // Tests reach into answers of many shapes; each asserts what it needs.
  // eslint-disable-next-line @typescript-eslint/no-explicit-any
  body: any;
  type: string;
  text: string;
  headers: Record<string, string>;
}

export interface Caller {
  get(path: string): Promise<Answer>;
  post(path: string, body?: unknown, headers?: Record<string, string>): Promise<Answer>;
  put(path: string, body?: unknown, headers?: Record<string, string>): Promise<Answer>;
  patch(path: string, body?: unknown, headers?: Record<string, string>): Promise<Answer>;
  delete(path: string): Promise<Answer>;
  /** any method, a body sent as it is */
  send(
    method: 'get' | 'post' | 'put' | 'patch' | 'delete',
    path: string,
    raw: string | undefined,
    headers?: Record<string, string>,
  ): Promise<Answer>;
}

const MIGRATIONS = join(process.cwd(), 'api/database/migrations');
/** Tuesday 2026-09-15, 15:00 UTC. */
export const MARKET_DAY = Date.UTC(2026, 8, 15, 15);

let passwordHash: Promise<string> | undefined;

export async function marketFactory(
  environment: Record<string, string> = {},
  database: Database = openDatabase(':memory:', MIGRATIONS),
): Promise<Market> {
  const clock = { now: MARKET_DAY };
  const config = readConfig({ NODE_ENV: 'test', LOG_LEVEL: 'silent', ...environment });
  const dependencies = createDependencies(config, MIGRATIONS, {
    clock: () => clock.now,
    log: pino({ level: config.logLevel }),
    database,
  });
  passwordHash ??= hashPassword(DEMO_PASSWORD);
  const hash = await passwordHash;
  loadReference(dependencies);
  dependencies.database.immediately(() => {
    loadCompanies(dependencies.database.db, hash, Date.UTC(2025, 3, 1));
    loadPriceLists(dependencies.database.db, Date.UTC(2025, 3, 1));
  });
  dependencies.catalogue.changed();
  const app = createApi(dependencies);
  return {
    app,
    dependencies,
    clock,
    as: async (email) => {
      const answer = await request(app).post('/api/auth/sign-in').send({ email, password: DEMO_PASSWORD });
      if (answer.status !== 200) throw new Error(`${email} cannot sign in: ${answer.text}`);
      const cookies = (answer.headers['set-cookie'] as unknown as string[]).map((cookie) => cookie.split(';')[0] ?? '');
      const xsrf = cookies.find((cookie) => cookie.startsWith('XSRF-TOKEN='))?.slice('XSRF-TOKEN='.length) ?? '';
      return caller(app, { cookie: cookies.join('; '), 'x-xsrf-token': decodeURIComponent(xsrf) });
    },
    visitor: caller(app, {}),
    close: () => dependencies.database.close(),
  };
}

function caller(app: Express, own: Record<string, string>): Caller {
  const send: Caller['send'] = async (method, path, raw, headers = {}) => {
    const agent = request(app);
    const call = agent[method](path).set({ ...own, ...headers });
    const answer = await (raw === undefined ? call : call.send(raw));
    return {
      status: answer.status,
      body: answer.body,
      type: answer.type,
      text: answer.text,
      headers: answer.headers as Record<string, string>,
    };
  };
  const json =
    (method: 'post' | 'put' | 'patch') =>
    (path: string, body?: unknown, headers: Record<string, string> = {}) =>
      send(method, path, JSON.stringify(body ?? {}), { 'content-type': 'application/json', ...headers });
  return {
    send,
    get: (path) => send('get', path, undefined),
    post: json('post'),
    put: json('put'),
    patch: json('patch'),
    delete: (path) => send('delete', path, undefined),
  };
}
