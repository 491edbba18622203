import { sql } from 'drizzle-orm';
import fc from 'fast-check';
import { minorOf } from '@shared/money/money';
import { ledgerChecks, verifyLedger } from '@api/receivables/verify-ledger';
import { type Answer, type Market, marketFactory } from '../factories/market-factory';
import { acceptedOrderFactory, as, dispatch, key } from '../factories/order-factory';

const cents = ({ amount }: { amount: string }) => minorOf(amount, 'USD');
const DAY = 86_400_000;
const account = 'ottery.northmere';

async function busyMarket(): Promise<Market> {
  const market = await marketFactory();
  for (const quantity of [2, 3]) {
    const order = await acceptedOrderFactory(market, { lines: [{ quantity }] });
    await dispatch(market, order, [1]);
    market.clock.now += DAY;
  }
  const clerk = await as(market, 'accounts@northmere.example');
  const [invoice] = (await clerk.get('/api/invoices?state=open')).body.items;
  const receipt = { tradeAccount: account, receivedOn: '2026-09-17', payerReference: 'transfer' };
  const allocations = [{ invoice: invoice.id, amount: '40.00', discount: '0.80' }];
  const got = await clerk.post('/api/receipts', { ...receipt, amount: '100.00', allocations }, key());
  expect(got.status).toBe(201);
  const back = await clerk.post('/api/receipts', { ...receipt, amount: '60.00' }, key());
  expect((await clerk.post(`/api/receipts/${back.body.id}/reversal`, { reason: 'returned' })).status).toBe(200);
  return market;
}

jest.setTimeout(120_000);

describe('the ledger', () => {
  let market: Market;
  beforeAll(async () => {
    market = await busyMarket();
  });
  afterAll(() => {
    expect(verify()).toEqual([]);
    market.close();
  });
  const run = (text: string) => {
    try {
      market.dependencies.database.db.run(sql.raw(text));
    } catch (error) {
      // What the database itself says; drizzle puts the statement before it.
      throw (error as Error).cause;
    }
  };
  /** Does harm and takes it back, triggers and all. */
  const undone = (work: () => void) => {
    run('savepoint harm');
    try {
      work();
    } finally {
      run('rollback to harm');
      run('release harm');
    }
  };
  const verify = () => verifyLedger(market.dependencies.database.db);

  it('agrees with everything it is made of', () => {
    expect(verify()).toEqual([]);
  });

  it.each([
    ["update ledger_entries set memo = 'x'", 'a posted ledger entry cannot be changed'],
    ['update ledger_entries set closed = 0', 'a posted ledger entry cannot be changed'],
    ['delete from ledger_entries', 'a ledger entry cannot be deleted'],
    ['update postings set debit_minor = debit_minor + 1 where debit_minor > 0', 'a posting cannot be changed'],
    ['delete from postings', 'a posting cannot be deleted'],
    ["insert into postings select id, 9, 'bank', 'USD', 1, 0 from ledger_entries limit 1", 'a posted ledger entry takes no more postings'],
    ['update invoices set total_minor = total_minor + 1', 'an issued invoice cannot be changed'],
    ['delete from invoices', 'an issued invoice cannot be deleted'],
    ["update order_moves set reason = 'x'", 'a recorded move cannot be changed'],
    ['delete from order_moves', 'a recorded move cannot be deleted'],
  ])('refuses %s', (statement, message) => {
    expect(() => run(statement)).toThrow(message);
    expect(verify()).toEqual([]);
  });

  it('refuses to close an entry that does not balance, or holds nothing', () => {
    undone(() => {
      const open = (id: string) =>
        run(`insert into ledger_entries (id, fabricator_id, sequence, on_day, at, kind, memo, document_kind, document_id, closed)
          values ('${id}', 'northmere', ${id.length + 900}, '2026-09-17', 0, 'x', 'x', 'invoice', 'x', 0)`);
      open('empty');
      expect(() => run("update ledger_entries set closed = 1 where id = 'empty'")).toThrow('must balance');
      open('lopsided');
      run("insert into postings values ('lopsided', 0, 'bank', 'USD', 5, 0), ('lopsided', 1, 'sales', 'USD', 0, 4)");
      expect(() => run("update ledger_entries set closed = 1 where id = 'lopsided'")).toThrow('must balance');
      expect(() => run("insert into postings values ('lopsided', 2, 'sales', 'USD', 1, 1)")).toThrow('postings_one_side');
    });
  });

  it('is zero on the trial balance of every day, and its receivable is what is open', async () => {
    const clerk = await as(market, 'accounts@northmere.example');
    for (const at of ['2026-09-14', '2026-09-15', '2026-09-16', '2026-09-17', '2026-12-31']) {
      const { body } = await clerk.get(`/api/ledger/trial-balance?at=${at}`);
      expect([body.at, body.difference.amount, body.totals.debit]).toEqual([at, '0.00', body.totals.credit]);
    }
    const { rows } = (await clerk.get('/api/ledger/trial-balance')).body;
    const of = (name: string) => rows.find((row: Answer['body']) => row.account === name);
    const invoices = (await clerk.get('/api/invoices?state=open')).body.items as Answer['body'][];
    expect(cents(of('receivable').debit)).toBe(invoices.reduce((sum, { open }) => sum + cents(open), 0));
    expect(of('unapplied cash').credit.amount).toBe('60.00');
    expect(of('bank').debit.amount).toBe('100.00');
    expect(of('discounts allowed').debit.amount).toBe('0.80');
  });

  it('shows the movements of an account with a balance that runs through every page', async () => {
    const clerk = await as(market, 'accounts@northmere.example');
    const whole = (await clerk.get(`/api/trade-accounts/${account}/movements`)).body.items as Answer['body'][];
    expect(whole.map(({ kind }) => kind)).toEqual([
      'reversal',
      'receipt recorded',
      'discount taken',
      'cash applied',
      'receipt recorded',
      'invoice issued',
      'invoice issued',
    ]);
    let balance = 0;
    for (const row of [...whole].reverse()) {
      balance += cents(row.debit) - cents(row.credit);
      expect(cents(row.balance)).toBe(balance);
    }
    const credit = (await clerk.get(`/api/trade-accounts/${account}/credit`)).body;
    expect(balance).toBe(cents(credit.receivable) - cents(credit.unapplied));
    const paged: Answer['body'][] = [];
    let cursor = '';
    do {
      const page = (await clerk.get(`/api/trade-accounts/${account}/movements?limit=2${cursor && `&cursor=${cursor}`}`)).body;
      paged.push(...page.items);
      cursor = page.nextCursor ?? '';
    } while (cursor);
    expect(paged).toEqual(whole);
    expect(whole[3].document).toMatchObject({ kind: 'allocation', number: 'NM-INV000001' });
    expect((await (await as(market, 'accounts@kestrelford.example')).get(`/api/trade-accounts/${account}/movements`)).status).toBe(404);
  });

  it('stays right whatever receipts, applications and reversals come in whatever order', async () => {
    const own = await busyMarket();
    const clerk = await as(own, 'accounts@northmere.example');
    const step = fc.record({
      what: fc.constantFrom('receive', 'apply', 'undo', 'return'),
      which: fc.nat({ max: 20 }),
      minor: fc.integer({ min: 1, max: 9_000 }),
    });
    await fc.assert(
      fc.asyncProperty(fc.array(step, { minLength: 5, maxLength: 15 }), async (steps) => {
        for (const { what, which, minor } of steps) {
          const receipts = (await clerk.get('/api/receipts')).body.items as Answer['body'][];
          const receipt = receipts[which % receipts.length];
          const invoices = (await clerk.get('/api/invoices')).body.items as Answer['body'][];
          const allocations = [{ invoice: invoices[which % invoices.length].id, amount: (minor / 100).toFixed(2) }];
          const answer =
            what === 'receive'
              ? await clerk.post(
                  '/api/receipts',
                  {
                    tradeAccount: account,
                    receivedOn: '2026-09-17',
                    amount: ((minor * 2) / 100).toFixed(2),
                    payerReference: 'x',
                    allocations,
                  },
                  key(),
                )
              : what === 'apply'
                ? await clerk.post(`/api/receipts/${receipt.id}/allocations`, { allocations }, key())
                : what === 'return'
                  ? await clerk.post(`/api/receipts/${receipt.id}/reversal`, { reason: 'returned' })
                  : await clerk.post(
                      `/api/allocations/${(await clerk.get(`/api/receipts/${receipt.id}`)).body.allocations[0]?.id ?? 'none'}/reversal`,
                      { reason: 'undone' },
                    );
          expect(answer.status).toBeLessThan(500);
        }
        expect(verifyLedger(own.dependencies.database.db)).toEqual([]);
      }),
      { numRuns: 8 },
    );
    own.close();
  });

  describe('verified', () => {
    /** What must not happen, done behind the product's back, and the check that has to notice. */
    const harms: [check: string, ...statements: string[]][] = [
      ['every entry is closed', 'update ledger_entries set closed = 0 where sequence = 1'],
      ['every entry balances', 'update postings set debit_minor = debit_minor + 1 where rowid = 1'],
      ['every entry is in one currency, that of its account', "update postings set currency = 'EUR' where rowid = 1"],
      ['the trial balance is zero', 'update postings set debit_minor = debit_minor + 1 where rowid = 1'],
      [
        'an entry is reversed by its mirror',
        'update postings set debit_minor = debit_minor + 1 where entry_id in (select id from ledger_entries where reverses is not null) and debit_minor > 0',
      ],
      ['an invoice is posted with its total', 'update invoices set total_minor = total_minor + 1 where sequence = 1'],
      ['an invoice sums to its total', 'update invoices set total_minor = total_minor + 1 where sequence = 1'],
      ['an invoice lacks its total less what was applied', 'update invoices set open_minor = open_minor - 1 where sequence = 1'],
      ['an allocation is posted as it stands', 'update allocations set amount_minor = amount_minor - 1'],
      ['a receipt is posted as it stands', "update receipts set amount_minor = amount_minor + 1 where number = 'NM-REC000001'"],
      [
        'a receipt has left its amount less what was applied',
        "update receipts set unapplied_minor = unapplied_minor - 1 where number = 'NM-REC000001'",
      ],
      ['nothing stands of a reversed receipt', "update receipts set reversed_at = 1 where number = 'NM-REC000001'"],
      ['an allocation stays within one account', "update invoices set trade_account_id = 'perrin.northmere' where sequence = 1"],
      ['the receivable of an account is what its invoices lack', 'update invoices set open_minor = open_minor - 1 where sequence = 2'],
      [
        'the unapplied cash of an account is what its receipts have left',
        "update receipts set unapplied_minor = unapplied_minor - 1 where number = 'NM-REC000001'",
      ],
      [
        'the kept receivable is the ledger’s',
        `update account_balances set receivable_minor = receivable_minor + 1 where trade_account_id = '${account}'`,
      ],
      [
        'the kept unapplied cash is the ledger’s',
        `update account_balances set unapplied_minor = unapplied_minor + 1 where trade_account_id = '${account}'`,
      ],
      [
        'the kept reservation is the orders’',
        `update account_balances set reserved_minor = reserved_minor + 1 where trade_account_id = '${account}'`,
      ],
      ['an order’s total is that of its sums', 'update orders set total_minor = total_minor + 1'],
      ['an order is invoiced for what its invoices say', 'update orders set invoiced_minor = invoiced_minor + 1'],
      ['an order that is out is invoiced whole', "update orders set state = 'closed'"],
      ['a line is out by its dispatches', 'update order_lines set dispatched = 2'],
      ['an order’s units are its lines’', 'update orders set units = units + 1'],
      [
        'every dispatch has its invoice',
        "insert into dispatches select 'd9', order_id, 'NM-DIS000003', at, person_id from dispatches limit 1",
        "update number_series set next = 4 where kind = 'dispatch'",
      ],
      ['numbers of invoices have no gap', 'update invoices set sequence = 7 where sequence = 2'],
      ['numbers of entries have no gap', 'update ledger_entries set sequence = 99 where sequence = 3'],
      ['numbers of receipts have no gap', "update receipts set number = 'NM-REC000009' where number = 'NM-REC000002'"],
      ['numbers of orders have no gap', "update number_series set next = next + 1 where kind = 'order' and company_id = 'northmere'"],
      ['numbers of dispatches have no gap', "delete from number_series where kind = 'dispatch'"],
    ];

    it.each(harms)('names the first row where %s no longer holds', (check, ...statements) => {
      undone(() => {
        const triggers = market.dependencies.database.db.all<{ name: string }>(
          sql.raw("select name from sqlite_master where type = 'trigger'"),
        );
        for (const { name } of triggers) run(`drop trigger "${name}"`);
        run('pragma ignore_check_constraints = on');
        for (const statement of statements) run(statement);
        const found = verify().find((one) => one.check === check);
        expect(found).toMatchObject({ check, row: expect.any(String) });
        expect(found?.expected).not.toEqual(found?.found);
      });
    });

    it('has a harm for every check there is', () => {
      expect(harms.map(([check]) => check).sort()).toEqual([...ledgerChecks].sort());
    });
  });
});
