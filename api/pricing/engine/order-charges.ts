import { type Reason } from '@shared/contracts/evaluation';
import { type OrderFamily, type PriceListContent } from '@shared/contracts/price-lists';
import { KG_PER_POUND } from '@shared/measures/constants';
import { type Exact, exact } from '@shared/money/exact';
import { percentOf, roundToMinor } from '@shared/money/money';

/** The charges of a whole order. Goods are list units at net prices; each charge is rounded half up once, when it is made. */

export interface OrderCharge {
  family: OrderFamily;
  label: string;
  netMinor: number;
  rule: string;
}

/** What order charges are made from. */
export interface OrderInHand {
  content: PriceListContent;
  version: string;
  goodsMinor: number;
  units: number;
  /** kg of all units, decimal */
  weightKg: Exact;
  /** delivery zone; null when nothing is delivered yet */
  zone: string | null;
  leadTimeClass: string | null;
}

/** What is missing from the goods to the minimum order. */
export function topUp({ content, version, goodsMinor }: OrderInHand): OrderCharge | null {
  const { minimumOrder } = content.orderCharges;
  if (minimumOrder === null || goodsMinor <= 0) return null;
  const missing = roundToMinor(exact(minimumOrder), content.currency) - goodsMinor;
  if (missing <= 0) return null;
  return {
    family: 'minimum order',
    label: `to the minimum order of ${minimumOrder}`,
    netMinor: missing,
    rule: `${version}/orderCharges/minimumOrder`,
  };
}

/** Flat and by weight to the zone; nothing where goods are above the zone's limit. A zone without a rate is refused. */
export function chargeDelivery({ content, version, goodsMinor, weightKg, zone }: OrderInHand): OrderCharge | Reason | null {
  const { delivery } = content.orderCharges;
  if (zone === null || delivery.length === 0) return null;
  const rate = delivery.find((entry) => entry.zone === zone);
  if (!rate) {
    return {
      code: 'no-rate',
      detail: `no delivery rate for the zone “${zone}”`,
      limit: delivery.map((entry) => entry.zone).join(', '),
      actual: zone,
      nearest: null,
      nearestValue: null,
      pointer: '/shipTo',
    };
  }
  if (rate.freeAbove !== null && goodsMinor > roundToMinor(exact(rate.freeAbove), content.currency)) return null;
  const byWeight = exact(rate.perWeight)
    .times(weightKg)
    .dividedBy(content.measure === 'imperial' ? KG_PER_POUND : '1');
  const netMinor = roundToMinor(byWeight.plus(exact(rate.flat)), content.currency);
  return netMinor === 0
    ? null
    : { family: 'delivery', label: `delivery, ${zone}`, netMinor, rule: `${version}/orderCharges/delivery/${zone}` };
}

/** One crate for each `unitsPerCrate` units begun. */
export function chargeCrates({ content, version, units }: OrderInHand): OrderCharge | null {
  const { crates } = content.orderCharges;
  if (!crates || units === 0) return null;
  const count = Math.ceil(units / crates.unitsPerCrate);
  const netMinor = roundToMinor(exact(crates.each).times(count), content.currency);
  return { family: 'crates', label: count === 1 ? '1 crate' : `${count} crates`, netMinor, rule: `${version}/orderCharges/crates` };
}

/** Percent of goods. */
export function chargeSurcharge({ content, version, goodsMinor }: OrderInHand): OrderCharge | null {
  const { surcharge } = content.orderCharges;
  if (!surcharge) return null;
  const netMinor = percentOf(goodsMinor, exact(surcharge.percent));
  return { family: 'surcharge', label: `${surcharge.label}, ${surcharge.percent} %`, netMinor, rule: `${version}/orderCharges/surcharge` };
}

/** Percent of goods for the lead-time class; a class without a row costs nothing. */
export function chargeRush({ content, version, goodsMinor, leadTimeClass }: OrderInHand): OrderCharge | null {
  const rush = content.orderCharges.rush.find((entry) => entry.leadTimeClass === leadTimeClass);
  if (!rush) return null;
  const netMinor = percentOf(goodsMinor, exact(rush.percent));
  return {
    family: 'rush',
    label: `${rush.leadTimeClass}, ${rush.percent} %`,
    netMinor,
    rule: `${version}/orderCharges/rush/${rush.leadTimeClass}`,
  };
}
