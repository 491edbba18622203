import { type Catalogue } from '@shared/contracts/catalogue';
import { catalogueParts } from '@api/database/schema/pricing';
import { type Dependencies } from '@api/dependencies';
import { catalogueData } from './catalogue-data';

/** Brings the reference data up to date; running it again changes nothing. For production too. */
export function loadReference({ stores, database, catalogue }: Pick<Dependencies, 'stores' | 'database' | 'catalogue'>): void {
  database.immediately(() => {
    for (const part of catalogueParts) {
      const items: Catalogue[typeof part][number][] = catalogueData[part];
      items.forEach((item, position) => stores.catalogue.keep(part, position, item));
    }
  });
  catalogue.changed();
}
