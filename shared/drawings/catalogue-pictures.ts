import type { Catalogue } from '../contracts/catalogue';
import type { PartItem, PartSlug } from '../contracts/catalogue-parts';
import { gasPicture, gridPicture, shapePicture, spacerPicture } from './cavity-pictures';
import type { Drawing } from './drawing';
import { coatingPicture, edgeWorkPicture, glassPicture, treatmentPicture } from './glass-pictures';

/**
 * The small picture of an item of the catalogue: what it looks like or does.
 *
 * @param part the part of the catalogue that `item` is from
 */
export function cataloguePicture(part: PartSlug, item: PartItem): Drawing {
  switch (part) {
    case 'glass':
      return glassPicture(item as Catalogue['glasses'][number]);
    case 'treatments':
      return treatmentPicture(item as Catalogue['treatments'][number]);
    case 'coatings':
      return coatingPicture(item as Catalogue['coatings'][number]);
    case 'spacers':
      return spacerPicture(item as Catalogue['spacers'][number]);
    case 'gases':
      return gasPicture(item as Catalogue['gases'][number]);
    case 'grids':
      return gridPicture(item as Catalogue['grids'][number]);
    case 'shapes':
      return shapePicture(item as Catalogue['shapes'][number]);
    case 'edge-work':
      return edgeWorkPicture(item);
  }
}
