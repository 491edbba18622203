import { type Exact, exact } from '@shared/money/exact';
import { decimalText } from './charge';
import { type CompiledList, type Rule } from './compile-list';

/** List and net amount of one rate at one billed size, minor units. */
export interface Amount {
  listMinor: number;
  netMinor: number;
}

/** What a unit is billed by: its bounding rectangle, each side rounded up to the increment. */
export interface BilledSize {
  /** the list's unit of size */
  width: Exact;
  height: Exact;
  /** exact parts of area, in² or mm², not below the list's minimum */
  areaParts: Exact;
  /** exact parts of length, in or mm */
  perimeterParts: Exact;
  /** ft² or m², ft or m: unrounded decimal strings of the charge sheet */
  areaText: string;
  perimeterText: string;
  /** amounts already made at this size under the same terms */
  amounts: Map<Rule, Amount>;
}

/** A side in mm as whole increments, rounded up. */
export function stepsOf(side: Exact, increment: Exact): number {
  const whole = side.dividedToIntegerBy(increment);
  const steps = whole.toNumber();
  return whole.times(increment).lessThan(side) ? steps + 1 : steps;
}

/** The billed size of so many increments of width and height. */
export function billSteps(widthSteps: number, heightSteps: number, { measures }: CompiledList): BilledSize {
  const width = measures.incrementSize.times(widthSteps);
  const height = measures.incrementSize.times(heightSteps);
  const product = width.times(height);
  const areaParts = product.lessThan(measures.minimumArea) ? measures.minimumArea : product;
  const perimeterParts = width.plus(height).times(2);
  return {
    width,
    height,
    areaParts,
    perimeterParts,
    areaText: decimalText(areaParts.dividedBy(measures.areaParts)),
    perimeterText: decimalText(perimeterParts.dividedBy(measures.lengthParts)),
    amounts: new Map(),
  };
}

/** The billed size of a unit of `width` × `height` mm, decimal strings. */
export function billSize(width: string, height: string, list: CompiledList): BilledSize {
  const { increment } = list.measures;
  return billSteps(stepsOf(exact(width), increment), stepsOf(exact(height), increment), list);
}
