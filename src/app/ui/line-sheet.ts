import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { type PricedLine } from '@shared/contracts/prices';
import { type Unit } from '@shared/contracts/units';
import { type MeasureSystem } from '@shared/measures/parse-length';

/** An opened line: both drawings of its unit to scale, and its charge sheet row by row. */
@Component({
  selector: 'app-line-sheet',
  imports: [],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: ``,
})
export class LineSheet {
  readonly line = input.required<
    Pick<PricedLine, 'charges' | 'unitPrice' | 'linePrice'> & { unit: Unit; quantity: number; tag: string | null }
  >();
  readonly priceList = input.required<{ name: string; effectiveFrom: string }>();
  readonly system = input.required<MeasureSystem>();
}
