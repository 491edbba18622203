import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';

export interface Option {
  value: string;
  label: string;
}

/** One of several, from a list that the system shows in its own way, which also works by keyboard and on a phone. */
@Component({
  selector: 'app-choice-field',
  imports: [MatFormFieldModule, MatInput],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <mat-form-field appearance="fill" floatLabel="always" subscriptSizing="dynamic">
      <mat-label>{{ label() }}</mat-label>
      <select #list matNativeControl (change)="chosen.emit(list.value)">
        @for (option of options(); track option.value) {
          <option [value]="option.value" [selected]="option.value === value()">{{ option.label }}</option>
        }
      </select>
    </mat-form-field>
  `,
  styleUrl: '../ui/boxed-field.scss',
})
export class ChoiceField {
  readonly label = input.required<string>();
  readonly options = input.required<readonly Option[]>();
  readonly value = input.required<string>();
  readonly chosen = output<string>();
}
