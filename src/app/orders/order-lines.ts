import { ChangeDetectionStrategy, Component, computed, inject, input, model } from '@angular/core';
import { MatTableModule } from '@angular/material/table';
import { type Order, type OrderLine } from '@shared/contracts/orders';
import { Session } from '../session/session';
import { Icon } from '../ui/icon';
import { LineSheet } from '../ui/line-sheet';
import { MoneyPipe } from '../ui/money-pipe';
import { SizePipe } from '../ui/size-pipe';
import { UnitThumb } from '../ui/unit-thumb';

/** The lines of an order, each of which opens to its drawings and charge sheet. */
@Component({
  selector: 'app-order-lines',
  imports: [MatTableModule, Icon, LineSheet, MoneyPipe, SizePipe, UnitThumb],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './order-lines.html',
  styleUrls: ['../ui/work-table.scss', './order-lines.scss'],
})
export class OrderLines {
  readonly order = input.required<Order>();
  /** the line that is open; in the address */
  readonly opened = model<string>();
  protected readonly system = inject(Session).user()?.company.measureSystem ?? 'metric';
  protected readonly columns = ['drawing', 'tag', 'size', 'makeUp', 'quantity', 'unitPrice', 'linePrice', 'expand'];
  protected readonly rows = computed(() => this.order().lines.map((line, i) => ({ line, name: line.tag ?? `line ${i + 1}` })));
  protected readonly isOpen = (_: number, { line }: { line: OrderLine }) => line.id === this.opened();

  protected toggle({ id }: OrderLine): void {
    this.opened.update((open) => (open === id ? undefined : id));
  }
}
