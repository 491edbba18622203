import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { type Reason } from '@shared/contracts/evaluation';
import { TakeNearest } from './take-nearest';

/** Why one maker cannot build the unit, and the nearest that it can. */
@Component({
  selector: 'app-maker-reasons',
  imports: [TakeNearest],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ul>
      @for (detail of details(); track detail) {
        <li>{{ detail }}</li>
      }
    </ul>
    <app-take-nearest [maker]="maker()" />
  `,
  styles: `
    :host {
      display: block;
      font-size: 13.5px;
    }
    ul {
      display: grid;
      gap: 4px;
      margin: 2px 0 4px;
      padding: 0;
      list-style: none;
      color: var(--sy-soft);
    }
  `,
})
export class MakerReasons {
  /** identity of the maker */
  readonly maker = input.required<string>();
  readonly reasons = input.required<readonly Reason[]>();
  /** Each once: two lites of the same glass are refused for the same reason. */
  protected readonly details = computed(() => [
    ...new Set(this.reasons().map(({ detail }) => `${detail.charAt(0).toUpperCase()}${detail.slice(1)}.`)),
  ]);
}
