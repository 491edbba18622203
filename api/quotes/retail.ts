import { exact } from '@shared/money/exact';
import { percentOf } from '@shared/money/money';

/** A unit price with the dealer's mark-up, in minor units, rounded once per unit, half up. Multiply by the quantity for the line. */
export function retailUnitMinor(unitPriceMinor: number, markUpPercent: string): number {
  return unitPriceMinor + percentOf(unitPriceMinor, exact(markUpPercent));
}
