import { type OrderFamily } from '@shared/contracts/price-lists';
import { type Totals } from '@shared/contracts/prices';
import { minorOf, money, spread } from '@shared/money/money';
import { type Currency } from '@shared/money/currencies';

/** What a tax of the price list falls on. */
export interface TaxScope {
  on: readonly ('goods' | OrderFamily)[];
}

export interface PartialDispatch {
  /** of the whole order */
  order: Totals;
  /** of the invoices made of it so far, whose charges and taxes stand in the order's order */
  earlier: readonly Totals[];
  /** price of the goods that leave now */
  goodsMinor: number;
  /** price of the goods that stay for later */
  laterGoodsMinor: number;
  /** units that leave now and later; the measure where goods cost nothing */
  units: number;
  laterUnits: number;
  /** of the order's taxes, in their order */
  taxScopes: readonly TaxScope[];
  currency: Currency;
}

/**
 * The totals of the invoice for a part of an order. Each order charge is spread over the
 * dispatches by the price of their goods, each tax by what it falls on: at every dispatch what
 * is not yet invoiced is divided between now and later, largest remainder first, and the last
 * dispatch takes what is left. So the invoices of an order always sum to the order, charge by
 * charge, base by base and tax by tax. A tax of a part may therefore differ by a cent from the
 * rate on the part's base.
 */
export function invoicePart(part: PartialDispatch): Totals {
  const { order, earlier, goodsMinor, laterGoodsMinor, currency } = part;
  const weights = goodsMinor + laterGoodsMinor > 0 ? ([goodsMinor, laterGoodsMinor] as const) : ([part.units, part.laterUnits] as const);
  const minor = (amount: { amount: string }) => minorOf(amount.amount, currency);
  const last = part.laterUnits === 0;
  const share = (left: number, [now, later]: readonly [number, number]) =>
    last ? left : now + later > 0 ? (spread(left, [now, later])[0] ?? 0) : 0;
  const sumOfEarlier = (pick: (totals: Totals) => { amount: string } | undefined) =>
    earlier.reduce((sum, totals) => {
      const found = pick(totals);
      return found ? sum + minor(found) : sum;
    }, 0);

  const charges = order.orderCharges.map((charge, i) => ({
    ...charge,
    minor: share(minor(charge.net) - sumOfEarlier((totals) => totals.orderCharges[i]?.net), weights),
  }));
  const taxes = order.tax.map((row, i) => {
    const baseLeft = minor(row.base) - sumOfEarlier((totals) => totals.tax[i]?.base);
    const scope = part.taxScopes[i]?.on ?? [];
    const taxed =
      (scope.includes('goods') ? goodsMinor : 0) +
      charges.reduce((sum, charge) => (scope.includes(charge.family) ? sum + charge.minor : sum), 0);
    const base = last ? baseLeft : taxed;
    const taxLeft = minor(row.amount) - sumOfEarlier((totals) => totals.tax[i]?.amount);
    return { ...row, baseMinor: base, minor: share(taxLeft, [base, Math.max(0, baseLeft - base)]) };
  });
  const total = goodsMinor + charges.reduce((sum, c) => sum + c.minor, 0) + taxes.reduce((sum, t) => sum + t.minor, 0);
  return {
    goods: money(goodsMinor, currency),
    orderCharges: charges.map(({ family, label, rule, minor: net }) => ({ family, label, net: money(net, currency), rule })),
    tax: taxes.map(({ label, rate, baseMinor, minor: amount }) => ({
      label,
      rate,
      base: money(baseMinor, currency),
      amount: money(amount, currency),
    })),
    total: money(total, currency),
  };
}
