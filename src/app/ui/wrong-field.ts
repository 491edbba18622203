import { Directive, effect, inject, input } from '@angular/core';
import { MatInput } from '@angular/material/input';

/** Shows a Material field as wrong while its own signal says so, where no form control stands behind it. */
@Directive({ selector: 'input[appWrongField], textarea[appWrongField]' })
export class WrongField {
  readonly appWrongField = input.required<boolean>();

  constructor() {
    const field = inject(MatInput, { self: true });
    effect(() => {
      const wrong = this.appWrongField();
      if (field.errorState === wrong) return;
      field.errorState = wrong;
      field.stateChanges.next();
    });
  }
}
