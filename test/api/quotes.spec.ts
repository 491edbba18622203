import { quoteItem, quoteSchema, type Quote } from '@shared/contracts/quotes';
import { amountOf, minorOf } from '@shared/money/money';
import { unitFactory } from '../factories/catalogue-factory';
import { type Caller, type Market, MARKET_DAY, marketFactory } from '../factories/market-factory';
import { pdfPages } from '../factories/pdf-text';
import { rowCounts } from '../factories/row-counts';

const line = (overrides = {}) => ({ unit: unitFactory(), quantity: 6, tag: 'W1', ...overrides });
const key = (text: string) => ({ 'idempotency-key': `key-${text}` });

// A market is made for each test, and 500 lines take their time on a busy machine.
jest.setTimeout(30_000);

describe('quotes', () => {
  let market: Market;
  let buyer: Caller;
  const make = async (body: Record<string, unknown> = {}): Promise<Quote> => {
    const answer = await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines: [line()], ...body });
    if (answer.status !== 201) throw new Error(answer.text);
    return answer.body as Quote;
  };
  beforeEach(async () => {
    market = await marketFactory();
    buyer = await market.as('buyer@ottery.example');
  });
  afterEach(() => market.close());

  it('is made with the prices in force, held for thirty days, in the shape of the contract', async () => {
    const quote = await make({ customer: { name: 'A. Mason', email: 'mason@house.example' }, notes: 'Back door first' });
    expect(() => quoteSchema.parse(quote)).not.toThrow();
    expect(quote).toMatchObject({
      number: 'Q-2026-0001',
      state: 'open',
      validUntil: '2026-10-15',
      revision: 1,
      priceListVersion: 'northmere.3',
      createdBy: 'Nell Ashdown',
      units: 6,
      goods: { amount: '1105.38', currency: 'USD' },
      leadTimeDays: 8,
      earliestOn: '2026-09-25',
      order: null,
      lines: [{ position: 1, tag: 'W1', makeUp: '3 temp / 16 argon / 3 temp low-e 3', quantity: 6, unitPrice: { amount: '184.23' } }],
    });
    expect((await buyer.get(`/api/quotes/${quote.id}`)).body).toEqual(quote);
  });

  it('costs what the same lines cost at the bench', async () => {
    const lines = [line(), line({ unit: unitFactory({ width: '400' }), quantity: 20, extras: ['setting-blocks'] })];
    const quote = await make({ lines, shipTo: 'ottery.place-4' });
    const priced = await buyer.post('/api/prices', { tradeAccount: 'ottery.northmere', lines, shipTo: 'ottery.place-4' });
    const [offer] = priced.body.offers;
    const { goods, orderCharges, tax, total } = quote;
    expect({ goods, orderCharges, tax, total }).toEqual({
      goods: offer.goods,
      orderCharges: offer.orderCharges,
      tax: offer.tax,
      total: offer.total,
    });
    expect(quote.lines.map(({ charges }) => charges)).toEqual(offer.lines.map(({ charges }: { charges: unknown }) => charges));
  });

  it('numbers quotes by dealer and year, without gaps where one is refused', async () => {
    await make();
    expect(
      (await buyer.post('/api/quotes', { tradeAccount: 'ottery.northmere', lines: [line({ unit: unitFactory({ width: '9000' }) })] }))
        .status,
    ).toBe(409);
    expect((await make()).number).toBe('Q-2026-0002');
    const neighbour = await market.as('buyer@perrin.example');
    const theirs = await neighbour.post('/api/quotes', { tradeAccount: 'perrin.northmere', lines: [line()] });
    expect(theirs.body.number).toBe('Q-2026-0001');
    market.clock.now = Date.UTC(2027, 0, 1, 4, 59);
    buyer = await market.as('buyer@ottery.example');
    expect((await make()).number).toBe('Q-2026-0003');
    market.clock.now = Date.UTC(2027, 0, 1, 5);
    expect((await make()).number).toBe('Q-2027-0001');
  });

  it('marks up each unit, rounded half up, and the lines from it', async () => {
    // 184.23 × 1.125 = 207.25875; marking up the line of 1105.38 instead would make 1243.55.
    const quote = await make({ markUpPercent: '12.5' });
    expect(quote.lines[0]!.retail).toEqual({
      unitPrice: { amount: '207.26', currency: 'USD' },
      linePrice: { amount: '1243.56', currency: 'USD' },
    });
    expect(quote.retailGoods.amount).toBe('1243.56');
    expect(quote.goods.amount).toBe('1105.38');
  });

  it('changes what stands around the lines and leaves their prices', async () => {
    const quote = await make({ customer: { name: 'A. Mason' } });
    const changed = await buyer.patch(`/api/quotes/${quote.id}`, {
      revision: 1,
      customer: null,
      markUpPercent: '12.5',
      notes: 'Second floor',
      validUntil: '2026-10-01',
      shipTo: 'ottery.place-4',
    });
    expect(changed.status).toBe(200);
    expect(changed.body).toMatchObject({
      revision: 2,
      customer: null,
      markUpPercent: '12.5',
      notes: 'Second floor',
      validUntil: '2026-10-01',
      shipTo: 'ottery.place-4',
      goods: quote.goods,
      tax: [{ label: 'Sales tax, Colorado' }],
    });
    expect(changed.body.lines[0].charges).toEqual(quote.lines[0]!.charges);
    expect(changed.body.total).not.toEqual(quote.total);
    const back = await buyer.patch(`/api/quotes/${quote.id}`, { revision: 2, shipTo: null });
    expect(back.body).toMatchObject({ shipTo: null, total: quote.total });
  });

  it('refuses a change made from an older state, and keeps the newer', async () => {
    const quote = await make();
    expect((await buyer.patch(`/api/quotes/${quote.id}`, { revision: 1, notes: 'first' })).status).toBe(200);
    const colleague = await market.as('admin@ottery.example');
    const late = await colleague.patch(`/api/quotes/${quote.id}`, { revision: 1, notes: 'second' });
    expect(late).toMatchObject({ status: 409, body: { type: '/problems/changed-meanwhile', revision: 2 } });
    expect((await buyer.get(`/api/quotes/${quote.id}`)).body.notes).toBe('first');
  });

  describe('the list', () => {
    const listed = async (query: string) => (await buyer.get(`/api/quotes?${query}`)).body.items.map(({ number }: Quote) => number);

    it('is newest first, in pages', async () => {
      for (let i = 0; i < 5; i++) {
        market.clock.now += 1000;
        await make();
      }
      const first = await buyer.get('/api/quotes?limit=2');
      expect(() => first.body.items.forEach((item: unknown) => quoteItem.parse(item))).not.toThrow();
      const second = await buyer.get(`/api/quotes?limit=2&cursor=${first.body.nextCursor}`);
      const third = await buyer.get(`/api/quotes?limit=2&cursor=${second.body.nextCursor}`);
      const numbers = [first, second, third].flatMap(({ body }) => body.items.map(({ number }: Quote) => number));
      expect(numbers).toEqual(['Q-2026-0005', 'Q-2026-0004', 'Q-2026-0003', 'Q-2026-0002', 'Q-2026-0001']);
      expect(third.body.nextCursor).toBeNull();
    });

    it('is searched in number, customer and tags, taking signs as they are', async () => {
      await make({ customer: { name: 'Harbour Inn' } });
      await make({ lines: [line({ tag: 'Kitchen 100%' }), line({ tag: 'Stairs' })] });
      expect(await listed('q=harbour')).toEqual(['Q-2026-0001']);
      expect(await listed('q=kitchen')).toEqual(['Q-2026-0002']);
      expect(await listed('q=stair')).toEqual(['Q-2026-0002']);
      expect(await listed('q=0002')).toEqual(['Q-2026-0002']);
      expect(await listed('q=100%25')).toEqual(['Q-2026-0002']);
      expect(await listed('q=%25')).toEqual(['Q-2026-0002']);
      expect(await listed('q=_')).toEqual([]);
      expect(await listed("q='")).toEqual([]);
    });

    it('tells open, expired and ordered apart by the dealer’s day', async () => {
      await make({ validUntil: '2026-09-15' });
      const ordered = await make();
      await make();
      const order = { poNumber: 'PO-1', shipTo: 'ottery.place-1', payment: 'account' };
      expect((await buyer.post(`/api/quotes/${ordered.id}/order`, order, key('order-1'))).status).toBe(201);
      expect(await listed('state=open')).toEqual(expect.arrayContaining(['Q-2026-0001', 'Q-2026-0003']));
      expect(await listed('state=expired')).toEqual([]);
      // Still the fifteenth in New York.
      market.clock.now = Date.UTC(2026, 8, 16, 3, 59);
      expect(await listed('state=expired')).toEqual([]);
      market.clock.now = Date.UTC(2026, 8, 16, 4);
      expect(await listed('state=expired')).toEqual(['Q-2026-0001']);
      expect(await listed('state=open')).toEqual(['Q-2026-0003']);
      expect(await listed('state=ordered')).toEqual(['Q-2026-0002']);
    });

    it('is filtered by trade account', async () => {
      await make();
      await make({ tradeAccount: 'ottery.kestrel-ford' });
      expect(await listed('tradeAccount=ottery.kestrel-ford')).toEqual(['Q-2026-0002']);
    });

    it.each([
      ['a state that is none', 'state=lost', '/state'],
      ['a cursor of another list', 'cursor=abc', '/cursor'],
      ['a limit of 201', 'limit=201', '/limit'],
    ])('refuses %s', async (_what, query, pointer) => {
      expect(await buyer.get(`/api/quotes?${query}`)).toMatchObject({ status: 422, body: { errors: [{ pointer }] } });
    });
  });

  it('shows its order once it is ordered, and changes no more', async () => {
    const quote = await make();
    const order = await buyer.post(
      `/api/quotes/${quote.id}/order`,
      { poNumber: 'PO-7', shipTo: 'ottery.place-1', payment: 'account' },
      key('order-7'),
    );
    expect(order.status).toBe(201);
    const { body } = await buyer.get(`/api/quotes/${quote.id}`);
    expect(body).toMatchObject({ state: 'ordered', order: { id: order.body.id, number: order.body.number } });
    const { db } = market.dependencies.database;
    const before = rowCounts(db);
    const { revision } = body;
    for (const answer of [
      await buyer.patch(`/api/quotes/${quote.id}`, { revision, notes: 'late' }),
      await buyer.post(`/api/quotes/${quote.id}/lines`, { lines: [line()] }),
      await buyer.put(`/api/quotes/${quote.id}/lines`, { revision, lines: [] }),
      await buyer.get(`/api/quotes/${quote.id}/re-price`),
      await buyer.post(`/api/quotes/${quote.id}/re-price`, { revision, accepted: quote.total.amount }),
    ]) {
      expect(answer).toMatchObject({ status: 409, body: { type: '/problems/not-in-this-state' } });
    }
    expect(rowCounts(db)).toEqual(before);
  });

  describe('nobody else’s business', () => {
    it('is not there for another dealer, in any call', async () => {
      const quote = await make();
      const { db } = market.dependencies.database;
      const neighbour = await market.as('admin@perrin.example');
      const before = rowCounts(db);
      const at = `/api/quotes/${quote.id}`;
      for (const answer of [
        await neighbour.get(at),
        await neighbour.get(`${at}/pdf`),
        await neighbour.get(`${at}/re-price`),
        await neighbour.patch(at, { revision: 1, notes: 'mine' }),
        await neighbour.post(`${at}/lines`, { lines: [line()] }),
        await neighbour.put(`${at}/lines`, { revision: 1, lines: [] }),
        await neighbour.post(`${at}/re-price`, { revision: 1, accepted: quote.total.amount }),
        await neighbour.post(`${at}/mail`, { to: 'a@b.example', subject: 's', message: 'm' }, key('theirs-1')),
      ]) {
        expect(answer).toMatchObject({ status: 404, type: 'application/problem+json' });
      }
      expect((await neighbour.get('/api/quotes')).body.items).toEqual([]);
      expect(rowCounts(db)).toEqual(before);
      expect((await buyer.get(at)).body).toEqual(quote);
    });

    it('never shows a fabricator the customer, the mark-up or what follows from it', async () => {
      const quote = await make({ customer: { name: 'Zebedee Quince' }, markUpPercent: '37.77', notes: 'gate code 4711' });
      const order = { poNumber: 'PO-9', shipTo: 'ottery.place-1', payment: 'account' };
      const placed = (await buyer.post(`/api/quotes/${quote.id}/order`, order, key('order-9'))).body;
      for (const mailbox of ['sales', 'accounts', 'plant', 'admin']) {
        const maker = await market.as(`${mailbox}@northmere.example`);
        for (const path of [`/api/quotes/${quote.id}`, `/api/quotes/${quote.id}/pdf`, '/api/quotes']) {
          expect([403, 404]).toContain((await maker.get(path)).status);
        }
        const seen = [await maker.get(`/api/orders/${placed.id}`), await maker.get('/api/orders')];
        expect(seen[0]!.status).toBe(200);
        for (const { text } of seen) {
          for (const secret of ['Quince', '37.77', '4711', quote.id, quote.retailGoods.amount]) expect(text).not.toContain(secret);
        }
      }
    });
  });

  describe('as PDF', () => {
    const textOf = async (path: string): Promise<string> => {
      const answer = await buyer.get(path);
      expect(answer).toMatchObject({ status: 200, type: 'application/pdf' });
      return pdfPages(answer.body).flat().join(' ');
    };

    it('shows wholesale what the maker charges and nothing of the mark-up', async () => {
      const quote = await make({ markUpPercent: '35' });
      const text = await textOf(`/api/quotes/${quote.id}/pdf`);
      expect(text).toContain('184.23');
      expect(text).toContain('Northmere Sealed Units');
      expect(text).not.toContain('248.71');
    });

    it('shows retail the dealer’s own prices and nothing of the maker’s', async () => {
      const quote = await make({ markUpPercent: '35', customer: { name: 'A. Mason', address: '1 Quarry Lane\nStoneby' } });
      const text = await textOf(`/api/quotes/${quote.id}/pdf?prices=retail`);
      for (const shown of ['248.71', '1,492.26', 'Ottery Glass & Sash', 'A. Mason', 'Stoneby', quote.number]) expect(text).toContain(shown);
      for (const hidden of ['184.23', 'Northmere', '1,105.38', '35 %', 'tier']) expect(text).not.toContain(hidden);
    });

    it('refuses prices that are neither', async () => {
      const quote = await make();
      expect(await buyer.get(`/api/quotes/${quote.id}/pdf?prices=secret`)).toMatchObject({
        status: 422,
        body: { errors: [{ pointer: '/prices' }] },
      });
    });
  });

  describe('by mail', () => {
    const letter = { to: 'mason@house.example', subject: 'Your windows', message: 'Dear A.,\nas discussed.' };

    it('goes to the outbox once for a key, with the PDF to attach', async () => {
      const quote = await make({ markUpPercent: '35' });
      const path = `/api/quotes/${quote.id}/mail`;
      const sent = await buyer.post(path, letter, key('mail-1'));
      expect(sent.status).toBe(200);
      expect(sent.body.mails).toEqual([
        { at: new Date(MARKET_DAY).toISOString(), to: 'mason@house.example', prices: 'retail', state: 'waiting' },
      ]);
      expect((await buyer.post(path, letter, key('mail-1'))).body.mails).toHaveLength(1);
      expect(market.dependencies.stores.outbox.mailsAbout('quote', quote.id)).toMatchObject([
        {
          fromName: 'Ottery Glass & Sash',
          replyTo: 'buyer@ottery.example',
          subject: 'Your windows',
          body: letter.message,
          attachments: [{ kind: 'quote', id: quote.id, prices: 'retail', fileName: 'Q-2026-0001.pdf' }],
        },
      ]);
      expect((await buyer.post(path, { ...letter, to: 'other@house.example' }, key('mail-1'))).body.type).toBe('/problems/key-reused');
      expect((await buyer.post(path, letter, key('mail-2'))).body.mails).toHaveLength(2);
    });

    it.each<[string, Record<string, unknown>, Record<string, string>, string]>([
      ['two addresses', { ...letter, to: 'a@b.example, c@d.example' }, key('mail-3'), '/to'],
      ['a header in the subject', { ...letter, subject: 'Hi\r\nBcc: all@b.example' }, key('mail-4'), '/subject'],
      ['no subject', { ...letter, subject: ' ' }, key('mail-5'), '/subject'],
      ['a message beyond measure', { ...letter, message: 'x'.repeat(4001) }, key('mail-6'), '/message'],
      ['no key', letter, {}, '/Idempotency-Key'],
    ])('refuses %s and writes nothing', async (_what, body, headers, pointer) => {
      const quote = await make();
      const { db } = market.dependencies.database;
      const before = rowCounts(db);
      const answer = await buyer.post(`/api/quotes/${quote.id}/mail`, body, headers);
      expect(answer).toMatchObject({ status: 422, body: { errors: [{ pointer }] } });
      expect(rowCounts(db)).toEqual(before);
    });

    it('sends no quote without lines', async () => {
      const quote = await make();
      await buyer.put(`/api/quotes/${quote.id}/lines`, { revision: 1, lines: [] });
      expect((await buyer.post(`/api/quotes/${quote.id}/mail`, letter, key('mail-7'))).body.type).toBe('/problems/not-in-this-state');
    });
  });

  it('keeps 500 lines whose sums agree', async () => {
    const lines = Array.from({ length: 500 }, (_, i) =>
      line({ unit: unitFactory({ width: String(400 + i) }), quantity: 1 + (i % 7), tag: `W${i + 1}` }),
    );
    const quote = await make({ lines, markUpPercent: '20' });
    expect(quote.lines.map(({ tag }) => tag)).toEqual(lines.map(({ tag }) => tag));
    const sum = (amounts: { amount: string }[]) =>
      amountOf(
        amounts.reduce((total, { amount }) => total + minorOf(amount, 'USD'), 0),
        'USD',
      );
    expect(quote.goods.amount).toBe(sum(quote.lines.map(({ linePrice }) => linePrice)));
    expect(quote.retailGoods.amount).toBe(sum(quote.lines.map(({ retail }) => retail.linePrice)));
    expect(quote.units).toBe(lines.reduce((total, { quantity }) => total + quantity, 0));
    const more = await buyer.post(`/api/quotes/${quote.id}/lines`, { lines: [line()] });
    expect(more).toMatchObject({ status: 422, body: { errors: [{ pointer: '/lines' }] } });
  });
});
