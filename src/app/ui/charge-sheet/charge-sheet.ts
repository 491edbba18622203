import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { type ChargeRow, type PricedLine } from '@shared/contracts/prices';
import { exact } from '@shared/money/exact';
import { Session } from '../../session/session';
import { Icon } from '../icon';
import { MoneyPipe } from '../money-pipe';
import { ChargeSheetIds } from './charge-sheet-ids';
import { chargeWords, type ListInWords, percentWords } from './charge-words';

/**
 * The charge sheet of one line, row by row: list, what comes off, and what is paid. Each row opens
 * to the sum and the rule behind it. While `stale`, no figure is shown.
 */
@Component({
  selector: 'app-charge-sheet',
  imports: [Icon, MoneyPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './charge-sheet.html',
  styleUrl: './charge-sheet.scss',
})
export class ChargeSheet {
  readonly line = input.required<Pick<PricedLine, 'charges' | 'unitPrice' | 'linePrice'>>();
  readonly quantity = input.required<number>();
  readonly priceList = input<ListInWords | null>(null);
  /** the figures are of an earlier unit; a new price is on its way */
  readonly stale = input(false);

  private readonly session = inject(Session);
  protected readonly id = inject(ChargeSheetIds).next();
  private readonly opened = signal<ReadonlySet<string>>(new Set());

  private readonly reader = computed(() => this.session.user()?.company ?? { locale: 'en-US', timeZone: 'UTC' });
  protected readonly hasDiscounts = computed(() => this.line().charges.some(({ discountPercent }) => !exact(discountPercent).isZero()));
  protected readonly columns = computed(() => (this.hasDiscounts() ? 4 : 3));
  protected readonly currency = computed(() => this.line().unitPrice.currency);
  protected readonly rows = computed(() =>
    this.line().charges.map((row, i) => {
      const key = keyOf(row);
      const open = !this.stale() && this.opened().has(key);
      return {
        ...row,
        key,
        id: `${this.id}-${i}`,
        label: `${row.label.charAt(0).toUpperCase()}${row.label.slice(1)}`,
        off: exact(row.discountPercent).isZero() ? '' : percentWords(exact(row.discountPercent), this.reader()),
        less: row.net.amount.startsWith('-'),
        words: open ? chargeWords(row, this.priceList(), this.reader()) : null,
      };
    }),
  );

  protected toggle(key: string): void {
    this.opened.update((before) => {
      const after = new Set(before);
      if (!after.delete(key)) after.add(key);
      return after;
    });
  }
}

/** A row keeps being open while the figures change, as long as it is charged for the same thing by the same rule. */
function keyOf({ rule, label }: ChargeRow): string {
  return `${rule} ${label}`;
}
