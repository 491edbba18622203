import { minorOf } from '@shared/money/money';
import { verifyLedger } from '@api/receivables/verify-ledger';
import { type Market, marketFactory } from '../factories/market-factory';
import { acceptedOrderFactory, as, dispatch, everyRow, orderFactory } from '../factories/order-factory';

const cents = ({ amount }: { amount: string }) => minorOf(amount, 'USD');

jest.setTimeout(60_000);

describe('moving an order', () => {
  let market: Market;
  beforeEach(async () => {
    market = await marketFactory();
  });
  afterEach(() => {
    expect(verifyLedger(market.dependencies.database.db)).toEqual([]);
    market.close();
  });
  const move = async (email: string, order: string, to: string, reason?: string) =>
    (await as(market, email)).post(`/api/orders/${order}/moves`, { to, reason });
  const reserved = async () =>
    cents((await (await as(market, 'buyer@ottery.example')).get('/api/trade-accounts/ottery.northmere/credit')).body.reserved);

  it('goes from the maker’s door to closed, each move by its own role', async () => {
    const { body: order } = await orderFactory(market);
    expect((await move('plant@northmere.example', order.id, 'accepted')).status).toBe(403);
    for (const [email, to] of [
      ['sales@northmere.example', 'accepted'],
      ['plant@northmere.example', 'in production'],
      ['plant@northmere.example', 'ready'],
    ] as const) {
      expect((await move(email, order.id, to)).body.state).toBe(to);
    }
    expect((await move('plant@northmere.example', order.id, 'dispatched')).status).toBe(409);
    expect((await dispatch(market, order)).body.state).toBe('dispatched');
    expect((await move('buyer@ottery.example', order.id, 'delivered')).body.state).toBe('delivered');
    expect((await move('buyer@ottery.example', order.id, 'closed')).status).toBe(403);
    expect((await move('sales@northmere.example', order.id, 'closed')).body.state).toBe('closed');
    expect((await move('sales@northmere.example', order.id, 'closed')).status).toBe(409);
  });

  it('offers each reader the moves that the server will take from them', async () => {
    const { body: order } = await orderFactory(market);
    const offered = async (email: string) =>
      (await (await as(market, email)).get(`/api/orders/${order.id}`)).body.moves.map(({ to }: { to: string }) => to);
    expect(await offered('sales@northmere.example')).toEqual(['accepted', 'refused', 'cancelled']);
    expect(await offered('accounts@northmere.example')).toEqual([]);
    expect(await offered('buyer@ottery.example')).toEqual(['cancelled']);
  });

  it.each([
    ['buyer@ottery.example', 'cancelled'],
    ['sales@northmere.example', 'cancelled'],
    ['sales@northmere.example', 'refused'],
  ])('frees the credit when %s makes it %s, with a reason', async (email, to) => {
    const { body: order } = await orderFactory(market);
    expect(await reserved()).toBe(cents(order.total));
    const before = everyRow(market);
    const without = await move(email, order.id, to);
    expect([without.status, without.body.errors]).toEqual([422, [{ pointer: '/reason', detail: expect.any(String) }]]);
    expect(everyRow(market)).toBe(before);
    const done = await move(email, order.id, to, 'Measured again');
    expect([done.status, done.body.state, done.body.history.at(-1).reason]).toEqual([200, to, 'Measured again']);
    expect(await reserved()).toBe(0);
    expect(done.body.moves).toEqual([]);
  });

  it('lets an order be cancelled until production starts, and not once a part of it is out', async () => {
    const begun = await acceptedOrderFactory(market);
    await move('plant@northmere.example', begun.id, 'in production');
    expect((await move('buyer@ottery.example', begun.id, 'cancelled', 'too late')).status).toBe(409);
    const partlyOut = await acceptedOrderFactory(market);
    await dispatch(market, partlyOut, [1]);
    expect((await move('buyer@ottery.example', partlyOut.id, 'cancelled', 'too late')).status).toBe(409);
    const accepted = await acceptedOrderFactory(market);
    expect((await move('buyer@ottery.example', accepted.id, 'cancelled', 'in time')).status).toBe(200);
  });

  it('keeps who, when and why', async () => {
    const { body: order } = await orderFactory(market);
    market.clock.now += 60_000;
    const { body } = await move('sales@northmere.example', order.id, 'refused', 'We do not make this shape');
    expect(body.history).toEqual([
      { from: null, to: 'submitted', at: '2026-09-15T15:00:00.000Z', by: 'Nell Ashdown', reason: null },
      { from: 'submitted', to: 'refused', at: '2026-09-15T15:01:00.000Z', by: 'Odile Marsh', reason: 'We do not make this shape' },
    ]);
  });

  it('answers 404 for another company’s order and 422 for a state that is none', async () => {
    const { body: order } = await orderFactory(market);
    expect((await move('sales@kestrelford.example', order.id, 'accepted')).status).toBe(404);
    expect((await move('buyer@perrin.example', order.id, 'cancelled', 'x')).status).toBe(404);
    expect((await move('sales@northmere.example', order.id, 'lost')).body.errors[0].pointer).toBe('/to');
  });
});
