import { ChangeDetectionStrategy, Component, effect, input, output } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatIconButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { debounce, filter, map, Subject, timer } from 'rxjs';
import { Icon } from './icon';

/** Searches as one types, after a short pause; Enter and the cross do not wait. */
@Component({
  selector: 'app-search-field',
  imports: [ReactiveFormsModule, MatFormFieldModule, MatInput, MatIconButton, Icon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <mat-form-field appearance="outline" subscriptSizing="dynamic">
      <mat-label>{{ label() }}</mat-label>
      <app-icon matPrefix name="search" class="glass" />
      <input
        matInput
        type="search"
        maxlength="60"
        autocomplete="off"
        spellcheck="false"
        [formControl]="text"
        (input)="typed.next(300)"
        (keydown.enter)="typed.next(0)"
      />
      @if (value()) {
        <button matIconButton matSuffix type="button" aria-label="Clear the search" (click)="clear()"><app-icon name="close" /></button>
      }
    </mat-form-field>
  `,
  styles: `
    :host {
      display: block;
      flex: 1 1 260px;
      max-width: 420px;
    }
    mat-form-field {
      width: 100%;
    }
    .glass {
      margin-left: 12px;
      color: var(--sy-soft);
    }
    input::-webkit-search-cancel-button {
      display: none;
    }
  `,
})
export class SearchField {
  readonly label = input.required<string>();
  /** what is searched for now, such as the address says */
  readonly value = input('');
  readonly searched = output<string>();
  protected readonly text = new FormControl('', { nonNullable: true });
  private sent: string | undefined;
  /** milliseconds to wait for more keys */
  protected readonly typed = new Subject<number>();

  constructor() {
    // Takes over what the address says, but not the echo of an earlier word while one types on.
    effect(() => {
      const value = this.value();
      if (value !== this.sent) this.text.setValue(value);
      this.sent = undefined;
    });
    this.typed
      .pipe(
        debounce((wait) => timer(wait)),
        map(() => this.text.value.trim()),
        filter((text) => text !== this.value()),
        takeUntilDestroyed(),
      )
      .subscribe((text) => {
        this.sent = text;
        this.searched.emit(text);
      });
  }

  protected clear(): void {
    this.text.setValue('');
    this.typed.next(0);
  }
}
