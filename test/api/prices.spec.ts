import { eq } from 'drizzle-orm';
import { contractPrices, promotions } from '@api/database/schema/pricing';
import { addresses, tradeAccounts } from '@api/database/schema/companies';
import { type Offer, priceAnswer } from '@shared/contracts/prices';
import { minorOf } from '@shared/money/money';
import { raise } from '@seeds/demo/price-lists';
import { badQuantities, badUnits } from '../factories/bad-units';
import { tripleFactory, unitFactory } from '../factories/catalogue-factory';
import { type Answer, type Caller, type Market, MARKET_DAY, marketFactory } from '../factories/market-factory';
import { publishList } from '../factories/publish-list';
import { rowCounts } from '../factories/row-counts';

/** A make-up that all three makers build and price. */
const everyones = (overrides = {}) =>
  unitFactory({
    lites: [
      { glass: 'clear-4', treatment: 'annealed' },
      { glass: 'clear-4', treatment: 'annealed', coating: { id: 'low-e-soft', surface: 3 } },
    ],
    cavities: [{ width: '12', gas: 'argon', spacer: 'stainless' }],
    ...overrides,
  });

const DAY_MS = 86_400_000;
const lines = [{ unit: everyones(), quantity: 6 }];
const offerOf = (answer: Answer, fabricator: string): Offer => {
  const offer = (answer.body.offers as Offer[]).find((one) => one.fabricator.id === fabricator);
  if (!offer) throw new Error(`no offer of ${fabricator}: ${answer.text}`);
  return offer;
};

describe('prices', () => {
  let market: Market;
  let buyer: Caller;
  const price = (body: Record<string, unknown>) => buyer.post('/api/prices', body);
  beforeAll(async () => {
    market = await marketFactory();
    buyer = await market.as('buyer@ottery.example');
  });
  afterAll(() => market.close());

  it('prices the worked example to the cent', async () => {
    const answer = await price({ tradeAccount: 'ottery.northmere', lines: [{ unit: unitFactory(), quantity: 6 }] });
    const line = offerOf(answer, 'northmere').lines[0]!;
    expect(line.charges.map(({ list, discountPercent, net }) => [list.amount, discountPercent, net.amount])).toEqual([
      ['27.71', '12', '24.38'],
      ['27.71', '12', '24.38'],
      ['25.73', '12', '22.64'],
      ['25.73', '12', '22.64'],
      ['17.81', '12', '15.67'],
      ['44.86', '12', '39.48'],
      ['9.09', '0', '9.09'],
      ['7.26', '5', '6.90'],
      ['10.61', '0', '10.61'],
      ['14.14', '0', '14.14'],
      ['0.00', '0', '-5.70'],
    ]);
    expect(line).toMatchObject({ unitPrice: { amount: '184.23', currency: 'USD' }, linePrice: { amount: '1105.38', currency: 'USD' } });
  });

  it('hints at the standard size that the worked example names', async () => {
    const answer = await price({ tradeAccount: 'ottery.northmere', lines: [{ unit: unitFactory(), quantity: 6 }] });
    expect(offerOf(answer, 'northmere').lines[0]!.hints).toContainEqual({
      kind: 'standard size',
      width: '914.4',
      height: '1219.2',
      unitPrice: { amount: '158.60', currency: 'USD' },
      saves: { amount: '25.63', currency: 'USD' },
    });
  });

  it.each([
    ['36 × 48 in, a standard size', '914.4', '1219.2', '158.60'],
    ['40 × 62 in', '1016', '1574.8', '254.88'],
    ['11 × 13 1/2 in, at both minimums', '279.4', '342.9', '39.71'],
  ])('prices %s as worked by hand', async (_what, width, height, amount) => {
    const answer = await price({ tradeAccount: 'ottery.northmere', lines: [{ unit: unitFactory({ width, height }), quantity: 6 }] });
    expect(offerOf(answer, 'northmere').lines[0]!.unitPrice.amount).toBe(amount);
  });

  it('answers every open account in its own currency, in the shape of the contract', async () => {
    const answer = await price({ lines });
    expect(answer.status).toBe(200);
    const { offers, pricedAt } = priceAnswer.parse(answer.body);
    expect(pricedAt).toBe(new Date(MARKET_DAY).toISOString());
    expect(offers.map(({ tradeAccount, currency, canBuild, leadTimeDays }) => [tradeAccount, currency, canBuild, leadTimeDays])).toEqual([
      ['ottery.aldersund', 'EUR', true, 14],
      ['ottery.kestrel-ford', 'USD', true, 11],
      ['ottery.northmere', 'USD', true, 8],
    ]);
    for (const { currency, lines: priced, goods, orderCharges, tax, total } of offers) {
      const minor = (amounts: { amount: string }[]) => amounts.reduce((sum, { amount }) => sum + minorOf(amount, currency as 'USD'), 0);
      for (const [i, line] of priced.entries()) {
        expect(minor(line.charges.map(({ net }) => net))).toBe(minor([line.unitPrice]));
        expect(minor([line.unitPrice]) * lines[i]!.quantity).toBe(minor([line.linePrice]));
      }
      expect(minor(priced.map(({ linePrice }) => linePrice))).toBe(minor([goods!]));
      expect(minor([goods!, ...orderCharges!.map(({ net }) => net), ...tax!.map((row) => row.amount)])).toBe(minor([total!]));
    }
  });

  it('answers for a small dealer’s one account alone', async () => {
    const neighbour = await market.as('buyer@millrace.example');
    const answer = await neighbour.post('/api/prices', { lines });
    expect(answer.body.offers.map(({ fabricator }: Offer) => fabricator.id)).toEqual(['northmere']);
  });

  it('gives reasons, the line and no price where a maker cannot build', async () => {
    const answer = await price({ lines: [...lines, { unit: tripleFactory({ width: '2400', height: '3000' }), quantity: 1 }] });
    const offer = offerOf(answer, 'northmere');
    expect(offer).toMatchObject({ canBuild: false, lines: [], leadTimeDays: null });
    expect(offer).not.toHaveProperty('total');
    expect(offer.reasons.length).toBeGreaterThan(0);
    expect(new Set(offer.reasons.map(({ line }) => line))).toEqual(new Set([1]));
  });

  it('gives the reason where a maker builds a unit for which its list has no rate', async () => {
    const version = publishList(
      market,
      'aldersund',
      (content) => ({ ...content, coatings: content.coatings.filter(({ coating }) => coating !== 'low-e-soft') }),
      MARKET_DAY + DAY_MS,
    );
    const answer = await price({ lines, at: new Date(MARKET_DAY + 2 * DAY_MS).toISOString() });
    expect(offerOf(answer, 'aldersund')).toMatchObject({
      priceListVersion: version,
      canBuild: false,
      lines: [],
      reasons: [{ code: 'no-rate', line: 0, pointer: '/lites/1/coating/id' }],
    });
    expect(offerOf(answer, 'northmere').canBuild).toBe(true);
  });

  it('prices with the list in force at an instant, whatever is published later', async () => {
    const at = '2026-03-01T12:00:00.000Z';
    const before = await price({ tradeAccount: 'ottery.northmere', lines, at });
    expect(offerOf(before, 'northmere').priceListVersion).toBe('northmere.2');
    const now = await price({ tradeAccount: 'ottery.northmere', lines });
    expect(offerOf(now, 'northmere').priceListVersion).toBe('northmere.3');

    const effectiveFrom = MARKET_DAY + 30 * DAY_MS;
    const next = publishList(market, 'northmere', (content) => raise(content, '10'), effectiveFrom);
    expect((await price({ tradeAccount: 'ottery.northmere', lines, at })).body).toEqual(before.body);
    expect((await price({ tradeAccount: 'ottery.northmere', lines })).body).toEqual(now.body);
    const justBefore = new Date(effectiveFrom - 1).toISOString();
    const then = new Date(effectiveFrom).toISOString();
    expect(offerOf(await price({ lines, at: justBefore }), 'northmere').priceListVersion).toBe('northmere.3');
    expect(offerOf(await price({ lines, at: then }), 'northmere').priceListVersion).toBe(next);
  });

  it('says where no list is in force: in the offer among several, as a problem for one', async () => {
    const at = '2024-01-01T00:00:00Z';
    const several = await price({ lines, at });
    expect(several.status).toBe(200);
    for (const offer of several.body.offers as Offer[]) {
      expect(offer).toMatchObject({ priceListVersion: null, canBuild: false, reasons: [{ code: 'no-price-list' }], lines: [] });
    }
    const one = await price({ tradeAccount: 'ottery.northmere', lines, at });
    expect(one).toMatchObject({ status: 409, body: { type: '/problems/no-price-list', errors: [{ pointer: '/tradeAccount' }] } });
  });

  it('charges for a rush and shortens the lead time', async () => {
    const usual = offerOf(await price({ tradeAccount: 'ottery.northmere', lines }), 'northmere');
    const rush = offerOf(await price({ tradeAccount: 'ottery.northmere', lines, leadTimeClass: 'rush' }), 'northmere');
    expect(rush.leadTimeDays).toBe(3);
    expect(rush.lines).toEqual(usual.lines);
    const goods = minorOf(rush.goods!.amount, 'USD');
    const charge = rush.orderCharges!.find(({ family }) => family === 'rush')!;
    expect(minorOf(charge.net.amount, 'USD')).toBe(Math.round(goods / 4));
  });

  it('delivers and taxes by ship-to, and spares the exempt', async () => {
    const ohio = offerOf(await price({ tradeAccount: 'ottery.northmere', lines, shipTo: 'ottery.place-1' }), 'northmere');
    const colorado = offerOf(await price({ tradeAccount: 'ottery.northmere', lines, shipTo: 'ottery.place-4' }), 'northmere');
    expect(ohio.tax!.map(({ label }) => label)).toEqual(['Sales tax, Ohio']);
    expect(colorado.tax!.map(({ label }) => label)).toEqual(['Sales tax, Colorado']);
    expect(colorado.orderCharges!.map(({ family }) => family)).toContain('delivery');

    const exempt = await market.as('buyer@perrin.example');
    const spared = await exempt.post('/api/prices', { tradeAccount: 'perrin.northmere', lines, shipTo: 'perrin.place-1' });
    expect(offerOf(spared, 'northmere').tax).toEqual([]);
    const elsewhere = await exempt.post('/api/prices', { tradeAccount: 'perrin.northmere', lines, shipTo: 'perrin.place-2' });
    expect(offerOf(elsewhere, 'northmere').tax).toHaveLength(1);
    const later = await exempt.post('/api/prices', {
      tradeAccount: 'perrin.northmere',
      lines,
      shipTo: 'perrin.place-1',
      at: '2028-01-02T12:00:00Z',
    });
    expect(offerOf(later, 'northmere').tax).toHaveLength(1);
  });

  it('goes to the first address where none is named', async () => {
    const named = await price({ lines, shipTo: 'ottery.place-1' });
    expect((await price({ lines })).body).toEqual(named.body);
  });

  it('prices goods alone for a dealer whose ship-to book is empty, and makes no quote', async () => {
    const { db } = market.dependencies.database;
    const book = db.select().from(addresses).where(eq(addresses.companyId, 'millrace')).all();
    const neighbour = await market.as('buyer@millrace.example');
    db.delete(addresses).where(eq(addresses.companyId, 'millrace')).run();
    try {
      const offer = offerOf(await neighbour.post('/api/prices', { lines }), 'northmere');
      expect(offer.tax).toEqual([]);
      expect(offer.orderCharges!.map(({ family }) => family)).toEqual(['surcharge']);
      const quote = await neighbour.post('/api/quotes', { tradeAccount: 'millrace.northmere', lines });
      expect(quote).toMatchObject({ status: 422, body: { errors: [{ pointer: '/shipTo' }] } });
    } finally {
      db.insert(addresses).values(book).run();
    }
  });

  it('takes a contract before the tier, for its own account and days alone', async () => {
    const { db } = market.dependencies.database;
    const agreed = {
      id: 'glass-for-ottery',
      kind: 'percent',
      family: 'glass',
      percent: '30',
      from: '2026-09-15',
      until: '2026-09-20',
    } as const;
    db.insert(contractPrices).values({ id: agreed.id, tradeAccountId: 'ottery.northmere', agreed, createdAt: MARKET_DAY }).run();
    try {
      const glassOf = (answer: Answer) => offerOf(answer, 'northmere').lines[0]!.charges[0]!;
      expect(glassOf(await price({ lines }))).toMatchObject({ discountPercent: '30', discountReason: 'contract' });
      expect(glassOf(await price({ lines, at: '2026-09-22T12:00:00Z' }))).toMatchObject({
        discountPercent: '12',
        discountReason: 'tier B',
      });
      const neighbour = await market.as('buyer@millrace.example');
      expect(glassOf(await neighbour.post('/api/prices', { lines }))).toMatchObject({ discountPercent: '5' });
    } finally {
      db.delete(contractPrices).where(eq(contractPrices.id, agreed.id)).run();
    }
  });

  it('takes a promotion by its code, and refuses a code that no maker asked knows', async () => {
    const { db } = market.dependencies.database;
    const offered = {
      id: 'autumn',
      name: 'Autumn glazing',
      code: 'LEAVES',
      percents: { all: '10' },
      from: '2026-09-01',
      until: '2026-10-31',
      minimumArea: null,
      tiers: [],
    };
    db.insert(promotions).values({ id: offered.id, fabricatorId: 'northmere', offered, createdAt: MARKET_DAY }).run();
    const familiesOf = (answer: Answer) => offerOf(answer, 'northmere').lines[0]!.charges.map(({ family }) => family);
    expect(familiesOf(await price({ lines }))).not.toContain('promotion');
    expect(familiesOf(await price({ lines, promotionCode: 'LEAVES' }))).toContain('promotion');
    for (const asked of [
      { lines, promotionCode: 'SNOW' },
      { lines, promotionCode: 'LEAVES', at: '2026-11-02T12:00:00Z' },
      { lines, promotionCode: 'LEAVES', tradeAccount: 'ottery.kestrel-ford' },
    ]) {
      expect(await price(asked)).toMatchObject({ status: 422, body: { errors: [{ pointer: '/promotionCode' }] } });
    }
  });

  it('charges an extra that is asked for where the list has it', async () => {
    const asked = [{ ...lines[0]!, extras: ['setting-blocks'] }];
    const answer = await price({ lines: asked });
    expect(offerOf(answer, 'northmere').lines[0]!.charges).toContainEqual(
      expect.objectContaining({ family: 'extras', net: { amount: '0.90', currency: 'USD' } }),
    );
    expect(offerOf(answer, 'kestrel-ford')).toMatchObject({
      canBuild: false,
      reasons: [{ code: 'no-rate', pointer: '/extras/0', line: 0 }],
    });
  });

  it('knows neither another’s account nor address', async () => {
    for (const tradeAccount of ['perrin.northmere', 'no-such-account']) {
      expect(await price({ lines, tradeAccount })).toMatchObject({ status: 404, body: { errors: [{ pointer: '/tradeAccount' }] } });
    }
    for (const shipTo of ['perrin.place-1', 'nowhere']) {
      expect(await price({ lines, shipTo })).toMatchObject({ status: 422, body: { errors: [{ pointer: '/shipTo' }] } });
    }
  });

  it('prices nothing at a closed account', async () => {
    const { db } = market.dependencies.database;
    const setState = (state: 'open' | 'closed') =>
      db.update(tradeAccounts).set({ state }).where(eq(tradeAccounts.id, 'ottery.kestrel-ford')).run();
    setState('closed');
    try {
      expect((await price({ lines, tradeAccount: 'ottery.kestrel-ford' })).body.type).toBe('/problems/account-not-open');
      expect((await price({ lines })).body.offers.map(({ fabricator }: Offer) => fabricator.id)).toEqual(['aldersund', 'northmere']);
    } finally {
      setState('open');
    }
  });

  describe('bad input', () => {
    const refused = async (body: Record<string, unknown>, pointer: string) => {
      const { db } = market.dependencies.database;
      const before = rowCounts(db);
      const answer = await price(body);
      expect(answer).toMatchObject({ status: 422, type: 'application/problem+json' });
      expect(answer.body.errors).toContainEqual({ pointer, detail: expect.any(String) });
      expect(rowCounts(db)).toEqual(before);
    };

    it.each(badUnits)('refuses %s at the field of its line', (_what, unit, pointer) =>
      refused({ lines: [lines[0], { unit, quantity: 1 }] }, `/lines/1/unit${pointer}`),
    );

    it.each(badQuantities.map((quantity) => [quantity]))('refuses a quantity of %j', (quantity) =>
      refused({ lines: [{ unit: everyones(), quantity }] }, '/lines/0/quantity'),
    );

    it.each<[string, Record<string, unknown>, string]>([
      ['no lines', { lines: [] }, '/lines'],
      ['lines that are none', { lines: 'all' }, '/lines'],
      ['501 lines', { lines: Array.from({ length: 501 }, () => lines[0]) }, '/lines'],
      ['an unknown lead-time class', { lines, leadTimeClass: 'yesterday' }, '/leadTimeClass'],
      ['an instant that is a day', { lines, at: '2026-09-15' }, '/at'],
      ['an instant that never was', { lines, at: '2026-02-30T00:00:00Z' }, '/at'],
      ['a currency, which the account decides', { lines, currency: 'XXX' }, '/currency'],
      ['an account that is no identity', { lines, tradeAccount: '' }, '/tradeAccount'],
      ['an extra that is no identity', { lines: [{ ...lines[0], extras: ['a b'] }] }, '/lines/0/extras/0'],
      ['a tag with a line break', { lines: [{ ...lines[0], tag: 'W1\nW2' }] }, '/lines/0/tag'],
    ])('refuses %s', (_what, body, pointer) => refused(body, pointer));

    it('refuses a name given twice, at its pointer', async () => {
      const raw = `{"lines":[{"unit":${JSON.stringify(everyones())},"quantity":1,"quantity":1000}]}`;
      const answer = await buyer.send('post', '/api/prices', raw, { 'content-type': 'application/json' });
      expect(answer).toMatchObject({ status: 422, body: { errors: [{ pointer: '/lines/0/quantity' }] } });
    });
  });
});
