import fc from 'fast-check';
import { type OrderFamily } from '@shared/contracts/price-lists';
import { type Totals } from '@shared/contracts/prices';
import { exact } from '@shared/money/exact';
import { minorOf, money, percentOf } from '@shared/money/money';
import { invoicePart, type TaxScope } from './invoice-part';

const usd = (minor: number) => money(minor, 'USD');
const cents = ({ amount }: { amount: string }) => minorOf(amount, 'USD');

interface Line {
  unitPriceMinor: number;
  quantity: number;
}

function orderOf(lines: Line[], charges: { family: OrderFamily; minor: number }[], taxes: (TaxScope & { rate: string })[]): Totals {
  const goods = lines.reduce((sum, line) => sum + line.unitPriceMinor * line.quantity, 0);
  const tax = taxes.map(({ rate, on }, i) => {
    const base = charges.reduce((sum, c) => (on.includes(c.family) ? sum + c.minor : sum), on.includes('goods') ? goods : 0);
    return { label: `tax ${i}`, rate, base: usd(base), amount: usd(percentOf(base, exact(rate))) };
  });
  const sum = charges.reduce((all, c) => all + c.minor, goods) + tax.reduce((all, t) => all + cents(t.amount), 0);
  return {
    goods: usd(goods),
    orderCharges: charges.map(({ family, minor }) => ({ family, label: family, net: usd(minor), rule: family })),
    tax,
    total: usd(sum),
  };
}

/** Invoices for one dispatch after the other, until everything is out. */
function invoiceAll(order: Totals, lines: Line[], dispatches: number[][], taxScopes: TaxScope[]): Totals[] {
  const left = lines.map(({ quantity }) => quantity);
  const invoices: Totals[] = [];
  const send = (now: number[]) => {
    if (now.every((n) => n === 0)) return;
    now.forEach((n, i) => (left[i]! -= n));
    const price = (quantities: number[]) => quantities.reduce((sum, n, i) => sum + n * lines[i]!.unitPriceMinor, 0);
    const count = (quantities: number[]) => quantities.reduce((sum, n) => sum + n, 0);
    invoices.push(
      invoicePart({
        order,
        earlier: [...invoices],
        goodsMinor: price(now),
        laterGoodsMinor: price(left),
        units: count(now),
        laterUnits: count(left),
        taxScopes,
        currency: 'USD',
      }),
    );
  };
  for (const dispatch of dispatches) send(left.map((n, i) => Math.min(n, dispatch[i % dispatch.length] ?? 0)));
  send([...left]);
  return invoices;
}

describe('the invoices of an order', () => {
  const families = fc.constantFrom<OrderFamily>('minimum order', 'delivery', 'crates', 'surcharge', 'rush');
  const arrangement = fc.record({
    lines: fc.array(fc.record({ unitPriceMinor: fc.integer({ min: 0, max: 90_000 }), quantity: fc.integer({ min: 1, max: 12 }) }), {
      minLength: 1,
      maxLength: 8,
    }),
    charges: fc.uniqueArray(fc.record({ family: families, minor: fc.integer({ min: 0, max: 50_000 }) }), {
      selector: ({ family }) => family,
      maxLength: 5,
    }),
    taxes: fc.array(
      fc.record({
        rate: fc.constantFrom('5.75', '8.25', '19', '0.5'),
        on: fc.uniqueArray(fc.constantFrom('goods' as const, 'delivery' as const, 'surcharge' as const), { minLength: 1 }),
      }),
      { maxLength: 3 },
    ),
    dispatches: fc.array(fc.array(fc.nat({ max: 5 }), { minLength: 1, maxLength: 8 }), { maxLength: 6 }),
  });

  it('sum to the order to the cent: goods, each charge, each base, each tax, total', () => {
    fc.assert(
      fc.property(arrangement, ({ lines, charges, taxes, dispatches }) => {
        const order = orderOf(lines, charges, taxes);
        const invoices = invoiceAll(order, lines, dispatches, taxes);
        const sum = (pick: (totals: Totals) => { amount: string }) => invoices.reduce((all, invoice) => all + cents(pick(invoice)), 0);
        expect(sum((t) => t.goods)).toBe(cents(order.goods));
        order.orderCharges.forEach((charge, i) => expect(sum((t) => t.orderCharges[i]!.net)).toBe(cents(charge.net)));
        order.tax.forEach((row, i) => {
          expect(sum((t) => t.tax[i]!.base)).toBe(cents(row.base));
          expect(sum((t) => t.tax[i]!.amount)).toBe(cents(row.amount));
        });
        expect(sum((t) => t.total)).toBe(cents(order.total));
      }),
      { numRuns: 400 },
    );
  });

  it('each add up, take nothing back, and tax what they hold within a cent of the rate', () => {
    fc.assert(
      fc.property(arrangement, ({ lines, charges, taxes, dispatches }) => {
        const order = orderOf(lines, charges, taxes);
        for (const invoice of invoiceAll(order, lines, dispatches, taxes)) {
          const parts = [invoice.goods, ...invoice.orderCharges.map((c) => c.net), ...invoice.tax.map((t) => t.amount)].map(cents);
          expect(parts.every((part) => part >= 0)).toBe(true);
          expect(parts.reduce((all, part) => all + part, 0)).toBe(cents(invoice.total));
          invoice.tax.forEach((row, i) => {
            const { on } = taxes[i]!;
            const held = invoice.orderCharges.reduce(
              (all, c) => (on.includes(c.family as 'delivery') ? all + cents(c.net) : all),
              on.includes('goods') ? cents(invoice.goods) : 0,
            );
            expect(cents(row.base)).toBe(held);
            expect(Math.abs(cents(row.amount) - percentOf(held, exact(row.rate)))).toBeLessThanOrEqual(1);
          });
        }
      }),
      { numRuns: 400 },
    );
  });

  it('spread a delivery of 100.00 over three equal parts as 33.33, 33.34, 33.33', () => {
    const lines = [{ unitPriceMinor: 5_000, quantity: 3 }];
    const order = orderOf(lines, [{ family: 'delivery', minor: 10_000 }], []);
    const parts = invoiceAll(order, lines, [[1], [1], [1]], []);
    expect(parts.map(({ orderCharges }) => orderCharges[0]!.net.amount)).toEqual(['33.33', '33.34', '33.33']);
  });

  it('spread by units where the goods cost nothing', () => {
    const lines = [{ unitPriceMinor: 0, quantity: 4 }];
    const order = orderOf(lines, [{ family: 'delivery', minor: 1_000 }], []);
    expect(invoiceAll(order, lines, [[1]], []).map((t) => t.total.amount)).toEqual(['2.50', '7.50']);
  });
});
