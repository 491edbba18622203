import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { type z } from 'zod';
import { type allocationSchema } from '@shared/contracts/receivables';
import { DayPipe, InstantPipe } from '../ui/date-pipes';
import { MoneyPipe } from '../ui/money-pipe';
import { StateMark } from '../ui/state-mark';

export type Allocation = z.infer<typeof allocationSchema>;

/** What of which receipt went to which invoice, and by whom; each can be taken back. */
@Component({
  selector: 'app-allocation-list',
  imports: [RouterLink, MatButton, DayPipe, InstantPipe, MoneyPipe, StateMark],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ul>
      @for (allocation of allocations(); track allocation.id) {
        <li class="sy-card">
          <p [class.struck]="allocation.reversedAt">
            <b>{{ allocation.amount | money }}</b>
            @if (hasDiscount(allocation)) {
              and {{ allocation.discount | money }} early-payment discount
            }
            @if (of() === 'receipt') {
              to <a [routerLink]="['/receivables/invoices', allocation.invoice.id]">{{ allocation.invoice.number }}</a>
            } @else {
              of <a [routerLink]="['/receivables/receipts', allocation.receipt.id]">{{ allocation.receipt.number }}</a>, received
              {{ allocation.receipt.receivedOn | day }}
            }
            <small>{{ allocation.at | instant }}, {{ allocation.by }}</small>
          </p>
          @if (allocation.reversedAt) {
            <app-state-mark state="reversed" words="taken back" />
          } @else {
            <button matButton type="button" (click)="takeBack.emit(allocation)">
              Take back<span class="sy-visually-hidden"> {{ allocation.amount | money }} of {{ allocation.receipt.number }}</span>
            </button>
          }
        </li>
      } @empty {
        <li class="sy-soft">{{ of() === 'receipt' ? 'Nothing is applied yet.' : 'Nothing is paid yet.' }}</li>
      }
    </ul>
  `,
  styles: `
    ul {
      display: grid;
      gap: 8px;
      margin: 0;
      padding: 0;
      list-style: none;
    }
    .sy-card {
      display: flex;
      flex-wrap: wrap;
      justify-content: space-between;
      align-items: center;
      gap: 8px 20px;
      padding: 8px 16px;
    }
    small {
      display: block;
      color: var(--sy-soft);
    }
    .struck {
      color: var(--sy-soft);
    }
    .struck b {
      text-decoration: line-through;
    }
  `,
})
export class AllocationList {
  readonly allocations = input.required<Allocation[]>();
  /** whose they are: named from the other end */
  readonly of = input.required<'receipt' | 'invoice'>();
  readonly takeBack = output<Allocation>();
  protected readonly hasDiscount = ({ discount }: Allocation) => /[1-9]/.test(discount.amount);
}
