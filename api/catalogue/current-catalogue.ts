import { type Catalogue } from '@shared/contracts/catalogue';
import { type Stores } from '../dependencies';

/** The catalogue as it stands, kept in memory: every evaluation and price reads it. */
export interface CurrentCatalogue {
  (): Catalogue;
  /** grows with each change; what is made from the catalogue is kept under it */
  version(): number;
  /** to be called by whoever changed reference data or a fabricator's capabilities */
  changed(): void;
}

export function currentCatalogue(stores: Pick<Stores, 'catalogue' | 'companies'>): CurrentCatalogue {
  let kept: Catalogue | undefined;
  let version = 1;
  const read = (): Catalogue => ({
    ...stores.catalogue.read(),
    fabricators: stores.companies.allFabricators().map(({ companies: company, fabricators: maker }) => ({
      id: company.id,
      name: company.name,
      about: maker.about,
      town: company.town,
      measureSystem: company.measureSystem,
      plantAltitude: maker.plantAltitudeM,
      capabilities: maker.capabilities,
    })),
  });
  return Object.assign(() => (kept ??= read()), {
    version: () => version,
    changed: () => {
      kept = undefined;
      version += 1;
    },
  });
}
