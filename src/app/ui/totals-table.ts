import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { type Totals } from '@shared/contracts/prices';
import { type Money } from '@shared/money/money';
import { MoneyPipe } from './money-pipe';

/** Goods, order charges, tax and total of a quote, order or invoice, row by row. */
@Component({
  selector: 'app-totals-table',
  imports: [MoneyPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <table>
      <caption class="sy-visually-hidden">
        {{
          caption()
        }}
      </caption>
      <tbody>
        <tr>
          <th scope="row">Goods</th>
          <td>{{ totals().goods | money: 'bare' }}</td>
        </tr>
        @for (charge of totals().orderCharges; track $index) {
          <tr>
            <th scope="row">{{ capital(charge.label) }}</th>
            <td>{{ charge.net | money: 'bare' }}</td>
          </tr>
        }
        @for (row of totals().tax; track $index) {
          <tr>
            <th scope="row">
              {{ capital(row.label) }}, {{ row.rate }} %<small>of {{ row.base | money: 'bare' }}</small>
            </th>
            <td>{{ row.amount | money: 'bare' }}</td>
          </tr>
        } @empty {
          @if (noTax(); as why) {
            <tr>
              <th scope="row">{{ why }}</th>
              <td>–</td>
            </tr>
          }
        }
        <tr class="sum">
          <th scope="row">Total</th>
          <td>{{ totals().total | money }}</td>
        </tr>
        @if (retail(); as goods) {
          <tr class="retail">
            <th scope="row">Goods at your retail prices</th>
            <td>{{ goods | money: 'bare' }}</td>
          </tr>
        }
      </tbody>
    </table>
  `,
  styles: `
    table {
      width: 100%;
      border-collapse: collapse;
      font-size: 14px;
    }
    th,
    td {
      padding: 3px 0;
      text-align: left;
      font-weight: 400;
      vertical-align: top;
    }
    td {
      text-align: right;
      white-space: nowrap;
      padding-left: 16px;
    }
    small {
      display: block;
      color: var(--sy-soft);
      font-size: 12.5px;
    }
    .sum th,
    .sum td {
      border-top: 1px solid var(--sy-ink);
      font-weight: 700;
      padding-top: 6px;
    }
    .sum td {
      font-size: 18px;
      line-height: 1.2;
    }
    .retail th,
    .retail td {
      color: var(--sy-soft);
      padding-top: 8px;
    }
  `,
})
export class TotalsTable {
  readonly totals = input.required<Totals>();
  readonly caption = input('Totals');
  /** the dealer's own retail sum, where a mark-up is set */
  readonly retail = input<Money>();
  /** words for a total without tax, such as `No tax, exempt` */
  readonly noTax = input<string>();

  /** Labels come as they stand within a sentence. */
  protected capital(label: string): string {
    return label.charAt(0).toUpperCase() + label.slice(1);
  }
}
