import { eq } from 'drizzle-orm';
import { type PriceListContent } from '@shared/contracts/price-lists';
import { priceListVersions } from '@api/database/schema/pricing';
import { type Market } from './market-factory';

/** Publishes another version of a demo list, made from the newest. Its id: `northmere.4`. */
export function publishList(
  market: Market,
  listId: string,
  change: (content: PriceListContent) => PriceListContent,
  effectiveFrom: number,
): string {
  const { db } = market.dependencies.database;
  const versions = db.select().from(priceListVersions).where(eq(priceListVersions.listId, listId)).all();
  const newest = versions.sort((a, b) => b.number - a.number)[0]!;
  const id = `${listId}.${newest.number + 1}`;
  db.insert(priceListVersions)
    .values({
      ...newest,
      id,
      number: newest.number + 1,
      content: change(structuredClone(newest.content)),
      effectiveFrom,
      publishedAt: market.clock.now,
      createdAt: market.clock.now,
    })
    .run();
  return id;
}
