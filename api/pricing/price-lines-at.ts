import { type Catalogue, type FabricatorItem } from '@shared/contracts/catalogue';
import { type Reason } from '@shared/contracts/evaluation';
import { type PriceListVersion, type PriceTerms } from '@shared/contracts/price-lists';
import { type LineInput, type PricedLine } from '@shared/contracts/prices';
import { type CheckedUnit } from './check-units';
import { compileList } from './engine/compile-list';
import { findHints } from './engine/hints';
import { createPricer } from './engine/price-lines';
import { type PricedUnit } from './engine/price-unit';
import { lineToWire } from './engine/rows-to-wire';

/** Why a line has no price, with the index of the line. */
export type LineReason = Reason & { line: number };

/** A line with its price, and as it travels and rests. */
export interface LineAtPrice {
  priced: PricedUnit;
  sheet: PricedLine;
}

/**
 * Prices lines at one maker under one version and terms; all of them, or none and why: the maker
 * cannot build a unit, or its list has no rate for a part of one.
 *
 * @param checked the lines' units, in their order
 */
export function priceLinesAt(
  lines: readonly Pick<LineInput, 'unit' | 'quantity' | 'extras'>[],
  checked: readonly CheckedUnit[],
  maker: FabricatorItem,
  version: PriceListVersion,
  terms: PriceTerms,
  catalogue: Catalogue,
): { lines: LineAtPrice[] } | { reasons: LineReason[] } {
  const unbuildable = checked.flatMap((unit, line) => unit.reasonsAt(maker).map((reason) => ({ ...reason, line })));
  if (unbuildable.length > 0) return { reasons: unbuildable };

  const list = compileList(version, catalogue);
  const price = createPricer(list, terms);
  const answers = lines.map(({ unit, quantity, extras }, i) => price({ unit, quantity, extras, weightKg: checked[i]?.weightKg }));
  const unrated = answers.flatMap((answer, line) => ('refusals' in answer ? answer.refusals.map((reason) => ({ ...reason, line })) : []));
  if (unrated.length > 0) return { reasons: unrated };

  return {
    lines: lines.flatMap((line, i) => {
      const [answer, own] = [answers[i], checked[i]];
      if (!answer || 'refusals' in answer || !own) return [];
      const { priced } = answer;
      const hints = findHints(line, priced.unitPriceMinor, list, price, ({ width, height }) => {
        const tried = own.at(width, height);
        return { canBuild: tried.reasonsAt(maker).length === 0, weightKg: tried.weightKg };
      });
      return [{ priced, sheet: lineToWire(priced, hints) }];
    }),
  };
}
