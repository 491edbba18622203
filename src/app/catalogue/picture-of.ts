import { type Catalogue } from '@shared/contracts/catalogue';
import { type PartItem, type PartSlug } from '@shared/contracts/catalogue-parts';
import { type Drawing } from '@shared/drawings/drawing';
import { section } from '@shared/drawings/section';
import { comparingUnit } from './comparing-unit';

/** The picture of an item. */
export function pictureOf(_part: PartSlug, _item: PartItem, catalogue: Catalogue): Drawing {
  return section(comparingUnit(catalogue), catalogue, { system: 'metric' });
}
