import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal, untracked } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Router, RouterLink } from '@angular/router';
import { termsText } from '@shared/calendar/terms';
import { moneySchema } from '@shared/contracts/primitives';
import { listAddresses, listTradeAccounts, readCredit } from '@shared/contracts/trade-accounts';
import { type Money } from '@shared/money/money';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';
import { type ProblemError } from '../api-client/problem-error';
import { CreditBar } from '../ui/credit-bar';
import { DayPipe } from '../ui/date-pipes';
import { showAtFields } from '../ui/field-problems';
import { Icon } from '../ui/icon';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { ReadableDaysPipe } from '../ui/readable-days-pipe';
import { TotalsTable } from '../ui/totals-table';
import { OrderDesk } from './order-desk';
import { QuoteDesk } from './quote-desk';

/** Refusals that the maker may lift after a look at the account. */
const reviewable = ['over-credit', 'account-on-hold', 'overdue'];

/** From a quote to an order: where to, under which number, by when, and what it does to the credit. */
@Component({
  selector: 'app-place-order-page',
  imports: [
    ReactiveFormsModule,
    MatButton,
    MatFormFieldModule,
    MatInput,
    RouterLink,
    CreditBar,
    DayPipe,
    Icon,
    MoneyPipe,
    ProblemNote,
    ReadableDaysPipe,
    TotalsTable,
  ],
  providers: [QuoteDesk, OrderDesk, DayPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './place-order-page.html',
  styleUrl: './place-order-page.scss',
})
export class PlaceOrderPage {
  readonly id = input.required<string>();
  private readonly api = inject(ApiClient);
  private readonly router = inject(Router);
  protected readonly quotes = inject(QuoteDesk);
  protected readonly orders = inject(OrderDesk);
  protected readonly quote = this.quotes.quote;

  protected readonly form = inject(NonNullableFormBuilder).group({
    poNumber: ['', [Validators.required, Validators.pattern(/\S/), Validators.maxLength(60)]],
    shipTo: ['', [Validators.required]],
    requiredOn: [''],
  });
  private readonly shipTo = toSignal(this.form.controls.shipTo.valueChanges, { initialValue: '' });
  protected readonly addresses = loaded(signal(true), () => this.api.call(listAddresses, { query: { limit: 200 } }));
  private readonly accounts = loaded(signal(true), () => this.api.call(listTradeAccounts, { query: { limit: 200 } }));
  protected readonly credit = loaded(
    computed(() => this.quote()?.tradeAccount),
    (id) => this.api.call(readCredit, { params: { id } }),
  );
  protected readonly account = computed(() => this.accounts.value()?.items.find(({ id }) => id === this.quote()?.tradeAccount));
  protected readonly terms = computed(() => {
    const account = this.account();
    return account ? termsText(account.terms) : '';
  });
  protected readonly address = computed(() => this.addresses.value()?.items.find(({ id }) => id === this.shipTo()));
  /** Totals on the screen are for the address on the screen. */
  protected readonly priced = computed(() => !this.quotes.saving() && this.quote()?.shipTo === this.shipTo());
  protected readonly shipToProblem = signal<ProblemError | null>(null);
  /** The maker's calendar decides; its answer to a day that does not do is the newest. */
  private readonly refusedUntil = signal('');
  protected readonly earliest = computed(() => this.refusedUntil() || (this.quote()?.earliestOn ?? ''));

  protected readonly changedPrice = computed(() => {
    const problem = this.orders.problem();
    return problem?.code === 'price-changed' ? { shown: moneyOf(problem, 'shown'), now: moneyOf(problem, 'now') } : null;
  });
  protected readonly shortage = computed(() => {
    const problem = this.orders.problem();
    if (!problem || !reviewable.includes(problem.code)) return null;
    return { code: problem.code, by: moneyOf(problem, 'shortBy'), available: moneyOf(problem, 'available') };
  });
  /** What is left to say when no field and no other box says it. */
  protected readonly otherProblem = signal<ProblemError | null>(null);

  constructor() {
    effect(() => this.quotes.use(this.id()));
    effect(() => this.takeFirstAddress());
    effect(() => {
      const problem = this.orders.problem();
      untracked(() => this.showProblem(problem));
    });
    effect(() => {
      const order = this.orders.placed();
      if (order) void this.router.navigate(['/orders', order.id], { replaceUrl: true, state: { placed: true } });
    });
  }

  /** Delivery and tax follow from the address, so the quote takes it and answers with its totals. */
  protected async priceFor(shipTo: string): Promise<void> {
    this.shipToProblem.set(await this.quotes.saveDetails({ shipTo }));
  }

  /** @param review ask the maker's clerk where credit does not reach  @param accepted another total than the quote's */
  protected place({ review = false, accepted }: { review?: boolean; accepted?: string | undefined } = {}): void {
    this.form.markAllAsTouched();
    const quote = this.quote();
    const { poNumber, shipTo, requiredOn } = this.form.getRawValue();
    if (!quote || poNumber.trim() === '' || shipTo === '' || !this.priced()) return;
    this.orders.place(quote.id, {
      poNumber: poNumber.trim(),
      shipTo,
      payment: 'account',
      accepted: accepted ?? quote.total.amount,
      ...(requiredOn === '' ? {} : { requiredOn }),
      ...(review ? { review } : {}),
    });
  }

  private takeFirstAddress(): void {
    const quote = this.quote();
    const addresses = this.addresses.value()?.items;
    const first = addresses?.find(({ id }) => id === quote?.shipTo) ?? addresses?.[0];
    if (!quote || !first || this.form.controls.shipTo.value !== '') return;
    this.form.controls.shipTo.setValue(first.id);
    if (quote.shipTo !== first.id && quote.state === 'open') untracked(() => void this.priceFor(first.id));
  }

  private showProblem(problem: ProblemError | null): void {
    const { poNumber, requiredOn, shipTo } = this.form.controls;
    const placed = problem !== null && showAtFields(problem, { '/poNumber': poNumber, '/requiredOn': requiredOn, '/shipTo': shipTo });
    const earliest = problem?.problem['earliest'];
    if (typeof earliest === 'string') this.refusedUntil.set(earliest);
    const shownElsewhere = problem !== null && (placed || problem.code === 'price-changed' || reviewable.includes(problem.code));
    this.otherProblem.set(shownElsewhere ? null : problem);
  }
}

/** A member of a problem that is money. */
function moneyOf({ problem }: ProblemError, member: string): Money | null {
  return moneySchema.safeParse(problem[member]).data ?? null;
}
