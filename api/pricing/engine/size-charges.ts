import { amountOf } from '@shared/money/money';
import { type Exact, exact } from '@shared/money/exact';
import { type Side } from './bill-size';
import { partOf } from './charge';
import { type CompiledList } from './compile-list';
import { type BandKind, type BandRule, sizeKey, type SurchargeRule } from './compile-size-charges';
import { addRow, refuse, type UnitInHand } from './unit-in-hand';

/** What shape and size add: percentages of the area charges at list, and fixed charges. */

/** What the size charges depend on, taken from the actual size. */
export interface SizeFacts {
  standard: boolean;
  /** in each kind the highest band that is exceeded */
  bands: readonly BandRule[];
}

/**
 * Which size charges a unit meets. The size is that of the bounding rectangle as ordered, not as
 * billed; a standard size is met as listed, width × height, and not turned. `Above` is strict.
 * `weightKg` may be null only where the list has no weight bands.
 */
export function sizeFactsOf(width: Side, height: Side, weightKg: string | null, list: CompiledList): SizeFacts {
  const bands: BandRule[] = [];
  for (const { kind, bands: ofKind } of list.bands) {
    const actual = measureOf(kind, width.mm, height.mm, weightKg);
    const highest = ofKind.find(({ above }) => actual.greaterThan(above));
    if (highest) bands.push(highest);
  }
  return { standard: list.standardSizes.has(sizeKey(width.text, height.text)), bands };
}

/** mm, mm² or kg. */
function measureOf(kind: BandKind, width: Exact, height: Exact, weightKg: string | null): Exact {
  switch (kind) {
    case 'united':
      return width.plus(height);
    case 'long edge':
      return width.greaterThan(height) ? width : height;
    case 'area':
      return width.times(height);
    case 'weight':
      return exact(weightKg ?? '0');
  }
}

/** A rectangle costs nothing more unless the list says so; any other shape needs its rate. */
export function chargeShape(hand: UnitInHand): void {
  const shape = hand.unit.shape.class;
  const rule = hand.list.shapes.get(shape);
  if (rule) addSurcharge(hand, rule);
  else if (shape !== 'rectangle') refuse(hand, `the shape ${shape.replace('-', ' ')}`, '/shape/class');
}

/** Non-standard size, then the band of each kind: they add up. */
export function chargeSize(hand: UnitInHand, { standard, bands }: SizeFacts): void {
  if (!standard && hand.list.nonStandard) addSurcharge(hand, hand.list.nonStandard);
  for (const band of bands) addSurcharge(hand, band);
}

/** One row for the percentage, one for the fixed charge. */
function addSurcharge(hand: UnitInHand, rule: SurchargeRule): void {
  if (rule.part) {
    const { areaMinor } = hand.sheet;
    const { currency } = hand.list;
    addRow(
      hand,
      rule.family,
      rule.percentLabel,
      amountOf(areaMinor, currency),
      currency,
      rule.partText,
      partOf(areaMinor, rule.part),
      rule.id,
    );
  }
  if (rule.fixedMinor > 0) addRow(hand, rule.family, rule.fixedLabel, '1', 'unit', rule.fixed, rule.fixedMinor, rule.id);
}
