import { type Quote } from '@shared/contracts/quotes';
import { raise } from '@seeds/demo/price-lists';
import { addresses, tradeAccounts } from '@api/database/schema/companies';
import { eq } from 'drizzle-orm';
import { unitFactory } from '../factories/catalogue-factory';
import { type Caller, type Market, MARKET_DAY, marketFactory } from '../factories/market-factory';
import { publishList } from '../factories/publish-list';
import { rowCounts } from '../factories/row-counts';

const DAY_MS = 86_400_000;
const line = (overrides = {}) => ({ unit: unitFactory(), quantity: 6, tag: 'W1', ...overrides });

// A market is made for each test, which takes its time on a busy machine.
jest.setTimeout(30_000);

describe('prices that a quote holds', () => {
  let market: Market;
  let buyer: Caller;
  let quote: Quote;
  const at = (path = '') => `/api/quotes/${quote.id}${path}`;
  /** What a quote holds whatever the day: the earliest day of an order moves on with the calendar. */
  const lasting = ({ earliestOn: _, ...held }: Quote) => held;
  const read = async () => (await buyer.get(at())).body as Quote;
  const goTo = async (now: number) => {
    market.clock.now = now;
    buyer = await market.as('buyer@ottery.example');
  };
  const priceNow = async (lines: unknown[]) =>
    (await buyer.post('/api/prices', { tradeAccount: 'ottery.northmere', lines })).body.offers[0];
  beforeEach(async () => {
    market = await marketFactory();
    buyer = await market.as('buyer@ottery.example');
    const lines = [line(), line({ tag: 'W2', unit: unitFactory({ width: '400' }), quantity: 1 })];
    quote = (await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines })).body;
  });
  afterEach(() => market.close());

  it('outlive the publication of another list, also for lines added and changed later', async () => {
    publishList(market, 'northmere', (content) => raise(content, '10'), MARKET_DAY + DAY_MS);
    await goTo(MARKET_DAY + 2 * DAY_MS);
    expect(lasting(await read())).toEqual(lasting(quote));
    expect((await priceNow([line()])).lines[0].unitPrice.amount).not.toBe('184.23');

    const added = (await buyer.post(at('/lines'), { lines: [line({ tag: 'W3' })] })).body as Quote;
    expect(added.lines[2]).toMatchObject({ unitPrice: { amount: '184.23' } });
    expect(added.priceListVersion).toBe('northmere.3');
    const [first] = added.lines;
    const changed = await buyer.put(at('/lines'), {
      revision: added.revision,
      lines: [{ id: first!.id, unit: unitFactory({ width: '914.4', height: '1219.2' }), quantity: 6 }],
    });
    expect(changed.body.lines[0].unitPrice.amount).toBe('158.60');
  });

  it('outlive a change of the account’s tier', async () => {
    market.dependencies.database.db.update(tradeAccounts).set({ tier: 'A' }).where(eq(tradeAccounts.id, 'ottery.northmere')).run();
    const added = (await buyer.post(at('/lines'), { lines: [line()] })).body as Quote;
    expect(added.lines[2]!.unitPrice.amount).toBe('184.23');
    expect((await priceNow([line()])).lines[0].unitPrice.amount).not.toBe('184.23');
  });

  it('are compared with those of now, line by line, and nothing changes by it', async () => {
    publishList(market, 'northmere', (content) => ({ ...content, quantityBreaks: [{ atLeast: 5, percent: '4' }] }), MARKET_DAY + DAY_MS);
    await goTo(MARKET_DAY + 2 * DAY_MS);
    const { status, body } = await buyer.get(at('/re-price'));
    expect(status).toBe(200);
    // 4 % of 189.93 is 7.60, not 5.70: 182.33 each. The single unit has no break in either list.
    expect(body).toMatchObject({
      priceListVersion: 'northmere.4',
      differences: [
        {
          line: quote.lines[0]!.id,
          tag: 'W1',
          before: { amount: '1105.38', currency: 'USD' },
          after: { amount: '1093.98', currency: 'USD' },
        },
      ],
      before: quote.total,
    });
    expect(body.after.amount).toBe((await priceNow(quote.lines.map(({ unit, quantity }) => ({ unit, quantity })))).total.amount);
    expect(lasting(await read())).toEqual(lasting(quote));
  });

  it('give way when the new total is accepted, and only then', async () => {
    const next = publishList(market, 'northmere', (content) => raise(content, '10'), MARKET_DAY + DAY_MS);
    await goTo(MARKET_DAY + 2 * DAY_MS);
    const preview = (await buyer.get(at('/re-price'))).body;
    const { db } = market.dependencies.database;
    const before = rowCounts(db);
    for (const accepted of [quote.total.amount, '0.00']) {
      expect(await buyer.post(at('/re-price'), { revision: 1, accepted })).toMatchObject({
        status: 409,
        body: { type: '/problems/price-changed', shown: { amount: accepted }, now: preview.after },
      });
    }
    expect(rowCounts(db)).toEqual(before);
    expect(lasting(await read())).toEqual(lasting(quote));

    const { status, body } = await buyer.post(at('/re-price'), { revision: 1, accepted: preview.after.amount });
    expect(status).toBe(200);
    expect(body).toMatchObject({
      revision: 2,
      priceListVersion: next,
      total: preview.after,
      validUntil: '2026-10-17',
      pricedAt: new Date(MARKET_DAY + 2 * DAY_MS).toISOString(),
    });
    expect(body.lines.map(({ id }: { id: string }) => id)).toEqual(quote.lines.map(({ id }) => id));
    expect(body.lines[0].charges[0].rule).toBe(`${next}/glass/clear-3`);
    expect((await buyer.get(at('/re-price'))).body.differences).toEqual([]);
  });

  it('do not give way to a list published while the dealer was looking', async () => {
    publishList(market, 'northmere', (content) => raise(content, '5'), MARKET_DAY + DAY_MS);
    await goTo(MARKET_DAY + 2 * DAY_MS);
    const { after } = (await buyer.get(at('/re-price'))).body;
    publishList(market, 'northmere', (content) => raise(content, '5'), MARKET_DAY + 2 * DAY_MS + 1000);
    market.clock.now += 2000;
    expect((await buyer.post(at('/re-price'), { revision: 1, accepted: after.amount })).body.type).toBe('/problems/price-changed');
  });

  it.each([
    ['no amount', 'all of it'],
    ['a comma', '1206,26'],
    ['a tenth of a cent', '1206.261'],
    ['an exponent', '1e3'],
    ['nothing', ''],
  ])('refuse %s as what was accepted', async (_what, accepted) => {
    expect(await buyer.post(at('/re-price'), { revision: 1, accepted })).toMatchObject({
      status: 422,
      body: { errors: [{ pointer: '/accepted' }] },
    });
  });

  it('end with the day of validity in the dealer’s time zone', async () => {
    await goTo(Date.UTC(2026, 9, 16, 3, 59));
    expect((await read()).state).toBe('open');
    expect((await buyer.post(at('/lines'), { lines: [line()] })).status).toBe(200);
    market.clock.now = Date.UTC(2026, 9, 16, 4);
    const expired = await read();
    expect(expired.state).toBe('expired');

    const { db } = market.dependencies.database;
    const before = rowCounts(db);
    const { revision } = expired;
    const [first, ...rest] = expired.lines.map(({ id, unit, quantity }) => ({ id, unit, quantity }));
    const order = { poNumber: 'PO-1', shipTo: 'ottery.place-1', payment: 'account' };
    for (const answer of [
      await buyer.post(at('/lines'), { lines: [line()] }),
      await buyer.put(at('/lines'), { revision, lines: [{ ...first, quantity: 60 }, ...rest] }),
      await buyer.patch(at(), { revision, validUntil: '2026-11-01' }),
      await buyer.post(at('/order'), order, { 'idempotency-key': 'order-of-expired' }),
    ]) {
      expect(answer).toMatchObject({ status: 409, body: { type: '/problems/quote-expired' } });
    }
    expect(rowCounts(db)).toEqual(before);
    expect(await read()).toEqual(expired);
    // What needs no price may still be put right.
    expect((await buyer.put(at('/lines'), { revision, lines: rest })).status).toBe(200);
  });

  it('are held anew when an expired quote is re-priced', async () => {
    await goTo(Date.UTC(2026, 10, 2, 15));
    const { after } = (await buyer.get(at('/re-price'))).body;
    const { status, body } = await buyer.post(at('/re-price'), { revision: 1, accepted: after.amount, validUntil: '2026-11-20' });
    expect(status).toBe(200);
    expect(body).toMatchObject({ state: 'open', validUntil: '2026-11-20' });
    expect((await buyer.post(at('/lines'), { lines: [line()] })).status).toBe(200);
  });

  it('may be held longer, up to the longest hold after they were made', async () => {
    await goTo(MARKET_DAY + 20 * DAY_MS);
    expect(await buyer.patch(at(), { revision: 1, validUntil: '2026-12-15' })).toMatchObject({
      status: 422,
      body: { errors: [{ pointer: '/validUntil' }] },
    });
    expect((await buyer.patch(at(), { revision: 1, validUntil: '2026-12-14' })).body.validUntil).toBe('2026-12-14');
  });

  it('are not made or renewed where no list is in force, the account is closed or the maker stopped', async () => {
    const { db } = market.dependencies.database;
    publishList(
      market,
      'northmere',
      (content) => ({ ...content, glass: content.glass.filter(({ glass }) => glass !== 'clear-3') }),
      MARKET_DAY + DAY_MS,
    );
    await goTo(MARKET_DAY + 2 * DAY_MS);
    const before = rowCounts(db);
    const stopped = await buyer.get(at('/re-price'));
    expect(stopped).toMatchObject({ status: 409, body: { type: '/problems/cannot-build', reasons: [{ code: 'no-rate' }, {}, {}, {}] } });

    await goTo(Date.UTC(2024, 0, 1));
    for (const answer of [
      await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines: [line()] }),
      await buyer.get(at('/re-price')),
    ]) {
      expect(answer).toMatchObject({ status: 409, body: { type: '/problems/no-price-list' } });
    }

    market.clock.now = MARKET_DAY;
    await goTo(MARKET_DAY);
    db.update(tradeAccounts).set({ state: 'closed' }).where(eq(tradeAccounts.id, 'ottery.northmere')).run();
    for (const answer of [
      await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines: [line()] }),
      await buyer.get(at('/re-price')),
      await buyer.post(at('/re-price'), { revision: 1, accepted: quote.total.amount }),
    ]) {
      expect(answer).toMatchObject({ status: 409, body: { type: '/problems/account-not-open' } });
    }
    expect({ ...rowCounts(db), sessions: 0 }).toEqual({ ...before, sessions: 0 });
  });

  it('refuse a ship-to where the maker’s list has no delivery', async () => {
    const { db } = market.dependencies.database;
    db.update(addresses).set({ zone: 'island' }).where(eq(addresses.id, 'ottery.place-3')).run();
    const before = rowCounts(db);
    for (const answer of [
      await buyer.patch(at(), { revision: 1, shipTo: 'ottery.place-3' }),
      await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines: [line()], shipTo: 'ottery.place-3' }),
    ]) {
      expect(answer).toMatchObject({ status: 422, body: { errors: [{ pointer: '/shipTo' }] } });
    }
    expect(rowCounts(db)).toEqual(before);
    expect(lasting(await read())).toEqual(lasting(quote));
  });
});
