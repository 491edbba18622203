import fc from 'fast-check';
import { minorOf } from '@shared/money/money';
import { verifyLedger } from '@api/receivables/verify-ledger';
import { type Answer, type Market, marketFactory } from '../factories/market-factory';
import { unitFactory } from '../factories/catalogue-factory';
import { acceptedOrderFactory, as, dispatch, everyRow, key, orderFactory } from '../factories/order-factory';

const cents = ({ amount }: { amount: string }) => minorOf(amount, 'USD');

jest.setTimeout(60_000);

describe('dispatching an order', () => {
  let market: Market;
  beforeEach(async () => {
    market = await marketFactory();
  });
  afterEach(() => {
    expect(verifyLedger(market.dependencies.database.db)).toEqual([]);
    market.close();
  });
  const send = async (order: string, lines: unknown, headers = key(), email = 'plant@northmere.example') =>
    (await as(market, email)).post(`/api/orders/${order}/dispatches`, { lines }, headers);
  const refused = async (call: () => Promise<Answer>) => {
    const before = everyRow(market);
    const answer = await call();
    expect(everyRow(market)).toBe(before);
    return { status: answer.status, ...answer.body };
  };

  it('makes part invoices of what went out, which sum to the order whatever the parts', async () => {
    const sizes = ['500', '612.5', '927.1', '1000', '1234.5'];
    await fc.assert(
      fc.asyncProperty(
        fc.array(fc.record({ size: fc.constantFrom(...sizes), quantity: fc.integer({ min: 1, max: 5 }) }), { minLength: 1, maxLength: 4 }),
        fc.array(fc.array(fc.nat({ max: 3 }), { minLength: 4, maxLength: 4 }), { maxLength: 3 }),
        async (lines, parts) => {
          const order = await acceptedOrderFactory(market, {
            lines: lines.map(({ size, quantity }) => ({ unit: unitFactory({ width: size, height: '800' }), quantity })),
            more: { shipTo: 'ottery.place-1' },
          });
          const left = lines.map(({ quantity }) => quantity);
          for (const part of parts) {
            const now = left.map((n, i) => Math.min(n, part[i] ?? 0));
            if (now.every((n) => n === 0)) continue;
            now.forEach((n, i) => (left[i] = (left[i] ?? 0) - n));
            expect((await dispatch(market, order, now)).status).toBe(201);
          }
          if (left.some((n) => n > 0)) await dispatch(market, order);
          const clerk = await as(market, 'accounts@northmere.example');
          const read = (await clerk.get(`/api/orders/${order.id}`)).body;
          expect(read.state).toBe('dispatched');
          const invoices = await Promise.all(
            read.dispatches.map(async (d: { invoice: { id: string } }) => (await clerk.get(`/api/invoices/${d.invoice.id}`)).body),
          );
          const sum = (pick: (invoice: Answer['body']) => { amount: string }) => invoices.reduce((all, i) => all + cents(pick(i)), 0);
          expect(sum((i) => i.total)).toBe(cents(order.total));
          expect(sum((i) => i.goods)).toBe(cents(order.goods));
          order.tax.forEach((row: Answer['body'], t: number) => expect(sum((i) => i.tax[t].amount)).toBe(cents(row.amount)));
          order.orderCharges.forEach((row: Answer['body'], c: number) => expect(sum((i) => i.orderCharges[c].net)).toBe(cents(row.net)));
        },
      ),
      { numRuns: 8 },
    );
  });

  it('sends once for one key', async () => {
    const order = await acceptedOrderFactory(market);
    const headers = key();
    const lines = [{ line: order.lines[0].id, quantity: 2 }];
    const answers = await Promise.all([1, 2].map(() => send(order.id, lines, headers)));
    expect(answers.map(({ status, body }) => [status, body.dispatchedUnits])).toEqual([
      [201, 2],
      [201, 2],
    ]);
    expect((await refused(() => send(order.id, [{ line: order.lines[0].id, quantity: 1 }], headers))).type).toBe('/problems/key-reused');
  });

  it('keeps the invoice from readers who see none', async () => {
    const order = await acceptedOrderFactory(market);
    const sent = await dispatch(market, order, [1]);
    expect(sent.body.dispatches[0]).toMatchObject({ number: 'NM-DIS000001', invoice: null });
    const clerk = await as(market, 'accounts@northmere.example');
    expect((await clerk.get(`/api/orders/${order.id}`)).body.dispatches[0].invoice.number).toBe('NM-INV000001');
  });

  it('refuses what it cannot send, at the line, and writes nothing', async () => {
    const order = await acceptedOrderFactory(market);
    const other = await acceptedOrderFactory(market);
    const line = order.lines[0].id;
    const bad: [lines: unknown, pointer: string][] = [
      [[{ line, quantity: 7 }], '/lines/0/quantity'],
      [[{ line, quantity: 0 }], '/lines/0/quantity'],
      [[{ line, quantity: -1 }], '/lines/0/quantity'],
      [[{ line, quantity: 1.5 }], '/lines/0/quantity'],
      [[{ line, quantity: 10_000_000 }], '/lines/0/quantity'],
      [[{ line, quantity: '1' }], '/lines/0/quantity'],
      [[{ line: other.lines[0].id, quantity: 1 }], '/lines/0/line'],
      [
        [
          { line, quantity: 1 },
          { line, quantity: 1 },
        ],
        '/lines/1/line',
      ],
      [[], '/lines'],
      [null, '/lines'],
      [[{ line, quantity: 1, price: '0.00' }], '/lines/0/price'],
    ];
    for (const [lines, pointer] of bad) {
      expect(await refused(() => send(order.id, lines))).toMatchObject({ status: 422, errors: [{ pointer }] });
    }
  });

  it('sends nothing of an order that is not accepted, or is all out, or is another’s', async () => {
    const placed = (await orderFactory(market)).body;
    const line = placed.lines[0].id;
    expect(await refused(() => send(placed.id, [{ line, quantity: 1 }]))).toMatchObject({ status: 409 });
    const out = await acceptedOrderFactory(market);
    await dispatch(market, out);
    expect(await refused(() => send(out.id, [{ line: out.lines[0].id, quantity: 1 }]))).toMatchObject({ status: 409 });
    expect(await refused(() => send(out.id, [{ line, quantity: 1 }], key(), 'plant@kestrelford.example'))).toMatchObject({ status: 404 });
    expect(await refused(() => send(out.id, [{ line, quantity: 1 }], key(), 'sales@northmere.example'))).toMatchObject({ status: 403 });
  });

  it('numbers invoices of each maker without a gap, refused dispatches between them', async () => {
    for (const account of ['ottery.northmere', 'ottery.kestrel-ford', 'ottery.northmere', 'perrin.northmere']) {
      const order = await acceptedOrderFactory(market, { account, lines: [{ quantity: 1 }] });
      if (account.endsWith('northmere')) {
        expect((await send(order.id, [{ line: order.lines[0].id, quantity: 9 }])).status).toBe(422);
      }
      expect((await dispatch(market, order)).status).toBe(201);
    }
    const numbers = async (email: string) =>
      (await (await as(market, email)).get('/api/invoices')).body.items.map(({ number }: { number: string }) => number).sort();
    expect(await numbers('accounts@northmere.example')).toEqual(['NM-INV000001', 'NM-INV000002', 'NM-INV000003']);
    expect(await numbers('accounts@kestrelford.example')).toEqual(['KF-INV000001']);
  });
});
