import { minorOf } from '@shared/money/money';
import { verifyLedger } from '@api/receivables/verify-ledger';
import { type Market, marketFactory } from '../factories/market-factory';
import { as, dispatch, key, orderFactory } from '../factories/order-factory';

const cents = ({ amount }: { amount: string }) => minorOf(amount, 'USD');

jest.setTimeout(60_000);

describe('an order from placing to its reversed receipt', () => {
  let market: Market;
  beforeAll(async () => {
    market = await marketFactory();
  });
  afterAll(() => market.close());

  it('moves the credit bar at each step and brings it back where it was', async () => {
    const [buyer, sales, plant, clerk] = await Promise.all([
      as(market, 'buyer@ottery.example'),
      as(market, 'sales@northmere.example'),
      as(market, 'plant@northmere.example'),
      as(market, 'accounts@northmere.example'),
    ]);
    const bar = async () => {
      const { body } = await buyer.get('/api/trade-accounts/ottery.northmere/credit');
      expect((await clerk.get('/api/trade-accounts/ottery.northmere/credit')).body).toEqual(body);
      expect(cents(body.exposure)).toBe(cents(body.receivable) + cents(body.reserved) - cents(body.unapplied));
      expect(cents(body.available)).toBe(cents(body.limit) - cents(body.exposure));
      expect(verifyLedger(market.dependencies.database.db)).toEqual([]);
      return { receivable: cents(body.receivable), reserved: cents(body.reserved), unapplied: cents(body.unapplied) };
    };
    const nothing = { receivable: 0, reserved: 0, unapplied: 0 };
    expect(await bar()).toEqual(nothing);

    const placed = await orderFactory(market, { lines: [{ quantity: 5 }, { quantity: 7, tag: 'kitchen' }] });
    expect([placed.status, placed.body.state]).toEqual([201, 'submitted']);
    const total = cents(placed.body.total);
    expect(total).toBeGreaterThan(0);
    expect(await bar()).toEqual({ ...nothing, reserved: total });

    const accepted = await sales.post(`/api/orders/${placed.body.id}/moves`, { to: 'accepted' });
    expect([accepted.status, accepted.body.state]).toEqual([200, 'accepted']);
    expect(await bar()).toEqual({ ...nothing, reserved: total });

    const first = await dispatch(market, placed.body, [2, 3]);
    expect([first.status, first.body.state, first.body.dispatchedUnits]).toEqual([201, 'accepted', 5]);
    const [part] = (await buyer.get('/api/invoices?state=open')).body.items;
    expect(await bar()).toEqual({ receivable: cents(part.total), reserved: total - cents(part.total), unapplied: 0 });

    const moves = ['in production', 'ready'];
    for (const to of moves) expect((await plant.post(`/api/orders/${placed.body.id}/moves`, { to })).status).toBe(200);
    const rest = await dispatch(market, placed.body);
    expect([rest.status, rest.body.state, rest.body.dispatchedUnits]).toEqual([201, 'dispatched', 12]);
    expect(await bar()).toEqual({ receivable: total, reserved: 0, unapplied: 0 });

    const invoices = (await clerk.get('/api/invoices?state=open')).body.items as { id: string; open: { amount: string } }[];
    expect(invoices.reduce((sum, { open }) => sum + cents(open), 0)).toBe(total);
    const receipt = await clerk.post(
      '/api/receipts',
      {
        tradeAccount: 'ottery.northmere',
        receivedOn: '2026-09-15',
        amount: ((total + 5_000) / 100).toFixed(2),
        payerReference: 'Transfer of September',
        allocations: invoices.map(({ id, open }) => ({ invoice: id, amount: open.amount })),
      },
      key(),
    );
    expect(receipt.status).toBe(201);
    expect(await bar()).toEqual({ ...nothing, unapplied: 5_000 });
    expect((await buyer.get('/api/invoices?state=open')).body.items).toEqual([]);

    const reversed = await clerk.post(`/api/receipts/${receipt.body.id}/reversal`, { reason: 'The bank took it back' });
    expect([reversed.status, reversed.body.reversed.reason, reversed.body.unapplied.amount]).toEqual([
      200,
      'The bank took it back',
      '0.00',
    ]);
    expect(await bar()).toEqual({ receivable: total, reserved: 0, unapplied: 0 });

    const again = await clerk.post(
      '/api/receipts',
      {
        tradeAccount: 'ottery.northmere',
        receivedOn: '2026-09-15',
        amount: (total / 100).toFixed(2),
        payerReference: 'Transfer, second try',
        allocations: invoices.map(({ id, open }) => ({ invoice: id, amount: open.amount })),
      },
      key(),
    );
    expect(again.status).toBe(201);
    expect(await bar()).toEqual(nothing);

    const { body } = await buyer.get(`/api/orders/${placed.body.id}`);
    expect(body.history.map(({ to, by }: { to: string; by: string }) => [to, by])).toEqual([
      ['submitted', 'Nell Ashdown'],
      ['accepted', 'Odile Marsh'],
      ['in production', 'Ines Varga'],
      ['ready', 'Ines Varga'],
      ['dispatched', 'Ines Varga'],
    ]);
    expect(body.dispatches).toHaveLength(2);
    const subjects = market.dependencies.stores.outbox.due(market.clock.now, 20).map(({ subject, to }) => [to, subject.split(' ')[0]]);
    expect(subjects.sort()).toEqual([
      ['buyer@ottery.example', 'Order'],
      ['hello@ottery.example', 'Invoice'],
      ['hello@ottery.example', 'Invoice'],
    ]);
  });
});
