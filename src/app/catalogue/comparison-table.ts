import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { type Comparison } from './facts';

/** Items side by side, with the method behind the figures below. */
@Component({
  selector: 'app-comparison-table',
  imports: [RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <p>{{ comparison().intro }}</p>
    <div class="scroll" role="region" tabindex="0" [attr.aria-label]="comparison().title">
      <table>
        <thead>
          <tr>
            <th scope="col"><span class="sy-visually-hidden">Item</span></th>
            @for (column of comparison().columns; track column.label) {
              <th scope="col">
                {{ column.label }}
                @if (column.unit) {
                  <small>{{ column.unit }}</small>
                }
              </th>
            }
          </tr>
        </thead>
        <tbody>
          @for (row of comparison().rows; track row.name) {
            <tr [class.chosen]="row.item === chosen()">
              <th scope="row">
                @if (row.item && row.item !== chosen()) {
                  <a [routerLink]="[base(), row.item]">{{ row.name }}</a>
                } @else {
                  {{ row.name }}
                }
              </th>
              @for (cell of row.cells; track $index) {
                <td>{{ cell }}</td>
              }
            </tr>
          }
        </tbody>
      </table>
    </div>
    <p class="method">{{ comparison().method }}</p>
  `,
  styles: `
    .scroll {
      overflow-x: auto;
      margin: 14px 0 8px;
    }
    table {
      border-collapse: collapse;
      min-width: min(100%, 620px);
      font-size: 14px;
    }
    th,
    td {
      padding: 8px 0 8px 28px;
      text-align: right;
      vertical-align: top;
      font-weight: 400;
      white-space: nowrap;
    }
    th:first-child {
      padding-left: 10px;
      text-align: left;
    }
    th:last-child,
    td:last-child {
      padding-right: 10px;
    }
    thead th {
      color: var(--sy-soft);
      font-size: 13px;
      vertical-align: bottom;
      white-space: normal;
      max-width: 150px;
      border-bottom: 1px solid var(--sy-ink);
    }
    thead small {
      display: block;
      font-size: 12px;
      white-space: nowrap;
    }
    tbody tr {
      border-bottom: 1px solid var(--sy-line);
    }
    tr.chosen {
      background: var(--sy-tint);
      box-shadow: inset 3px 0 var(--sy-copper);
    }
    tr.chosen > * {
      font-weight: 700;
    }
    .method {
      max-width: 66ch;
      font-size: 13px;
      color: var(--sy-soft);
    }
  `,
})
export class ComparisonTable {
  readonly comparison = input.required<Comparison>();
  /** path of the part, under which the items have their pages */
  readonly base = input.required<string>();
  /** the item whose page this is */
  readonly chosen = input('');
}
