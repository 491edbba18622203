import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal, untracked } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import { Router } from '@angular/router';
import { firstValueFrom } from 'rxjs';
import { type InvoiceItem, listInvoices, recordReceipt } from '@shared/contracts/receivables';
import { listTradeAccounts } from '@shared/contracts/trade-accounts';
import { dayIn } from '@shared/calendar/days';
import { amountOf, money } from '@shared/money/money';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';
import { ProblemError } from '../api-client/problem-error';
import { Session } from '../session/session';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { fillOldest, sumShares, type TypedShare } from './shares';
import { ShareTable } from './share-table';

/** Records a bank transfer: who paid, when, how much, and which invoices it is for. What is left over stays unapplied. */
@Component({
  selector: 'app-record-receipt-page',
  imports: [ReactiveFormsModule, MatFormFieldModule, MatInput, MatSelectModule, MatButton, MoneyPipe, ProblemNote, ShareTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './record-receipt-page.html',
  styleUrl: './record-receipt-page.scss',
})
export class RecordReceiptPage {
  readonly account = input<string>();
  readonly invoice = input<string>();
  private readonly api = inject(ApiClient);
  private readonly router = inject(Router);
  private readonly today = dayIn(inject(Session).user()?.company.timeZone ?? 'UTC', Date.now());
  /** one key an attempt: pressing again after a lost answer records nothing twice */
  private key = crypto.randomUUID();

  protected readonly form = inject(NonNullableFormBuilder).group({
    tradeAccount: ['', Validators.required],
    receivedOn: [this.today, Validators.required],
    amount: ['', [Validators.required, Validators.pattern(/^\s*\d{1,12}(\.\d{1,3})?\s*$/)]],
    payerReference: ['', [Validators.required, Validators.maxLength(140)]],
  });
  private readonly typedForm = toSignal(this.form.valueChanges, { initialValue: this.form.getRawValue() });
  protected readonly accounts = loaded(signal({ limit: 200 }), (query) => this.api.call(listTradeAccounts, { query }));
  protected readonly chosen = computed(() => this.accounts.value()?.items.find(({ id }) => id === this.typedForm().tradeAccount));
  protected readonly open = loaded(
    computed(() => this.chosen()?.id),
    (tradeAccount) => this.api.call(listInvoices, { query: { tradeAccount, state: 'open', limit: 200 } }),
  );
  protected readonly shares = signal<ReadonlyMap<string, TypedShare>>(new Map());
  protected readonly sum = computed(() =>
    sumShares(this.typedForm().amount ?? '', [...this.shares().values()], this.open.value()?.items ?? [], this.chosen()?.currency ?? 'USD'),
  );
  protected readonly inMoney = (minor: number) => money(minor, this.chosen()?.currency ?? 'USD');
  protected readonly busy = signal(false);
  protected readonly problem = signal<ProblemError | null>(null);

  constructor() {
    effect(() => {
      const account = this.account();
      if (account && this.accounts.value()) untracked(() => this.form.controls.tradeAccount.setValue(account));
    });
    effect(() => {
      const invoice = this.open.value()?.items.find(({ id }) => id === this.invoice());
      if (invoice) untracked(() => this.prefill(invoice));
    });
    this.form.controls.tradeAccount.valueChanges.subscribe(() => this.shares.set(new Map()));
  }

  private prefill(invoice: InvoiceItem): void {
    if (this.shares().size > 0 || this.form.controls.amount.dirty) return;
    this.form.patchValue({ amount: invoice.open.amount, payerReference: invoice.reference });
    this.applyWhole(invoice);
  }

  protected put(share: TypedShare): void {
    this.shares.update((shares) => new Map(shares).set(share.invoice, share));
  }

  protected applyWhole(invoice: InvoiceItem): void {
    this.put({ invoice: invoice.id, amount: invoice.open.amount, discount: '' });
  }

  protected applyOldest(): void {
    const currency = this.chosen()?.currency ?? 'USD';
    const filled = fillOldest(this.sum().receivedMinor ?? 0, this.open.value()?.items ?? [], currency);
    this.shares.set(
      new Map([...filled].map(([invoice, minor]) => [invoice, { invoice, amount: amountOf(minor, currency), discount: '' }])),
    );
  }

  protected async record(): Promise<void> {
    this.form.markAllAsTouched();
    const { unappliedMinor, wrong } = this.sum();
    if (this.form.invalid || this.busy() || wrong.size > 0 || unappliedMinor === null || unappliedMinor < 0) return;
    const typed = this.form.getRawValue();
    this.busy.set(true);
    this.problem.set(null);
    try {
      const allocations = [...this.shares().values()]
        .filter(({ amount }) => /[1-9]/.test(amount))
        .map(({ invoice, amount, discount }) => ({
          invoice,
          amount: amount.trim(),
          ...(/[1-9]/.test(discount) ? { discount: discount.trim() } : {}),
        }));
      const body = { ...typed, amount: typed.amount.trim(), payerReference: typed.payerReference.trim(), allocations };
      const receipt = await firstValueFrom(this.api.call(recordReceipt, { body, idempotencyKey: this.key }));
      await this.router.navigate(['/receivables/receipts', receipt.id]);
    } catch (error) {
      const problem = ProblemError.from(error);
      this.problem.set(problem);
      // A refusal recorded nothing; what is sent next is another request.
      if (problem.status >= 400 && problem.status < 500) this.key = crypto.randomUUID();
    } finally {
      this.busy.set(false);
    }
  }
}
