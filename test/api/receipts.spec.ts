import { minorOf } from '@shared/money/money';
import { verifyLedger } from '@api/receivables/verify-ledger';
import { type Answer, type Market, marketFactory } from '../factories/market-factory';
import { acceptedOrderFactory, as, dispatch, everyRow, key } from '../factories/order-factory';

const cents = ({ amount }: { amount: string }) => minorOf(amount, 'USD');
const dollars = (minor: number) => (minor / 100).toFixed(2);
const DAY = 86_400_000;
const account = 'ottery.northmere';

jest.setTimeout(60_000);

describe('receipts', () => {
  let market: Market;
  /** two open invoices, the second double the first */
  let invoices: Answer['body'][];
  beforeEach(async () => {
    market = await marketFactory();
    for (const quantity of [3, 6]) await dispatch(market, await acceptedOrderFactory(market, { lines: [{ quantity }] }));
    invoices = (await (await clerk()).get('/api/invoices?state=open')).body.items;
    invoices.sort((a, b) => cents(a.total) - cents(b.total));
  });
  afterEach(() => {
    expect(verifyLedger(market.dependencies.database.db)).toEqual([]);
    market.close();
  });
  const clerk = () => as(market, 'accounts@northmere.example');
  const record = async (body: Record<string, unknown>, headers = key()) =>
    (await clerk()).post(
      '/api/receipts',
      { tradeAccount: account, receivedOn: '2026-09-15', payerReference: 'transfer', ...body },
      headers,
    );
  const open = async (i: number) => cents((await (await clerk()).get(`/api/invoices/${invoices[i]!.id}`)).body.open);
  const refused = async (call: () => Promise<Answer>) => {
    const before = everyRow(market);
    const answer = await call();
    expect(everyRow(market)).toBe(before);
    return { status: answer.status, ...answer.body };
  };

  it('are applied to invoices in part or whole, the rest unapplied, and later applied', async () => {
    const [small, large] = invoices.map(({ total }) => cents(total)) as [number, number];
    const got = await record({ amount: dollars(small + 5_000), allocations: [{ invoice: invoices[0]!.id, amount: dollars(small) }] });
    expect([got.status, got.body.unapplied.amount, await open(0)]).toEqual([201, '50.00', 0]);
    const part = await (
      await clerk()
    ).post(`/api/receipts/${got.body.id}/allocations`, { allocations: [{ invoice: invoices[1]!.id, amount: '20.00' }] }, key());
    expect([part.status, part.body.unapplied.amount, await open(1)]).toEqual([200, '30.00', large - 2_000]);
    const rest = await (
      await clerk()
    ).post(
      `/api/receipts/${got.body.id}/allocations`,
      {
        allocations: [
          { invoice: invoices[1]!.id, amount: '10.00' },
          { invoice: invoices[1]!.id, amount: '20.00' },
        ],
      },
      key(),
    );
    expect([rest.status, rest.body.unapplied.amount, await open(1)]).toEqual([200, '0.00', large - 5_000]);
    expect(rest.body.allocations.map(({ amount }: { amount: { amount: string } }) => amount.amount)).toEqual([
      dollars(small),
      '20.00',
      '10.00',
      '20.00',
    ]);
  });

  it('are recorded and applied once for one key', async () => {
    const headers = key();
    const answers = await Promise.all([1, 2].map(() => record({ amount: '10.00' }, headers)));
    expect(answers.map(({ status, body }) => [status, body.id])).toEqual([
      [201, answers[0]!.body.id],
      [201, answers[0]!.body.id],
    ]);
    expect((await refused(() => record({ amount: '10.01' }, headers))).type).toBe('/problems/key-reused');
    const apply = key();
    const allocations = [{ invoice: invoices[0]!.id, amount: '4.00' }];
    for (let twice = 0; twice < 2; twice++) {
      const applied = await (await clerk()).post(`/api/receipts/${answers[0]!.body.id}/allocations`, { allocations }, apply);
      expect([applied.status, applied.body.unapplied.amount]).toEqual([200, '6.00']);
    }
  });

  it('settle with the early-payment discount within terms, to the cent', async () => {
    const total = cents(invoices[0]!.total);
    const { discount } = (await (await clerk()).get(`/api/invoices/${invoices[0]!.id}`)).body;
    const off = cents(discount.amount);
    expect(off).toBe(Math.round(total * 0.02));
    const got = await record({
      amount: dollars(total - off),
      receivedOn: '2026-09-15',
      allocations: [{ invoice: invoices[0]!.id, amount: dollars(total - off), discount: dollars(off) }],
    });
    expect([got.status, got.body.unapplied.amount, await open(0)]).toEqual([201, '0.00', 0]);
    const { body } = await (await clerk()).get('/api/ledger/trial-balance');
    expect(body.rows.find(({ account: name }: { account: string }) => name === 'discounts allowed').debit).toEqual(discount.amount);
    expect(body.difference.amount).toBe('0.00');
  });

  it('take the discount by the day the money came in, not the day it is applied', async () => {
    const total = cents(invoices[0]!.total);
    const got = await record({ amount: dollars(total) });
    market.clock.now += 40 * DAY;
    const allocations = [{ invoice: invoices[0]!.id, amount: dollars(total - 100), discount: '1.00' }];
    const applied = await (await clerk()).post(`/api/receipts/${got.body.id}/allocations`, { allocations }, key());
    expect([applied.status, applied.body.unapplied.amount]).toEqual([200, '1.00']);
    const late = await record({ receivedOn: '2026-10-20', amount: '98.00' });
    const tooLate = [{ invoice: invoices[1]!.id, amount: '98.00', discount: '2.00' }];
    expect(
      await refused(async () => (await clerk()).post(`/api/receipts/${late.body.id}/allocations`, { allocations: tooLate }, key())),
    ).toMatchObject({ status: 422, errors: [{ pointer: '/allocations/0/discount' }] });
  });

  it('come back allocation by allocation: the invoice is open again, the cash unapplied, once', async () => {
    const total = cents(invoices[0]!.total);
    const got = await record({ amount: dollars(total), allocations: [{ invoice: invoices[0]!.id, amount: dollars(total) }] });
    const [allocation] = got.body.allocations;
    market.clock.now += DAY;
    const back = await (await clerk()).post(`/api/allocations/${allocation.id}/reversal`, { reason: 'wrong invoice' });
    expect([back.status, back.body.unapplied.amount, await open(0)]).toEqual([200, dollars(total), total]);
    expect(back.body.allocations[0].reversedAt).toBe('2026-09-16T15:00:00.000Z');
    const entries = back.body.entries as { id: string; on: string; kind: string; reverses: string | null }[];
    expect(entries.map(({ on, kind }) => [on, kind])).toEqual([
      ['2026-09-15', 'receipt recorded'],
      ['2026-09-15', 'cash applied'],
      ['2026-09-16', 'reversal'],
    ]);
    expect(entries[2]!.reverses).toBe(entries[1]!.id);
    expect(
      await refused(async () => (await clerk()).post(`/api/allocations/${allocation.id}/reversal`, { reason: 'again' })),
    ).toMatchObject({ status: 409 });
  });

  it('come back whole, allocations and discount first, and take nothing more', async () => {
    const total = cents(invoices[0]!.total);
    const got = await record({
      amount: dollars(total),
      allocations: [{ invoice: invoices[0]!.id, amount: dollars(total - 200), discount: '2.00' }],
    });
    const back = await (await clerk()).post(`/api/receipts/${got.body.id}/reversal`, { reason: 'returned by the bank' });
    expect([back.status, back.body.unapplied.amount, await open(0)]).toEqual([200, '0.00', total]);
    const again = async () => (await clerk()).post(`/api/receipts/${got.body.id}/reversal`, { reason: 'twice' });
    expect(await refused(again)).toMatchObject({ status: 409 });
    const more = [{ invoice: invoices[0]!.id, amount: '1.00' }];
    expect(
      await refused(async () => (await clerk()).post(`/api/receipts/${got.body.id}/allocations`, { allocations: more }, key())),
    ).toMatchObject({ status: 409 });
  });

  it('post an application no earlier than its invoice', async () => {
    const got = await record({
      amount: '5.00',
      receivedOn: '2026-09-01',
      allocations: [{ invoice: invoices[0]!.id, amount: '5.00' }],
    });
    expect(got.body.entries.map(({ on }: { on: string }) => on)).toEqual(['2026-09-01', '2026-09-15']);
  });

  it('refuse what does not fit, at its field, and write nothing', async () => {
    const other = await acceptedOrderFactory(market, { account: 'perrin.northmere', lines: [{ quantity: 1 }] });
    await dispatch(market, other);
    const theirs = (await (await clerk()).get('/api/invoices?tradeAccount=perrin.northmere')).body.items[0].id;
    const own = invoices[0]!.id;
    const total = cents(invoices[0]!.total);
    const bad: [body: Record<string, unknown>, pointer: string][] = [
      [{ amount: '0' }, '/amount'],
      [{ amount: '0.00' }, '/amount'],
      [{ amount: '-5.00' }, '/amount'],
      [{ amount: 'NaN' }, '/amount'],
      [{ amount: '1e3' }, '/amount'],
      [{ amount: '10,00' }, '/amount'],
      [{ amount: '1.005' }, '/amount'],
      [{ amount: 10 }, '/amount'],
      [{ amount: '1'.repeat(30) }, '/amount'],
      [{ amount: '10.00', receivedOn: '2026-09-16' }, '/receivedOn'],
      [{ amount: '10.00', receivedOn: '2026-02-30' }, '/receivedOn'],
      [{ amount: '10.00', payerReference: 'a\nb' }, '/payerReference'],
      [{ amount: '10.00', currency: 'XYZ' }, '/currency'],
      [{ amount: '10.00', allocations: [{ invoice: own, amount: '10.01' }] }, '/allocations/0/amount'],
      [
        {
          amount: '10.00',
          allocations: [
            { invoice: own, amount: '6.00' },
            { invoice: own, amount: '6.00' },
          ],
        },
        '/allocations/1/amount',
      ],
      [{ amount: dollars(total + 1), allocations: [{ invoice: own, amount: dollars(total + 1) }] }, '/allocations/0/amount'],
      [{ amount: '10.00', allocations: [{ invoice: own, amount: '1.001' }] }, '/allocations/0/amount'],
      [{ amount: '10.00', allocations: [{ invoice: own, amount: '0.00' }] }, '/allocations/0/amount'],
      [{ amount: '10.00', allocations: [{ invoice: own, amount: '9.00', discount: '0.20' }] }, '/allocations/0/discount'],
      [{ amount: dollars(total), allocations: [{ invoice: own, amount: dollars(total), discount: '0.01' }] }, '/allocations/0/discount'],
      [{ amount: '10.00', allocations: [{ invoice: theirs, amount: '1.00' }] }, '/allocations/0/invoice'],
      [{ amount: '10.00', allocations: [{ invoice: 'no-such', amount: '1.00' }] }, '/allocations/0/invoice'],
    ];
    for (const [body, pointer] of bad) {
      const answer = await refused(() => record(body));
      expect([JSON.stringify(body), answer.status, answer.errors?.[0]?.pointer]).toEqual([JSON.stringify(body), 422, pointer]);
    }
    expect(await refused(() => record({ amount: '10.00', tradeAccount: 'ottery.kestrel-ford' }))).toMatchObject({ status: 404 });
    expect(await refused(async () => (await clerk()).post('/api/receipts/x/reversal', { reason: 'x' }))).toMatchObject({ status: 404 });
    expect(await refused(async () => (await clerk()).post('/api/allocations/x/reversal', { reason: 'x' }))).toMatchObject({ status: 404 });
  });

  it('are listed the newest first, a page at a time, by account and by what is left', async () => {
    for (const amount of ['1.00', '2.00', '3.00']) {
      market.clock.now += 1000;
      await record({ amount, allocations: amount === '2.00' ? [{ invoice: invoices[0]!.id, amount: '2.00' }] : [] });
    }
    const list = async (query: string) => (await (await clerk()).get(`/api/receipts?${query}`)).body;
    const amounts = ({ items }: Answer['body']) => items.map(({ amount }: { amount: { amount: string } }) => amount.amount);
    const first = await list('limit=2');
    expect(amounts(first)).toEqual(['3.00', '2.00']);
    expect(amounts(await list(`limit=2&cursor=${first.nextCursor}`))).toEqual(['1.00']);
    expect(amounts(await list('unapplied=true'))).toEqual(['3.00', '1.00']);
    expect(amounts(await list(`tradeAccount=${account}&unapplied=false`))).toEqual(['2.00']);
    expect(amounts(await list('tradeAccount=ottery.kestrel-ford'))).toEqual([]);
  });
});
