import type { Evaluation } from '../contracts/evaluation';
import { cavityPressures, insulatingUnitFactor, isochoricPressure, summer, winter } from './climate-load';
import { centreDeflection, centreMoment, displacedVolume } from './plates';
import type { ResolvedLite, ResolvedUnit } from './resolve-unit';

/** Glass: Young's modulus in MPa, Poisson's ratio (EN 572-1 and EN 16612, from memory). */
const youngsModulus = 70_000;
const poisson = 0.23;
/** Below this short edge, climate load takes hold of stiff lites most, mm. */
const stiffShortEdge = 500;
/** Above this share of the sun, annealed glass may break from uneven warming: common practice, no published source. */
const hotAbsorptance = 0.5;

const caution = 'A screen, not a design: local codes and a licensed professional decide.';

/** The site against the makers' plants, m: the greatest climb and the greatest descent; null when the site is unknown. */
export interface AltitudeSpan {
  up: number;
  down: number;
}

/**
 * Wind, snow, weather and height on the lites: what each cavity's gas would push, how the lites
 * share it, and the stress at the centre. Rectangles only; any number of lites.
 *
 * @param absorptance of the sun, by lite
 */
export function loadOf(unit: ResolvedUnit, absorptance: readonly number[], altitude: AltitudeSpan | null): Evaluation['load'] {
  const vented = unit.cavities.map(({ capillary }) => capillary);
  const up = Math.max(summer.altitude, altitude?.up ?? summer.altitude);
  const down = Math.min(winter.altitude, altitude?.down ?? winter.altitude);
  // A tube that is open on the way and crimped at the site takes the height out of the load.
  const hot = vented.map((open) => isochoricPressure({ ...summer, altitude: open ? 0 : up }));
  const cold = vented.map((open) => isochoricPressure({ ...winter, altitude: open ? 0 : down }));
  const method = {
    name: 'EN 16612:2019 climate load, plates on four edges by Lévy and Navier, allowable stress after ASTM E1300',
    boundary: `four edges held, E 70 GPa, ν 0.23, small deflections (on the safe side for stress); summer +20 K, −2 kPa, ${signed(up)} m; winter −25 K, +4 kPa, ${signed(down)} m; allowable for 3 s, 8 breaks in 1 000`,
    leavesOut:
      'how long a load lasts (weather and snow last longer than 3 s, and glass then bears less), shared shear of laminates, own weight on a slope, frame deflection, holes, thermal stress, impact, guarding',
  };
  const climate = { summer: Math.max(...hot), winter: Math.min(...cold) };
  const warnings = [...standingWarnings(unit, absorptance), caution];
  if (unit.unit.shape.class !== 'rectangle') {
    const statement = `The plate method covers rectangles, not this shape: no stress is given. The climate load holds for every shape. ${caution}`;
    return { applies: false, statement, method, climate, insulatingUnitFactor: null, stress: [], warnings };
  }

  const shortEdge = Math.min(unit.widthMm, unit.heightMm);
  const ratio = Math.max(unit.widthMm, unit.heightMm) / shortEdge;
  const bv = displacedVolume(ratio, poisson);
  const stiffness = unit.lites.map((lite) => (28.9 ** 4 * cubedThickness(lite)) / (bv * shortEdge ** 4));
  const widths = unit.cavities.map(({ widthMm }) => widthMm);
  const outside = [0, ...outsideLoads(unit)];

  // The worst of every pairing of outside load and weather, for each lite on its own.
  const worst = unit.lites.map(() => 0);
  for (const isochoric of [hot, cold, hot.map(() => 0)]) {
    for (const load of outside) {
      const pressures = cavityPressures(stiffness, widths, isochoric, load);
      for (const i of unit.lites.keys()) {
        const net = (i === 0 ? load : pressures[i - 1]!) - (pressures[i] ?? 0);
        worst[i] = Math.max(worst[i]!, Math.abs(net));
      }
    }
  }
  const alpha = centreDeflection(ratio);
  const beta = centreMoment(ratio, poisson);
  const stress = unit.lites.map((lite, i) => {
    const mpa = worst[i]! / 1000;
    const cubed = cubedThickness(lite);
    const rigidity = (youngsModulus * cubed) / (12 * (1 - poisson ** 2));
    return {
      lite: i + 1,
      stressMpa: (6 * beta * mpa * shortEdge ** 2 * Math.max(...lite.glass.plies)) / cubed,
      allowableMpa: lite.treatment.allowableStressMpa,
      deflectionMm: (alpha * mpa * shortEdge ** 4) / rigidity,
    };
  });
  for (const { lite, stressMpa, allowableMpa } of stress) {
    if (stressMpa > allowableMpa) {
      warnings.unshift(
        `Lite ${lite}: ${stressMpa.toFixed(1)} MPa is above the ${allowableMpa} MPa allowed. Take thicker or stronger glass, or have it designed.`,
      );
    }
  }
  const [first, second] = unit.lites;
  const factor =
    unit.lites.length === 2
      ? insulatingUnitFactor(shortEdge, widths[0]!, Math.cbrt(cubedThickness(first!)), Math.cbrt(cubedThickness(second!)), bv)
      : null;
  return { applies: true, statement: scope(unit), method, climate, insulatingUnitFactor: factor, stress, warnings };
}

/** Σd³ of the plies, mm³: a laminate without shared shear, on the safe side. */
function cubedThickness({ glass }: ResolvedLite): number {
  return glass.plies.reduce((sum, ply) => sum + ply ** 3, 0);
}

/** Loads on lite 1 from outside, kPa, inward positive: wind both ways, snow where the glass slopes. */
function outsideLoads({ place }: ResolvedUnit): number[] {
  const wind = (place.windPressure ?? 0) / 1000;
  const slope = ((place.slope ?? 90) * Math.PI) / 180;
  const snow = ((place.snowLoad ?? 0) / 1000) * Math.cos(slope) ** 2;
  return [wind, -wind, snow, wind + snow];
}

function scope({ place, lites }: ResolvedUnit): string {
  const missing = [
    place.windPressure === undefined ? 'wind' : null,
    place.snowLoad === undefined && (place.slope ?? 90) < 90 ? 'snow' : null,
  ].filter(Boolean);
  const share = lites.length > 2 ? ' The insulating-unit factor is defined for two lites; more share the load by the same gas law.' : '';
  const unknown = missing.length > 0 ? `No ${missing.join(' or ')} load is given, so the stress holds none. ` : '';
  return `${unknown}${caution}${share}`;
}

function standingWarnings({ lites, place, widthMm, heightMm }: ResolvedUnit, absorptance: readonly number[]): string[] {
  const warnings: string[] = [];
  if (Math.min(widthMm, heightMm) < stiffShortEdge) {
    warnings.push(`A short edge under ${stiffShortEdge} mm makes the lites stiff: weather and height then load glass and seals most.`);
  }
  if ((place.slope ?? 90) < 75) {
    warnings.push('More than 15° from vertical: codes ask for special glass overhead, such as laminated inside (IRC R308.6, from memory).');
  }
  for (const [i, share] of absorptance.entries()) {
    if (share > hotAbsorptance && lites[i]?.treatment.kind === 'annealed') {
      warnings.push(
        `Lite ${i + 1} is annealed and takes up ${Math.round(share * 100)} % of the sun: uneven warming can crack it. Ask the maker about heat-strengthened glass.`,
      );
    }
  }
  return warnings;
}

function signed(value: number): string {
  return `${value < 0 ? '−' : '+'}${Math.abs(Math.round(value))}`;
}
