import { type Exact, exact } from '@shared/money/exact';
import { type Charge, decimalText } from './charge';
import { type CompiledList } from './compile-list';

const ZERO = 48;

/** One side of a unit. */
export interface Side {
  mm: Exact;
  /** mm, without needless zeros */
  text: string;
  /** increments billed */
  steps: number;
}

/** What one rate comes to at one billed size under one dealer's terms. */
export interface RatedCharge {
  listMinor: number;
  netMinor: number;
  /** the row by number of the lite, surface or cavity, once it was asked for */
  rows: (Charge | undefined)[];
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
  /** ft² or m², ft or m: as the charge sheet says it */
  areaText: string;
  perimeterText: string;
  /** what was charged at this size already, the same terms given, by number of the rule */
  charged: (RatedCharge | undefined)[];
}

/** A side given in mm, billed in whole increments, rounded up. */
export function billSide(side: string, { measures: { increment } }: CompiledList): Side {
  const mm = exact(side);
  return { mm, text: plainText(side), steps: stepsOf(mm, increment) };
}

/** A decimal string without needless zeros: `0914.40` → `914.4`. */
function plainText(text: string): string {
  const last = text.charCodeAt(text.length - 1);
  return text.charCodeAt(0) === ZERO || (last === ZERO && text.includes('.')) ? exact(text).toString() : text;
}

/** A length in mm as whole increments, rounded up. */
export function stepsOf(mm: Exact, increment: Exact): number {
  const whole = mm.dividedToIntegerBy(increment);
  const steps = whole.toNumber();
  return whole.times(increment).lessThan(mm) ? steps + 1 : steps;
}

/** The billed size of so many increments of width and height. */
export function billSize(widthSteps: number, heightSteps: number, { measures, ruleCount }: CompiledList): BilledSize {
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
    charged: new Array<undefined>(ruleCount),
  };
}
