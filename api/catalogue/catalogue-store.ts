import { asc } from 'drizzle-orm';
import { type Catalogue } from '@shared/contracts/catalogue';
import { type Db } from '../database/open-database';
import { catalogueItems, type CataloguePart, catalogueParts } from '../database/schema/pricing';

/** Rows of the reference data. */
export function catalogueStore(db: Db) {
  return {
    read: (): Omit<Catalogue, 'fabricators'> => {
      const rows = db.select().from(catalogueItems).orderBy(asc(catalogueItems.position)).all();
      const parts = Object.fromEntries(
        catalogueParts.map((part) => [part, rows.filter((row) => row.part === part).map((row) => row.data)]),
      );
      return parts as unknown as Omit<Catalogue, 'fabricators'>;
    },

    /** Adds an item or brings it up to date. */
    keep: (part: CataloguePart, position: number, data: Catalogue[CataloguePart][number]) =>
      db
        .insert(catalogueItems)
        .values({ part, id: data.id, position, data })
        .onConflictDoUpdate({ target: [catalogueItems.part, catalogueItems.id], set: { position, data } })
        .run(),
  };
}
