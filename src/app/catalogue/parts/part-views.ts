import { type Catalogue } from '@shared/contracts/catalogue';
import { catalogueParts, type PartItem, type PartSlug } from '@shared/contracts/catalogue-parts';
import { coatingView } from './coating-view';
import { edgeWorkView } from './edge-work-view';
import { gasView } from './gas-view';
import { glassView } from './glass-view';
import { gridView } from './grid-view';
import { type PartView } from './part-view';
import { shapeView } from './shape-view';
import { spacerView } from './spacer-view';
import { treatmentView } from './treatment-view';

/** Each view takes the items of its own part alone; `viewOf` and `itemsOf` keep them together. */
const views = {
  glass: glassView,
  treatments: treatmentView,
  coatings: coatingView,
  spacers: spacerView,
  gases: gasView,
  grids: gridView,
  shapes: shapeView,
  'edge-work': edgeWorkView,
} as Record<PartSlug, PartView<unknown>>;

export function viewOf(slug: PartSlug): PartView<PartItem> {
  return views[slug] as PartView<PartItem>;
}

export function partOf(slug: PartSlug): (typeof catalogueParts)[number] {
  return catalogueParts.find((part) => part.slug === slug)!;
}

export function itemsOf(slug: PartSlug, catalogue: Catalogue): readonly PartItem[] {
  return catalogue[partOf(slug).key];
}
