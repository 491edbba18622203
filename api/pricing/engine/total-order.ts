import { type Reason } from '@shared/contracts/evaluation';
import { type Destination, type PriceListVersion } from '@shared/contracts/price-lists';
import { type Currency } from '@shared/money/currencies';
import { Exact, exact } from '@shared/money/exact';
import { chargeCrates, chargeDelivery, chargeRush, chargeSurcharge, type OrderCharge, type OrderInHand, topUp } from './order-charges';
import { taxRows, type TaxRow } from './tax-rows';

/** What of a priced line an order's total depends on; a `PricedUnit` is one. */
export interface LineToTotal {
  quantity: number;
  linePriceMinor: number;
  /** kg of one unit, decimal string; null where the list asks for no weight */
  weightKg: string | null;
}

export interface OrderTotal {
  currency: Currency;
  goodsMinor: number;
  orderCharges: OrderCharge[];
  tax: TaxRow[];
  /** why there is no tax; null where tax was reckoned */
  taxNote: string | null;
  totalMinor: number;
}

/**
 * Goods, order charges, tax and their sum. Without a destination there is neither delivery nor tax.
 * An exempt destination pays no tax, and the note says so. Refuses a zone the list has no rate for.
 */
export function totalOrder(
  lines: readonly LineToTotal[],
  { version, content }: PriceListVersion,
  destination: Destination | null,
  leadTimeClass: string | null,
): { totalled: OrderTotal } | { refusals: Reason[] } {
  let goodsMinor = 0;
  let units = 0;
  let weightKg = new Exact(0);
  for (const line of lines) {
    goodsMinor += line.linePriceMinor;
    units += line.quantity;
    if (line.weightKg !== null) weightKg = weightKg.plus(exact(line.weightKg).times(line.quantity));
  }
  if (!Number.isSafeInteger(goodsMinor)) throw new RangeError(`${goodsMinor} minor units are too many`);
  const hand: OrderInHand = { content, version, goodsMinor, units, weightKg, zone: destination?.zone ?? null, leadTimeClass };

  const delivery = chargeDelivery(hand);
  if (delivery && 'code' in delivery) return { refusals: [delivery] };
  const orderCharges = [topUp(hand), delivery, chargeCrates(hand), chargeSurcharge(hand), chargeRush(hand)].filter(
    (charge) => charge !== null,
  );
  const tax = destination && !destination.exempt ? taxRows(content, destination.jurisdiction, { goodsMinor, charges: orderCharges }) : [];
  const taxNote = destination === null ? 'no destination' : destination.exempt ? `exempt in ${destination.jurisdiction}` : null;

  let totalMinor = goodsMinor;
  for (const { netMinor } of orderCharges) totalMinor += netMinor;
  for (const { amountMinor } of tax) totalMinor += amountMinor;
  return { totalled: { currency: content.currency, goodsMinor, orderCharges, tax, taxNote, totalMinor } };
}
