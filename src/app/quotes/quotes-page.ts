import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatTableModule } from '@angular/material/table';
import { RouterLink } from '@angular/router';
import { listQuotes, quoteState } from '@shared/contracts/quotes';
import { ApiClient } from '../api-client/api-client';
import { pagedList } from '../api-client/paged-list';
import { DayPipe } from '../ui/date-pipes';
import { filterAddress } from '../ui/filter-address';
import { Icon } from '../ui/icon';
import { ListFooter } from '../ui/list-footer';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { SearchField } from '../ui/search-field';
import { StateMark } from '../ui/state-mark';

/** The dealer's quotes; search and state stand in the address. */
@Component({
  selector: 'app-quotes-page',
  imports: [
    MatButton,
    MatFormFieldModule,
    MatInput,
    MatTableModule,
    RouterLink,
    DayPipe,
    Icon,
    ListFooter,
    MoneyPipe,
    ProblemNote,
    SearchField,
    StateMark,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './quotes-page.html',
  styleUrls: ['../ui/work-table.scss', './quotes-page.scss'],
})
export class QuotesPage {
  readonly q = input<string>();
  readonly state = input<string>();
  private readonly api = inject(ApiClient);
  protected readonly filter = filterAddress();
  protected readonly states = quoteState.options;
  protected readonly columns = ['number', 'customer', 'maker', 'units', 'total', 'validUntil', 'state'];

  /** A state in the address that is none is left out, rather than refused. */
  protected readonly chosen = computed(() => quoteState.safeParse(this.state()).data);
  protected readonly filtered = computed(() => !!this.q() || this.chosen() !== undefined);
  protected readonly list = pagedList(
    computed(() => ({ q: this.q(), state: this.chosen() })),
    (query) => this.api.call(listQuotes, { query }),
  );
}
