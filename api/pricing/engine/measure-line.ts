import { type Catalogue } from '@shared/contracts/catalogue';
import { type Reason } from '@shared/contracts/evaluation';
import { type Unit } from '@shared/contracts/units';
import { geometryOf } from '@shared/glazing/geometry';
import { resolveUnit } from '@shared/glazing/resolve-unit';
import { weightOf } from '@shared/glazing/weight';

/**
 * The weight of one unit in kg as a decimal string, to the gram. It comes from the engineering as a
 * binary float; once rounded here it only decides a weight band and feeds a delivery charge, both in
 * exact decimals from then on. A product that the catalogue does not hold has no weight: refused.
 */
export function weighUnit(unit: Unit, catalogue: Catalogue): { weightKg: string } | { refusals: Reason[] } {
  const found = resolveUnit(unit, catalogue);
  if ('problems' in found) {
    const refusals = found.problems.map(({ pointer, detail }) => ({
      code: 'unknown-product',
      detail,
      limit: 'products of the catalogue',
      actual: 'unknown',
      nearest: null,
      nearestValue: null,
      pointer,
    }));
    return { refusals };
  }
  return { weightKg: weightOf(found.resolved, geometryOf(found.resolved)).weight.toFixed(3) };
}
