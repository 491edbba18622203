import { type Catalogue, type FabricatorItem } from '@shared/contracts/catalogue';
import { type Reason } from '@shared/contracts/evaluation';
import { type Unit } from '@shared/contracts/units';
import { buildabilityOf } from '@shared/glazing/buildability';
import { geometryOf } from '@shared/glazing/geometry';
import { type ResolvedUnit, resolveUnit } from '@shared/glazing/resolve-unit';
import { weightOf } from '@shared/glazing/weight';

/** A unit as far as a price needs its engineering. */
export interface CheckedUnit {
  /** of one unit, kg, decimal string to the gram */
  weightKg: string;
  /** why this maker cannot build it; empty when it can */
  reasonsAt(fabricator: FabricatorItem): readonly Reason[];
  /** the same parts at another size, mm, decimal strings */
  at(width: string, height: string): CheckedUnit;
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
    return kept(checked, key, () => checkUnit(unit, catalogue));
  });
}

function checkUnit(unit: Unit, catalogue: Catalogue): CheckedUnit {
  const found = resolveUnit(unit, catalogue);
  if ('problems' in found) throw new RangeError(found.problems.map(({ pointer, detail }) => `${pointer}: ${detail}`).join('; '));
  return checkResolved(found.resolved, catalogue);
}

function checkResolved(resolved: ResolvedUnit, catalogue: Catalogue): CheckedUnit {
  const geometry = geometryOf(resolved);
  const { weight } = weightOf(resolved, geometry);
  const reasons = new Map<string, readonly Reason[]>();
  const sizes = new Map<string, CheckedUnit>();
  return {
    weightKg: weight.toFixed(3),
    reasonsAt: (fabricator) =>
      kept(reasons, fabricator.id, () => buildabilityOf(resolved, geometry, weight, fabricator, catalogue).reasons),
    at: (width, height) =>
      kept(sizes, `${width}x${height}`, () =>
        checkResolved(
          { ...resolved, unit: { ...resolved.unit, width, height }, widthMm: Number(width), heightMm: Number(height) },
          catalogue,
        ),
      ),
  };
}

function kept<Key, Value>(values: Map<Key, Value>, key: Key, make: () => Value): Value {
  let value = values.get(key);
  if (value === undefined) values.set(key, (value = make()));
  return value;
}
