import { createHash, randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { type UnitInput } from '@shared/contracts/units';
import { type Member } from '@api/companies/actor';
import { type Answer, type Caller, type Market } from './market-factory';
import { unitFactory } from './catalogue-factory';

/** Quotes and orders of the demo market, made through the API. */

export const key = (): Record<string, string> => ({ 'idempotency-key': randomUUID() });

const callers = new WeakMap<Market, Map<string, Promise<Caller>>>();
/** Someone of the market, signed in once in any twelve hours of its clock: sessions end. */
export function as(market: Market, email: string): Promise<Caller> {
  const known = callers.get(market) ?? new Map<string, Promise<Caller>>();
  callers.set(market, known);
  const when = `${email} ${Math.floor(market.clock.now / 43_200_000)}`;
  const caller = known.get(when) ?? market.as(email);
  known.set(when, caller);
  return caller;
}

/** Someone of the market as use cases see them, without a sign-in: `buyer.ottery`. */
export function memberFactory({ dependencies }: Pick<Market, 'dependencies'>, personId: string): Member {
  const { name, email, roles, company } = dependencies.stores.people.user(personId);
  return {
    personId,
    sessionId: 'none',
    name,
    email,
    roles,
    companyId: company.id,
    companyKind: company.kind,
    companyName: company.name,
    timeZone: company.timeZone,
    orderLimitMinor: null,
  };
}

export interface LineWish {
  unit?: UnitInput;
  quantity?: number;
  tag?: string;
}

/** A quote of the caller's at a trade account; one line of six units unless said otherwise. */
export async function quoteFactory(caller: Caller, account = 'ottery.northmere', lines: LineWish[] = [{}]): Promise<Answer['body']> {
  const made = await caller.post('/api/quotes', {
    tradeAccount: account,
    lines: lines.map(({ unit = unitFactory(), quantity = 6, tag }) => ({ unit, quantity, tag })),
  });
  if (made.status !== 201) throw new Error(`no quote: ${made.text}`);
  return made.body;
}

/** What an order says beside its quote. */
export const orderWish = (dealer = 'ottery', more: Record<string, unknown> = {}) => ({
  poNumber: 'PO 4711',
  shipTo: `${dealer}.place-1`,
  payment: 'account',
  ...more,
});

/** An order of a new quote, placed by the dealer's buyer; the answer whatever it is. */
export async function orderFactory(
  market: Market,
  { account = 'ottery.northmere', lines, more }: { account?: string; lines?: LineWish[]; more?: Record<string, unknown> } = {},
): Promise<Answer> {
  const dealer = account.split('.')[0] ?? '';
  const buyer = await as(market, `buyer@${dealer}.example`);
  const quote = await quoteFactory(buyer, account, lines);
  return buyer.post(`/api/quotes/${quote.id}/order`, orderWish(dealer, more), key());
}

/** An order that sales have accepted. */
export async function acceptedOrderFactory(market: Market, wish: Parameters<typeof orderFactory>[1] = {}): Promise<Answer['body']> {
  const placed = await orderFactory(market, wish);
  if (placed.status !== 201) throw new Error(`no order: ${placed.text}`);
  const sales = await as(market, `sales@${makerDomain(placed.body.fabricator.id)}.example`);
  const accepted = await sales.post(`/api/orders/${placed.body.id}/moves`, { to: 'accepted' });
  if (accepted.status !== 200) throw new Error(`not accepted: ${accepted.text}`);
  return placed.body;
}

/** Sends out lines of an order by index; all that is left of it without any. */
export async function dispatch(market: Market, order: Answer['body'], quantities?: number[]): Promise<Answer> {
  const plant = await as(market, `plant@${makerDomain(order.fabricator.id)}.example`);
  const now = (await plant.get(`/api/orders/${order.id}`)).body;
  const lines = (now.lines as { id: string; quantity: number; dispatched: number }[])
    .map(({ id, quantity, dispatched }, i) => ({ line: id, quantity: quantities ? (quantities[i] ?? 0) : quantity - dispatched }))
    .filter(({ quantity }) => quantity > 0);
  return plant.post(`/api/orders/${order.id}/dispatches`, { lines }, key());
}

const makerDomain = (fabricator: string) => fabricator.replace('-', '');

const digest = (rows: unknown) => createHash('sha256').update(JSON.stringify(rows)).digest('hex').slice(0, 12);

/** A digest of every row of every table but the sessions, to see that nothing was written. */
export function everyRow({ dependencies }: Market): string {
  const { db } = dependencies.database;
  const tables = db.all<{ name: string }>(
    sql`select name from sqlite_master where type = 'table' and name not like 'sqlite%' and name <> 'sessions' order by name`,
  );
  return tables.map(({ name }) => `${name} ${digest(db.all(sql.raw(`select * from "${name}"`)))}`).join('\n');
}
