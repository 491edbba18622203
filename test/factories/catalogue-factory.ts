import type { Capabilities, Catalogue, FabricatorItem } from '@shared/contracts/catalogue';
import { shapeClasses, type Unit, type UnitInput, unitSchema } from '@shared/contracts/units';
import { catalogueData } from '../../seeds/reference/catalogue-data';

/** Two made-up makers: one that can do nearly all, one with narrow limits. */
export function catalogueFactory(overrides: Partial<Catalogue> = {}): Catalogue {
  return { ...structuredClone(catalogueData), fabricators: [wideMaker(), narrowMaker()], ...overrides };
}

/** A double unit, 36 1/2 × 48 1/4 in, 3 mm tempered, 16 mm argon, soft low-e on surface 3. */
export function unitFactory(overrides: Partial<UnitInput> = {}): Unit {
  return unitSchema.parse({
    width: '927.1',
    height: '1225.55',
    lites: [
      { glass: 'clear-3', treatment: 'tempered' },
      { glass: 'clear-3', treatment: 'tempered', coating: { id: 'low-e-soft', surface: 3 } },
    ],
    cavities: [{ width: '16', gas: 'argon', spacer: 'stainless' }],
    ...overrides,
  });
}

/** Three lites with two soft coats, 4 / 12 argon / 4 / 12 argon / 4. */
export function tripleFactory(overrides: Partial<UnitInput> = {}): Unit {
  const cavity = { width: '12', gas: 'argon', spacer: 'warm-edge' };
  return unitFactory({
    lites: [
      { glass: 'clear-4', treatment: 'annealed', coating: { id: 'low-e-soft', surface: 2 } },
      { glass: 'clear-4', treatment: 'annealed' },
      { glass: 'clear-4', treatment: 'annealed', coating: { id: 'low-e-soft', surface: 5 } },
    ],
    cavities: [cavity, cavity],
    ...overrides,
  });
}

export function wideMaker(): FabricatorItem {
  const ids = (items: { id: string }[]) => items.map(({ id }) => id);
  const capabilities: Capabilities = {
    lites: { max: 4 },
    unit: {
      minWidth: '150',
      minHeight: '150',
      maxLong: '4000',
      maxShort: '2500',
      maxAreaM2: 8,
      maxAspect: 12,
      maxWeightKg: 400,
      maxOverall: '80',
    },
    glass: ids(catalogueData.glasses).map((glass) => ({ glass, maxLong: '4000', maxShort: '2500' })),
    treatments: ids(catalogueData.treatments).map((treatment) => ({
      treatment,
      minNominalMm: 2.5,
      maxNominalMm: 12,
      minEdge: '150',
      maxLong: '4000',
      maxShort: '2500',
    })),
    coatings: ids(catalogueData.coatings).map((coating) => ({ coating, maxPerUnit: 3 })),
    spacers: catalogueData.spacers.map(({ id, widthsMm }) => ({ spacer: id, widths: widthsMm })),
    gases: ids(catalogueData.gases).map((gas) => ({ gas, minCavity: '6', maxCavity: '24' })),
    grids: catalogueData.grids.map(({ id }) => ({ bar: id, minCavity: '12' })),
    edgeWork: ids(catalogueData.edgeWork),
    shapes: [...shapeClasses],
    capillary: { offered: true, adviseAboveM: 700 },
  };
  return {
    id: 'wide',
    name: 'Wide Works',
    about: 'Makes nearly everything.',
    town: 'Lowmarket',
    measureSystem: 'metric',
    plantAltitude: 100,
    capabilities,
  };
}

export function narrowMaker(): FabricatorItem {
  const capabilities: Capabilities = {
    lites: { max: 2 },
    unit: {
      minWidth: '304.8',
      minHeight: '304.8',
      maxLong: '2438.4',
      maxShort: '1524',
      maxAreaM2: 3,
      maxAspect: 5,
      maxWeightKg: 90,
      maxOverall: '32',
    },
    glass: ['clear-4', 'clear-5', 'clear-6'].map((glass) => ({ glass, maxLong: '2438.4', maxShort: '1524' })),
    treatments: [
      { treatment: 'annealed', minNominalMm: 3, maxNominalMm: 6, minEdge: '304.8', maxLong: '2438.4', maxShort: '1524' },
      { treatment: 'tempered', minNominalMm: 4, maxNominalMm: 6, minEdge: '355.6', maxLong: '2133.6', maxShort: '1219.2' },
    ],
    coatings: [{ coating: 'low-e-soft', maxPerUnit: 1 }],
    spacers: [
      { spacer: 'aluminium', widths: ['8', '12', '16'] },
      { spacer: 'stainless', widths: ['12', '16'] },
    ],
    gases: [
      { gas: 'air', minCavity: '6', maxCavity: '20' },
      { gas: 'argon', minCavity: '10', maxCavity: '16' },
    ],
    grids: [{ bar: 'flat-16', minCavity: '12' }],
    edgeWork: ['seamed'],
    shapes: ['rectangle', 'raked-head'],
    capillary: { offered: false, adviseAboveM: 500 },
  };
  return {
    id: 'narrow',
    name: 'Narrow Works',
    about: 'Makes few things.',
    town: 'Highmarket',
    measureSystem: 'imperial',
    plantAltitude: 250,
    capabilities,
  };
}
