import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { type z } from 'zod';
import { type entrySchema } from '@shared/contracts/receivables';
import { DayPipe } from '../ui/date-pipes';
import { MoneyPipe } from '../ui/money-pipe';

/** Ledger entries of a document: what was debited and credited, and what took it back. */
@Component({
  selector: 'app-entry-list',
  imports: [DayPipe, MoneyPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="sy-table" tabindex="0" role="region" aria-label="Ledger entries">
      <table>
        <thead>
          <tr>
            <th scope="col">Entry</th>
            <th scope="col">Account</th>
            <th scope="col" class="sy-number">Debit</th>
            <th scope="col" class="sy-number">Credit</th>
          </tr>
        </thead>
        @for (entry of entries(); track entry.id) {
          <tbody>
            @for (posting of entry.postings; track $index) {
              <tr>
                @if ($first) {
                  <th scope="rowgroup" [attr.rowspan]="entry.postings.length">
                    {{ entry.memo }}<small>{{ entry.on | day }}</small>
                  </th>
                }
                <td>{{ posting.account }}</td>
                <td class="sy-number">{{ isZero(posting.debit.amount) ? '' : (posting.debit | money: 'bare') }}</td>
                <td class="sy-number">{{ isZero(posting.credit.amount) ? '' : (posting.credit | money: 'bare') }}</td>
              </tr>
            }
          </tbody>
        }
      </table>
    </div>
  `,
  styles: `
    table {
      border-collapse: collapse;
      font-size: 14px;
    }
    th,
    td {
      padding: 7px 14px;
      text-align: left;
      vertical-align: top;
      font-weight: 400;
    }
    thead th {
      color: var(--sy-soft);
      font-size: 13px;
    }
    tbody {
      border-top: 1px solid var(--sy-line);
    }
    th.sy-number,
    td.sy-number {
      text-align: right;
    }
    small {
      display: block;
      color: var(--sy-soft);
    }
  `,
})
export class EntryList {
  readonly entries = input.required<z.infer<typeof entrySchema>[]>();
  protected readonly isZero = (amount: string) => !/[1-9]/.test(amount);
}
