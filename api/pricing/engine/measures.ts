import { type PriceListContent } from '@shared/contracts/price-lists';
import { KG_PER_POUND, MM_PER_INCH } from '@shared/measures/constants';
import { Exact, exact } from '@shared/money/exact';

/** A divisor with its half, which added before makes a quotient cut to whole one rounded half up. */
export interface Divisor {
  by: Exact;
  half: Exact;
}

/**
 * How a list measures. A billed area is kept in parts that are exact (in² or mm²) and a rate is
 * scaled to those parts; `areaDivisor` is what remains to divide by, last of all. Dividing area by
 * 144 first would cut an endless quotient and could turn a half cent down that must go up.
 */
export interface Measures {
  /** mm in the list's unit of size, in or mm */
  mm: Exact;
  /** kg in the list's unit of weight, lb or kg */
  kg: Exact;
  /** what a rate per area is multiplied with to be for one part of area, but for `areaDivisor` */
  perArea: Exact;
  perLength: Exact;
  areaDivisor: Divisor | null;
  lengthDivisor: Divisor | null;
  /** parts in a unit of area or length of the list */
  areaParts: Exact;
  lengthParts: Exact;
  sizeUnit: string;
  areaUnit: string;
  lengthUnit: string;
  weightUnit: string;
  /** mm, and as a fraction of whole numbers, for dividing by few digits is fast */
  increment: Exact;
  incrementTop: Exact;
  incrementBottom: Exact;
  /** list's unit of size */
  incrementSize: Exact;
  /** one increment square, parts of area */
  incrementArea: Exact;
  /** parts of area */
  minimumArea: Exact;
}

export function measuresOf({ measure, billing }: Pick<PriceListContent, 'measure' | 'billing'>): Measures {
  const imperial = measure === 'imperial';
  const mm = exact(imperial ? MM_PER_INCH : '1');
  const areaParts = new Exact(imperial ? 144 : 1_000_000);
  const lengthParts = new Exact(imperial ? 12 : 1000);
  const one = new Exact(1);
  const incrementSize = exact(billing.increment);
  if (incrementSize.isZero()) throw new RangeError('sizes cannot be billed in steps of nothing');
  const increment = incrementSize.times(mm);
  const incrementBottom = new Exact(10).pow(increment.decimalPlaces());
  return {
    mm,
    kg: exact(imperial ? KG_PER_POUND : '1'),
    perArea: imperial ? one : one.dividedBy(areaParts),
    perLength: imperial ? one : one.dividedBy(lengthParts),
    areaDivisor: imperial ? { by: areaParts, half: areaParts.dividedBy(2) } : null,
    lengthDivisor: imperial ? { by: lengthParts, half: lengthParts.dividedBy(2) } : null,
    areaParts,
    lengthParts,
    sizeUnit: imperial ? 'in' : 'mm',
    areaUnit: imperial ? 'ft²' : 'm²',
    lengthUnit: imperial ? 'ft' : 'm',
    weightUnit: imperial ? 'lb' : 'kg',
    increment,
    incrementTop: increment.times(incrementBottom),
    incrementBottom,
    incrementSize,
    incrementArea: incrementSize.times(incrementSize),
    minimumArea: exact(billing.minimumArea).times(areaParts),
  };
}
