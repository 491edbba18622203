import { type Reason } from '@shared/contracts/evaluation';
import { type RowFamily } from '@shared/contracts/price-lists';
import { type Exact } from '@shared/money/exact';

/**
 * One row of a charge sheet in minor units. For a row of a unit family `quantity` × `rate`,
 * rounded, is the list amount; for a net rate, quantity break or promotion it is the net amount,
 * for these come after the list. Both are unrounded decimal strings (see `decimalText`); of a percentage the quantity
 * is an amount of money and the rate a fraction (`0.06`).
 */
export interface Charge {
  readonly family: RowFamily;
  readonly label: string;
  readonly quantity: string;
  /** what is counted: `ft²`, `m`, `cavity`, or a currency */
  readonly unit: string;
  readonly rate: string;
  readonly listMinor: number;
  readonly discountPercent: string;
  readonly discountReason: string | null;
  readonly netMinor: number;
  /** version, part and entry of the list, such as `northmere.3/glass/clear-3`; or `contract/<id>`, `promotion/<id>` */
  readonly rule: string;
}

/** What the charges of one unit are written on, in the order of the families. */
export interface Sheet {
  charges: Charge[];
  refusals: Reason[];
  /** list amounts of glass, treatment, coating, assembly and gas, on which percentages are taken */
  areaMinor: number;
}

/** A decimal string for a sheet; a quotient that does not end is cut after 20 decimals, as many as `exact` reads. */
export function decimalText(value: Exact): string {
  return value.toDecimalPlaces(20).toString();
}

/** A half cent is rounded up, away from zero: the only place where an exact amount in minor units becomes whole. */
export function wholeMinor(amount: Exact): number {
  const whole = amount.round().toNumber();
  if (!Number.isSafeInteger(whole)) throw new RangeError(`${amount.toString()} minor units are too many`);
  return whole === 0 ? 0 : whole;
}

/** `part` of an amount in minor units, rounded; 0.06 for 6 %. */
export function partOf(minor: number, part: Exact): number {
  return wholeMinor(part.times(minor));
}
