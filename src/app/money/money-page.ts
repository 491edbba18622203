import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatTableModule } from '@angular/material/table';
import { RouterLink } from '@angular/router';
import { dayIn } from '@shared/calendar/days';
import { termsText } from '@shared/calendar/terms';
import { type InvoiceItem, listInvoices } from '@shared/contracts/receivables';
import { ApiClient } from '../api-client/api-client';
import { pagedList } from '../api-client/paged-list';
import { Session } from '../session/session';
import { CreditBar } from '../ui/credit-bar';
import { DayPipe } from '../ui/date-pipes';
import { filterAddress } from '../ui/filter-address';
import { ListFooter } from '../ui/list-footer';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { SearchField } from '../ui/search-field';
import { StateMark } from '../ui/state-mark';
import { earlyPaymentOf } from './early-payment';
import { OwnCredit } from './own-credit';

/** Where the dealer stands with each maker, and the invoices, those due first at the top. */
@Component({
  selector: 'app-money-page',
  imports: [MatButton, MatTableModule, RouterLink, CreditBar, DayPipe, ListFooter, MoneyPipe, ProblemNote, SearchField, StateMark],
  providers: [OwnCredit],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './money-page.html',
  styleUrls: ['../ui/work-table.scss', './money-page.scss'],
})
export class MoneyPage {
  readonly q = input<string>();
  /** `open` where the address says nothing */
  readonly state = input<string>();
  /** a trade account, to see its invoices alone */
  readonly account = input<string>();
  private readonly api = inject(ApiClient);
  private readonly session = inject(Session);
  protected readonly own = inject(OwnCredit);
  protected readonly filter = filterAddress();
  protected readonly columns = ['due', 'number', 'maker', 'issued', 'total', 'open', 'state'];
  protected readonly seesMovements = this.session.may('trade-accounts.movements');
  private readonly today = dayIn(this.session.user()?.company.timeZone ?? 'UTC', Date.now());
  protected readonly termsText = termsText;

  protected readonly chosen = computed(() => (['paid', 'any'] as const).find((state) => state === this.state()) ?? 'open');
  protected readonly onlyOf = computed(() => this.own.accounts()?.find(({ account }) => account.id === this.account())?.account);
  protected readonly list = pagedList(
    computed(() => {
      const chosen = this.chosen();
      const state: InvoiceItem['state'] | undefined = chosen === 'any' ? undefined : chosen;
      return { q: this.q(), state, tradeAccount: this.account() };
    }),
    (query) => this.api.call(listInvoices, { query }),
  );

  protected early(invoice: InvoiceItem) {
    const account = this.own.accounts()?.find(({ account }) => account.id === invoice.tradeAccount)?.account;
    return account ? earlyPaymentOf(invoice, account.terms, this.today) : null;
  }

  protected isNothing(amount: string): boolean {
    return !/[1-9]/.test(amount);
  }
}
