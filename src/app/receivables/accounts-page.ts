import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { RouterLink } from '@angular/router';
import { listTradeAccounts } from '@shared/contracts/trade-accounts';
import { termsText } from '@shared/calendar/terms';
import { ApiClient } from '../api-client/api-client';
import { pagedList } from '../api-client/paged-list';
import { ListFooter } from '../ui/list-footer';
import { ProblemNote } from '../ui/problem-note';
import { StateMark } from '../ui/state-mark';

/** The dealers who buy on account. */
@Component({
  selector: 'app-accounts-page',
  imports: [RouterLink, ListFooter, ProblemNote, StateMark],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="sy-page">
      <div class="sy-head"><h1>Trade accounts</h1></div>
      @if (accounts.problem(); as problem) {
        <app-problem-note [problem]="problem" (retry)="accounts.reload()" />
      }
      @if (accounts.items().length > 0) {
        <div class="sy-table" tabindex="0" role="region" aria-label="Trade accounts">
          <table class="plain">
            <thead>
              <tr>
                <th scope="col">Dealer</th>
                <th scope="col">State</th>
                <th scope="col" class="wide">Tier</th>
                <th scope="col">Terms</th>
                <th scope="col" class="wide">Counts against the limit</th>
                <th scope="col" class="wide">Currency</th>
              </tr>
            </thead>
            <tbody>
              @for (account of accounts.items(); track account.id) {
                <tr>
                  <td>
                    <a [routerLink]="['/receivables/accounts', account.id]">{{ account.dealer.name }}</a>
                  </td>
                  <td>
                    @if (account.onHold) {
                      <app-state-mark state="on hold" />
                    } @else {
                      {{ account.state }}
                    }
                  </td>
                  <td class="wide">{{ account.tier }}</td>
                  <td>{{ termsText(account.terms) }}</td>
                  <td class="wide">from {{ account.countsFrom }}</td>
                  <td class="wide">{{ account.currency }}</td>
                </tr>
              }
            </tbody>
          </table>
        </div>
      } @else if (accounts.loading()) {
        <span class="sy-waiting tall" aria-hidden="true"></span>
      } @else if (!accounts.problem()) {
        <p class="sy-card">No dealer holds an account with you yet.</p>
      }
      <app-list-footer
        noun="trade account"
        [shown]="accounts.items().length"
        [hasMore]="accounts.hasMore()"
        [loading]="accounts.loading()"
        (more)="accounts.more()"
      />
    </div>
  `,
  styleUrl: './tables.scss',
})
export class AccountsPage {
  private readonly api = inject(ApiClient);
  protected readonly accounts = pagedList(signal({ limit: 100 }), (query) => this.api.call(listTradeAccounts, { query }));
  protected readonly termsText = termsText;
}
