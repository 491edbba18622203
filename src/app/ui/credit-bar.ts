import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { type Credit } from '@shared/contracts/trade-accounts';
import { type Money } from '@shared/money/money';
import { creditShares } from './credit-shares';
import { Icon } from './icon';
import { MoneyPipe } from './money-pipe';

/**
 * How much of a credit limit is used, reserved by orders and free, as a bar and in figures;
 * a hold and what is overdue are said plainly. `adding` shows what one more order would take.
 */
@Component({
  selector: 'app-credit-bar',
  imports: [Icon, MoneyPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="bar" aria-hidden="true">
      <i class="used" [style.width.%]="shares().share.used"></i><i class="reserved" [style.width.%]="shares().share.reserved"></i
      ><i class="adding" [style.width.%]="shares().share.adding"></i>
    </div>
    <ul>
      <li><i class="used" aria-hidden="true"></i>{{ shares().used | money }} used</li>
      <li><i class="reserved" aria-hidden="true"></i>{{ shares().reserved | money }} on order</li>
      @if (adding(); as more) {
        <li><i class="adding" aria-hidden="true"></i>{{ more | money }} this order</li>
      }
      @if (shares().over) {
        <li class="sy-over"><app-icon name="warning" /> {{ over() | money }} over the limit</li>
      } @else {
        <li>
          <i class="free" aria-hidden="true"></i><b>{{ shares().free | money }} free</b>
        </li>
      }
      <li class="limit">of {{ credit().limit | money }}</li>
    </ul>
    @if (credit().onHold) {
      <p class="sy-over"><app-icon name="pause" /> On hold: the maker takes no orders on account until it lifts the hold.</p>
    }
    @if (isOverdue()) {
      <p class="sy-over"><app-icon name="warning" /> {{ credit().overdue | money }} overdue</p>
    }
  `,
  styles: `
    .bar {
      display: flex;
      height: 8px;
      border-radius: 4px;
      overflow: hidden;
      background: var(--sy-tint);
      box-shadow: inset 0 0 0 1px var(--sy-line);
      margin: 6px 0;
    }
    .used {
      background: var(--sy-glass-edge);
    }
    .reserved {
      background: var(--sy-bead);
    }
    .adding {
      background: var(--sy-copper);
    }
    ul {
      display: flex;
      flex-wrap: wrap;
      gap: 2px 16px;
      margin: 0;
      padding: 0;
      list-style: none;
      font-size: 13px;
      color: var(--sy-soft);
    }
    li i {
      display: inline-block;
      width: 9px;
      height: 9px;
      border-radius: 2px;
      margin-right: 6px;
    }
    li .free {
      background: var(--sy-tint);
      box-shadow: inset 0 0 0 1px var(--sy-edge);
    }
    b {
      color: var(--sy-ink);
    }
    p {
      margin-top: 4px;
      font-size: 13px;
    }
    @media print {
      .bar i {
        print-color-adjust: exact;
      }
    }
  `,
})
export class CreditBar {
  readonly credit = input.required<Credit>();
  readonly adding = input<Money>();
  protected readonly shares = computed(() => creditShares(this.credit(), this.adding()));
  protected readonly over = computed<Money>(() => {
    const { amount, currency } = this.shares().free;
    return { amount: amount.replace(/^-/, ''), currency };
  });
  protected readonly isOverdue = computed(() => /[1-9]/.test(this.credit().overdue.amount));
}
