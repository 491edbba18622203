import { minorOf } from '@shared/money/money';
import { auditRows } from '@api/database/schema/companies';
import { verifyLedger } from '@api/receivables/verify-ledger';
import { type Market, marketFactory } from '../factories/market-factory';
import { acceptedOrderFactory, as, dispatch, everyRow, key, orderFactory, orderWish, quoteFactory } from '../factories/order-factory';

const cents = ({ amount }: { amount: string }) => minorOf(amount, 'USD');
const DAY = 86_400_000;

jest.setTimeout(60_000);

describe('credit', () => {
  let market: Market;
  beforeEach(async () => {
    market = await marketFactory();
  });
  afterEach(() => {
    expect(verifyLedger(market.dependencies.database.db)).toEqual([]);
    market.close();
  });
  const credit = async (account = 'ottery.northmere') =>
    (await (await as(market, `buyer@${account.split('.')[0]}.example`)).get(`/api/trade-accounts/${account}/credit`)).body;
  const change = async (body: Record<string, unknown>, account = 'ottery.northmere', email = 'accounts@northmere.example') =>
    (await as(market, email)).post(`/api/trade-accounts/${account}/credit-changes`, body);

  it('refuses an order above what is free, by how much and with what to do, and reserves nothing', async () => {
    const first = await orderFactory(market, { account: 'millrace.northmere', lines: [{ quantity: 20 }] });
    expect(first.status).toBe(201);
    const { available, limit } = await credit('millrace.northmere');
    expect(cents(available)).toBe(cents(limit) - cents(first.body.total));
    const before = await credit('millrace.northmere');
    const second = await orderFactory(market, { account: 'millrace.northmere', lines: [{ quantity: 400 }] });
    expect([second.status, second.type, second.body.type, second.body.ways]).toEqual([
      409,
      'application/problem+json',
      '/problems/over-credit',
      ['review'],
    ]);
    expect(second.body.available).toEqual(available);
    expect(cents(second.body.shortBy)).toBeGreaterThan(0);
    expect(await credit('millrace.northmere')).toEqual(before);
  });

  it('lets the limit be met to the cent and not passed by one', async () => {
    const buyer = await as(market, 'buyer@ottery.example');
    const quote = await quoteFactory(buyer);
    const total = cents(quote.total);
    await change({ limit: ((total - 1) / 100).toFixed(2), reason: 'a cent too little' });
    const short = await buyer.post(`/api/quotes/${quote.id}/order`, orderWish(), key());
    expect([short.status, short.body.shortBy.amount]).toEqual([409, '0.01']);
    await change({ limit: (total / 100).toFixed(2), reason: 'just enough' });
    expect((await buyer.post(`/api/quotes/${quote.id}/order`, orderWish(), key())).status).toBe(201);
    expect((await credit()).available.amount).toBe('0.00');
  });

  it('never lets two orders pass the limit together', async () => {
    const buyer = await as(market, 'buyer@ottery.example');
    const admin = await as(market, 'admin@ottery.example');
    const quotes = await Promise.all([1, 2, 3, 4].map(() => quoteFactory(buyer)));
    const total = cents(quotes[0].total);
    await change({ limit: ((total * 2.5) / 100).toFixed(2), reason: 'room for two' });
    const answers = await Promise.all(
      quotes.map(({ id }, i) => (i % 2 ? buyer : admin).post(`/api/quotes/${id}/order`, orderWish(), key())),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 201, 409, 409]);
    const after = await credit();
    expect([cents(after.reserved), cents(after.available) >= 0]).toEqual([total * 2, true]);
  });

  it('goes to the clerk’s review when asked to, reserving only when released', async () => {
    const asked = await orderFactory(market, { account: 'millrace.northmere', lines: [{ quantity: 400 }], more: { review: true } });
    expect([asked.status, asked.body.state]).toEqual([201, 'credit review']);
    expect((await credit('millrace.northmere')).reserved.amount).toBe('0.00');
    const sales = await as(market, 'sales@northmere.example');
    expect((await sales.post(`/api/orders/${asked.body.id}/moves`, { to: 'submitted' })).status).toBe(403);
    const clerk = await as(market, 'accounts@northmere.example');
    const released = await clerk.post(`/api/orders/${asked.body.id}/moves`, { to: 'submitted' });
    expect([released.status, released.body.state]).toEqual([200, 'submitted']);
    const after = await credit('millrace.northmere');
    expect(after.reserved).toEqual(asked.body.total);
    expect(cents(after.available)).toBeLessThan(0);
  });

  it('stops an account on hold, says so, and takes the order into review', async () => {
    await change({ onHold: true, reason: 'letter returned' });
    const refused = await orderFactory(market);
    expect([refused.status, refused.body.type, refused.body.ways]).toEqual([409, '/problems/account-on-hold', ['review']]);
    expect((await orderFactory(market, { more: { review: true } })).body.state).toBe('credit review');
    await change({ onHold: false, reason: 'letter arrived' });
    expect((await orderFactory(market)).status).toBe(201);
  });

  it('stops at invoices overdue beyond the days of grace, not before', async () => {
    const order = await acceptedOrderFactory(market, { lines: [{ quantity: 1 }] });
    await dispatch(market, order);
    const [invoice] = (await (await as(market, 'buyer@ottery.example')).get('/api/invoices')).body.items;
    const { graceDays } = (await (await as(market, 'buyer@ottery.example')).get('/api/trade-accounts')).body.items.find(
      ({ id }: { id: string }) => id === 'ottery.northmere',
    );
    market.clock.now = Date.parse(`${invoice.dueOn}T15:00:00Z`) + graceDays * DAY;
    expect((await credit()).overdue).toEqual(graceDays > 0 ? invoice.open : { amount: '0.00', currency: 'USD' });
    expect((await orderFactory(market, { lines: [{ quantity: 1 }] })).status).toBe(201);
    market.clock.now += DAY;
    expect((await credit()).overdue).toEqual(invoice.open);
    expect((await orderFactory(market)).body.type).toBe('/problems/overdue');
  });

  describe('counted from dispatch', () => {
    const account = 'perrin.kestrel-ford';
    const clerk = 'accounts@kestrelford.example';

    it('reserves nothing at placement and holds the limit when goods leave', async () => {
      await change({ limit: '4000', reason: 'small for the test' }, account, clerk);
      const order = await acceptedOrderFactory(market, { account, lines: [{ quantity: 30 }] });
      expect(cents(order.total)).toBeGreaterThan(400_000);
      expect(await credit(account)).toMatchObject({ reserved: { amount: '0.00' }, exposure: { amount: '0.00' } });
      expect((await dispatch(market, order, [10])).status).toBe(201);
      const before = everyRow(market);
      const whole = await dispatch(market, order);
      expect([whole.status, whole.body.type, whole.body.ways]).toEqual([409, '/problems/over-credit', []]);
      expect(everyRow(market)).toBe(before);
      expect(cents((await credit(account)).available)).toBeGreaterThanOrEqual(0);
      await change({ limit: '9000', reason: 'raised' }, account, clerk);
      expect((await dispatch(market, order)).body.state).toBe('dispatched');
    });

    it('reserves what is not invoiced when the account turns to counting from placement, and back', async () => {
      const order = await acceptedOrderFactory(market, { account, lines: [{ quantity: 20 }] });
      await dispatch(market, order, [5]);
      const invoiced = cents((await credit(account)).receivable);
      await change({ countsFrom: 'placement', reason: 'site finished' }, account, clerk);
      expect(cents((await credit(account)).reserved)).toBe(cents(order.total) - invoiced);
      await change({ countsFrom: 'dispatch', reason: 'next site' }, account, clerk);
      expect((await credit(account)).reserved.amount).toBe('0.00');
    });
  });

  it('keeps who changed a limit, from what to what, and why', async () => {
    expect((await change({ limit: '75000.50', reason: 'good payer' })).body.limit.amount).toBe('75000.50');
    const [row] = market.dependencies.database.db.select().from(auditRows).all();
    expect(row).toMatchObject({
      personId: 'accounts.northmere',
      action: 'credit changed',
      subjectId: 'ottery.northmere',
      before: { limitMinor: 6_000_000 },
      after: { limitMinor: 7_500_050 },
      reason: 'good payer',
    });
  });

  it.each<[body: Record<string, unknown>, pointer: string]>([
    [{ limit: '-1', reason: 'x' }, '/limit'],
    [{ limit: 'NaN', reason: 'x' }, '/limit'],
    [{ limit: '1e9', reason: 'x' }, '/limit'],
    [{ limit: '12,50', reason: 'x' }, '/limit'],
    [{ limit: '12.505', reason: 'x' }, '/limit'],
    [{ limit: 100, reason: 'x' }, '/limit'],
    [{ limit: '100' }, '/reason'],
    [{ limit: '100', reason: '  ' }, '/reason'],
    [{ countsFrom: 'never', reason: 'x' }, '/countsFrom'],
    [{ onHold: 'yes', reason: 'x' }, '/onHold'],
    [{ reason: 'x' }, '/'],
    [{ tier: 'C', reason: 'x' }, '/tier'],
  ])('refuses the change %j at %s and writes nothing', async (body, pointer) => {
    const before = everyRow(market);
    const answer = await change(body);
    expect([answer.status, answer.body.errors[0].pointer]).toEqual([422, pointer]);
    expect(everyRow(market)).toBe(before);
  });

  it('is nobody else’s business', async () => {
    for (const email of ['buyer@perrin.example', 'accounts@kestrelford.example']) {
      expect((await (await as(market, email)).get('/api/trade-accounts/ottery.northmere/credit')).status).toBe(404);
    }
    expect((await change({ limit: '1', reason: 'x' }, 'ottery.northmere', 'accounts@kestrelford.example')).status).toBe(404);
    expect((await change({ limit: '1', reason: 'x' }, 'ottery.northmere', 'sales@northmere.example')).status).toBe(403);
  });
});
