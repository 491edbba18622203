import { type PriceListContent } from '@shared/contracts/price-lists';
import { type Db } from '@api/database/open-database';
import { priceLists, priceListVersions } from '@api/database/schema/pricing';
import { aldersundList, kestrelFordList, northmereList, raise } from './price-lists';

const DAY_MS = 86_400_000;

/** One list a maker; each year's version is the next one's, lowered by the year's increase. */
const lists: { maker: string; name: string; content: PriceListContent; years: [afterDays: number, reason: string][] }[] = [
  {
    maker: 'northmere',
    name: 'Northmere trade list',
    content: northmereList,
    years: [
      [0, 'First list'],
      [290, 'Glass and gas up'],
      [470, 'Summer list'],
    ],
  },
  {
    maker: 'kestrel-ford',
    name: 'Kestrel Ford list',
    content: kestrelFordList,
    years: [
      [0, 'First list'],
      [280, 'Yearly increase'],
    ],
  },
  {
    maker: 'aldersund',
    name: 'Aldersund prisliste',
    content: aldersundList,
    years: [
      [0, 'First list'],
      [275, 'Yearly increase'],
    ],
  },
];

/**
 * Publishes the demo lists, earlier versions at lower rates, so that the newest is the list
 * as written in price-lists.ts.
 *
 * @param from UTC epoch ms at which the first version takes effect
 */
export function loadPriceLists(db: Db, from: number): void {
  for (const { maker, name, content, years } of lists) {
    db.insert(priceLists).values({ id: maker, fabricatorId: maker, name, currency: content.currency, measure: content.measure }).run();
    years.forEach(([afterDays, reason], i) => {
      const effectiveFrom = from + afterDays * DAY_MS;
      const behind = years.length - 1 - i;
      db.insert(priceListVersions)
        .values({
          id: `${maker}.${i + 1}`,
          listId: maker,
          number: i + 1,
          state: 'published',
          content: behind === 0 ? content : raise(content, String(-3 * behind)),
          effectiveFrom,
          publishedAt: effectiveFrom - DAY_MS,
          createdAt: effectiveFrom - 2 * DAY_MS,
          createdBy: `sales.${maker}`,
          reason,
        })
        .run();
    });
  }
}
