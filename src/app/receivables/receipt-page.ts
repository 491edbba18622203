import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { firstValueFrom, type Observable } from 'rxjs';
import {
  applyReceipt,
  listInvoices,
  readReceipt,
  type Receipt,
  reverseAllocation,
  reverseReceipt,
  type InvoiceItem,
} from '@shared/contracts/receivables';
import { amountOf, minorOf } from '@shared/money/money';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';
import { ProblemError } from '../api-client/problem-error';
import { Asker } from '../ui/asker';
import { DayPipe, InstantPipe } from '../ui/date-pipes';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { StateMark } from '../ui/state-mark';
import { type Allocation, AllocationList } from './allocation-list';
import { EntryList } from './entry-list';
import { ShareTable } from './share-table';
import { fillOldest, sumShares, type TypedShare } from './shares';

/** One receipt: where its money went, what is still unapplied, and what was posted. */
@Component({
  selector: 'app-receipt-page',
  imports: [RouterLink, MatButton, DayPipe, InstantPipe, MoneyPipe, ProblemNote, StateMark, AllocationList, EntryList, ShareTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './receipt-page.html',
  styleUrl: './tables.scss',
})
export class ReceiptPage {
  readonly id = input.required<string>();
  private readonly api = inject(ApiClient);
  private readonly asker = inject(Asker);
  /** one key an attempt: pressing again after a lost answer applies nothing twice */
  private key = crypto.randomUUID();
  protected readonly receipt = loaded(this.id, (id) => this.api.call(readReceipt, { params: { id } }));
  protected readonly hasUnapplied = computed(() => /[1-9]/.test(this.receipt.value()?.unapplied.amount ?? '0'));
  protected readonly open = loaded(
    computed(() => (this.hasUnapplied() ? this.receipt.value()?.tradeAccount : undefined)),
    (tradeAccount) => this.api.call(listInvoices, { query: { tradeAccount, state: 'open', limit: 200 } }),
  );
  protected readonly shares = signal<ReadonlyMap<string, TypedShare>>(new Map());
  protected readonly sum = computed(() => {
    const receipt = this.receipt.value();
    return sumShares(
      receipt?.unapplied.amount ?? '',
      [...this.shares().values()],
      this.open.value()?.items ?? [],
      receipt?.amount.currency ?? 'USD',
    );
  });
  protected readonly ready = computed(
    () => this.sum().appliedMinor > 0 && (this.sum().unappliedMinor ?? -1) >= 0 && this.sum().wrong.size === 0,
  );
  protected readonly problem = signal<ProblemError | null>(null);
  protected readonly busy = signal(false);

  protected put(share: TypedShare): void {
    this.shares.update((shares) => new Map(shares).set(share.invoice, share));
  }

  protected applyWhole(receipt: Receipt, invoice: InvoiceItem): void {
    const { currency } = receipt.amount;
    const [minor = 0] = fillOldest(minorOf(receipt.unapplied.amount, currency), [invoice], currency).values();
    this.put({ invoice: invoice.id, amount: amountOf(minor, currency), discount: '' });
  }

  protected async apply(receipt: Receipt): Promise<void> {
    if (!this.ready() || this.busy()) return;
    const allocations = [...this.shares().values()]
      .filter(({ amount }) => /[1-9]/.test(amount))
      .map(({ invoice, amount, discount }) => ({
        invoice,
        amount: amount.trim(),
        ...(/[1-9]/.test(discount) ? { discount: discount.trim() } : {}),
      }));
    await this.change(this.api.call(applyReceipt, { params: { id: receipt.id }, body: { allocations }, idempotencyKey: this.key }));
  }

  protected async takeBack(allocation: Allocation): Promise<void> {
    const reason = await this.asker.reason({
      title: `Take ${allocation.amount.amount} back from ${allocation.invoice.number}?`,
      text: 'A reversing entry is posted; the money becomes unapplied cash of this receipt again. The reason is kept.',
      confirm: 'Take back',
    });
    if (reason) await this.change(this.api.call(reverseAllocation, { params: { id: allocation.id }, body: { reason } }));
  }

  protected async reverse(receipt: Receipt): Promise<void> {
    const reason = await this.asker.reason({
      title: `Reverse receipt ${receipt.number} of ${receipt.amount.amount}?`,
      text: 'What was applied is taken back first; its invoices are open again. The entries stay and are reversed by new ones. The reason is kept.',
      confirm: 'Reverse receipt',
    });
    if (reason) await this.change(this.api.call(reverseReceipt, { params: { id: receipt.id }, body: { reason } }));
  }

  private async change(call: Observable<Receipt>): Promise<void> {
    this.busy.set(true);
    this.problem.set(null);
    try {
      this.receipt.set(await firstValueFrom(call));
      this.shares.set(new Map());
      this.key = crypto.randomUUID();
      this.open.reload();
    } catch (error) {
      const problem = ProblemError.from(error);
      this.problem.set(problem);
      if (problem.status >= 400 && problem.status < 500) this.key = crypto.randomUUID();
    } finally {
      this.busy.set(false);
    }
  }
}
