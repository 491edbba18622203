import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { type Hint, type PricedLine } from '@shared/contracts/prices';
import { type Unit } from '@shared/contracts/units';
import { elevation } from '@shared/drawings/elevation';
import { section } from '@shared/drawings/section';
import { geometryOf } from '@shared/glazing/geometry';
import { resolveUnit } from '@shared/glazing/resolve-unit';
import { weightOf } from '@shared/glazing/weight';
import { formatArea, formatWeight } from '@shared/measures/format-quantity';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { CurrentCatalogue } from '../api-client/current-catalogue';
import { ChargeSheet } from './charge-sheet/charge-sheet';
import { Drawing } from './drawing/drawing';
import { MoneyPipe } from './money-pipe';
import { ProblemNote } from './problem-note';
import { SizePipe } from './size-pipe';

/** A line of a quote or an order, as far as its sheet shows it. */
type ShownLine = Pick<PricedLine, 'charges' | 'unitPrice' | 'linePrice'> & {
  unit: Unit;
  quantity: number;
  tag: string | null;
  hints?: Hint[];
};

/** An opened line: both drawings of its unit to scale, and its charge sheet row by row. */
@Component({
  selector: 'app-line-sheet',
  imports: [ChargeSheet, Drawing, MoneyPipe, ProblemNote, SizePipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="unit">
      @if (pictures(); as shown) {
        <div class="drawings">
          @for (picture of shown.drawings; track picture.title) {
            <app-drawing [drawing]="picture" />
          }
        </div>
        @if (shown.facts; as facts) {
          <p class="sy-soft sy-small">{{ facts }}</p>
        }
      } @else if (catalogue.problem(); as wrong) {
        <app-problem-note [problem]="wrong" heading="No drawings." (retry)="catalogue.reload()" />
      } @else {
        <span class="sy-waiting" role="status" aria-label="Drawing the unit"></span>
      }
    </div>
    <div class="charges">
      <app-charge-sheet [line]="line()" [quantity]="line().quantity" [priceList]="priceList()" [stale]="stale()" />
      @for (hint of stale() ? [] : (line().hints ?? []); track $index) {
        <p class="hint sy-small">
          @if (hint.kind === 'standard size') {
            <b>{{ hint | size }}</b> is a standard size: saves {{ hint.saves | money }} each.
          } @else {
            <b>{{ hint | size }}</b> is billed one step less: saves {{ hint.saves | money }} each.
          }
          @if (editable()) {
            <button type="button" (click)="resized.emit(hint)">Use this size</button>
          }
        </p>
      }
    </div>
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: minmax(0, 1.25fr) minmax(0, 1fr);
      gap: 12px 32px;
      align-items: start;
      white-space: normal;
    }
    .drawings {
      display: flex;
      gap: 8px;
      max-width: 560px;
    }
    .hint {
      margin-top: 6px;
      color: var(--sy-soft);
    }
    .hint button {
      min-height: 24px;
      padding: 0 2px;
      border: 0;
      background: none;
      color: var(--sy-copper);
      font: inherit;
      font-weight: 700;
      cursor: pointer;
    }
    .hint button:hover {
      text-decoration: underline;
    }
    b {
      color: var(--sy-ink);
    }
    .sy-waiting {
      height: 220px;
    }
    @media (max-width: 900px) {
      :host {
        grid-template-columns: minmax(0, 1fr);
      }
    }
  `,
})
export class LineSheet {
  readonly line = input.required<ShownLine>();
  readonly priceList = input.required<{ name: string; effectiveFrom: string }>();
  readonly system = input.required<MeasureSystem>();
  /** a new price is on its way */
  readonly stale = input(false);
  /** whether the size can be changed here */
  readonly editable = input(false);
  /** a cheaper size was taken */
  readonly resized = output<Hint>();
  protected readonly catalogue = inject(CurrentCatalogue);

  protected readonly pictures = computed(() => {
    const catalogue = this.catalogue.catalogue();
    if (!catalogue) return null;
    const { unit, tag, quantity } = this.line();
    const system = this.system();
    const found = resolveUnit(unit, catalogue);
    // What the catalogue no longer holds cannot be drawn through; its outline still can.
    if ('problems' in found) return { drawings: [elevation(unit, catalogue, { system, tag })], facts: '' };
    const geometry = geometryOf(found.resolved);
    const { weight } = weightOf(found.resolved, geometry);
    const all = quantity > 1 ? `, ${formatWeight(weight * quantity, system)} together` : '';
    return {
      drawings: [elevation(unit, catalogue, { system, tag }), section(unit, catalogue, { system })],
      facts: `${formatArea(geometry.area, system)} each; ${formatWeight(weight, system)} each${all}`,
    };
  });
}
