import { eq } from 'drizzle-orm';
import { minorOf } from '@shared/money/money';
import { fabricators, tradeAccounts } from '@api/database/schema/companies';
import { verifyLedger } from '@api/receivables/verify-ledger';
import { type Market, marketFactory } from '../factories/market-factory';
import { unitFactory } from '../factories/catalogue-factory';
import { as, everyRow, key, orderFactory, orderWish, quoteFactory } from '../factories/order-factory';

const cents = ({ amount }: { amount: string }) => minorOf(amount, 'USD');
const DAY = 86_400_000;

jest.setTimeout(60_000);

describe('placing an order', () => {
  let market: Market;
  beforeEach(async () => {
    market = await marketFactory();
  });
  afterEach(() => {
    expect(verifyLedger(market.dependencies.database.db)).toEqual([]);
    market.close();
  });
  const place = async (quote: string, more: Record<string, unknown> = {}, headers = key(), email = 'buyer@ottery.example') =>
    (await as(market, email)).post(`/api/quotes/${quote}/order`, orderWish(email.split('@')[1]!.split('.')[0], more), headers);
  const quote = async (...wish: Parameters<typeof quoteFactory> extends [unknown, ...infer Rest] ? Rest : never) =>
    quoteFactory(await as(market, 'buyer@ottery.example'), ...wish);
  /** The refusal, having changed nothing. */
  const refused = async (call: () => Promise<Awaited<ReturnType<typeof place>>>) => {
    const before = everyRow(market);
    const answer = await call();
    expect(everyRow(market)).toBe(before);
    expect(answer.type).toBe('application/problem+json');
    return { status: answer.status, ...answer.body };
  };

  it('keeps lines, whole charge sheets, prices and version of the quote', async () => {
    const made = await quote('ottery.northmere', [{ tag: 'Kitchen' }, { quantity: 2, tag: 'Stair' }]);
    const { status, body } = await place(made.id);
    expect(status).toBe(201);
    expect(body).toMatchObject({
      number: 'NM-000001',
      state: 'submitted',
      quote: made.id,
      units: 8,
      total: made.total,
      goods: made.goods,
      priceListVersion: made.priceListVersion,
      promisedOn: '2026-09-25',
    });
    const kept = ({ charges, unitPrice, linePrice, tag, unit, quantity, makeUp }: (typeof body.lines)[number]) => ({
      charges,
      unitPrice,
      linePrice,
      tag,
      unit,
      quantity,
      makeUp,
    });
    expect(body.lines.map(kept)).toEqual(made.lines.map(kept));
    expect(body.lines[0].charges.length).toBeGreaterThan(3);
    const buyer = await as(market, 'buyer@ottery.example');
    expect((await buyer.get(`/api/quotes/${made.id}`)).body).toMatchObject({
      state: 'ordered',
      order: { id: body.id, number: 'NM-000001' },
    });
  });

  it('shows the quote to the dealer alone, and to nobody else’s company anything', async () => {
    const { body } = await orderFactory(market);
    const sales = await (await as(market, 'sales@northmere.example')).get(`/api/orders/${body.id}`);
    expect([sales.status, sales.body.quote, sales.body.lines.length]).toEqual([200, null, 1]);
    for (const email of ['buyer@perrin.example', 'sales@kestrelford.example']) {
      expect((await (await as(market, email)).get(`/api/orders/${body.id}`)).status).toBe(404);
    }
  });

  it('makes one order for one key, however often and however closely it comes', async () => {
    const made = await quote();
    const headers = key();
    const answers = await Promise.all([1, 2, 3].map(() => place(made.id, {}, headers)));
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
    const buyer = await as(market, 'buyer@ottery.example');
    expect((await buyer.get('/api/orders')).body.items).toHaveLength(1);
    expect(cents((await buyer.get('/api/trade-accounts/ottery.northmere/credit')).body.reserved)).toBe(cents(answers[0]!.body.total));
  });

  it('refuses a key that came with something else, but leaves each person their own keys', async () => {
    const made = await quote();
    const headers = key();
    expect((await place(made.id, {}, headers)).status).toBe(201);
    expect(await refused(() => place(made.id, { poNumber: 'another' }, headers))).toMatchObject({
      status: 422,
      type: '/problems/key-reused',
    });
    const other = await quote();
    const admin = await place(other.id, {}, headers, 'admin@ottery.example');
    expect(admin.status).toBe(201);
  });

  it('does not use a key up when it refuses', async () => {
    const made = await quote();
    const headers = key();
    expect((await place(made.id, { shipTo: 'nowhere' }, headers)).status).toBe(422);
    expect((await place(made.id, {}, headers)).status).toBe(201);
  });

  it('wants a key', async () => {
    const made = await quote();
    expect(await refused(() => place(made.id, {}, {}))).toMatchObject({ status: 422, errors: [{ pointer: '/Idempotency-Key' }] });
  });

  it('orders a quote once, in time, and of one’s own company', async () => {
    const made = await quote();
    const late = await quote();
    expect((await place(made.id)).status).toBe(201);
    expect(await refused(() => place(made.id))).toMatchObject({ status: 409, type: '/problems/not-in-this-state' });
    expect(await refused(() => place('no-such-quote'))).toMatchObject({ status: 404 });
    expect(await refused(() => place(late.id, {}, key(), 'buyer@perrin.example'))).toMatchObject({ status: 404 });
    market.clock.now += 31 * DAY;
    expect(await refused(() => place(late.id))).toMatchObject({ status: 409, type: '/problems/quote-expired' });
  });

  it('slips no other price in: a ship-to with other delivery and tax is shown and has to be accepted', async () => {
    const made = await quote();
    const away = { shipTo: 'ottery.place-4' };
    const shown = await refused(() => place(made.id, away));
    expect(shown).toMatchObject({ status: 409, type: '/problems/price-changed', shown: made.total });
    expect(shown.now.amount).not.toBe(made.total.amount);
    expect(await refused(() => place(made.id, { ...away, accepted: made.total.amount }))).toMatchObject({ status: 409 });
    const taken = await place(made.id, { ...away, accepted: shown.now.amount });
    expect([taken.status, taken.body.total]).toEqual([201, shown.now]);
  });

  it('holds the quote’s prices when the list changes, since the quote holds its version', async () => {
    const made = await quote();
    market.clock.now += 20 * DAY;
    const placed = await place(made.id);
    expect([placed.status, placed.body.total]).toEqual([201, made.total]);
  });

  it('refuses what the maker can no longer build, line by line', async () => {
    const made = await quote('ottery.northmere', [{ unit: unitFactory({ width: '500', height: '500' }) }, { unit: unitFactory() }]);
    const { dependencies } = market;
    const maker = dependencies.stores.companies.fabricator('northmere')!;
    const unit = { ...maker.capabilities.unit, maxLong: '1000' };
    dependencies.database.db
      .update(fabricators)
      .set({ capabilities: { ...maker.capabilities, unit } })
      .where(eq(fabricators.companyId, 'northmere'))
      .run();
    dependencies.catalogue.changed();
    const answer = await refused(() => place(made.id));
    expect(answer).toMatchObject({ status: 409, type: '/problems/cannot-build', reasons: [{ line: 1 }] });
    expect(answer.detail).toContain('line 2');
  });

  it('refuses a ship-to that is not in the book, and cards', async () => {
    const made = await quote();
    expect(await refused(() => place(made.id, { shipTo: 'perrin.place-1' }))).toMatchObject({
      status: 422,
      errors: [{ pointer: '/shipTo' }],
    });
    expect(await refused(() => place(made.id, { payment: 'card' }))).toMatchObject({ status: 409, type: '/problems/card-not-taken' });
  });

  it('takes a required day that the plant can meet, and names the earliest otherwise', async () => {
    const made = await quote();
    const early = await refused(() => place(made.id, { requiredOn: '2026-09-24' }));
    expect(early).toMatchObject({ status: 422, earliest: '2026-09-25', errors: [{ pointer: '/requiredOn' }] });
    expect(early.errors[0].detail).toContain('2026-09-25');
    expect(await refused(() => place(made.id, { requiredOn: '2026-09-26' }))).toMatchObject({ status: 422 });
    const placed = await place(made.id, { requiredOn: '2026-10-01' });
    expect([placed.status, placed.body.requiredOn, placed.body.promisedOn]).toEqual([201, '2026-10-01', '2026-09-25']);
  });

  it('lets a PO number stand on two orders', async () => {
    expect((await orderFactory(market)).status).toBe(201);
    expect((await orderFactory(market)).status).toBe(201);
  });

  it('goes nowhere at a closed account, not even by approval or release', async () => {
    const made = await quote();
    const waiting = await orderFactory(market, { lines: [{ quantity: 600 }], more: { review: true } });
    expect(waiting.body.state).toBe('credit review');
    market.dependencies.database.db.update(tradeAccounts).set({ state: 'closed' }).where(eq(tradeAccounts.id, 'ottery.northmere')).run();
    expect(await refused(() => place(made.id))).toMatchObject({ status: 409, type: '/problems/account-not-open' });
    const clerk = await as(market, 'accounts@northmere.example');
    expect(await refused(() => clerk.post(`/api/orders/${waiting.body.id}/moves`, { to: 'submitted' }))).toMatchObject({
      status: 409,
      type: '/problems/account-not-open',
    });
  });

  describe('above the buyer’s limit', () => {
    // Perrin's buyer may order up to 6 000 in total.
    const large = [{ quantity: 60 }];

    it('waits for the dealer admin, reserving nothing; approval checks credit then', async () => {
      const placed = await orderFactory(market, { account: 'perrin.northmere', lines: large });
      expect([placed.status, placed.body.state]).toEqual([201, 'awaiting approval']);
      expect(cents(placed.body.total)).toBeGreaterThan(600_000);
      const admin = await as(market, 'admin@perrin.example');
      const credit = async () => (await admin.get('/api/trade-accounts/perrin.northmere/credit')).body;
      expect((await credit()).reserved.amount).toBe('0.00');
      expect(market.dependencies.stores.outbox.due(market.clock.now, 9)).toEqual([]);
      const buyer = await as(market, 'buyer@perrin.example');
      expect((await buyer.post(`/api/orders/${placed.body.id}/moves`, { to: 'submitted' })).status).toBe(403);
      const approved = await admin.post(`/api/orders/${placed.body.id}/moves`, { to: 'submitted' });
      expect([approved.status, approved.body.state]).toEqual([200, 'submitted']);
      expect((await credit()).reserved).toEqual(placed.body.total);
      expect(market.dependencies.stores.outbox.due(market.clock.now, 9)).toHaveLength(1);
    });

    it('goes to credit review on approval where credit does not reach', async () => {
      const placed = await orderFactory(market, { account: 'perrin.northmere', lines: [{ quantity: 300 }] });
      expect(placed.body.state).toBe('awaiting approval');
      const admin = await as(market, 'admin@perrin.example');
      const approved = await admin.post(`/api/orders/${placed.body.id}/moves`, { to: 'submitted' });
      expect([approved.status, approved.body.state]).toEqual([200, 'credit review']);
      expect(approved.body.history.at(-1).reason).toContain('credit');
      expect((await admin.get('/api/trade-accounts/perrin.northmere/credit')).body.reserved.amount).toBe('0.00');
    });

    it('does not wait when the dealer admin orders', async () => {
      const made = await quoteFactory(await as(market, 'admin@perrin.example'), 'perrin.northmere', large);
      expect((await place(made.id, {}, key(), 'admin@perrin.example')).body.state).toBe('submitted');
    });
  });
});
