import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { type Catalogue } from '@shared/contracts/catalogue';
import { elevation } from '@shared/drawings/elevation';
import { Drawing } from '../ui/drawing/drawing';
import { CatalogueFrame } from './catalogue-frame';
import { comparingUnit } from './comparing-unit';
import { drawOpening, drawRebate, drawRoundingDown, drawThreePlaces } from './draw-measuring';
import { decimals } from './facts';

const MM_PER_INCH = 25.4;
/** The unit of the examples: 36 1/2 × 48 1/4 in, in mm. */
const example = { width: '927.1', height: '1225.55' };

/** How a unit is measured, and what a standard size is. */
@Component({
  selector: 'app-sizes-page',
  imports: [RouterLink, CatalogueFrame, Drawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sizes-page.html',
  styleUrls: ['./catalogue.scss', './sizes-page.scss'],
})
export class SizesPage {
  readonly catalogue = input.required<Catalogue>();

  protected readonly trail = [{ name: 'Catalogue', path: '/catalogue' }];
  protected readonly drawings = { opening: drawOpening(), places: drawThreePlaces(), rule: drawRoundingDown(), rebate: drawRebate() };
  protected readonly seen = computed(() =>
    elevation({ ...comparingUnit(this.catalogue()), ...example }, this.catalogue(), { system: 'imperial' }),
  );

  /** How much narrower the largest upright rectangle is, by the difference of the diagonals; by Pythagoras. */
  protected readonly skews = [1 / 8, 1 / 4, 1 / 2].map((difference) => {
    const [width, height] = [Number(example.width) / MM_PER_INCH, Number(example.height) / MM_PER_INCH];
    const lean = (difference * Math.hypot(width, height)) / (2 * width);
    return {
      difference: `${{ 0.125: '1/8', 0.25: '1/4', 0.5: '1/2' }[difference]} in`,
      lean: `${decimals(lean, 2)} in`,
      leanMm: `${decimals(lean * MM_PER_INCH, 1)} mm`,
    };
  });

  /** Overall thickness of double units of two like lites. */
  protected readonly thicknesses = computed(() => {
    const glasses = this.catalogue().glasses.filter(
      (glass) => glass.tint === null && glass.construction === 'monolithic' && glass.nominalMm >= 3 && glass.nominalMm <= 8,
    );
    const cavities = [...new Set(this.catalogue().spacers.flatMap(({ widthsMm }) => widthsMm))].map(Number).filter((width) => width <= 20);
    return {
      glasses,
      rows: cavities
        .sort((a, b) => a - b)
        .map((cavity) => ({
          cavity,
          cells: glasses.map(({ actualMm }) => {
            const overall = 2 * actualMm + cavity;
            return { mm: decimals(overall, 1), inches: decimals(overall / MM_PER_INCH, 2) };
          }),
        })),
    };
  });
}
