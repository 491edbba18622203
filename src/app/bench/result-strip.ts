import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { usual } from '@shared/glazing/condensation';
import { formatArea, formatWeight } from '@shared/measures/format-quantity';
import { otherMeasure } from '@shared/measures/format-length';
import { formatThickness } from './format-thickness';
import { UnitDraft } from './unit-draft';

/** What comes of the unit, in four figures and a sentence; each with its method, in full below. */
@Component({
  selector: 'app-result-strip',
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './result-strip.html',
  styleUrl: './result-strip.scss',
})
export class ResultStrip {
  private readonly draft = inject(UnitDraft);

  protected readonly figures = computed(() => {
    const { thermal, solar, weight, geometry } = this.draft.evaluation();
    const system = this.draft.system();
    const other = otherMeasure(system);
    const mm = geometry.overallThickness * 1000;
    const [weightFigure = '', weightUnit = ''] = formatWeight(weight, system).split(' ');
    const thickness = formatThickness(mm, system);
    return [
      {
        name: `U-value, ${plainName(thermal.method.name)}`,
        value: thermal.uEn673?.toFixed(2) ?? 'none',
        unit: thermal.uEn673 === null ? '' : 'W/m²K',
        below: 'vertical, centre of glass',
      },
      {
        name: `Solar gain, ${plainName(solar.method.name)}`,
        value: solar.g?.toFixed(2) ?? 'none',
        unit: solar.g === null ? '' : 'g',
        below: lightWords(solar.lightTransmittance),
      },
      {
        name: 'Weight, each',
        value: weightFigure,
        unit: weightUnit,
        below: formatWeight(weight, other),
      },
      {
        name: 'Overall thickness',
        value: thickness.value,
        unit: thickness.unit,
        below: `${formatThickness(mm, other).value} ${formatThickness(mm, other).unit}`,
      },
    ];
  });

  protected readonly condensation = computed(() => {
    const { condensation } = this.draft.evaluation();
    if (!condensation.applies || condensation.foggingHumidity === null) return condensation.statement ?? '';
    const { outsideTemperature = usual.outside, insideTemperature = usual.inside } = this.draft.shown().place ?? {};
    const degrees = (celsius: number) => this.degrees(celsius);
    const share = Math.round(Math.min(1, condensation.foggingHumidity) * 100);
    const when = `with ${degrees(outsideTemperature)} outside and ${degrees(insideTemperature)} in the room`;
    const verdict =
      condensation.fogs === null
        ? `the centre fogs from ${share} % humidity`
        : condensation.fogs
          ? `the centre fogs; it stays clear below ${share} % humidity`
          : `the centre stays clear; it would fog from ${share} % humidity`;
    return `Condensation: ${when} ${verdict}. The edge fogs before it.`;
  });

  protected readonly area = computed(() => {
    const { geometry, weight } = this.draft.evaluation();
    const system = this.draft.system();
    const quantity = this.draft.quantity() ?? 1;
    const all = quantity > 1 ? ` All ${quantity} weigh ${formatWeight(weight * quantity, system)}.` : '';
    return `Area ${formatArea(geometry.area, system)} (${formatArea(geometry.area, otherMeasure(system))}).${all}`;
  });

  protected readonly methods = computed(() => {
    const { thermal, solar, condensation } = this.draft.evaluation();
    return [
      { of: 'U-value', ...thermal.method, statement: thermal.statement },
      { of: 'Solar gain and light', ...solar.method, statement: solar.statement },
      { of: 'Condensation', ...condensation.method, statement: condensation.statement },
    ];
  });

  private degrees(celsius: number): string {
    const value = this.draft.system() === 'imperial' ? (celsius * 9) / 5 + 32 : celsius;
    return `${Math.round(value)} ${this.draft.system() === 'imperial' ? '°F' : '°C'}`.replace('-', '−');
  }
}

/** The method without its edition, which the full text names: `EN 673:2011` → `EN 673`. */
function plainName(name: string): string {
  return name.replace(/[:,].*$/, '');
}

function lightWords(light: number | null): string {
  return light === null ? '' : `light ${light.toFixed(2)}`;
}
