import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { type Unit } from '@shared/contracts/units';
import { cornersOf, cornersPath, crossing, insetCorners, outlinePath, type Placing, placeX, placeY } from '@shared/drawings/placed-outline';
import { outlineOf } from '@shared/glazing/outline';
import { formatLength } from '@shared/measures/format-length';
import { Session } from '../session/session';

const BOX = 60;
/** A hint of the spacer; too small here to be to scale. */
const EDGE = 2.2;

/** A unit from outside, small, its proportions true: for telling lines apart at a glance. */
@Component({
  selector: 'app-unit-thumb',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <svg [attr.viewBox]="'0 0 ' + box + ' ' + box" role="img" [attr.aria-label]="words()">
      <path class="glass" [attr.d]="shape().outer" />
      <path class="spacer" [attr.d]="shape().inner" />
      @for (bar of shape().bars; track $index) {
        <path class="spacer" [attr.d]="bar" />
      }
    </svg>
  `,
  styles: `
    :host {
      display: block;
      width: 60px;
      height: 60px;
      flex: none;
    }
    svg {
      display: block;
      width: 100%;
      height: 100%;
    }
    .glass {
      fill: var(--sy-glass);
      stroke: var(--sy-ink);
      stroke-width: 1.1;
    }
    .spacer {
      fill: none;
      stroke: var(--sy-metal);
      stroke-width: 1;
    }
  `,
})
export class UnitThumb {
  readonly unit = input.required<Unit>();
  private readonly session = inject(Session);
  protected readonly box = BOX;

  protected readonly words = computed(() => {
    const system = this.session.user()?.company.measureSystem ?? 'metric';
    const { width, height, shape } = this.unit();
    return `${shape.class.replaceAll('-', ' ')}, ${formatLength(width, system)} wide, ${formatLength(height, system)} high`;
  });

  protected readonly shape = computed(() => {
    const unit = this.unit();
    const width = Number(unit.width);
    const height = Number(unit.height);
    const scale = (BOX - 4) / Math.max(width, height);
    const placing: Placing = { x: (BOX - width * scale) / 2, y: (BOX + height * scale) / 2, scale };
    const outline = outlineOf(unit);
    const inner = insetCorners(cornersOf(outline), Math.min(EDGE / scale, width / 4, height / 4));
    const bars: string[] = [];
    for (let i = 1; i <= (unit.grid?.across ?? 0); i++) {
      const at = (width * i) / ((unit.grid?.across ?? 0) + 1);
      const run = crossing(inner, 'x', at);
      if (run) bars.push(`M${placeX(placing, at)} ${placeY(placing, run[0])}V${placeY(placing, run[1])}`);
    }
    for (let i = 1; i <= (unit.grid?.down ?? 0); i++) {
      const at = (height * i) / ((unit.grid?.down ?? 0) + 1);
      const run = crossing(inner, 'y', at);
      if (run) bars.push(`M${placeX(placing, run[0])} ${placeY(placing, at)}H${placeX(placing, run[1])}`);
    }
    return { outer: outlinePath(outline, placing), inner: cornersPath(inner, placing), bars };
  });
}
