import { type ChargeRow, type Hint as WireHint, type PricedLine, type Totals } from '@shared/contracts/prices';
import { type Currency } from '@shared/money/currencies';
import { money } from '@shared/money/money';
import { type Charge } from './charge';
import { type Hint } from './hints';
import { type PricedUnit } from './price-unit';
import { type OrderTotal } from './total-order';

/** From minor units to the contracts of prices. */

export function chargeToWire(charge: Charge, currency: Currency): ChargeRow {
  const { family, label, quantity, unit, rate, listMinor, discountPercent, discountReason, netMinor, rule } = charge;
  return {
    family,
    label,
    basis: { quantity, unit },
    rate,
    list: money(listMinor, currency),
    discountPercent,
    discountReason,
    net: money(netMinor, currency),
    rule,
  };
}

export function lineToWire(priced: PricedUnit, hints: readonly Hint[]): PricedLine {
  const { currency } = priced;
  return {
    unitPrice: money(priced.unitPriceMinor, currency),
    linePrice: money(priced.linePriceMinor, currency),
    charges: priced.charges.map((charge) => chargeToWire(charge, currency)),
    hints: hints.map((hint) => hintToWire(hint, currency)),
  };
}

export function hintToWire({ kind, width, height, unitPriceMinor, savesMinor }: Hint, currency: Currency): WireHint {
  return { kind, width, height, unitPrice: money(unitPriceMinor, currency), saves: money(savesMinor, currency) };
}

export function totalsToWire(total: OrderTotal): Totals {
  const { currency } = total;
  return {
    goods: money(total.goodsMinor, currency),
    orderCharges: total.orderCharges.map(({ family, label, netMinor, rule }) => ({ family, label, net: money(netMinor, currency), rule })),
    tax: total.tax.map(({ label, rate, baseMinor, amountMinor }) => ({
      label,
      rate,
      base: money(baseMinor, currency),
      amount: money(amountMinor, currency),
    })),
    total: money(total.totalMinor, currency),
  };
}
