import { type Exact, exact } from '@shared/money/exact';
import { type Charge, decimalText } from './charge';
import { type CompiledList } from './compile-list';
import { type Measures } from './measures';

const ZERO = 48;

/** One side of a unit. */
export interface Side {
  mm: Exact;
  /** mm, without needless zeros */
  text: string;
  /** increments billed */
  steps: number;
}

/** What one rate comes to at one billed area or perimeter under one dealer's terms. */
export interface RatedCharge {
  listMinor: number;
  netMinor: number;
  /** the row by number of the lite, surface or cavity, once it was asked for */
  rows: (Charge | undefined)[];
}

/** A billed area or perimeter. */
export interface Billed {
  /** exact parts, in² or mm², in or mm */
  parts: Exact;
  /** ft² or m², ft or m: as the charge sheet says it */
  text: string;
  /** what was charged on it already, the same terms given, by number of the rule */
  charged: (RatedCharge | undefined)[];
}

/** Areas and perimeters billed before, by their number of increments: for one list and one dealer's terms. */
export interface BilledBefore {
  sides: Map<string, Side>;
  areas: Map<number, Billed>;
  perimeters: Map<number, Billed>;
}

/** A side given in mm, billed in whole increments, rounded up. */
export function billSide(side: string, { measures }: CompiledList, before?: BilledBefore): Side {
  const known = before?.sides.get(side);
  if (known) return known;
  const mm = exact(side);
  const billed = { mm, text: plainText(side), steps: stepsOf(mm, measures) };
  before?.sides.set(side, billed);
  return billed;
}

/** A decimal string without needless zeros: `0914.40` → `914.4`. */
function plainText(text: string): string {
  const last = text.charCodeAt(text.length - 1);
  return text.charCodeAt(0) === ZERO || (last === ZERO && text.includes('.')) ? exact(text).toString() : text;
}

/** A length in mm as whole increments, rounded up. */
export function stepsOf(mm: Exact, { increment, incrementTop, incrementBottom }: Measures): number {
  const whole = mm.times(incrementBottom).dividedToIntegerBy(incrementTop);
  const steps = whole.toNumber();
  return whole.times(increment).lessThan(mm) ? steps + 1 : steps;
}

/** Width × height as billed, not below the list's minimum. */
export function billArea(width: Side, height: Side, { measures, ruleCount }: CompiledList, before?: BilledBefore): Billed {
  const steps = wholeSteps(width.steps * height.steps);
  const known = before?.areas.get(steps);
  if (known) return known;
  const product = measures.incrementArea.times(steps);
  const parts = product.lessThan(measures.minimumArea) ? measures.minimumArea : product;
  const billed = { parts, text: decimalText(parts.dividedBy(measures.areaParts)), charged: new Array<undefined>(ruleCount) };
  before?.areas.set(steps, billed);
  return billed;
}

/** 2 × (width + height) as billed. */
export function billPerimeter(width: Side, height: Side, { measures, ruleCount }: CompiledList, before?: BilledBefore): Billed {
  const steps = wholeSteps(2 * (width.steps + height.steps));
  const known = before?.perimeters.get(steps);
  if (known) return known;
  const parts = measures.incrementSize.times(steps);
  const billed = { parts, text: decimalText(parts.dividedBy(measures.lengthParts)), charged: new Array<undefined>(ruleCount) };
  before?.perimeters.set(steps, billed);
  return billed;
}

/** Counts of increments are whole numbers; beyond 2⁵³ they would stop being so. */
function wholeSteps(steps: number): number {
  if (!Number.isSafeInteger(steps)) throw new RangeError('a size of too many increments');
  return steps;
}
