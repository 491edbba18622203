import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { type InvoiceItem } from '@shared/contracts/receivables';
import { DayPipe } from '../ui/date-pipes';
import { MoneyPipe } from '../ui/money-pipe';
import { type TypedShare } from './shares';

/** Open invoices with a field for what of the money goes to each; Enter or the button takes the whole open amount. */
@Component({
  selector: 'app-share-table',
  imports: [DayPipe, MoneyPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="sy-table" tabindex="0" role="region" aria-label="Open invoices">
      <table>
        <thead>
          <tr>
            <th scope="col">Invoice</th>
            <th scope="col" class="wide">Due</th>
            <th scope="col" class="sy-number">Open</th>
            <th scope="col" class="sy-number">Apply</th>
            <th scope="col" class="sy-number">Discount</th>
          </tr>
        </thead>
        <tbody>
          @for (invoice of invoices(); track invoice.id) {
            <tr>
              <td>
                {{ invoice.number }}<small>{{ invoice.reference }}</small>
              </td>
              <td class="wide">
                {{ invoice.dueOn | day }}
                @if (invoice.overdueDays > 0) {
                  <small class="sy-over">{{ invoice.overdueDays }} days overdue</small>
                }
              </td>
              <td class="sy-number">
                <button type="button" (click)="whole.emit(invoice)" [attr.aria-label]="'Apply all of ' + invoice.number">
                  {{ invoice.open | money: 'bare' }}
                </button>
              </td>
              <td class="sy-number">
                <input
                  inputmode="decimal"
                  [attr.aria-label]="'Apply to ' + invoice.number"
                  [attr.aria-invalid]="wrong().has(invoice.id)"
                  [attr.aria-describedby]="wrong().has(invoice.id) ? 'wrong-' + invoice.id : null"
                  [value]="shareOf(invoice).amount"
                  (input)="typed.emit({ invoice: invoice.id, amount: valueOf($event), discount: shareOf(invoice).discount })"
                />
                @if (wrong().get(invoice.id); as text) {
                  <small class="sy-over" [id]="'wrong-' + invoice.id">{{ text }}</small>
                }
              </td>
              <td class="sy-number">
                <input
                  inputmode="decimal"
                  class="narrow"
                  [attr.aria-label]="'Early-payment discount on ' + invoice.number"
                  [value]="shareOf(invoice).discount"
                  (input)="typed.emit({ invoice: invoice.id, amount: shareOf(invoice).amount, discount: valueOf($event) })"
                />
              </td>
            </tr>
          } @empty {
            <tr>
              <td colspan="5" class="sy-soft">Nothing is open at this account; all of it will stay unapplied.</td>
            </tr>
          }
        </tbody>
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
    tbody tr {
      border-top: 1px solid var(--sy-line);
    }
    th.sy-number,
    td.sy-number {
      text-align: right;
    }
    small {
      display: block;
      color: var(--sy-soft);
      white-space: normal;
    }
    small.sy-over {
      color: var(--sy-error);
    }
    input {
      width: 104px;
      min-height: 32px;
      padding: 3px 8px;
      border: 1px solid var(--sy-edge);
      border-radius: 6px;
      background: var(--sy-sheet);
      color: inherit;
      font: inherit;
      text-align: right;
    }
    input.narrow {
      width: 76px;
    }
    input[aria-invalid='true'] {
      border-color: var(--sy-error);
    }
    button {
      min-height: 32px;
      border: 0;
      background: none;
      color: var(--sy-copper);
      font: inherit;
      text-decoration: underline;
      text-underline-offset: 2px;
      cursor: pointer;
    }
    @media (max-width: 700px) {
      .wide {
        display: none;
      }
      th,
      td {
        padding: 7px 8px;
      }
      input {
        width: 84px;
      }
      input.narrow {
        width: 60px;
      }
    }
  `,
})
export class ShareTable {
  readonly invoices = input.required<readonly InvoiceItem[]>();
  readonly shares = input.required<ReadonlyMap<string, TypedShare>>();
  readonly wrong = input.required<ReadonlyMap<string, string>>();
  readonly typed = output<TypedShare>();
  /** all that is open of this one */
  readonly whole = output<InvoiceItem>();
  protected readonly shareOf = ({ id }: InvoiceItem): TypedShare => this.shares().get(id) ?? { invoice: id, amount: '', discount: '' };
  protected readonly valueOf = (event: Event): string => (event.target as HTMLInputElement).value;
}
