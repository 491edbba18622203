import type { Capabilities, Catalogue, FabricatorItem } from '../contracts/catalogue';
import type { Evaluation, Reason } from '../contracts/evaluation';
import { formatLengthBoth } from '../measures/format-length';
import type { ResolvedUnit } from './resolve-unit';

/** A maker's limits on what a unit is made of: products, cavities, number of lites. */
export function partReasons(
  unit: ResolvedUnit,
  { overallThickness }: Evaluation['geometry'],
  fabricator: FabricatorItem,
  catalogue: Catalogue,
): Reason[] {
  const { capabilities } = fabricator;
  const both = (mm: string) => formatLengthBoth(mm, fabricator.measureSystem);
  return [
    ...liteCount(unit, capabilities),
    ...liteReasons(unit, capabilities, catalogue),
    ...coatingCounts(unit, capabilities),
    ...cavityReasons(unit, capabilities, catalogue, both),
    ...wholeReasons(unit, overallThickness, capabilities, catalogue, both),
  ];
}

interface Named {
  id: string;
  name: string;
}

/** A product that the maker does not work with; the nearest is one it does. */
function notMade(code: string, what: string, item: Named, made: readonly string[], nearest: Named | undefined, pointer: string): Reason {
  return {
    code,
    detail: `does not make units with ${item.name}${nearest ? `; takes ${nearest.name}` : ''}`,
    limit: made.length === 0 ? `no ${what}` : made.join(', '),
    actual: item.id,
    nearest: nearest?.id ?? null,
    nearestValue: nearest?.id ?? null,
    pointer,
  };
}

function liteCount({ lites }: ResolvedUnit, { lites: { max } }: Capabilities): Reason[] {
  if (lites.length <= max) return [];
  const [limit, actual] = [`${max} lites`, `${lites.length} lites`];
  return [
    {
      code: 'lites-max',
      detail: `makes units of up to ${max} lites, not ${lites.length}`,
      limit,
      actual,
      nearest: limit,
      nearestValue: null,
      pointer: '/lites',
    },
  ];
}

function liteReasons({ lites, unit }: ResolvedUnit, made: Capabilities, catalogue: Catalogue): Reason[] {
  return lites.flatMap(({ glass, treatment, edgeWork }, i) => {
    const reasons: Reason[] = [];
    const at = `/lites/${i}`;
    const glasses = made.glass.map((own) => own.glass);
    if (!glasses.includes(glass.id)) {
      // The nearest glass of the same kind; a thicker one before a thinner one at the same distance.
      const alike = catalogue.glasses.filter(
        (other) => glasses.includes(other.id) && other.construction === glass.construction && other.tint === glass.tint,
      );
      const nearest = closest(alike, (other) => Math.abs(other.nominalMm - glass.nominalMm) - other.nominalMm / 1000);
      reasons.push(notMade('glass-not-made', 'glass', glass, glasses, nearest, `${at}/glass`));
    }
    const own = ovenFor(made, treatment.id, glass.nominalMm);
    if (!own) {
      const treatments = made.treatments.map((candidate) => candidate.treatment);
      const nearest = catalogue.treatments.find(
        (other) => treatments.includes(other.id) && other.allowableStressMpa >= treatment.allowableStressMpa,
      );
      reasons.push(notMade('treatment-not-made', 'treatment', treatment, treatments, nearest, `${at}/treatment`));
    } else if (glass.nominalMm < own.minNominalMm || glass.nominalMm > own.maxNominalMm) {
      const thin = glass.nominalMm < own.minNominalMm;
      const alike = catalogue.glasses.filter(
        (other) =>
          glasses.includes(other.id) &&
          other.construction === glass.construction &&
          other.tint === glass.tint &&
          other.nominalMm >= own.minNominalMm &&
          other.nominalMm <= own.maxNominalMm,
      );
      const nearest = closest(alike, (other) => Math.abs(other.nominalMm - glass.nominalMm));
      const bound = thin ? own.minNominalMm : own.maxNominalMm;
      reasons.push({
        code: thin ? 'treatment-thickness-min' : 'treatment-thickness-max',
        detail: `${treatment.name} glass ${thin ? 'from' : 'up to'} ${bound} mm, not ${glass.nominalMm} mm`,
        limit: `${bound} mm`,
        actual: `${glass.nominalMm} mm`,
        nearest: nearest ? `${nearest.nominalMm} mm` : null,
        nearestValue: nearest?.id ?? null,
        pointer: `${at}/glass`,
      });
    }
    const coating = unit.lites[i]?.coating;
    const coatings = made.coatings.map((candidate) => candidate.coating);
    if (coating && !coatings.includes(coating.id)) {
      const wanted = catalogue.coatings.find(({ id }) => id === coating.id)!;
      const alike = catalogue.coatings.filter((other) => coatings.includes(other.id) && other.kind === wanted.kind);
      const nearest = closest(alike, (other) => Math.abs(other.emissivity - wanted.emissivity));
      reasons.push(notMade('coating-not-made', 'coating', wanted, coatings, nearest, `${at}/coating/id`));
    }
    if (edgeWork !== null && !made.edgeWork.includes(edgeWork)) {
      const item = catalogue.edgeWork.find(({ id }) => id === edgeWork)!;
      const nearest = catalogue.edgeWork.find(({ id }) => made.edgeWork.includes(id));
      reasons.push(notMade('edge-work-not-made', 'edge work', item, made.edgeWork, nearest, `${at}/edgeWork`));
    }
    return reasons;
  });
}

/** The row for a treatment and thickness: a maker may list one treatment by ranges of thickness. The nearest range where none holds it. */
export function ovenFor(
  { treatments }: Capabilities,
  treatment: string,
  nominalMm: number,
): Capabilities['treatments'][number] | undefined {
  const outside = (row: Capabilities['treatments'][number]) => Math.max(row.minNominalMm - nominalMm, nominalMm - row.maxNominalMm, 0);
  return closest(
    treatments.filter((row) => row.treatment === treatment),
    outside,
  );
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

function cavityReasons({ cavities, unit }: ResolvedUnit, made: Capabilities, catalogue: Catalogue, both: (mm: string) => string): Reason[] {
  return cavities.flatMap(({ gas, spacer, widthMm, capillary }, i) => {
    const reasons: Reason[] = [];
    const at = `/cavities/${i}`;
    const written = unit.cavities[i]!.width;
    const own = made.gases.find((candidate) => candidate.gas === gas.id);
    const inGas = (width: string) => !own || (Number(width) >= Number(own.minCavity) && Number(width) <= Number(own.maxCavity));

    const bars = made.spacers.find((candidate) => candidate.spacer === spacer.id);
    const distance = (width: string) => Math.abs(Number(width) - widthMm);
    // One width for both rules, so that it passes spacer and gas together.
    const width = bars && (closest(bars.widths.filter(inGas), distance) ?? closest(bars.widths, distance));
    if (!bars) {
      const spacers = made.spacers.map((candidate) => candidate.spacer);
      const nearest = closest(
        catalogue.spacers.filter(({ id }) => spacers.includes(id)),
        (other) => Math.abs(other.conductivity - spacer.conductivity),
      );
      reasons.push(notMade('spacer-not-made', 'spacer', spacer, spacers, nearest, `${at}/spacer`));
    } else if (!bars.widths.some((candidate) => Number(candidate) === widthMm)) {
      reasons.push({
        code: 'cavity-width',
        detail: `${spacer.name} spacer comes in ${bars.widths.join(', ')} mm, not ${written} mm`,
        limit: `${bars.widths.join(', ')} mm`,
        actual: `${written} mm`,
        nearest: width ? `${width} mm` : null,
        nearestValue: width ?? null,
        pointer: `${at}/width`,
      });
    }

    if (!own) {
      const gases = made.gases.map((candidate) => candidate.gas);
      reasons.push(notMade('gas-not-made', 'gas', gas, gases, catalogue.gases.find(({ id }) => gases.includes(id)), `${at}/gas`)); // prettier-ignore
    } else if (!inGas(written)) {
      const narrow = widthMm < Number(own.minCavity);
      const bound = narrow ? own.minCavity : own.maxCavity;
      const nearest = bars ? bars.widths.filter(inGas).sort((a, b) => distance(a) - distance(b))[0] : bound;
      reasons.push({
        code: narrow ? 'gas-cavity-min' : 'gas-cavity-max',
        detail: `fills ${gas.name} into cavities ${narrow ? 'from' : 'up to'} ${both(bound)}, not ${written} mm`,
        limit: `${bound} mm`,
        actual: `${written} mm`,
        nearest: nearest ? `${nearest} mm` : null,
        nearestValue: nearest ?? null,
        pointer: `${at}/width`,
      });
    }
    if (capillary && !made.capillary.offered) {
      reasons.push({
        code: 'capillary-not-made',
        detail: 'fits no capillary tubes',
        limit: 'no tube',
        actual: 'tube',
        nearest: 'no tube',
        nearestValue: null,
        pointer: `${at}/capillary`,
      });
    }
    return reasons;
  });
}

function wholeReasons(
  { unit, grid, cavities }: ResolvedUnit,
  thickness: number,
  made: Capabilities,
  catalogue: Catalogue,
  both: (mm: string) => string,
): Reason[] {
  const reasons: Reason[] = [];
  const { class: shape } = unit.shape;
  if (!made.shapes.includes(shape)) {
    const named = (id: string) => catalogue.shapes.find((item) => item.class === id)?.name ?? id;
    reasons.push({
      code: 'shape-not-made',
      detail: `does not make this shape: ${named(shape)}`,
      limit: made.shapes.join(', '),
      actual: shape,
      nearest: null,
      nearestValue: null,
      pointer: '/shape/class',
    });
  }
  if (grid) {
    const own = made.grids.find(({ bar }) => bar === grid.bar.id);
    const widest = Math.max(...cavities.map(({ widthMm }) => widthMm));
    if (!own) {
      const bars = made.grids.map(({ bar }) => bar);
      const nearest = closest(
        catalogue.grids.filter(({ id }) => bars.includes(id)),
        (other) => Math.abs(other.widthMm - grid.bar.widthMm),
      );
      reasons.push(notMade('grid-not-made', 'grid', grid.bar, bars, nearest, '/grid/bar'));
    } else if (widest < Number(own.minCavity)) {
      const cavity = cavities.findIndex(({ widthMm }) => widthMm === widest);
      reasons.push({
        code: 'grid-cavity-min',
        detail: `${grid.bar.name} goes into cavities from ${both(own.minCavity)}, not ${widest} mm`,
        limit: `${own.minCavity} mm`,
        actual: `${widest} mm`,
        nearest: `${own.minCavity} mm`,
        nearestValue: own.minCavity,
        pointer: `/cavities/${cavity}/width`,
      });
    }
  }
  const overall = Math.round(thickness * 1e8) / 1e5;
  if (overall > Number(made.unit.maxOverall)) {
    const [limit, actual] = [`${made.unit.maxOverall} mm`, `${overall} mm`];
    const detail = `units up to ${both(made.unit.maxOverall)} thick overall, not ${overall} mm`;
    reasons.push({ code: 'overall-max', detail, limit, actual, nearest: limit, nearestValue: null, pointer: '/cavities' });
  }
  return reasons;
}

/** The item with the least distance, the earlier of equals; undefined of none. */
function closest<T>(items: readonly T[], distance: (item: T) => number): T | undefined {
  return items.reduce<T | undefined>((best, item) => (best === undefined || distance(item) < distance(best) ? item : best), undefined);
}
