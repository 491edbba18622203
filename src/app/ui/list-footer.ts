import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';

/** Under a list: how many are shown, and a button for the next page. The count is announced. */
@Component({
  selector: 'app-list-footer',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <p role="status" class="sy-soft">{{ text() }}</p>
    @if (hasMore()) {
      <button matButton="outlined" type="button" [attr.aria-disabled]="loading()" (click)="loading() || more.emit()">
        {{ loading() ? 'Reading…' : 'Show more' }}
      </button>
    }
  `,
  styles: `
    :host {
      display: flex;
      align-items: center;
      flex-wrap: wrap;
      gap: 8px 20px;
      min-height: 40px;
      margin-top: 10px;
      font-size: 14px;
    }
  `,
})
export class ListFooter {
  readonly shown = input.required<number>();
  readonly hasMore = input.required<boolean>();
  readonly loading = input(false);
  /** one of them, such as `quote`; `many` where an s does not make them many */
  readonly noun = input.required<string>();
  readonly many = input<string>();
  readonly more = output();

  protected readonly text = computed(() => {
    const count = this.shown();
    if (this.loading() && count === 0) return `Reading ${this.many() ?? `${this.noun()}s`}…`;
    const things = count === 1 ? this.noun() : (this.many() ?? `${this.noun()}s`);
    return this.hasMore() ? `The first ${count} ${things}` : `${count} ${things}`;
  });
}
