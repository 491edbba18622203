import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { Icon } from '../ui/icon';
import { type NobodyNote } from './nobody-builds';
import { TakeNearest } from './take-nearest';

/** Beside a field: that nobody can build what it holds, why not, and the nearest that one maker can. */
@Component({
  selector: 'app-field-note',
  imports: [Icon, TakeNearest],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (note(); as nobody) {
      <p>
        <app-icon name="warning" /> No maker can build this. {{ nobody.maker.name }} comes nearest: {{ nobody.detail }}.
        <app-take-nearest [maker]="nobody.maker.id" />
      </p>
    }
  `,
  styles: `
    :host {
      display: block;
    }
    :host:empty {
      display: none;
    }
    p {
      padding: 0 2px;
      color: var(--sy-error);
      font-size: 13px;
    }
  `,
})
export class FieldNote {
  readonly note = input.required<NobodyNote | null>();
}
