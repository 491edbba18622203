import { type Hint as WireHint } from '@shared/contracts/prices';
import { type Unit } from '@shared/contracts/units';
import { type Exact, exact } from '@shared/money/exact';
import { stepsOf } from './bill-size';
import { type CompiledList } from './compile-list';
import { sizeKey } from './compile-size-charges';
import { type Pricer } from './price-lines';
import { type LineToPrice } from './price-unit';

/** The same unit at another size that costs less. Sizes in mm, decimal strings. */
export interface Hint {
  kind: WireHint['kind'];
  width: string;
  height: string;
  unitPriceMinor: number;
  savesMinor: number;
}

/** The most standard sizes that are named. */
const mostStandard = 3;
/** How far in mm a side may be from a standard size that is still worth naming, our own choice: 4 in. */
const nearMm = '101.6';

/** What the maker says of the unit at a size that is tried. */
export interface SizeTried {
  canBuild: boolean;
  /** kg, decimal string; reckoned from the unit where it is left out */
  weightKg?: string;
}

/**
 * What would make a line cheaper: the nearest standard sizes, smaller or larger, and the next
 * increment down in height, width or both. Each is priced in full and named only where it saves.
 * Only a rectangle is hinted at; what becomes of another shape at another size is not ours to say.
 *
 * @param price prices by the list and terms that `unitPriceMinor` comes from
 * @param tryUnit the unit at the size tried, as the maker sees it
 */
export function findHints(
  line: LineToPrice,
  unitPriceMinor: number,
  list: CompiledList,
  price: Pricer,
  tryUnit: (unit: Unit) => SizeTried = () => ({ canBuild: true }),
): Hint[] {
  if (line.unit.shape.class !== 'rectangle') return [];
  const own = { width: exact(line.unit.width), height: exact(line.unit.height) };

  const tryAt = (kind: Hint['kind'], size: Size): Hint | undefined => {
    const width = size.width.toString();
    const height = size.height.toString();
    const unit = { ...line.unit, width, height };
    const { canBuild, weightKg } = tryUnit(unit);
    if (!canBuild) return undefined;
    const answer = price({ unit, quantity: line.quantity, extras: line.extras, weightKg });
    if ('refusals' in answer) return undefined;
    const savesMinor = unitPriceMinor - answer.priced.unitPriceMinor;
    return savesMinor > 0 ? { kind, width, height, unitPriceMinor: answer.priced.unitPriceMinor, savesMinor } : undefined;
  };

  const hints: Hint[] = [];
  for (const size of nearestStandardSizes(own, list)) {
    const hint = tryAt('standard size', size);
    if (hint) hints.push(hint);
    if (hints.length === mostStandard) break;
  }
  for (const size of incrementsBelow(own, list)) {
    const hint = tryAt('increment below', size);
    if (hint && !hints.some(({ width, height }) => width === hint.width && height === hint.height)) hints.push(hint);
  }
  return hints;
}

interface Size {
  width: Exact;
  height: Exact;
}

/** Standard sizes within reach of one that is none itself, the nearest first. */
function nearestStandardSizes({ width, height }: Size, list: CompiledList): Size[] {
  if (list.standardSizes.has(sizeKey(width.toString(), height.toString()))) return [];
  const reach = {
    from: { width: width.minus(nearMm), height: height.minus(nearMm) },
    to: { width: width.plus(nearMm), height: height.plus(nearMm) },
  };
  return standardSizesOf(list)
    .filter(
      (size) =>
        size.width.greaterThanOrEqualTo(reach.from.width) &&
        size.width.lessThanOrEqualTo(reach.to.width) &&
        size.height.greaterThanOrEqualTo(reach.from.height) &&
        size.height.lessThanOrEqualTo(reach.to.height),
    )
    .map((size) => ({ size, away: size.width.minus(width).abs().plus(size.height.minus(height).abs()) }))
    .sort((a, b) => a.away.comparedTo(b.away))
    .map(({ size }) => size);
}

const standardSizesInMm = new WeakMap<CompiledList, readonly Size[]>();

/** The list's standard sizes in mm, reckoned once for each list. */
function standardSizesOf(list: CompiledList): readonly Size[] {
  let sizes = standardSizesInMm.get(list);
  if (!sizes) {
    const { mm } = list.measures;
    sizes = list.content.standardSizes.map(({ width, height }) => ({ width: exact(width).times(mm), height: exact(height).times(mm) }));
    standardSizesInMm.set(list, sizes);
  }
  return sizes;
}

/** The largest size below the last increment begun, in height, in width and in both. */
function incrementsBelow({ width, height }: Size, { measures }: CompiledList): Size[] {
  const below = (side: Exact) => measures.increment.times(stepsOf(side, measures) - 1);
  const lower = { width: below(width), height: below(height) };
  const sizes = [
    { width, height: lower.height },
    { width: lower.width, height },
    { width: lower.width, height: lower.height },
  ];
  return sizes.filter((size) => !size.width.isZero() && !size.height.isZero());
}
