import ISO11649 from 'iso-11649';
import { minorOf } from '@shared/money/money';
import { verifyLedger } from '@api/receivables/verify-ledger';
import { type Answer, type Market, marketFactory } from '../factories/market-factory';
import { pdfPages } from '../factories/pdf-text';
import { acceptedOrderFactory, as, dispatch, key } from '../factories/order-factory';

const cents = ({ amount }: { amount: string }) => minorOf(amount, 'USD');
const DAY = 86_400_000;

jest.setTimeout(60_000);

describe('invoices', () => {
  let market: Market;
  beforeAll(async () => {
    market = await marketFactory();
    for (const [account, quantity] of [
      ['ottery.northmere', 2],
      ['perrin.northmere', 3],
      ['ottery.northmere', 4],
      ['ottery.kestrel-ford', 5],
    ] as const) {
      await dispatch(market, await acceptedOrderFactory(market, { account, lines: [{ quantity, tag: 'Hall' }] }));
      market.clock.now += 2 * DAY;
    }
  });
  afterAll(() => {
    expect(verifyLedger(market.dependencies.database.db)).toEqual([]);
    market.close();
  });
  const get = async (email: string, path: string) => (await as(market, email)).get(path);
  const numbers = ({ body }: Answer) => body.items.map(({ number }: { number: string }) => number);

  it('carry number, ISO 11649 reference, and due and discount day by the terms', async () => {
    const clerk = 'accounts@northmere.example';
    const [item] = (await get(clerk, '/api/invoices?state=open')).body.items;
    expect(item).toMatchObject({ number: 'NM-INV000001', issuedOn: '2026-09-15', dueOn: '2026-10-15', state: 'open', overdueDays: 0 });
    expect(ISO11649.validate(item.reference)).toBe(true);
    const { body } = await get(clerk, `/api/invoices/${item.id}`);
    expect(body.discount).toMatchObject({ percent: '2', until: '2026-09-25' });
    expect(body.lines).toEqual([expect.objectContaining({ position: 1, tag: 'Hall', quantity: 2 })]);
    expect(body.lines[0].description).toContain('36 1/2 × 48 1/4 in');
    const sum = [body.goods, ...body.orderCharges.map((c: Answer['body']) => c.net), ...body.tax.map((t: Answer['body']) => t.amount)];
    expect(sum.reduce((all, amount) => all + cents(amount), 0)).toBe(cents(body.total));
    expect(body.entries).toHaveLength(1);
    expect(body.entries[0].postings.map(({ account }: { account: string }) => account)).toEqual([
      'receivable',
      'sales',
      'delivery and surcharges',
      'sales tax',
    ]);
  });

  it('show a dealer its own, without the ledger', async () => {
    const buyer = 'buyer@ottery.example';
    const own = await get(buyer, '/api/invoices');
    expect(numbers(own).sort()).toEqual(['KF-INV000001', 'NM-INV000001', 'NM-INV000003']);
    const { body } = await get(buyer, `/api/invoices/${own.body.items[0].id}`);
    expect(body.entries).toEqual([]);
    expect((await get('buyer@perrin.example', `/api/invoices/${own.body.items[0].id}`)).status).toBe(404);
    const northmeres = own.body.items.find(({ number }: { number: string }) => number === 'NM-INV000001');
    expect((await get('accounts@kestrelford.example', `/api/invoices/${northmeres.id}`)).status).toBe(404);
    expect((await get('plant@northmere.example', `/api/invoices/${northmeres.id}`)).status).toBe(403);
  });

  it('are listed by due day, searched by the beginning of number or reference, a page at a time', async () => {
    const clerk = 'accounts@northmere.example';
    expect(numbers(await get(clerk, '/api/invoices?state=open'))).toEqual(['NM-INV000001', 'NM-INV000002', 'NM-INV000003']);
    expect(numbers(await get(clerk, '/api/invoices'))).toEqual(['NM-INV000003', 'NM-INV000002', 'NM-INV000001']);
    for (const query of ['state=open', '', 'q=nm-inv', 'tradeAccount=ottery.northmere', 'q=RF']) {
      const whole = numbers(await get(clerk, `/api/invoices?${query}`));
      const paged: string[] = [];
      let cursor = '';
      do {
        const page = await get(clerk, `/api/invoices?${query}&limit=1${cursor && `&cursor=${cursor}`}`);
        paged.push(...numbers(page));
        cursor = page.body.nextCursor ?? '';
      } while (cursor);
      expect(paged).toEqual(whole);
    }
    const [{ reference }] = (await get(clerk, '/api/invoices?q=NM-INV000002')).body.items;
    const grouped = encodeURIComponent(reference.toLowerCase().replace(/(.{4})/g, '$1 '));
    expect(numbers(await get(clerk, `/api/invoices?q=${grouped}`))).toEqual(['NM-INV000002']);
    expect(numbers(await get(clerk, '/api/invoices?tradeAccount=ottery.northmere'))).toEqual(['NM-INV000003', 'NM-INV000001']);
    expect(numbers(await get(clerk, '/api/invoices?tradeAccount=ottery.kestrel-ford'))).toEqual([]);
    expect(numbers(await get('buyer@perrin.example', '/api/invoices?tradeAccount=ottery.northmere'))).toEqual([]);
  });

  it('come as PDF with number, reference, order and total, as do acknowledgements, to either side alone', async () => {
    const { body: list } = await get('buyer@ottery.example', '/api/invoices?q=NM-INV000001');
    const [item] = list.items;
    const { body: invoice } = await get('buyer@ottery.example', `/api/invoices/${item.id}`);
    const texts = async (email: string, path: string) => {
      const answer = await get(email, path);
      expect([answer.status, answer.type]).toEqual([200, 'application/pdf']);
      expect(answer.headers['content-disposition']).toContain('.pdf"');
      return pdfPages(answer.body as Uint8Array)
        .flat()
        .join(' ');
    };
    for (const email of ['buyer@ottery.example', 'accounts@northmere.example']) {
      const paper = await texts(email, `/api/invoices/${item.id}/pdf`);
      for (const text of [item.number, invoice.order.number, invoice.order.poNumber, invoice.dispatch.number])
        expect(paper).toContain(text);
      expect(paper.replace(/\s/g, '')).toContain(item.reference);
      const order = await texts(email, `/api/orders/${invoice.order.id}/pdf`);
      expect(order).toContain(invoice.order.number);
    }
    for (const path of [`/api/invoices/${item.id}/pdf`, `/api/orders/${invoice.order.id}/pdf`]) {
      expect((await get('buyer@perrin.example', path)).status).toBe(404);
    }
  });

  it('turn paid with the last cent, and overdue by days', async () => {
    const clerk = await as(market, 'accounts@northmere.example');
    const [invoice] = (await clerk.get('/api/invoices?q=NM-INV000002')).body.items;
    await clerk.post(
      '/api/receipts',
      {
        tradeAccount: invoice.tradeAccount,
        receivedOn: '2026-09-20',
        amount: invoice.open.amount,
        payerReference: invoice.reference,
        allocations: [{ invoice: invoice.id, amount: invoice.open.amount }],
      },
      key(),
    );
    const read = (await clerk.get(`/api/invoices/${invoice.id}`)).body;
    expect([read.state, read.open.amount, read.allocations.length]).toEqual(['paid', '0.00', 1]);
    expect(numbers(await clerk.get('/api/invoices?state=paid'))).toEqual(['NM-INV000002']);
    market.clock.now = Date.parse('2026-10-20T15:00:00Z');
    const later = await get('accounts@northmere.example', '/api/invoices?q=NM-INV');
    expect(later.body.items.map(({ overdueDays }: { overdueDays: number }) => overdueDays)).toEqual([1, 0, 5]);
  });

  it.each(['limit=0', 'limit=201', 'limit=x', 'state=lost', 'cursor=abc', `q=${'x'.repeat(61)}`, 'tradeAccount=a%20b'])(
    'refuse the query %s',
    async (query) => {
      const answer = await get('accounts@northmere.example', `/api/invoices?${query}`);
      expect([answer.status, answer.body.errors[0].pointer]).toEqual([422, `/${query.split('=')[0]}`]);
    },
  );
});
