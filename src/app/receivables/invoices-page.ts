import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { MatTableModule } from '@angular/material/table';
import { RouterLink } from '@angular/router';
import { listInvoices } from '@shared/contracts/receivables';
import { ApiClient } from '../api-client/api-client';
import { pagedList } from '../api-client/paged-list';
import { DayPipe } from '../ui/date-pipes';
import { filterAddress } from '../ui/filter-address';
import { ListFooter } from '../ui/list-footer';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { SearchField } from '../ui/search-field';
import { StateMark } from '../ui/state-mark';

type Shown = 'open' | 'paid' | 'all';

/** The fabricator's invoices by due date; filters stand in the address. */
@Component({
  selector: 'app-invoices-page',
  imports: [MatTableModule, MatButtonToggleModule, RouterLink, DayPipe, MoneyPipe, ListFooter, ProblemNote, SearchField, StateMark],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './invoices-page.html',
  styleUrl: './tables.scss',
})
export class InvoicesPage {
  readonly state = input<Shown, string | undefined>('open', {
    transform: (value) => (value === 'paid' || value === 'all' ? value : 'open'),
  });
  readonly q = input('', { transform: (value: string | undefined) => value ?? '' });
  private readonly api = inject(ApiClient);
  protected readonly filter = filterAddress();
  protected readonly columns = ['number', 'dealer', 'issued', 'due', 'state', 'total', 'open'];
  private readonly query = computed(() => {
    const state = this.state();
    return { limit: 50, ...(state === 'all' ? {} : { state }), ...(this.q() ? { q: this.q() } : {}) };
  });
  protected readonly invoices = pagedList(this.query, (query) => this.api.call(listInvoices, { query }));
}
