import { type SQL, sql } from 'drizzle-orm';
import { type OrderFilter } from '@api/orders/order-list-store';
import { type QuoteFilter } from '@api/quotes/quote-store';
import { type InvoiceFilter } from '@api/receivables/invoice-store';
import { type ReceiptFilter } from '@api/receivables/receipt-store';
import { type Market, marketFactory } from '../factories/market-factory';

/** A query as drizzle builds it. */
interface Built {
  toSQL(): { sql: string; params: unknown[] };
}

const dealer: OrderFilter & InvoiceFilter = { companyKind: 'dealer', companyId: 'ottery' };
const maker: OrderFilter & InvoiceFilter = { companyKind: 'fabricator', companyId: 'northmere' };

describe('the plans of list queries', () => {
  let market: Market;
  beforeAll(async () => {
    market = await marketFactory();
  });
  afterAll(() => market.close());

  function planOf(query: Built): string[] {
    const { sql: text, params } = query.toSQL();
    const parts = text.split('?');
    const bound = parts.reduce<SQL>(
      (all, part, i) => (i < params.length ? sql`${all}${sql.raw(part)}${params[i]}` : sql`${all}${sql.raw(part)}`),
      sql``,
    );
    return market.dependencies.database.db.all<{ detail: string }>(sql`explain query plan ${bound}`).map(({ detail }) => detail);
  }
  function expectIndex(query: Built, index: string): void {
    const plan = planOf(query);
    expect(plan.join('\n')).toContain(`INDEX ${index} `);
    expect(plan.filter((step) => /\bSCAN\b|TEMP B-TREE/.test(step))).toEqual([]);
  }
  const stores = () => market.dependencies.stores;

  const orderLists: [OrderFilter, string][] = [
    [dealer, 'orders_of_dealer'],
    [maker, 'orders_of_fabricator'],
    [{ ...dealer, state: 'ready' }, 'orders_of_dealer_by_state'],
    [{ ...maker, state: 'ready' }, 'orders_of_fabricator_by_state'],
    [{ ...maker, dealerId: 'ottery' }, 'orders_of_account'],
    [{ ...maker, dealerId: 'ottery', state: 'ready' }, 'orders_of_account'],
  ];
  it.each(orderLists)('orders %j: first and later pages walk %s', (filter, index) => {
    expectIndex(stores().orderLists.page(filter, undefined, 51), index);
    expectIndex(stores().orderLists.page(filter, [1, 'x'], 51), index);
  });

  const orderSearches: [OrderFilter, string, string][] = [
    [dealer, 'orders_of_dealer_by_number', 'orders_of_dealer_by_po'],
    [maker, 'orders_by_number', 'orders_of_fabricator_by_po'],
    [{ ...dealer, state: 'ready' }, 'orders_of_dealer_by_number', 'orders_of_dealer_by_po'],
    [{ ...maker, state: 'ready', dealerId: 'ottery' }, 'orders_by_number', 'orders_of_fabricator_by_po'],
  ];
  it.each(orderSearches)('orders %j: the beginning of a number walks %s, of a PO number %s', (filter, byNumber, byPo) => {
    for (const after of [undefined, ['NM-000009', 'x'] as [string, string]]) {
      expectIndex(stores().orderLists.byNumber(filter, 'NM', after, 51), byNumber);
      expectIndex(stores().orderLists.byPoNumber(filter, 'job', 'JOB', after, 51), byPo);
    }
  });

  const invoiceLists: [InvoiceFilter, string][] = [
    [dealer, 'invoices_of_dealer'],
    [maker, 'invoices_of_fabricator'],
    [{ ...dealer, state: 'open' }, 'invoices_open_of_dealer'],
    [{ ...maker, state: 'open' }, 'invoices_open_of_fabricator'],
    [{ ...maker, state: 'paid' }, 'invoices_of_fabricator'],
    [{ ...maker, tradeAccountId: 'a' }, 'invoices_of_account'],
    [{ ...maker, tradeAccountId: 'a', state: 'open' }, 'invoices_open_of_account'],
  ];
  it.each(invoiceLists)('invoices %j walk %s', (filter, index) => {
    expectIndex(stores().invoices.page(filter, undefined, 51), index);
    expectIndex(stores().invoices.page(filter, ['2026-01-01', 'x'], 51), index);
  });

  it.each<[InvoiceFilter, 'number' | 'reference', string]>([
    [dealer, 'number', 'invoices_of_dealer_by_number'],
    [dealer, 'reference', 'invoices_of_dealer_by_reference'],
    [maker, 'number', 'invoices_by_number'],
    [maker, 'reference', 'invoices_by_reference'],
    [{ ...maker, tradeAccountId: 'a', state: 'open' }, 'number', 'invoices_by_number'],
  ])('invoices %j by the beginning of a %s walk %s', (filter, by, index) => {
    expectIndex(stores().invoices.search(filter, by, 'NM', undefined, 51), index);
    expectIndex(stores().invoices.search(filter, by, 'NM', ['NM-INV000009', 'x'], 51), index);
  });

  it.each<[ReceiptFilter, string]>([
    [{ fabricatorId: 'northmere' }, 'receipts_newest'],
    [{ fabricatorId: 'northmere', unapplied: true }, 'receipts_unapplied'],
    [{ fabricatorId: 'northmere', unapplied: false }, 'receipts_newest'],
    [{ fabricatorId: 'northmere', tradeAccountId: 'a' }, 'receipts_of_account'],
    [{ fabricatorId: 'northmere', tradeAccountId: 'a', unapplied: true }, 'receipts_of_account'],
  ])('receipts %j walk %s', (filter, index) => {
    expectIndex(stores().receipts.page(filter, undefined, 51), index);
    expectIndex(stores().receipts.page(filter, [1, 'x'], 51), index);
  });

  it.each<[QuoteFilter, string]>([
    [{ today: '2026-09-15' }, 'quotes_newest'],
    [{ today: '2026-09-15', state: 'open' }, 'quotes_by_state'],
    [{ today: '2026-09-15', state: 'expired' }, 'quotes_by_state'],
    [{ today: '2026-09-15', state: 'ordered' }, 'quotes_by_state'],
    [{ today: '2026-09-15', tradeAccountId: 'a' }, 'quotes_newest'],
    [{ today: '2026-09-15', q: 'kitchen' }, 'quotes_newest'],
  ])('quotes %j walk %s', (filter, index) => {
    expectIndex(stores().quotes.page('ottery', filter, undefined, 51), index);
    expectIndex(stores().quotes.page('ottery', filter, [1, 'x'], 51), index);
  });

  it('knows a scan and a sort when it sees them', () => {
    const query = (text: string) => ({ toSQL: () => ({ sql: text, params: [] }) });
    expect(() => expectIndex(query('select * from orders order by po_number'), 'orders_of_dealer')).toThrow();
    expect(planOf(query('select * from orders order by po_number')).join()).toMatch(/SCAN orders.*TEMP B-TREE/);
  });
});
