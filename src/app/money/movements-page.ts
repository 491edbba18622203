import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatTableModule } from '@angular/material/table';
import { RouterLink } from '@angular/router';
import { listMovements } from '@shared/contracts/trade-accounts';
import { type Money } from '@shared/money/money';
import { ApiClient } from '../api-client/api-client';
import { pagedList } from '../api-client/paged-list';
import { CreditBar } from '../ui/credit-bar';
import { DayPipe } from '../ui/date-pipes';
import { Icon } from '../ui/icon';
import { ListFooter } from '../ui/list-footer';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { OwnCredit } from './own-credit';

/** Every movement of one trade account with its balance, the newest first. */
@Component({
  selector: 'app-movements-page',
  imports: [MatTableModule, RouterLink, CreditBar, DayPipe, Icon, ListFooter, MoneyPipe, ProblemNote],
  providers: [OwnCredit],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './movements-page.html',
  styleUrls: ['../ui/work-table.scss', './movements-page.scss'],
})
export class MovementsPage {
  readonly id = input.required<string>();
  private readonly api = inject(ApiClient);
  protected readonly own = inject(OwnCredit);
  protected readonly columns = ['on', 'what', 'debit', 'credit', 'balance'];
  protected readonly account = computed(() => this.own.accounts()?.find(({ account }) => account.id === this.id()));
  protected readonly list = pagedList(
    computed(() => ({ id: this.id() })),
    ({ id, cursor }) => this.api.call(listMovements, { params: { id }, query: { cursor, limit: 100 } }),
  );

  /** An amount, or nothing where it is none: empty cells read easier than columns of zeros. */
  protected shown(amount: Money): Money | null {
    return /[1-9]/.test(amount.amount) ? amount : null;
  }
}
