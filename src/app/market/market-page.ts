import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatTableModule } from '@angular/material/table';
import { dayIn } from '@shared/calendar/days';
import { companyKind } from '@shared/contracts/session';
import { listCompanies } from '@shared/contracts/trade-accounts';
import { ApiClient } from '../api-client/api-client';
import { pagedList } from '../api-client/paged-list';
import { Session } from '../session/session';
import { DayPipe } from '../ui/date-pipes';
import { filterAddress } from '../ui/filter-address';
import { ListFooter } from '../ui/list-footer';
import { ProblemNote } from '../ui/problem-note';
import { SearchField } from '../ui/search-field';

/** The companies of the market, without any business of theirs. */
@Component({
  selector: 'app-market-page',
  imports: [MatButton, MatFormFieldModule, MatInput, MatTableModule, DayPipe, ListFooter, ProblemNote, SearchField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './market-page.html',
  styleUrls: ['../ui/work-table.scss', './market-page.scss'],
})
export class MarketPage {
  readonly q = input<string>();
  readonly kind = input<string>();
  private readonly api = inject(ApiClient);
  private readonly timeZone = inject(Session).user()?.company.timeZone ?? 'UTC';
  protected readonly filter = filterAddress();
  protected readonly columns = ['name', 'kind', 'town', 'people', 'tradeAccounts', 'since'];
  protected readonly kinds = companyKind.options;
  protected readonly chosen = computed(() => companyKind.safeParse(this.kind()).data);
  protected readonly list = pagedList(signal({ limit: 200 }).asReadonly(), (query) => this.api.call(listCompanies, { query }));
  protected readonly shown = computed(() => {
    const q = (this.q() ?? '').toLowerCase();
    const kind = this.chosen();
    return this.list
      .items()
      .filter((company) => kind === undefined || company.kind === kind)
      .filter(({ name, town }) => q === '' || name.toLowerCase().includes(q) || town.toLowerCase().includes(q));
  });

  protected dayOf(instant: string): string {
    return dayIn(this.timeZone, Date.parse(instant));
  }
}
