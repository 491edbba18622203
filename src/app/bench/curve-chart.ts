import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { resolveUnit } from '@shared/glazing/resolve-unit';
import { uCurve } from '@shared/glazing/u-curve';
import { plotCurve } from './plot-curve';
import { UnitDraft } from './unit-draft';

/** U-value against the width of a cavity, for the gas chosen, with the width that the unit has. */
@Component({
  selector: 'app-curve-chart',
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './curve-chart.html',
  styleUrls: ['./curve-chart.scss', './quiet.scss'],
})
export class CurveChart {
  protected readonly draft = inject(UnitDraft);
  private readonly wanted = signal(0);
  protected readonly cavities = computed(() => this.draft.shown().cavities.map((_, i) => i));
  protected readonly cavity = computed(() => Math.min(this.wanted(), this.cavities().length - 1));

  private readonly resolved = computed(() => {
    const found = resolveUnit(this.draft.shown(), this.draft.catalogue());
    return 'resolved' in found ? found.resolved : null;
  });
  private readonly points = computed(() => {
    const unit = this.resolved();
    return unit ? uCurve(unit, this.cavity()) : [];
  });
  private readonly own = computed(() => this.resolved()?.cavities[this.cavity()]);
  private readonly ownPoint = computed(() => {
    const unit = this.resolved();
    const own = this.own();
    return unit && own ? uCurve(unit, this.cavity(), [own.widthMm])[0] : undefined;
  });

  /** The best of the widths that the spacer comes in, where it is better than the unit's own by what one can read. */
  protected readonly better = computed(() => {
    const unit = this.resolved();
    const own = this.own();
    const at = this.ownPoint();
    if (!unit || !own || !at) return null;
    const offered = uCurve(unit, this.cavity(), own.spacer.widthsMm.map(Number));
    const best = offered.reduce((least, point) => (point.u < least.u - 1e-9 ? point : least), at);
    return at.u - best.u >= 0.005 ? { widthMm: best.widthMm, u: best.u.toFixed(2) } : null;
  });

  protected readonly gas = computed(() => this.own()?.gas.name ?? '');
  protected readonly title = computed(() => {
    const which = this.cavities().length > 1 ? `width of cavity ${this.cavity() + 1}` : 'cavity width';
    return `U-value against ${which}, ${this.gas()}`;
  });
  protected readonly plot = computed(() => plotCurve(this.points(), this.ownPoint() ?? null));
  protected readonly text = computed(() => {
    const points = this.points();
    const own = this.ownPoint();
    const [first, last] = [points[0], points.at(-1)];
    if (!first || !last || !own) return '';
    const least = points.reduce((a, b) => (b.u < a.u ? b : a));
    const say = ({ widthMm, u }: { widthMm: number; u: number }) => `${u.toFixed(2)} at ${widthMm} mm`;
    return `${this.title()}, W/m²K by EN 673: ${say(first)}, lowest ${say(least)}, ${say(last)}; this unit ${say(own)}.`;
  });

  protected choose(index: number): void {
    this.wanted.set(index);
  }

  protected take(widthMm: number): void {
    this.draft.chooseCavity(this.cavity(), { width: String(widthMm) });
  }
}
