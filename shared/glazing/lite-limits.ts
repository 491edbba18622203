import type { Capabilities, Catalogue, GlassItem } from '../contracts/catalogue';
import type { Reason } from '../contracts/evaluation';
import { closest } from './closest';
import { notMade } from './not-made';
import { ovenFor } from './oven-for';
import type { ResolvedLite, ResolvedUnit } from './resolve-unit';

/** A maker's limits on the lites: how many, and the glass, treatment, coating and edge of each. */
export function liteReasons(unit: ResolvedUnit, made: Capabilities, catalogue: Catalogue): Reason[] {
  return [
    ...countReasons(unit, made),
    ...unit.lites.flatMap((lite, i) => {
      const at = `/lites/${i}`;
      return [
        ...glassReasons(lite, made, catalogue, at),
        ...coatingReasons(lite, made, catalogue, at),
        ...edgeReasons(lite, made, catalogue, at),
      ];
    }),
    ...coatingCounts(unit, made),
  ];
}

function countReasons({ lites }: ResolvedUnit, { lites: { max } }: Capabilities): Reason[] {
  if (lites.length <= max) return [];
  const [limit, actual] = [`${max} lites`, `${lites.length} lites`];
  const detail = `makes units of up to ${max} lites, not ${lites.length}`;
  return [{ code: 'lites-max', detail, limit, actual, nearest: limit, nearestValue: null, pointer: '/lites' }];
}

/** Glass and treatment together: the nearest glass is one that the maker works and can treat. */
function glassReasons({ glass, treatment }: ResolvedLite, made: Capabilities, catalogue: Catalogue, at: string): Reason[] {
  const reasons: Reason[] = [];
  const own = ovenFor(made, treatment.id, glass.nominalMm);
  const glasses = made.glass.map((row) => row.glass);
  const treatable = ({ nominalMm }: GlassItem) => !own || (nominalMm >= own.minNominalMm && nominalMm <= own.maxNominalMm);
  const alike = catalogue.glasses.filter(
    (other) => glasses.includes(other.id) && treatable(other) && other.construction === glass.construction && other.tint === glass.tint,
  );
  // A thicker glass before a thinner one at the same distance.
  const nearest = closest(alike, (other) => Math.abs(other.nominalMm - glass.nominalMm) - other.nominalMm / 1000);

  if (!glasses.includes(glass.id)) reasons.push(notMade('glass-not-made', 'glass', glass, glasses, nearest, `${at}/glass`));
  if (!own) {
    const treatments = made.treatments.map((row) => row.treatment);
    const stronger = catalogue.treatments.find(
      ({ id, allowableStressMpa }) => treatments.includes(id) && allowableStressMpa >= treatment.allowableStressMpa,
    );
    reasons.push(notMade('treatment-not-made', 'treatment', treatment, treatments, stronger, `${at}/treatment`));
  } else if (!treatable(glass)) {
    const thin = glass.nominalMm < own.minNominalMm;
    const bound = thin ? own.minNominalMm : own.maxNominalMm;
    reasons.push({
      code: thin ? 'treatment-thickness-min' : 'treatment-thickness-max',
      detail: `makes ${treatment.name} glass ${thin ? 'from' : 'up to'} ${bound} mm, not ${glass.nominalMm} mm`,
      limit: `${bound} mm`,
      actual: `${glass.nominalMm} mm`,
      nearest: nearest ? `${nearest.nominalMm} mm` : null,
      nearestValue: nearest?.id ?? null,
      pointer: `${at}/glass`,
    });
  }
  return reasons;
}

function coatingReasons({ coating }: ResolvedLite, made: Capabilities, catalogue: Catalogue, at: string): Reason[] {
  const coatings = made.coatings.map((row) => row.coating);
  if (!coating || coatings.includes(coating.item.id)) return [];
  const alike = catalogue.coatings.filter(({ id, kind }) => coatings.includes(id) && kind === coating.item.kind);
  const nearest = closest(alike, ({ emissivity }) => Math.abs(emissivity - coating.item.emissivity));
  return [notMade('coating-not-made', 'coating', coating.item, coatings, nearest, `${at}/coating/id`)];
}

function edgeReasons({ edgeWork }: ResolvedLite, made: Capabilities, catalogue: Catalogue, at: string): Reason[] {
  if (edgeWork === null || made.edgeWork.includes(edgeWork)) return [];
  const item = catalogue.edgeWork.find(({ id }) => id === edgeWork) ?? { id: edgeWork, name: edgeWork };
  const nearest = catalogue.edgeWork.find(({ id }) => made.edgeWork.includes(id));
  return [notMade('edge-work-not-made', 'edge work', item, made.edgeWork, nearest, `${at}/edgeWork`)];
}

/** A maker may put a coating on only so many lites of one unit. */
function coatingCounts({ lites }: ResolvedUnit, made: Capabilities): Reason[] {
  return made.coatings.flatMap(({ coating, maxPerUnit }) => {
    const coated = [...lites.entries()].filter(([, lite]) => lite.coating?.item.id === coating);
    const [tooMany, lite] = coated[maxPerUnit] ?? [];
    if (tooMany === undefined || !lite?.coating) return [];
    const [limit, actual] = [`${maxPerUnit} per unit`, `${coated.length} per unit`];
    const detail = `puts ${lite.coating.item.name} on ${maxPerUnit} ${maxPerUnit === 1 ? 'lite' : 'lites'} of a unit, not ${coated.length}`;
    return [{ code: 'coating-max', detail, limit, actual, nearest: limit, nearestValue: null, pointer: `/lites/${tooMany}/coating` }];
  });
}
