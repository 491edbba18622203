import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { RouterLink } from '@angular/router';
import { firstValueFrom } from 'rxjs';
import { readInvoice, reverseAllocation } from '@shared/contracts/receivables';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';
import { ProblemError } from '../api-client/problem-error';
import { Asker } from '../ui/asker';
import { DayPipe } from '../ui/date-pipes';
import { Icon } from '../ui/icon';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { StateMark } from '../ui/state-mark';
import { type Allocation, AllocationList } from './allocation-list';
import { EntryList } from './entry-list';

/** One invoice as the clerk sees it: what it is for, what was paid, and what was posted. */
@Component({
  selector: 'app-invoice-page',
  imports: [RouterLink, DayPipe, MoneyPipe, Icon, ProblemNote, StateMark, AllocationList, EntryList],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './invoice-page.html',
  styleUrl: './tables.scss',
})
export class InvoicePage {
  readonly id = input.required<string>();
  private readonly api = inject(ApiClient);
  private readonly asker = inject(Asker);
  protected readonly invoice = loaded(this.id, (id) => this.api.call(readInvoice, { params: { id } }));
  protected readonly problem = signal<ProblemError | null>(null);
  protected readonly isOpen = computed(() => this.invoice.value()?.state === 'open');

  protected async takeBack(allocation: Allocation): Promise<void> {
    const reason = await this.asker.reason({
      title: `Take ${allocation.amount.amount} back from ${allocation.invoice.number}?`,
      text: 'A reversing entry is posted; the money becomes unapplied cash of the receipt again. The reason is kept.',
      confirm: 'Take back',
    });
    if (!reason) return;
    this.problem.set(null);
    try {
      await firstValueFrom(this.api.call(reverseAllocation, { params: { id: allocation.id }, body: { reason } }));
      this.invoice.reload();
    } catch (error) {
      this.problem.set(ProblemError.from(error));
    }
  }
}
