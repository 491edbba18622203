import { ChangeDetectionStrategy, Component, effect, type ElementRef, input, signal, viewChild } from '@angular/core';
import { FormControl, ReactiveFormsModule } from '@angular/forms';

let count = 0;

/**
 * A value one can change where it stands: Enter or leaving the field saves, Escape puts the
 * saved value back. What could not be saved stays as typed, with the reason under it.
 */
@Component({
  selector: 'app-in-place-field',
  imports: [ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <input
      #field
      [formControl]="text"
      [attr.aria-label]="label()"
      [attr.aria-invalid]="problem() !== null"
      [attr.aria-describedby]="problem() === null ? null : problemId"
      [attr.inputmode]="keys()"
      [attr.maxlength]="longest()"
      [attr.placeholder]="placeholder()"
      [class.right]="align() === 'right'"
      autocomplete="off"
      spellcheck="false"
      (focus)="field.select()"
      (blur)="commit()"
      (keydown.enter)="commit(true); $event.preventDefault()"
      (keydown.escape)="revert(); $event.stopPropagation()"
    />
    @if (problem(); as reason) {
      <span class="reason" role="alert" [id]="problemId">{{ reason }}</span>
    }
  `,
  styles: `
    :host {
      display: block;
    }
    input {
      width: 100%;
      min-width: 0;
      height: 30px;
      padding: 2px 6px;
      border: 1px solid var(--sy-line);
      border-radius: 6px;
      background: transparent;
      color: var(--sy-ink);
      font: inherit;
      font-variant-numeric: tabular-nums;
    }
    input:hover {
      border-color: var(--sy-edge);
    }
    input:focus {
      outline: 2px solid var(--sy-copper);
      outline-offset: -1px;
      background: var(--sy-paper);
    }
    input[aria-invalid='true'] {
      border-color: var(--sy-error);
    }
    .right {
      text-align: right;
    }
    /* Two fields side by side share the line below for what is wrong with either. */
    :host(.paired) {
      display: contents;
    }
    :host(.paired) input {
      grid-row: 1;
    }
    .reason {
      grid-column: 1 / -1;
      display: block;
      margin-top: 3px;
      color: var(--sy-error);
      font-size: 12.5px;
      line-height: 1.35;
      white-space: normal;
      text-align: left;
    }
  `,
})
export class InPlaceField {
  /** what it is and of which line, for those who do not see the table */
  readonly label = input.required<string>();
  readonly value = input.required<string>();
  /** saves the text; answers why it cannot be, or null */
  readonly save = input.required<(text: string) => Promise<string | null>>();
  readonly align = input<'left' | 'right'>('left');
  readonly keys = input<'numeric' | 'text'>('text');
  readonly longest = input(60);
  readonly placeholder = input<string>();

  protected readonly text = new FormControl('', { nonNullable: true });
  protected readonly problem = signal<string | null>(null);
  protected readonly problemId = `in-place-${++count}`;
  private readonly field = viewChild.required<ElementRef<HTMLInputElement>>('field');
  /** the value the text was last taken from */
  private from = '';
  /** the text sent last, until it is saved or typed over */
  private sent: string | null = null;

  constructor() {
    effect(() => {
      const value = this.value();
      // A new saved value shows, unless one is typing another meanwhile.
      if (this.text.value === this.from) this.text.setValue(value);
      this.from = value;
    });
  }

  focus(): void {
    this.field().nativeElement.focus();
  }

  /** @param again send a text that was refused once more */
  protected async commit(again = false): Promise<void> {
    const text = this.text.value.trim();
    if (text === this.from) {
      this.revert();
      return;
    }
    if (text === this.sent && !(again && this.problem() !== null)) return;
    this.sent = text;
    const problem = await this.save()(text);
    this.problem.set(problem);
    if (problem !== null) return;
    this.sent = null;
    // Saved: from here on the field follows the saved value, which may be written another way.
    if (this.text.value.trim() === text) {
      this.text.setValue(this.value());
      this.from = this.value();
    }
  }

  protected revert(): void {
    this.problem.set(null);
    this.sent = null;
    this.text.setValue(this.from);
  }
}
