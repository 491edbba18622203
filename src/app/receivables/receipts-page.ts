import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { RouterLink } from '@angular/router';
import { listReceipts } from '@shared/contracts/receivables';
import { ApiClient } from '../api-client/api-client';
import { pagedList } from '../api-client/paged-list';
import { DayPipe } from '../ui/date-pipes';
import { filterAddress } from '../ui/filter-address';
import { ListFooter } from '../ui/list-footer';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { StateMark } from '../ui/state-mark';

/** Money received, newest first; what is not applied can be found by itself. */
@Component({
  selector: 'app-receipts-page',
  imports: [RouterLink, MatButtonToggleModule, DayPipe, MoneyPipe, ListFooter, ProblemNote, StateMark],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="sy-page">
      <div class="sy-head">
        <h1>Receipts</h1>
        <a routerLink="/receivables/receipts/new" class="action">Record a receipt</a>
      </div>
      <div class="filters">
        <mat-button-toggle-group
          aria-label="Which receipts"
          hideSingleSelectionIndicator
          [value]="show()"
          (change)="filter({ show: $event.value === 'all' ? '' : $event.value })"
        >
          <mat-button-toggle value="all">All</mat-button-toggle>
          <mat-button-toggle value="unapplied">With unapplied cash</mat-button-toggle>
        </mat-button-toggle-group>
      </div>
      @if (receipts.problem(); as problem) {
        <app-problem-note [problem]="problem" (retry)="receipts.reload()" />
      }
      @if (receipts.items().length > 0) {
        <div class="sy-table" tabindex="0" role="region" aria-label="Receipts">
          <table class="plain">
            <thead>
              <tr>
                <th scope="col">Number</th>
                <th scope="col">Received</th>
                <th scope="col">Dealer</th>
                <th scope="col" class="wide">What the payer wrote</th>
                <th scope="col" class="sy-number">Amount</th>
                <th scope="col" class="sy-number">Unapplied</th>
              </tr>
            </thead>
            <tbody>
              @for (receipt of receipts.items(); track receipt.id) {
                <tr>
                  <td>
                    <a [routerLink]="['/receivables/receipts', receipt.id]">{{ receipt.number }}</a>
                    @if (receipt.reversed) {
                      <app-state-mark state="reversed" />
                    }
                  </td>
                  <td>{{ receipt.receivedOn | day }}</td>
                  <td>{{ receipt.dealer.name }}</td>
                  <td class="wide">{{ receipt.payerReference }}</td>
                  <td class="sy-number" [class.struck]="receipt.reversed">{{ receipt.amount | money }}</td>
                  <td class="sy-number">{{ hasAny(receipt.unapplied.amount) ? (receipt.unapplied | money) : '' }}</td>
                </tr>
              }
            </tbody>
          </table>
        </div>
      } @else if (receipts.loading()) {
        <span class="sy-waiting tall" aria-hidden="true"></span>
      } @else if (!receipts.problem()) {
        <p class="sy-card">
          {{ show() === 'unapplied' ? 'No cash is unapplied.' : 'Nothing received yet. Record the first receipt above.' }}
        </p>
      }
      <app-list-footer
        noun="receipt"
        [shown]="receipts.items().length"
        [hasMore]="receipts.hasMore()"
        [loading]="receipts.loading()"
        (more)="receipts.more()"
      />
    </div>
  `,
  styleUrl: './tables.scss',
})
export class ReceiptsPage {
  readonly show = input<'all' | 'unapplied', string | undefined>('all', { transform: (value) => (value === 'unapplied' ? value : 'all') });
  private readonly api = inject(ApiClient);
  protected readonly filter = filterAddress();
  private readonly query = computed(() => ({ limit: 50, ...(this.show() === 'unapplied' ? { unapplied: 'true' } : {}) }));
  protected readonly receipts = pagedList(this.query, (query) => this.api.call(listReceipts, { query }));
  protected readonly hasAny = (amount: string) => /[1-9]/.test(amount);
}
