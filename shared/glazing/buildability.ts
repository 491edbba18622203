import type { Catalogue, FabricatorItem } from '../contracts/catalogue';
import type { Evaluation, Reason } from '../contracts/evaluation';
import { formatLengthBoth } from '../measures/format-length';
import { formatAltitude } from '../measures/format-quantity';
import { cavityReasons } from './cavity-limits';
import { liteReasons } from './lite-limits';
import type { ResolvedUnit } from './resolve-unit';
import { sizeReasons } from './size-limits';

type Buildability = Evaluation['buildability'][number];

/** Whether one maker can build a unit: every limit it breaks, and advice that breaks nothing. `weight` in kg. */
export function buildabilityOf(
  unit: ResolvedUnit,
  geometry: Evaluation['geometry'],
  weight: number,
  fabricator: FabricatorItem,
  catalogue: Catalogue,
): Buildability {
  const { capabilities, measureSystem } = fabricator;
  const both = (mm: string) => formatLengthBoth(mm, measureSystem);
  const reasons: Reason[] = [
    ...liteReasons(unit, capabilities, catalogue),
    ...cavityReasons(unit, capabilities, catalogue, both),
    ...shapeReasons(unit, fabricator, catalogue),
    ...thicknessReasons(geometry.overallThickness, fabricator, both),
    ...sizeReasons(unit, geometry, weight, fabricator),
  ];
  return {
    fabricator: { id: fabricator.id, name: fabricator.name },
    canBuild: reasons.length === 0,
    reasons,
    advice: altitudeAdvice(unit, fabricator),
  };
}

function shapeReasons({ unit }: ResolvedUnit, { capabilities: { shapes } }: FabricatorItem, catalogue: Catalogue): Reason[] {
  const actual = unit.shape.class;
  if (shapes.includes(actual)) return [];
  const name = catalogue.shapes.find((item) => item.class === actual)?.name ?? actual;
  const detail = `does not make this shape: ${name}`;
  return [{ code: 'shape-not-made', detail, limit: shapes.join(', '), actual, nearest: null, nearestValue: null, pointer: '/shape/class' }];
}

/** @param thickness overall, m */
function thicknessReasons(thickness: number, { capabilities }: FabricatorItem, both: (mm: string) => string): Reason[] {
  const { maxOverall } = capabilities.unit;
  const overall = Math.round(thickness * 1e8) / 1e5;
  if (overall <= Number(maxOverall)) return [];
  const [limit, actual] = [`${maxOverall} mm`, `${overall} mm`];
  const detail = `makes units up to ${both(maxOverall)} thick overall, not ${both(String(overall))}`;
  return [{ code: 'overall-max', detail, limit, actual, nearest: limit, nearestValue: null, pointer: '/cavities' }];
}

/** What the climb from plant to site asks for: a tube where the gas allows one, else care. */
function altitudeAdvice({ place, cavities }: ResolvedUnit, { name, plantAltitude, measureSystem, capabilities }: FabricatorItem): string[] {
  if (place.altitude === undefined) return [];
  const { capillary } = capabilities;
  const difference = place.altitude - plantAltitude;
  const sealed = cavities.filter((cavity) => !cavity.capillary);
  if (Math.abs(difference) <= capillary.adviseAboveM || sealed.length === 0) return [];
  const height = `The site lies ${formatAltitude(Math.abs(difference), measureSystem)} ${difference > 0 ? 'above' : 'below'} the plant of ${name}.`;
  if (sealed.every(({ gas }) => gas.gas !== 'air')) {
    return [
      `${height} An open capillary tube and a gas fill exclude each other: ask for air with a tube, or for a fill matched to the site's pressure. The load rises with the height.`,
    ];
  }
  const tube = capillary.offered
    ? 'A capillary tube is advised.'
    : 'A capillary tube is advised, and this maker offers none: ask how it matches the pressure.';
  return [`${height} ${tube}`];
}
