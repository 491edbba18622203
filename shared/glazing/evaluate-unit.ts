import type { Catalogue } from '../contracts/catalogue';
import type { Evaluation } from '../contracts/evaluation';
import type { Unit } from '../contracts/units';
import { buildabilityOf } from './buildability';
import { condensationOf } from './condensation';
import { geometryOf } from './geometry';
import { type AltitudeSpan, loadOf } from './load';
import { type ResolvedUnit, resolveUnit } from './resolve-unit';
import { safetyGlazingOf } from './safety-glazing';
import { solarOf } from './solar-en410';
import { thermalOf, thermalResultOf } from './thermal-en673';
import { weightOf } from './weight';

/**
 * All that the engineering says of a unit, in SI units: the same in browser and server. Call
 * `findImpossibilities` first.
 *
 * @throws RangeError when the unit names what the catalogue does not hold
 */
export function evaluateUnit(unit: Unit, catalogue: Catalogue): Evaluation {
  const found = resolveUnit(unit, catalogue);
  if ('problems' in found) throw new RangeError(found.problems.map(({ pointer, detail }) => `${pointer}: ${detail}`).join('; '));
  return evaluateResolved(found.resolved, catalogue);
}

/** The same for a unit whose products are at hand. */
export function evaluateResolved(unit: ResolvedUnit, catalogue: Catalogue): Evaluation {
  const geometry = geometryOf(unit);
  const { weight, parts } = weightOf(unit, geometry);
  const heat = thermalResultOf(unit);
  const solar = solarOf(unit, heat);
  return {
    geometry,
    weight,
    weightParts: parts,
    thermal: thermalOf(unit, heat),
    solar,
    condensation: condensationOf(heat.u, unit.place),
    load: loadOf(unit, solar.absorptance, altitudeSpan(unit, catalogue)),
    safety: safetyGlazingOf(unit, geometry.area),
    buildability: catalogue.fabricators.map((fabricator) => buildabilityOf(unit, geometry, weight, fabricator, catalogue)),
  };
}

/** How far the site lies above and below the makers' plants: which of them makes it is not known here. */
function altitudeSpan({ place }: ResolvedUnit, { fabricators }: Catalogue): AltitudeSpan | null {
  const { altitude } = place;
  if (altitude === undefined || fabricators.length === 0) return null;
  const climbs = fabricators.map(({ plantAltitude }) => altitude - plantAltitude);
  return { up: Math.max(...climbs), down: Math.min(...climbs) };
}
