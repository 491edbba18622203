import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { readTrialBalance } from '@shared/contracts/receivables';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';
import { DayPipe } from '../ui/date-pipes';
import { filterAddress } from '../ui/filter-address';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';

/** Debits and credits of every account up to a day; the difference is said, and is zero. */
@Component({
  selector: 'app-trial-balance-page',
  imports: [MatFormFieldModule, MatInput, DayPipe, MoneyPipe, ProblemNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="sy-page">
      <div class="sy-head">
        <h1>Trial balance</h1>
        <mat-form-field appearance="outline" subscriptSizing="dynamic">
          <mat-label>Up to and with</mat-label>
          <input matInput type="date" [value]="at() || (balance.value()?.at ?? '')" (change)="filter({ at: valueOf($event) })" />
        </mat-form-field>
      </div>
      @if (balance.problem(); as problem) {
        <app-problem-note [problem]="problem" (retry)="balance.reload()" />
      }
      @if (balance.value(); as it) {
        <p class="sy-soft" role="status">
          As at {{ it.at | day }}. Debits less credits: <b [class.sy-over]="!isZero(it.difference.amount)">{{ it.difference | money }}</b>
        </p>
        <div class="sy-table" tabindex="0" role="region" aria-label="Trial balance">
          <table class="plain">
            <thead>
              <tr>
                <th scope="col">Account</th>
                <th scope="col" class="sy-number">Debit</th>
                <th scope="col" class="sy-number">Credit</th>
              </tr>
            </thead>
            <tbody>
              @for (row of it.rows; track row.account) {
                <tr>
                  <td>{{ row.account }}</td>
                  <td class="sy-number">{{ isZero(row.debit.amount) ? '' : (row.debit | money: 'bare') }}</td>
                  <td class="sy-number">{{ isZero(row.credit.amount) ? '' : (row.credit | money: 'bare') }}</td>
                </tr>
              }
            </tbody>
            <tfoot>
              <tr class="sum">
                <td>Sum</td>
                <td class="sy-number">{{ it.totals.debit | money }}</td>
                <td class="sy-number">{{ it.totals.credit | money }}</td>
              </tr>
            </tfoot>
          </table>
        </div>
      } @else if (balance.loading()) {
        <span class="sy-waiting tall" aria-hidden="true"></span>
      }
    </div>
  `,
  styles: `
    p {
      margin-bottom: 10px;
    }
  `,
  styleUrl: './tables.scss',
})
export class TrialBalancePage {
  readonly at = input('', { transform: (value: string | undefined) => (/^\d{4}-\d{2}-\d{2}$/.test(value ?? '') ? value! : '') });
  private readonly api = inject(ApiClient);
  protected readonly filter = filterAddress();
  protected readonly balance = loaded(
    computed(() => (this.at() ? { at: this.at() } : {})),
    (query) => this.api.call(readTrialBalance, { query }),
  );
  protected readonly isZero = (amount: string) => !/[1-9]/.test(amount);
  protected readonly valueOf = (event: Event): string => (event.target as HTMLInputElement).value;
}
