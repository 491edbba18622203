import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatTableModule } from '@angular/material/table';
import { RouterLink } from '@angular/router';
import { dayIn } from '@shared/calendar/days';
import { listOrders, type OrderItem, orderState } from '@shared/contracts/orders';
import { ApiClient } from '../api-client/api-client';
import { pagedList } from '../api-client/paged-list';
import { Session } from '../session/session';
import { DayPipe } from '../ui/date-pipes';
import { filterAddress } from '../ui/filter-address';
import { ListFooter } from '../ui/list-footer';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { SearchField } from '../ui/search-field';
import { StateMark } from '../ui/state-mark';
import { isLate } from './is-late';

/** Orders of one's own company, a dealer's or a fabricator's; search and state stand in the address. */
@Component({
  selector: 'app-orders-page',
  imports: [
    MatButton,
    MatFormFieldModule,
    MatInput,
    MatTableModule,
    RouterLink,
    DayPipe,
    ListFooter,
    MoneyPipe,
    ProblemNote,
    SearchField,
    StateMark,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './orders-page.html',
  styleUrls: ['../ui/work-table.scss', './orders-page.scss'],
})
export class OrdersPage {
  readonly q = input<string>();
  readonly state = input<string>();
  private readonly api = inject(ApiClient);
  private readonly company = inject(Session).user()?.company;
  protected readonly filter = filterAddress();
  protected readonly isDealer = this.company?.kind === 'dealer';
  protected readonly states = orderState.options;
  protected readonly columns = ['number', 'other', 'po', 'units', 'total', 'placed', 'promised', 'state'];
  private readonly timeZone = this.company?.timeZone ?? 'UTC';
  private readonly today = dayIn(this.timeZone, Date.now());

  /** A state in the address that is none is left out, rather than refused. */
  protected readonly chosen = computed(() => orderState.safeParse(this.state()).data);
  protected readonly filtered = computed(() => !!this.q() || this.chosen() !== undefined);
  protected readonly list = pagedList(
    computed(() => ({ q: this.q(), state: this.chosen() })),
    (query) => this.api.call(listOrders, { query }),
  );

  protected placedOn({ placedAt }: OrderItem): string {
    return dayIn(this.timeZone, Date.parse(placedAt));
  }

  protected late(order: OrderItem): boolean {
    return isLate(order, this.today);
  }
}
