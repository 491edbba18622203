import { type Quote } from '@shared/contracts/quotes';
import { badQuantities, badUnits } from '../factories/bad-units';
import { tripleFactory, unitFactory } from '../factories/catalogue-factory';
import { type Caller, type Market, marketFactory } from '../factories/market-factory';
import { rowCounts } from '../factories/row-counts';

const line = (overrides = {}) => ({ unit: unitFactory(), quantity: 6, ...overrides });
const small = unitFactory({ width: '914.4', height: '1219.2' });

describe('lines of a quote', () => {
  let market: Market;
  let buyer: Caller;
  const make = async (lines: unknown[] = [line({ tag: 'A' }), line({ tag: 'B', unit: small })]): Promise<Quote> => {
    const answer = await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines });
    if (answer.status !== 201) throw new Error(answer.text);
    return answer.body as Quote;
  };
  const put = (quote: Quote, lines: unknown[]) => buyer.put(`/api/quotes/${quote.id}/lines`, { revision: quote.revision, lines });
  const sent = ({ id, unit, quantity, tag, extras }: Quote['lines'][number]) => ({
    id,
    unit,
    quantity,
    ...(tag === null ? {} : { tag }),
    extras,
  });
  beforeAll(async () => {
    market = await marketFactory();
    buyer = await market.as('buyer@ottery.example');
  });
  afterAll(() => market.close());

  it('are appended after those that are there', async () => {
    const quote = await make();
    const { status, body } = await buyer.post(`/api/quotes/${quote.id}/lines`, { lines: [line({ tag: 'C', extras: ['setting-blocks'] })] });
    expect(status).toBe(200);
    expect(body.lines.slice(0, 2)).toEqual(quote.lines);
    // 189.93 and 0.90 for blocks, less 3 %: 190.83 − 5.72.
    expect(body.lines[2]).toMatchObject({ position: 3, tag: 'C', extras: ['setting-blocks'], unitPrice: { amount: '185.11' } });
    expect(body).toMatchObject({ revision: 2, units: 18 });
  });

  it('are appended by two people at once without loss', async () => {
    const quote = await make();
    const colleague = await market.as('admin@ottery.example');
    const answers = await Promise.all(
      [buyer, colleague, buyer].map((caller, i) => caller.post(`/api/quotes/${quote.id}/lines`, { lines: [line({ tag: `N${i}` })] })),
    );
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200]);
    const { body } = await buyer.get(`/api/quotes/${quote.id}`);
    expect(body.lines.map(({ position }: { position: number }) => position)).toEqual([1, 2, 3, 4, 5]);
    expect(
      body.lines
        .slice(2)
        .map(({ tag }: { tag: string }) => tag)
        .sort(),
    ).toEqual(['N0', 'N1', 'N2']);
    expect(body.revision).toBe(4);
  });

  it('are copied, reordered and removed in one list, kept ones to the letter', async () => {
    const quote = await make();
    const [a, b] = quote.lines;
    const { id: _id, ...copyOfA } = sent(a!);
    const { body } = await put(quote, [sent(b!), sent(a!), copyOfA]);
    expect(
      body.lines.map(({ id, tag, position }: Quote['lines'][number]) => [id === a!.id ? 'a' : id === b!.id ? 'b' : 'new', tag, position]),
    ).toEqual([
      ['b', 'B', 1],
      ['a', 'A', 2],
      ['new', 'A', 3],
    ]);
    expect(body.lines[0]).toEqual({ ...b, position: 1 });
    expect(body.lines[2].charges).toEqual(a!.charges);
    const removed = await put(body, [sent(body.lines[0])]);
    expect(removed.body.goods).toEqual(b!.linePrice);
  });

  it('are put back at the price they had', async () => {
    const quote = await make();
    const [a, b] = quote.lines;
    const removed = await put(quote, [sent(b!)]);
    const { id: _id, ...again } = sent(a!);
    const { body } = await put(removed.body, [again, sent(b!)]);
    expect(body.lines[0].charges).toEqual(a!.charges);
    expect(body.total).toEqual(quote.total);
  });

  it('take another price with another quantity, unit or extra, and the same id', async () => {
    const quote = await make();
    const [a, b] = quote.lines;
    const { body } = await put(quote, [
      { ...sent(a!), quantity: 4 },
      { ...sent(b!), extras: ['setting-blocks'] },
    ]);
    expect(body.lines.map(({ id }: { id: string }) => id)).toEqual([a!.id, b!.id]);
    expect(body.lines[0].charges.map(({ family }: { family: string }) => family)).not.toContain('quantity break');
    expect(body.lines[1].charges.map(({ family }: { family: string }) => family)).toContain('extras');
    expect(body.units).toBe(10);
  });

  it('keep their sheet when only the tag changes', async () => {
    const quote = await make();
    const { body } = await put(
      quote,
      quote.lines.map((one, i) => ({ ...sent(one), tag: `T${i}` })),
    );
    expect(body.lines).toEqual(quote.lines.map((one, i) => ({ ...one, tag: `T${i}` })));
  });

  it('may all be removed, and then the quote costs nothing', async () => {
    const quote = await make();
    const { body } = await put(quote, []);
    expect(body).toMatchObject({
      lines: [],
      orderCharges: [],
      tax: [],
      units: 0,
      total: { amount: '0.00' },
      retailGoods: { amount: '0.00' },
    });
  });

  it('are not changed from an older state', async () => {
    const quote = await make();
    await put(quote, [sent(quote.lines[0]!)]);
    expect(await put(quote, [])).toMatchObject({ status: 409, body: { type: '/problems/changed-meanwhile' } });
  });

  it('are refused with reasons at the field where the maker cannot build, and nothing is written', async () => {
    const quote = await make();
    const { db } = market.dependencies.database;
    const before = rowCounts(db);
    const tooLarge = line({ unit: tripleFactory({ width: '2400', height: '3000' }) });
    for (const answer of [
      await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines: [line(), tooLarge] }),
      await buyer.post(`/api/quotes/${quote.id}/lines`, { lines: [line(), tooLarge] }),
      await put(quote, [sent(quote.lines[0]!), tooLarge]),
    ]) {
      expect(answer).toMatchObject({ status: 409, body: { type: '/problems/cannot-build' } });
      expect(answer.body.reasons.length).toBeGreaterThan(0);
      for (const { line: at } of answer.body.reasons) expect(at).toBe(1);
      for (const { pointer } of answer.body.errors) expect(pointer).toMatch(/^\/lines\/1\/unit\//);
    }
    expect(rowCounts(db)).toEqual(before);
    expect((await buyer.get(`/api/quotes/${quote.id}`)).body).toEqual(quote);
  });

  describe('bad input', () => {
    let quote: Quote;
    beforeAll(async () => {
      quote = await make();
    });
    const refusedEverywhere = async (bad: unknown, pointer: string) => {
      const { db } = market.dependencies.database;
      const before = rowCounts(db);
      for (const answer of [
        await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines: [line(), bad] }),
        await buyer.post(`/api/quotes/${quote.id}/lines`, { lines: [line(), bad] }),
        await put(quote, [sent(quote.lines[0]!), bad]),
      ]) {
        expect(answer).toMatchObject({ status: 422, type: 'application/problem+json' });
        expect(answer.body.errors).toContainEqual({ pointer: `/lines/1${pointer}`, detail: expect.any(String) });
      }
      expect(rowCounts(db)).toEqual(before);
      expect((await buyer.get(`/api/quotes/${quote.id}`)).body).toEqual(quote);
    };

    it.each(badUnits)('refuses %s wherever lines come in', (_what, unit, pointer) =>
      refusedEverywhere({ unit, quantity: 1 }, `/unit${pointer}`),
    );

    it.each(badQuantities.map((quantity) => [quantity]))('refuses a quantity of %j wherever lines come in', (quantity) =>
      refusedEverywhere({ unit: unitFactory(), quantity }, '/quantity'),
    );

    it('refuses an extra that the list does not have', () => refusedEverywhere(line({ extras: ['balloons'] }), '/extras/0'));

    it('refuses a line of another quote, and one line twice', async () => {
      const other = await make();
      const [a] = quote.lines;
      for (const [lines, pointer] of [
        [[{ ...sent(other.lines[0]!) }], '/lines/0/id'],
        [[sent(a!), sent(a!)], '/lines/1/id'],
      ] as const) {
        expect(await put(quote, [...lines])).toMatchObject({ status: 422, body: { errors: [{ pointer }] } });
      }
      expect((await buyer.get(`/api/quotes/${quote.id}`)).body).toEqual(quote);
    });

    it.each<[string, Record<string, unknown>, string]>([
      ['no account', { tradeAccount: undefined }, '/tradeAccount'],
      ['no lines', { lines: [] }, '/lines'],
      ['a customer without a name', { customer: { name: '' } }, '/customer/name'],
      ['an address that is no e-mail', { customer: { name: 'A', email: 'a@@b' } }, '/customer/email'],
      ['a negative mark-up', { markUpPercent: '-5' }, '/markUpPercent'],
      ['a mark-up of NaN', { markUpPercent: 'NaN' }, '/markUpPercent'],
      ['a mark-up as a number', { markUpPercent: 12.5 }, '/markUpPercent'],
      ['a mark-up of 1 000 %', { markUpPercent: '1000' }, '/markUpPercent'],
      ['notes beyond measure', { notes: 'x'.repeat(2001) }, '/notes'],
      ['a day that never was', { validUntil: '2026-02-30' }, '/validUntil'],
      ['a day that is past', { validUntil: '2026-09-14' }, '/validUntil'],
      ['a day beyond the longest hold', { validUntil: '2026-12-15' }, '/validUntil'],
      ['another’s address', { shipTo: 'perrin.place-1' }, '/shipTo'],
      ['a currency, which the account decides', { currency: 'XXX' }, '/currency'],
      ['a price of one’s own', { total: { amount: '1.00', currency: 'USD' } }, '/total'],
    ])('refuses a quote with %s', async (_what, change, pointer) => {
      const { db } = market.dependencies.database;
      const before = rowCounts(db);
      const answer = await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines: [line()], ...change });
      expect(answer).toMatchObject({ status: 422, type: 'application/problem+json' });
      expect(answer.body.errors).toContainEqual({ pointer, detail: expect.any(String) });
      expect(rowCounts(db)).toEqual(before);
    });

    it('holds prices to the last day of the longest hold', async () => {
      const answer = await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines: [line()], validUntil: '2026-12-14' });
      expect(answer).toMatchObject({ status: 201, body: { validUntil: '2026-12-14' } });
    });

    it.each(['perrin.northmere', 'no-such-account'])('refuses the account %s, which is not the dealer’s', async (tradeAccount) => {
      const { db } = market.dependencies.database;
      const before = rowCounts(db);
      expect(await buyer.post('/api/quotes', { tradeAccount, lines: [line()] })).toMatchObject({
        status: 404,
        body: { errors: [{ pointer: '/tradeAccount' }] },
      });
      expect(rowCounts(db)).toEqual(before);
    });

    it.each([
      ['a quote that is not there', 'get', '/api/quotes/no-such-quote'],
      ['a quote that is no identity', 'get', '/api/quotes/%00'],
      ['an identity beyond measure', 'get', `/api/quotes/${'x'.repeat(65)}`],
    ] as const)('finds nothing for %s', async (_what, method, path) => {
      expect(await buyer[method](path)).toMatchObject({ status: 404, type: 'application/problem+json' });
    });

    it('refuses a body of 10 MB', async () => {
      const answer = await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines: [], notes: 'x'.repeat(10_000_000) });
      expect(answer.status).toBe(413);
    });
  });
});
