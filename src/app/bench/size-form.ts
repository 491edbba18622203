import { ChangeDetectionStrategy, Component, computed, inject, output, viewChild } from '@angular/core';
import { LengthField } from '../ui/length-field';
import { FieldNote } from './field-note';
import { NobodyBuilds } from './nobody-builds';
import { TextField } from './text-field';
import { UnitDraft } from './unit-draft';

/** Width and height as seen from outside, how many, and the dealer's own mark. Enter adds the line. */
@Component({
  selector: 'app-size-form',
  imports: [FieldNote, LengthField, TextField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-length-field
      #width
      label="Width"
      [system]="draft.system()"
      [text]="draft.draft().width"
      (textChange)="draft.type({ width: $event })"
      enterKeyHint="done"
      (entered)="entered.emit()"
    />
    <app-field-note [note]="widthNote()" />
    <app-length-field
      label="Height"
      [system]="draft.system()"
      [text]="draft.draft().height"
      (textChange)="draft.type({ height: $event })"
      enterKeyHint="done"
      (entered)="entered.emit()"
    />
    <app-field-note [note]="heightNote()" />
    <div class="pair">
      <app-text-field
        label="How many"
        keys="numeric"
        [longest]="6"
        [text]="draft.draft().quantity"
        [problem]="quantityProblem()"
        (typed)="draft.type({ quantity: $event })"
        enterKeyHint="done"
        (entered)="entered.emit()"
      />
      <app-text-field
        label="Tag"
        [text]="draft.draft().tag"
        [problem]="tagProblem()"
        (typed)="draft.type({ tag: $event })"
        enterKeyHint="done"
        (entered)="entered.emit()"
      />
    </div>
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 10px;
    }
    app-length-field,
    .pair {
      --mat-form-field-container-text-size: 18px;
    }
    .pair {
      display: grid;
      grid-template-columns: 5fr 7fr;
      gap: 10px;
      align-items: start;
    }
  `,
})
export class SizeForm {
  /** Enter was pressed in one of the fields */
  readonly entered = output();
  protected readonly draft = inject(UnitDraft);
  private readonly nobody = inject(NobodyBuilds);
  private readonly width = viewChild.required<LengthField>('width');

  protected readonly widthNote = computed(() => this.nobody.at('/width'));
  protected readonly heightNote = computed(() => this.nobody.at('/height'));
  protected readonly quantityProblem = computed(() => this.draft.problemAt('/quantity'));
  protected readonly tagProblem = computed(() => this.draft.problemAt('/tag'));

  /** Ready for the next size. */
  focusWidth(): void {
    this.width().focus();
  }
}
