import { ChangeDetectionStrategy, Component, computed, DestroyRef, inject, signal } from '@angular/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { WrongField } from '../ui/wrong-field';
import { UnitDraft } from './unit-draft';

/** A pause after which unfinished text is taken for a mistake, ms. */
const PAUSE = 900;

/** The make-up as the trade writes it. A long one runs over two lines; Enter settles it. */
@Component({
  selector: 'app-make-up-field',
  imports: [MatFormFieldModule, MatInput, WrongField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <mat-form-field appearance="fill" floatLabel="always" subscriptSizing="dynamic">
      <mat-label>As you would write it</mat-label>
      <textarea
        #field
        matInput
        rows="1"
        autocomplete="off"
        autocapitalize="off"
        spellcheck="false"
        maxlength="300"
        enterkeyhint="done"
        [value]="draft.makeUp()"
        [appWrongField]="shown() !== null"
        (input)="type(field.value)"
        (blur)="settle()"
        (keydown.enter)="$event.preventDefault(); settle()"
      ></textarea>
      @if (shown(); as words) {
        <mat-error>{{ words }}</mat-error>
      }
    </mat-form-field>
  `,
  styleUrl: '../ui/boxed-field.scss',
  styles: `
    textarea {
      field-sizing: content;
      resize: none;
      overflow: hidden;
    }
  `,
})
export class MakeUpField {
  protected readonly draft = inject(UnitDraft);
  private readonly settled = signal(true);
  private pause: ReturnType<typeof setTimeout> | undefined;
  protected readonly shown = computed(() => (this.settled() ? this.draft.problemAt('/makeUp') : null));

  constructor() {
    inject(DestroyRef).onDestroy(() => clearTimeout(this.pause));
  }

  protected type(text: string): void {
    this.settled.set(false);
    clearTimeout(this.pause);
    this.pause = setTimeout(() => this.settled.set(true), PAUSE);
    this.draft.typeMakeUp(text);
  }

  /** Written out as usual, where it can be read. */
  protected settle(): void {
    this.settled.set(true);
    this.draft.settleMakeUp();
  }
}
