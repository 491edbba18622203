import { verifyLedger } from '@api/receivables/verify-ledger';
import { type Caller, type Market, marketFactory } from '../factories/market-factory';
import { acceptedOrderFactory, as, everyRow, key, orderWish, quoteFactory } from '../factories/order-factory';

jest.setTimeout(60_000);

describe('what orders and receipts make of bad input', () => {
  let market: Market;
  let quote: string;
  let order: { id: string; lines: { id: string }[] };
  let before: string;
  beforeAll(async () => {
    market = await marketFactory();
    quote = (await quoteFactory(await as(market, 'buyer@ottery.example'))).id;
    order = await acceptedOrderFactory(market);
    for (const email of ['plant@northmere.example', 'accounts@northmere.example']) await as(market, email);
    before = everyRow(market);
  });
  afterEach(() => expect(everyRow(market)).toBe(before));
  afterAll(() => {
    expect(verifyLedger(market.dependencies.database.db)).toEqual([]);
    market.close();
  });
  const wish = (more: Record<string, unknown>) => JSON.stringify(orderWish('ottery', more));
  const buyer = () => as(market, 'buyer@ottery.example');

  it.each<[body: string, pointer: string]>([
    [wish({ poNumber: '' }), '/poNumber'],
    [wish({ poNumber: '   ' }), '/poNumber'],
    [wish({ poNumber: 'a\u0000b' }), '/poNumber'],
    [wish({ poNumber: 'x'.repeat(61) }), '/poNumber'],
    [wish({ poNumber: 4711 }), '/poNumber'],
    [wish({ poNumber: undefined }), '/poNumber'],
    [wish({ shipTo: null }), '/shipTo'],
    [wish({ shipTo: "' or 1 = 1 --" }), '/shipTo'],
    [wish({ shipTo: 'nowhere' }), '/shipTo'],
    [wish({ payment: 'cheque' }), '/payment'],
    [wish({ requiredOn: 'tomorrow' }), '/requiredOn'],
    [wish({ requiredOn: '2026-02-30' }), '/requiredOn'],
    [wish({ requiredOn: '0000-00-00' }), '/requiredOn'],
    [wish({ requiredOn: '1999-01-01' }), '/requiredOn'],
    [wish({ accepted: 12 }), '/accepted'],
    [wish({ review: 'yes' }), '/review'],
    [wish({ total: '0.01' }), '/total'],
    ['[]', '/'],
    ['null', '/'],
    ['{"poNumber":"1","poNumber":"2","shipTo":"ottery.place-1","payment":"account"}', '/poNumber'],
  ])('refuses the order %s at %s', async (body, pointer) => {
    const answer = await (await buyer()).send('post', `/api/quotes/${quote}/order`, body, { 'content-type': 'application/json', ...key() });
    expect([answer.status, answer.type, answer.body.errors[0].pointer]).toEqual([422, 'application/problem+json', pointer]);
  });

  it.each(['', 'short', 'has space in it', 'x'.repeat(201), 'ümläutümläut'])('refuses the key %j', async (value) => {
    const headers = {
      'content-type': 'application/json',
      'idempotency-key': encodeURI(value) === value ? value : Buffer.from(value).toString('latin1'),
    };
    const answer = await (await buyer()).send('post', `/api/quotes/${quote}/order`, wish({}), headers);
    expect([answer.status, answer.body.errors[0].pointer]).toEqual([422, '/Idempotency-Key']);
  });

  it.each<[what: string, status: number, raw: string, type: string]>([
    ['20 000 levels of nesting', 400, '['.repeat(20_000), 'application/json'],
    ['a body of 10 MB', 413, JSON.stringify({ poNumber: 'x'.repeat(10_000_000) }), 'application/json'],
    ['half a body', 400, '{"poNumber":', 'application/json'],
    ['another media type', 415, 'poNumber=1', 'application/x-www-form-urlencoded'],
  ])('answers %s with %d everywhere', async (_what, status, raw, type) => {
    const calls: [caller: Caller, path: string][] = [
      [await buyer(), `/api/quotes/${quote}/order`],
      [await buyer(), `/api/orders/${order.id}/moves`],
      [await as(market, 'plant@northmere.example'), `/api/orders/${order.id}/dispatches`],
      [await as(market, 'accounts@northmere.example'), '/api/receipts'],
    ];
    for (const [caller, path] of calls) {
      const answer = await caller.send('post', path, raw, { 'content-type': type, ...key() });
      expect([path, answer.status, answer.type]).toEqual([path, status, 'application/problem+json']);
    }
  });

  it.each(['no-such-order', '..', '%00', "'", 'x'.repeat(65), '0'])('finds nothing at /api/orders/%s', async (id) => {
    const answer = await (await buyer()).get(`/api/orders/${id}`);
    expect([answer.status, answer.type]).toEqual([404, 'application/problem+json']);
  });
});
