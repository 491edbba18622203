import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { type Fact } from './facts';

/** The physical figures of one item, with where they come from. */
@Component({
  selector: 'app-fact-table',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <table>
      <caption class="sy-visually-hidden">
        {{
          caption()
        }}
      </caption>
      <tbody>
        @for (fact of facts(); track fact.label) {
          <tr>
            <th scope="row">
              {{ fact.label }}
              @if (fact.note) {
                <small>{{ fact.note }}</small>
              }
            </th>
            <td>
              {{ fact.value }}
              @if (fact.unit) {
                <span class="unit">{{ fact.unit }}</span>
              }
            </td>
          </tr>
        }
      </tbody>
    </table>
    @if (source(); as words) {
      <p class="source">{{ words }}.</p>
    }
  `,
  styles: `
    table {
      width: 100%;
      border-collapse: collapse;
      font-size: 14px;
      border-top: 1px solid var(--sy-line);
    }
    th,
    td {
      padding: 6px 0;
      border-bottom: 1px solid var(--sy-line);
      vertical-align: top;
      font-weight: 400;
      text-align: left;
    }
    th {
      padding-right: 16px;
      color: var(--sy-soft);
    }
    small {
      display: block;
      font-size: 12px;
    }
    td {
      text-align: right;
    }
    .unit {
      color: var(--sy-soft);
    }
    .source {
      margin: 6px 0 0;
      font-size: 12px;
      color: var(--sy-soft);
    }
  `,
})
export class FactTable {
  readonly facts = input.required<readonly Fact[]>();
  readonly source = input<string | null>(null);
  /** what the table is of, for those who hear it */
  readonly caption = input.required<string>();
}
