import {
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  type ElementRef,
  inject,
  input,
  output,
  signal,
  viewChild,
} from '@angular/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { WrongField } from '../ui/wrong-field';

/** A pause after which unfinished text is taken for a mistake, ms. */
const PAUSE = 900;

/** A line of text, kept as it is typed, with the message about it below once one pauses or leaves. */
@Component({
  selector: 'app-text-field',
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
        spellcheck="false"
        [attr.maxlength]="longest()"
        [value]="text()"
        [appWrongField]="shown() !== null"
        [attr.inputmode]="keys()"
        [attr.enterkeyhint]="enterKeyHint()"
        (input)="type(field.value)"
        (blur)="settled.set(true)"
        (keydown.enter)="enter($event)"
      />
      @if (suffix(); as words) {
        <span matTextSuffix class="beside">{{ words }}</span>
      }
      @if (shown(); as words) {
        <mat-error>{{ words }}</mat-error>
      }
    </mat-form-field>
  `,
  styleUrl: '../ui/boxed-field.scss',
})
export class TextField {
  readonly label = input.required<string>();
  readonly text = input.required<string>();
  readonly problem = input<string | null>(null);
  readonly suffix = input('');
  readonly keys = input<'numeric' | 'decimal' | null>(null);
  readonly longest = input(80);
  readonly enterKeyHint = input<string | null>(null);
  readonly typed = output<string>();
  readonly entered = output();

  private readonly field = viewChild.required<ElementRef<HTMLInputElement>>('field');
  protected readonly settled = signal(true);
  private pause: ReturnType<typeof setTimeout> | undefined;
  protected readonly shown = computed(() => (this.settled() ? this.problem() : null));

  constructor() {
    inject(DestroyRef).onDestroy(() => clearTimeout(this.pause));
  }

  focus(): void {
    this.field().nativeElement.focus();
    this.field().nativeElement.select();
  }

  protected type(text: string): void {
    this.settled.set(false);
    clearTimeout(this.pause);
    this.pause = setTimeout(() => this.settled.set(true), PAUSE);
    this.typed.emit(text);
  }

  protected enter(event: Event): void {
    event.preventDefault();
    if (!(event as KeyboardEvent).repeat) this.entered.emit();
  }
}
