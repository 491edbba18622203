import { type Catalogue, type FabricatorItem } from '@shared/contracts/catalogue';
import { type Reason } from '@shared/contracts/evaluation';
import { type Unit } from '@shared/contracts/units';
import { buildabilityOf } from '@shared/glazing/buildability';
import { geometryOf } from '@shared/glazing/geometry';
import { resolveUnit } from '@shared/glazing/resolve-unit';
import { weightOf } from '@shared/glazing/weight';

/** A unit as far as a price needs its engineering. */
export interface CheckedUnit {
  /** of one unit, kg, decimal string to the gram */
  weightKg: string;
  /** why this maker cannot build it; empty when it can */
  reasonsAt(fabricator: FabricatorItem): readonly Reason[];
}

/**
 * Looks up, measures and weighs each different unit once, and asks each maker once. Wherever a
 * unit goes, it is the same unit.
 *
 * @throws RangeError when a unit names what the catalogue does not hold: impossible units are refused before
 */
export function checkUnits(units: readonly Unit[], catalogue: Catalogue): CheckedUnit[] {
  const checked = new Map<string, CheckedUnit>();
  return units.map((unit) => {
    const { place: _place, ...parts } = unit;
    const key = JSON.stringify(parts);
    let known = checked.get(key);
    if (!known) checked.set(key, (known = checkUnit(unit, catalogue)));
    return known;
  });
}

function checkUnit(unit: Unit, catalogue: Catalogue): CheckedUnit {
  const found = resolveUnit(unit, catalogue);
  if ('problems' in found) throw new RangeError(found.problems.map(({ pointer, detail }) => `${pointer}: ${detail}`).join('; '));
  const geometry = geometryOf(found.resolved);
  const { weight } = weightOf(found.resolved, geometry);
  const reasons = new Map<string, readonly Reason[]>();
  return {
    weightKg: weight.toFixed(3),
    reasonsAt: (fabricator) => {
      let known = reasons.get(fabricator.id);
      if (!known) {
        known = buildabilityOf(found.resolved, geometry, weight, fabricator, catalogue).reasons;
        reasons.set(fabricator.id, known);
      }
      return known;
    },
  };
}
