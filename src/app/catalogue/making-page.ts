import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { type Catalogue } from '@shared/contracts/catalogue';
import { section } from '@shared/drawings/section';
import { standardPressure } from '@shared/glazing/climate-load';
import { dewPoint, saturationPressure } from '@shared/glazing/condensation';
import { makingPictures } from '@shared/drawings/making-pictures';
import { Drawing } from '../ui/drawing/drawing';
import { CatalogueFrame } from './catalogue-frame';
import { comparingUnit, heatAndLight } from './comparing-unit';
import { drawDewPoint } from './draw-dew-point';
import { decimals, percentText } from './facts';
import { makingSteps } from './making-steps';

/** Winter outside and room, °C. */
const winter = { outside: -10, inside: 20 };
/** Outer surface and 4 mm of glass, m²K/W, as EN 673 takes them. */
const beforeSurface2 = 1 / 25 + 0.004;

/** How a unit is made, how moisture gets in and fogs it, and what capillary tubes are for. */
@Component({
  selector: 'app-making-page',
  imports: [RouterLink, CatalogueFrame, Drawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './making-page.html',
  styleUrls: ['./catalogue.scss', './making-page.scss'],
})
export class MakingPage {
  readonly catalogue = input.required<Catalogue>();

  protected readonly trail = [{ name: 'Catalogue', path: '/catalogue' }];
  protected readonly whole = computed(() => section(comparingUnit(this.catalogue()), this.catalogue(), { system: 'metric' }));
  private readonly pictures = makingPictures();
  protected readonly steps = makingSteps.map((step) => ({ ...step, drawing: this.pictures[step.picture] }));

  protected readonly fog = computed(() => {
    const { u } = heatAndLight(comparingUnit(this.catalogue()), this.catalogue());
    const face = winter.outside + u * (winter.inside - winter.outside) * beforeSurface2;
    const fogsFrom = saturationPressure(face) / saturationPressure(20);
    return { face: decimals(face, 1), from: percentText(fogsFrom), drawing: drawDewPoint(face, fogsFrom) };
  });
  protected readonly dry = `${decimals(dewPoint(20, 0.01), 0)} °C`;

  protected readonly heights = [500, 1000, 1500, 2000].map((metres) => {
    const pressure = standardPressure(metres) / 1000;
    return {
      metres,
      feet: Math.round(metres / 0.3048 / 10) * 10,
      pressure: decimals(pressure, 1),
      push: decimals(standardPressure(0) / 1000 - pressure, 1),
    };
  });
}
