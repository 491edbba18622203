import { type Catalogue } from '@shared/contracts/catalogue';
import { type PartSlug } from '@shared/contracts/catalogue-parts';
import { type Drawing } from '@shared/drawings/drawing';
import { drawBars } from './draw-bars';
import { drawUCurves } from './draw-u-curves';
import { decimals } from './facts';
import { curveOf } from './parts/gas-view';

/** The chart of a part, where one says more than a table; `chosen` is the item it is drawn for. */
export function chartOf(part: PartSlug, catalogue: Catalogue, chosen: string | null): Drawing | null {
  if (part === 'gases') {
    return drawUCurves(catalogue.gases.map(({ id, name }) => ({ name, points: curveOf(catalogue, id), chosen: id === chosen })));
  }
  if (part === 'treatments') {
    return drawBars(
      'Allowable surface stress',
      catalogue.treatments.map(({ id, name, allowableStressMpa }) => ({
        name,
        value: allowableStressMpa,
        text: `${decimals(allowableStressMpa, 1)} MPa`,
        chosen: id === chosen,
      })),
    );
  }
  return null;
}
