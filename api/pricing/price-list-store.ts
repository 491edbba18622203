import { and, desc, eq, lte, sql } from 'drizzle-orm';
import { type PriceListVersion } from '@shared/contracts/price-lists';
import { type Currency } from '@shared/money/currencies';
import { type Db } from '../database/open-database';
import { priceLists, priceListVersions } from '../database/schema/pricing';

/** Rows of price lists and their published versions. */
export function priceListStore(db: Db) {
  // A published version never changes (a trigger keeps it), so it is read and parsed once;
  // drafts are not kept here.
  const kept = new Map<string, PriceListVersion>();

  const inForce = db
    .select({ id: priceListVersions.id })
    .from(priceListVersions)
    .innerJoin(priceLists, eq(priceLists.id, priceListVersions.listId))
    .where(
      and(
        eq(priceLists.fabricatorId, sql.placeholder('fabricatorId')),
        eq(priceLists.currency, sql.placeholder('currency')),
        eq(priceListVersions.state, 'published'),
        lte(priceListVersions.effectiveFrom, sql.placeholder('at')),
      ),
    )
    .orderBy(desc(priceListVersions.effectiveFrom), desc(priceListVersions.number))
    .limit(1)
    .prepare();
  const published = db
    .select({ version: priceListVersions, listName: priceLists.name })
    .from(priceListVersions)
    .innerJoin(priceLists, eq(priceLists.id, priceListVersions.listId))
    .where(and(eq(priceListVersions.id, sql.placeholder('id')), eq(priceListVersions.state, 'published')))
    .prepare();

  /** A published version. The same object each time. @throws Error when there is none: quotes and orders refer to it */
  const version = (id: string): PriceListVersion => {
    const known = kept.get(id);
    if (known) return known;
    const row = published.get({ id });
    if (!row) throw new Error(`no published price list version ${id}`);
    const read: PriceListVersion = {
      version: id,
      name: `${row.listName} ${row.version.number}`,
      effectiveFrom: new Date(row.version.effectiveFrom ?? 0).toISOString(),
      content: row.version.content,
    };
    kept.set(id, read);
    return read;
  };

  return {
    version,

    /** The fabricator's version in this currency with the latest effective-from at or before `at` (UTC epoch ms). */
    inForce: (fabricatorId: string, currency: Currency, at: number): PriceListVersion | undefined => {
      const found = inForce.get({ fabricatorId, currency, at });
      return found && version(found.id);
    },
  };
}
