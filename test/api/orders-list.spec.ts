import { type Answer, type Market, marketFactory } from '../factories/market-factory';
import { as, orderFactory } from '../factories/order-factory';

jest.setTimeout(60_000);

describe('the list of orders', () => {
  let market: Market;
  beforeAll(async () => {
    market = await marketFactory();
    for (const [account, poNumber] of [
      ['ottery.northmere', 'Job 12 / a'],
      ['perrin.northmere', 'P-1'],
      ['ottery.northmere', 'job 12 / b'],
      ['ottery.kestrel-ford', 'NM-000001'],
      ['ottery.northmere', 'JOB 7'],
      ['perrin.northmere', '%'],
    ] as const) {
      market.clock.now += 60_000;
      const placed = await orderFactory(market, { account, lines: [{ quantity: 1 }], more: { poNumber } });
      expect(placed.status).toBe(201);
    }
    const order = (await list('sales@northmere.example', 'q=NM-000001')).items[0].id;
    expect((await (await as(market, 'sales@northmere.example')).post(`/api/orders/${order}/moves`, { to: 'accepted' })).status).toBe(200);
  });
  afterAll(() => market.close());
  const list = async (email: string, query = ''): Promise<Answer['body']> =>
    (await (await as(market, email)).get(`/api/orders?${query}`)).body;
  const numbers = ({ items }: Answer['body']): string[] => items.map(({ number }: { number: string }) => number);

  it('shows each company its own, the newest first', async () => {
    expect(numbers(await list('buyer@ottery.example'))).toEqual(['NM-000004', 'KF-000001', 'NM-000003', 'NM-000001']);
    expect(numbers(await list('plant@northmere.example'))).toEqual(['NM-000005', 'NM-000004', 'NM-000003', 'NM-000002', 'NM-000001']);
    expect(numbers(await list('sales@kestrelford.example'))).toEqual(['KF-000001']);
    expect((await (await as(market, 'operator@sealyard.example')).get('/api/orders')).status).toBe(403);
  });

  it.each(['', 'state=submitted', 'dealer=ottery', 'dealer=ottery&state=submitted', 'q=NM', 'q=job', 'q=nm-0&state=submitted'])(
    'pages through %j without a gap or a double',
    async (query) => {
      const whole = numbers(await list('sales@northmere.example', query));
      expect(whole.length).toBeGreaterThan(1);
      const paged: string[] = [];
      let cursor = '';
      do {
        const page = await list('sales@northmere.example', `${query}&limit=1${cursor && `&cursor=${cursor}`}`);
        paged.push(...numbers(page));
        cursor = page.nextCursor ?? '';
      } while (cursor);
      expect(paged).toEqual(whole);
    },
  );

  it('filters by state and, for the maker, by dealer', async () => {
    expect(numbers(await list('sales@northmere.example', 'state=accepted'))).toEqual(['NM-000001']);
    expect(numbers(await list('sales@northmere.example', 'dealer=perrin'))).toEqual(['NM-000005', 'NM-000002']);
    expect(numbers(await list('sales@northmere.example', 'dealer=ottery&state=submitted'))).toEqual(['NM-000004', 'NM-000003']);
    expect(numbers(await list('sales@kestrelford.example', 'dealer=perrin'))).toEqual([]);
    expect(numbers(await list('buyer@ottery.example', 'dealer=perrin'))).toEqual([]);
  });

  it('finds the beginning of an order number, then of a PO number, whatever the case and the signs', async () => {
    expect(numbers(await list('buyer@ottery.example', 'q=nm-000001'))).toEqual(['NM-000001', 'KF-000001']);
    expect(numbers(await list('buyer@ottery.example', 'q=JOB%2012'))).toEqual(['NM-000003', 'NM-000001']);
    expect(numbers(await list('buyer@ottery.example', 'q=job'))).toEqual(['NM-000004', 'NM-000003', 'NM-000001']);
    expect(numbers(await list('buyer@perrin.example', 'q=%25'))).toEqual(['NM-000005']);
    expect(numbers(await list('buyer@ottery.example', 'q=%25'))).toEqual([]);
    expect(numbers(await list('buyer@ottery.example', 'q=12'))).toEqual([]);
    expect(numbers(await list('buyer@perrin.example', 'q=job'))).toEqual([]);
  });

  it.each(['limit=0', 'limit=201', 'limit=1.5', 'state=lost', 'cursor=!', 'cursor=WzFd', `q=${'x'.repeat(61)}`, 'dealer=%27'])(
    'refuses %s at its field',
    async (query) => {
      const answer = await (await as(market, 'buyer@ottery.example')).get(`/api/orders?${query}`);
      expect([answer.status, answer.body.errors[0].pointer]).toEqual([422, `/${query.split('=')[0]}`]);
    },
  );
});
