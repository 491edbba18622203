import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { type ProblemError } from '../api-client/problem-error';
import { DayPipe } from './date-pipes';
import { ReadableDaysPipe } from './readable-days-pipe';

/** What went wrong and what to do, read out at once. Offers to try again where that may help. */
@Component({
  selector: 'app-problem-note',
  imports: [MatButton, ReadableDaysPipe],
  providers: [DayPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="sy-problem" role="alert">
      <p>
        @if (heading(); as words) {
          <b>{{ words }}</b>
        }
        {{ problem().detail | readableDays }}
      </p>
      @if (problem().errors.length > 0) {
        <ul>
          @for (error of problem().errors; track $index) {
            <li>{{ error.detail | readableDays }}</li>
          }
        </ul>
      }
      <div class="ways">
        @if (mayRetry()) {
          <button matButton type="button" (click)="retry.emit()">Try again</button>
        }
        <ng-content />
      </div>
    </div>
  `,
  styles: `
    :host {
      display: block;
    }
    ul {
      margin: 4px 0 0;
      padding-left: 20px;
    }
    .ways {
      display: flex;
      flex-wrap: wrap;
      gap: 8px;
    }
  `,
})
export class ProblemNote {
  readonly problem = input.required<ProblemError>();
  /** bold words before the detail */
  readonly heading = input<string>();
  /** whether whoever shows this can do it again */
  readonly retriable = input(true);
  readonly retry = output();
  /** Only where the same thing may go better the next time: no connection, too many calls, our own failure. */
  protected readonly mayRetry = computed(() => {
    const { status } = this.problem();
    return this.retriable() && (status === 0 || status === 429 || status >= 500);
  });
}
