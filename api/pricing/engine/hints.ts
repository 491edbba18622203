import { type Catalogue } from '@shared/contracts/catalogue';
import { type PriceListVersion, type PriceTerms } from '@shared/contracts/price-lists';
import { type Hint as WireHint } from '@shared/contracts/prices';
import { type Unit } from '@shared/contracts/units';
import { type Exact, exact } from '@shared/money/exact';
import { stepsOf } from './bill-size';
import { type CompiledList, compileList } from './compile-list';
import { sizeKey } from './compile-size-charges';
import { compileTerms } from './compile-terms';
import { type LineToPrice, priceCompiled } from './price-unit';

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

/**
 * What would make a line cheaper: the nearest standard sizes, smaller or larger, and the next
 * increment down in height, width or both. Each is priced in full and named only where it saves.
 * Only a rectangle is hinted at; what becomes of another shape at another size is not ours to say.
 *
 * @param allows whether the maker can build the unit at the size tried
 */
export function findHints(
  line: LineToPrice,
  unitPriceMinor: number,
  version: PriceListVersion,
  terms: PriceTerms,
  catalogue: Catalogue,
  allows: (unit: Unit) => boolean = () => true,
): Hint[] {
  if (line.unit.shape.class !== 'rectangle') return [];
  const list = compileList(version, catalogue);
  const compiledTerms = compileTerms(terms, list);
  const own = { width: exact(line.unit.width), height: exact(line.unit.height) };

  const tryAt = (kind: Hint['kind'], size: Size): Hint | undefined => {
    const width = size.width.toString();
    const height = size.height.toString();
    const unit = { ...line.unit, width, height };
    const answer = priceCompiled({ unit, quantity: line.quantity, extras: line.extras }, list, compiledTerms);
    if ('refusals' in answer) return undefined;
    const savesMinor = unitPriceMinor - answer.priced.unitPriceMinor;
    return savesMinor > 0 && allows(unit) ? { kind, width, height, unitPriceMinor: answer.priced.unitPriceMinor, savesMinor } : undefined;
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
function nearestStandardSizes({ width, height }: Size, { content, measures, standardSizes }: CompiledList): Size[] {
  if (standardSizes.has(sizeKey(width, height))) return [];
  const near: { size: Size; away: Exact }[] = [];
  for (const standard of content.standardSizes) {
    const size = { width: exact(standard.width).times(measures.mm), height: exact(standard.height).times(measures.mm) };
    const across = size.width.minus(width).abs();
    const down = size.height.minus(height).abs();
    if (across.greaterThan(nearMm) || down.greaterThan(nearMm)) continue;
    near.push({ size, away: across.plus(down) });
  }
  return near.sort((a, b) => a.away.comparedTo(b.away)).map(({ size }) => size);
}

/** The largest size below the last increment begun, in height, in width and in both. */
function incrementsBelow({ width, height }: Size, { measures: { increment } }: CompiledList): Size[] {
  const below = (side: Exact) => increment.times(stepsOf(side, increment) - 1);
  const lower = { width: below(width), height: below(height) };
  const sizes = [
    { width, height: lower.height },
    { width: lower.width, height },
    { width: lower.width, height: lower.height },
  ];
  return sizes.filter((size) => !size.width.isZero() && !size.height.isZero());
}
