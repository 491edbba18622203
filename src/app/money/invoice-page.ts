import { ChangeDetectionStrategy, Component, computed, effect, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Title } from '@angular/platform-browser';
import { RouterLink } from '@angular/router';
import { dayIn } from '@shared/calendar/days';
import { readInvoice } from '@shared/contracts/receivables';
import { money, minorOf } from '@shared/money/money';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';
import { Session } from '../session/session';
import { CopyButton } from '../ui/copy-button';
import { DayPipe } from '../ui/date-pipes';
import { Icon } from '../ui/icon';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { StateMark } from '../ui/state-mark';
import { TotalsTable } from '../ui/totals-table';

/** One invoice as the dealer reads it: what was sent, what is open, until when, and how to pay it. */
@Component({
  selector: 'app-invoice-page',
  imports: [MatButton, RouterLink, CopyButton, DayPipe, Icon, MoneyPipe, ProblemNote, StateMark, TotalsTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './invoice-page.html',
  styleUrl: './invoice-page.scss',
})
export class InvoicePage {
  readonly id = input.required<string>();
  private readonly api = inject(ApiClient);
  private readonly title = inject(Title);
  private readonly today = dayIn(inject(Session).user()?.company.timeZone ?? 'UTC', Date.now());
  protected readonly source = loaded(this.id, (id) => this.api.call(readInvoice, { params: { id } }));
  protected readonly invoice = this.source.value;
  protected readonly pdf = computed(() => `/api/invoices/${encodeURIComponent(this.id())}/pdf`);
  protected readonly shownAllocations = computed(() => this.invoice()?.allocations.filter(({ reversedAt }) => reversedAt === null) ?? []);
  /** The early-payment discount, as long as its day is not past and nothing is paid yet. */
  protected readonly early = computed(() => {
    const invoice = this.invoice();
    const discount = invoice?.discount;
    if (!invoice || !discount || invoice.state === 'paid' || discount.until < this.today || invoice.open.amount !== invoice.total.amount)
      return null;
    const { currency } = invoice;
    return { ...discount, pay: money(minorOf(invoice.open.amount, currency) - minorOf(discount.amount.amount, currency), currency) };
  });

  constructor() {
    effect(() => {
      const invoice = this.invoice();
      if (invoice) this.title.setTitle(`Invoice ${invoice.number} · Sealyard`);
    });
  }

  protected isNothing(amount: string): boolean {
    return !/[1-9]/.test(amount);
  }
}
