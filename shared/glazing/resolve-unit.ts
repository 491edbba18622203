import type { Catalogue, CoatingItem, GasItem, GlassItem, GridItem, SpacerItem, TreatmentItem } from '../contracts/catalogue';
import type { FieldError } from '../contracts/problems';
import type { Place, Unit } from '../contracts/units';

/** A lite with the products it names. */
export interface ResolvedLite {
  glass: GlassItem;
  treatment: TreatmentItem;
  /** `surface` counts glass faces from outside, from 1. */
  coating: { item: CoatingItem; surface: number } | null;
  edgeWork: string | null;
}

export interface ResolvedCavity {
  widthMm: number;
  gas: GasItem;
  spacer: SpacerItem;
  /** An open capillary tube. */
  capillary: boolean;
}

/** A unit whose products were all found: what the engineering works on. Lites from outside in. */
export interface ResolvedUnit {
  unit: Unit;
  widthMm: number;
  heightMm: number;
  lites: ResolvedLite[];
  cavities: ResolvedCavity[];
  grid: { bar: GridItem; across: number; down: number } | null;
  place: Place;
}

/**
 * Looks up every product that the unit names. An identity the catalogue does not hold is a
 * problem at its field.
 */
export function resolveUnit(unit: Unit, catalogue: Catalogue): { resolved: ResolvedUnit } | { problems: FieldError[] } {
  const problems: FieldError[] = [];
  const find = <T extends { id: string }>(items: readonly T[], id: string, what: string, pointer: string): T | undefined => {
    const item = items.find((candidate) => candidate.id === id);
    if (!item) problems.push({ pointer, detail: `the catalogue holds no ${what} “${id}”` });
    return item;
  };

  const lites: ResolvedLite[] = [];
  for (const [i, lite] of unit.lites.entries()) {
    const at = `/lites/${i}`;
    const glass = find(catalogue.glasses, lite.glass, 'glass', `${at}/glass`);
    const treatment = find(catalogue.treatments, lite.treatment, 'treatment', `${at}/treatment`);
    const item = lite.coating && find(catalogue.coatings, lite.coating.id, 'coating', `${at}/coating/id`);
    if (lite.edgeWork !== undefined) find(catalogue.edgeWork, lite.edgeWork, 'edge work', `${at}/edgeWork`);
    if (!glass || !treatment) continue;
    lites.push({
      glass,
      treatment,
      coating: item && lite.coating ? { item, surface: lite.coating.surface } : null,
      edgeWork: lite.edgeWork ?? null,
    });
  }

  const cavities: ResolvedCavity[] = [];
  for (const [i, cavity] of unit.cavities.entries()) {
    const gas = find(catalogue.gases, cavity.gas, 'gas', `/cavities/${i}/gas`);
    const spacer = find(catalogue.spacers, cavity.spacer, 'spacer', `/cavities/${i}/spacer`);
    if (gas && spacer) cavities.push({ widthMm: Number(cavity.width), gas, spacer, capillary: cavity.capillary ?? false });
  }

  const bar = unit.grid && find(catalogue.grids, unit.grid.bar, 'grid bar', '/grid/bar');
  if (problems.length > 0) return { problems };
  const grid = unit.grid && bar ? { bar, across: unit.grid.across, down: unit.grid.down } : null;
  return {
    resolved: { unit, widthMm: Number(unit.width), heightMm: Number(unit.height), lites, cavities, grid, place: unit.place ?? {} },
  };
}
