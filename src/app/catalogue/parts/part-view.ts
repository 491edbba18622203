import { type Catalogue } from '@shared/contracts/catalogue';
import { type PartSlug } from '@shared/contracts/catalogue-parts';
import { type Comparison, type Fact, type OfferWords } from '../facts';

/** How one part of the catalogue is explained: the same questions of each, answered in its own file. */
export interface PartView<Item = unknown> {
  slug: PartSlug;
  /** what a page of one item calls it: `gas fill` */
  kind: string;
  /** one sentence on what the part is */
  lead: string;
  /** what to know before choosing; a paragraph each */
  guide: readonly string[];
  /** where it can hurt someone: said on the spot */
  caution?: string;
  /** a statement of the guide that has no published source */
  practice?: string;
  facts(item: Item, catalogue: Catalogue): Fact[];
  /** where the figures come from; null where there are none */
  source(item: Item): string | null;
  comparison?(catalogue: Catalogue): Comparison;
  offer(item: Item): OfferWords;
  /** the `make` of a Bench address with the item chosen; null where the Bench cannot hold it */
  bench?(item: Item, catalogue: Catalogue): string | null;
}
