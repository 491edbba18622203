import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { type Catalogue } from '@shared/contracts/catalogue';
import { section } from '@shared/drawings/section';
import { evaluateResolved } from '@shared/glazing/evaluate-unit';
import { makeUpText } from '@shared/glazing/make-up-text';
import { Session } from '../session/session';
import { Drawing } from '../ui/drawing/drawing';
import { benchMake, comparingUnit, resolved } from './comparing-unit';
import { decimals } from './facts';
import { sizeWords } from './parts/offer-words';

/** What Sealyard is for, and for whom, on one screen. */
@Component({
  selector: 'app-front-page',
  imports: [RouterLink, Drawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './front-page.html',
  styleUrls: ['./catalogue.scss', './front-page.scss'],
})
export class FrontPage {
  readonly catalogue = input.required<Catalogue>();
  protected readonly session = inject(Session);

  protected readonly shown = computed(() => {
    const catalogue = this.catalogue();
    const unit = comparingUnit(catalogue);
    const { thermal, solar, geometry, weight } = evaluateResolved(resolved(unit, catalogue), { ...catalogue, fabricators: [] });
    return {
      drawing: section(unit, catalogue, { system: 'metric', sheet: { width: 400, height: 318, textSize: 15 } }),
      words: makeUpText(unit, catalogue),
      make: benchMake(unit),
      size: `${unit.width}x${unit.height}mm`,
      results: [
        { name: 'U-value, EN 673', value: decimals(thermal.uEn673 ?? NaN, 2), unit: 'W/m²K' },
        { name: 'Solar gain, EN 410', value: decimals(solar.g ?? NaN, 2), unit: 'g' },
        { name: 'Weight of the unit', value: decimals(weight, 1), unit: 'kg' },
        { name: 'Overall thickness', value: decimals(geometry.overallThickness * 1000, 1), unit: 'mm' },
      ],
    };
  });

  protected readonly makers = computed(() =>
    this.catalogue().fabricators.map(({ id, name, town, about, measureSystem, capabilities }) => ({
      id,
      name,
      town,
      about,
      largest: sizeWords(capabilities.unit.maxLong, capabilities.unit.maxShort, measureSystem),
    })),
  );
}
