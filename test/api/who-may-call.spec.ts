import { randomUUID } from 'node:crypto';
import { type Endpoint } from '@shared/contracts/endpoint';
import { type EndpointId, endpoints } from '@shared/contracts/endpoints';
import { type Role, roles } from '@shared/contracts/session';
import { mayCall } from '@shared/contracts/who-may-call';
import { type Caller, type Market, marketFactory } from '../factories/market-factory';
import { unitFactory } from '../factories/catalogue-factory';

/** A person with each role on the side of the things below, and one with the same role elsewhere. */
const people: Record<Role, { own: string; other: string | null }> = {
  buyer: { own: 'buyer@ottery.example', other: 'buyer@perrin.example' },
  'dealer-admin': { own: 'admin@ottery.example', other: 'admin@perrin.example' },
  sales: { own: 'sales@northmere.example', other: 'sales@kestrelford.example' },
  accounts: { own: 'accounts@northmere.example', other: 'accounts@kestrelford.example' },
  plant: { own: 'plant@northmere.example', other: 'plant@kestrelford.example' },
  'fabricator-admin': { own: 'admin@northmere.example', other: 'admin@kestrelford.example' },
  operator: { own: 'operator@sealyard.example', other: null },
};

/** The things of Ottery and Northmere that paths name. */
interface Things {
  quote: string;
  openQuote: string;
  order: string;
  orderLine: string;
  invoice: string;
  receipt: string;
  allocation: string;
}

type Ask = (things: Things) => { id?: string; body?: unknown };
const line = { unit: unitFactory(), quantity: 2 };
const account = 'ottery.northmere';
const order = (quote: string): ReturnType<Ask> => ({ id: quote, body: { poNumber: 'PO 1', shipTo: 'ottery.place-1', payment: 'account' } });

/** What each call of a thing, or with a body, needs to get past parsing. An endpoint that is missing fails. */
const asks: Partial<Record<EndpointId, Ask>> = {
  'session.revoke': () => ({ id: randomUUID() }),
  'units.evaluate': () => ({ body: { unit: line.unit } }),
  'prices.price': () => ({ body: { tradeAccount: account, lines: [line] } }),
  'trade-accounts.credit': () => ({ id: account }),
  'trade-accounts.movements': () => ({ id: account }),
  'trade-accounts.change-credit': () => ({ id: account, body: { limit: '60000', reason: 'yearly review' } }),
  'quotes.create': () => ({ body: { tradeAccount: account, lines: [line] } }),
  'quotes.read': ({ quote }) => ({ id: quote }),
  'quotes.change': ({ openQuote }) => ({ id: openQuote, body: { revision: 99 } }),
  'quotes.add-lines': ({ openQuote }) => ({ id: openQuote, body: { lines: [line] } }),
  'quotes.change-lines': ({ openQuote }) => ({ id: openQuote, body: { revision: 99, lines: [line] } }),
  'quotes.preview-re-price': ({ openQuote }) => ({ id: openQuote }),
  'quotes.re-price': ({ openQuote }) => ({ id: openQuote, body: { revision: 99, accepted: '1.00' } }),
  'quotes.pdf': ({ quote }) => ({ id: quote }),
  'quotes.mail': ({ openQuote }) => ({ id: openQuote, body: { to: 'someone@customer.example', subject: 'Quote', message: 'Here it is.' } }),
  'orders.place': ({ quote }) => order(quote),
  'orders.read': ({ order: id }) => ({ id }),
  'orders.move': ({ order: id }) => ({ id, body: { to: 'closed' } }),
  'orders.dispatch': ({ order: id, orderLine }) => ({ id, body: { lines: [{ line: orderLine, quantity: 9999 }] } }),
  'orders.pdf': ({ order: id }) => ({ id }),
  'invoices.read': ({ invoice }) => ({ id: invoice }),
  'invoices.pdf': ({ invoice }) => ({ id: invoice }),
  'receipts.record': ({ invoice }) => ({
    body: {
      tradeAccount: account,
      receivedOn: '2026-09-15',
      amount: '1.00',
      payerReference: 'x',
      allocations: [{ invoice, amount: '1.00' }],
    },
  }),
  'receipts.read': ({ receipt }) => ({ id: receipt }),
  'receipts.apply': ({ receipt, invoice }) => ({ id: receipt, body: { allocations: [{ invoice, amount: '999999.00' }] } }),
  'receipts.reverse-allocation': ({ allocation }) => ({ id: allocation, body: { reason: 'wrong invoice' } }),
  'receipts.reverse': ({ receipt }) => ({ id: receipt, body: { reason: 'bounced' } }),
};
/** Calls that name no thing of a company in their path or body: what they answer is the caller's own. */
const ofOnesOwn: EndpointId[] = ['session.revoke', 'units.evaluate'];
/** Sign-in needs no session; signing out and ending sessions would end the walk. */
const endsTheWalk: EndpointId[] = ['session.sign-in', 'session.sign-out'];

describe('who may call what', () => {
  let market: Market;
  let things: Things;
  const callers = new Map<string, Caller>();
  const as = async (email: string): Promise<Caller> => {
    let caller = callers.get(email);
    if (!caller) callers.set(email, (caller = await market.as(email)));
    return caller;
  };
  const call = ({ method, path, idempotent }: Endpoint, caller: Caller, { id, body }: { id?: string; body?: unknown }) => {
    const address = path.replace(':id', id ?? '');
    const verb = method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
    const headers: Record<string, string> = idempotent ? { 'idempotency-key': randomUUID() } : {};
    if (body === undefined) return caller.send(verb, address, undefined, headers);
    return caller.send(verb, address, JSON.stringify(body), { ...headers, 'content-type': 'application/json' });
  };
  const ask = (endpoint: Endpoint) => asks[endpoint.id as EndpointId]?.(things) ?? {};

  beforeAll(async () => {
    market = await marketFactory();
    const buyer = await as(people.buyer.own);
    const openQuote = (await buyer.post('/api/quotes', { tradeAccount: account, lines: [line] })).body;
    const quote = (await buyer.post('/api/quotes', { tradeAccount: account, lines: [line] })).body;
    const key = () => ({ 'idempotency-key': randomUUID() });
    const placed = (await buyer.post(`/api/quotes/${quote.id}/order`, order(quote.id).body, key())).body;
    await (await as(people.sales.own)).post(`/api/orders/${placed.id}/moves`, { to: 'accepted' });
    const dispatched = await (
      await as(people.plant.own)
    ).post(`/api/orders/${placed.id}/dispatches`, { lines: [{ line: placed.lines[0].id, quantity: 1 }] }, key());
    expect(dispatched.status).toBe(201);
    const clerk = await as(people.accounts.own);
    const invoice = (await clerk.get('/api/invoices')).body.items[0];
    const receipt = await clerk.post(
      '/api/receipts',
      {
        tradeAccount: account,
        receivedOn: '2026-09-15',
        amount: '2.00',
        payerReference: 'transfer',
        allocations: [{ invoice: invoice.id, amount: '1.00' }],
      },
      key(),
    );
    expect(receipt.status).toBe(201);
    things = {
      quote: quote.id,
      openQuote: openQuote.id,
      order: placed.id,
      orderLine: placed.lines[0].id,
      invoice: invoice.id,
      receipt: receipt.body.id,
      allocation: receipt.body.allocations[0].id,
    };
  });
  afterAll(() => market.close());

  it('knows what every call needs', () => {
    const unknown = (endpoints as readonly Endpoint[]).filter(
      ({ id, params, body }) => (params || body) && id !== 'session.sign-in' && !asks[id as EndpointId],
    );
    expect(unknown.map(({ id }) => id)).toEqual([]);
  });

  describe.each(
    (endpoints as readonly Endpoint[])
      .filter(({ id }) => !endsTheWalk.includes(id as EndpointId))
      .map((endpoint) => [endpoint.id, endpoint] as const),
  )('%s', (id, endpoint) => {
    it('for visitors', async () => {
      const { status } = await call(endpoint, market.visitor, ask(endpoint));
      if (mayCall(id as EndpointId, [])) expect(status).toBe(200);
      else expect(status).toBe(401);
    });

    it.each(roles)('for %s of the own side', async (role) => {
      const caller = await as(people[role].own);
      const held = (await caller.get('/api/auth/me')).body.user.roles as Role[];
      const { status } = await call(endpoint, caller, ask(endpoint));
      if (!mayCall(id as EndpointId, held)) expect(status).toBe(403);
      // Past the door: done, or refused for a reason of its own, but neither shut out nor broken.
      else expect([401, 403].includes(status) || status >= 500).toBe(false);
    });

    // There is one market, so no operator of another.
    it.each(roles.filter((role) => people[role].other !== null))('for %s of another company', async (role) => {
      const caller = await as(people[role].other ?? '');
      const held = (await caller.get('/api/auth/me')).body.user.roles as Role[];
      const wanted = ask(endpoint);
      const answer = await call(endpoint, caller, wanted);
      if (!mayCall(id as EndpointId, held)) return expect(answer.status).toBe(403);
      const namesOthersThing =
        (wanted.id !== undefined || JSON.stringify(wanted.body ?? '').includes(account)) && !ofOnesOwn.includes(id as EndpointId);
      if (namesOthersThing) return expect(answer.status).toBe(404);
      expect(answer.status).toBeLessThan(500);
      for (const thing of Object.values(things)) expect(answer.text).not.toContain(thing);
    });
  });
});
