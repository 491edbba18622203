import type { Catalogue, FabricatorItem } from '../contracts/catalogue';
import type { Evaluation, Reason } from '../contracts/evaluation';
import { formatAltitude } from '../measures/format-quantity';
import { partReasons } from './part-limits';
import type { ResolvedUnit } from './resolve-unit';
import { sizeReasons } from './size-limits';

type Buildability = Evaluation['buildability'][number];

/** Whether one maker can build a unit: every limit it breaks, and advice that breaks nothing. */
export function buildabilityOf(
  unit: ResolvedUnit,
  geometry: Evaluation['geometry'],
  weight: number,
  fabricator: FabricatorItem,
  catalogue: Catalogue,
): Buildability {
  const reasons: Reason[] = [...partReasons(unit, geometry, fabricator, catalogue), ...sizeReasons(unit, geometry, weight, fabricator)];
  return {
    fabricator: { id: fabricator.id, name: fabricator.name },
    canBuild: reasons.length === 0,
    reasons,
    advice: altitudeAdvice(unit, fabricator),
  };
}

/** What the climb from plant to site asks for: a tube where the gas allows one, else care. */
function altitudeAdvice(
  { place, cavities }: ResolvedUnit,
  { name, plantAltitude, measureSystem, capabilities: { capillary } }: FabricatorItem,
): string[] {
  if (place.altitude === undefined) return [];
  const difference = place.altitude - plantAltitude;
  if (Math.abs(difference) <= capillary.adviseAboveM) return [];
  const height = `The site lies ${formatAltitude(Math.abs(difference), measureSystem)} ${difference > 0 ? 'above' : 'below'} the plant of ${name}.`;
  const sealed = cavities.filter((cavity) => !cavity.capillary);
  if (sealed.length === 0) return [];
  if (sealed.every(({ gas }) => gas.gas !== 'air')) {
    return [
      `${height} An open capillary tube and a gas fill exclude each other: ask for air with a tube, or for a fill matched to the site's pressure. The load rises with the height.`,
    ];
  }
  return [
    capillary.offered
      ? `${height} A capillary tube is advised.`
      : `${height} A capillary tube is advised, and this maker offers none: ask how it matches the pressure.`,
  ];
}
