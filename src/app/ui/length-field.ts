import {
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  type ElementRef,
  inject,
  input,
  model,
  output,
  signal,
  viewChild,
} from '@angular/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { besideLength, readLength, stepLength } from './read-length';
import { WrongField } from './wrong-field';

/** A pause after which unfinished text is taken for a mistake, ms. */
const PAUSE = 900;

let count = 0;

/**
 * A length as people write it: `36 1/2`, `36-1/2"`, `927 mm`, `3' 0 1/2"`. The text is kept as it
 * is typed; the other measure stands beside it, and what is wrong with it below, once one pauses
 * or leaves. Arrow keys step by 1/16 in or 1 mm, with Shift by 1 in or 10 mm.
 */
@Component({
  selector: 'app-length-field',
  imports: [MatFormFieldModule, MatInput, WrongField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <mat-form-field appearance="fill" floatLabel="always" subscriptSizing="dynamic">
      <mat-label>{{ label() }}</mat-label>
      <input
        #field
        matInput
        type="text"
        autocomplete="off"
        autocapitalize="off"
        spellcheck="false"
        maxlength="60"
        [value]="text()"
        [appWrongField]="shown() !== null"
        [attr.enterkeyhint]="enterKeyHint()"
        [aria-describedby]="besideId"
        (input)="typed(field.value)"
        (blur)="settled.set(true)"
        (keydown.enter)="enter($event)"
        (keydown.arrowup)="step($event, 1)"
        (keydown.arrowdown)="step($event, -1)"
        (keydown.shift.arrowup)="step($event, 1)"
        (keydown.shift.arrowdown)="step($event, -1)"
      />
      <span matTextSuffix class="beside" [id]="besideId">
        @if (beside(); as words) {
          <span class="unit">{{ words.unit }}</span> {{ words.other }}
        }
      </span>
      @if (shown(); as problem) {
        <mat-error>{{ problem }}</mat-error>
      }
    </mat-form-field>
  `,
  styleUrl: './boxed-field.scss',
  styles: `
    .unit:not(:empty) {
      margin-right: 6px;
    }
  `,
})
export class LengthField {
  readonly label = input.required<string>();
  readonly text = model.required<string>();
  readonly system = input.required<MeasureSystem>();
  readonly optional = input(false);
  readonly zero = input(false);
  /** said by whoever knows more than the field, below it; the text itself can be read */
  readonly problem = input<string | null>(null);
  /** what the Enter key of a phone says */
  readonly enterKeyHint = input<string | null>(null);
  readonly entered = output();

  protected readonly besideId = `length-beside-${++count}`;
  private readonly field = viewChild.required<ElementRef<HTMLInputElement>>('field');
  protected readonly settled = signal(true);
  private pause: ReturnType<typeof setTimeout> | undefined;

  private readonly read = computed(() => readLength(this.text(), this.system(), { optional: this.optional(), zero: this.zero() }));
  protected readonly shown = computed(() => {
    const read = this.read();
    return 'problem' in read ? (this.settled() ? read.problem : null) : this.problem();
  });
  protected readonly beside = computed(() => {
    const read = this.read();
    return 'mm' in read && read.mm !== null ? besideLength(this.text(), read.mm, this.system()) : null;
  });

  constructor() {
    inject(DestroyRef).onDestroy(() => clearTimeout(this.pause));
  }

  focus(): void {
    this.field().nativeElement.focus();
    this.field().nativeElement.select();
  }

  protected typed(text: string): void {
    this.settled.set(false);
    clearTimeout(this.pause);
    this.pause = setTimeout(() => this.settled.set(true), PAUSE);
    this.text.set(text);
  }

  protected enter(event: Event): void {
    event.preventDefault();
    this.settled.set(true);
    // Held down, the key would add line after line.
    if (!(event as KeyboardEvent).repeat && 'mm' in this.read()) this.entered.emit();
  }

  protected step(event: Event, by: 1 | -1): void {
    const read = this.read();
    if ('problem' in read || read.mm === null) return;
    event.preventDefault();
    const next = stepLength(read.mm, this.text(), this.system(), by, (event as KeyboardEvent).shiftKey);
    if (next !== null) this.text.set(next);
  }
}
