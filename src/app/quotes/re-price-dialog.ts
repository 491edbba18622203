import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { addDays, dayIn } from '@shared/calendar/days';
import { previewRePrice } from '@shared/contracts/quotes';
import { type Money, money, minorOf } from '@shared/money/money';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';
import { type ProblemError } from '../api-client/problem-error';
import { Session } from '../session/session';
import { DayPipe, InstantPipe } from '../ui/date-pipes';
import { showAtFields } from '../ui/field-problems';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { ReadableDaysPipe } from '../ui/readable-days-pipe';
import { type QuoteDesk } from './quote-desk';

/** What the quote would cost under the list in force now, line by line, and a button to take it. Closes with true. */
@Component({
  selector: 'app-re-price-dialog',
  imports: [
    MatDialogModule,
    MatButton,
    MatFormFieldModule,
    MatInput,
    ReactiveFormsModule,
    InstantPipe,
    MoneyPipe,
    ProblemNote,
    ReadableDaysPipe,
  ],
  providers: [DayPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './re-price-dialog.html',
  styles: `
    table {
      width: 100%;
      border-collapse: collapse;
      margin: 12px 0;
    }
    th,
    td {
      padding: 5px 0 5px 14px;
      border-bottom: 1px solid var(--sy-line);
      text-align: left;
    }
    th:first-child,
    td:first-child {
      padding-left: 0;
    }
    thead th {
      color: var(--sy-soft);
      font-size: 13px;
      font-weight: 400;
    }
    tbody th {
      font-weight: 400;
    }
    tfoot th,
    tfoot td {
      border: 0;
      border-top: 1px solid var(--sy-ink);
      font-weight: 700;
    }
    .sy-number {
      text-align: right;
    }
    .held {
      margin-top: 10px;
    }
    .sy-waiting {
      height: 120px;
    }
  `,
})
export class RePriceDialog {
  protected readonly desk = inject<QuoteDesk>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<RePriceDialog, boolean>>(MatDialogRef);
  private readonly api = inject(ApiClient);
  private readonly today = dayIn(inject(Session).user()?.company.timeZone ?? 'UTC', Date.now());
  protected readonly preview = loaded(
    computed(() => this.desk.quote()?.id),
    (id) => this.api.call(previewRePrice, { params: { id } }),
  );
  protected readonly rows = computed(() =>
    (this.preview.value()?.differences ?? []).map(({ tag, before, after, line }) => {
      const position = (this.desk.quote()?.lines.findIndex(({ id }) => id === line) ?? 0) + 1;
      return { name: tag ?? `line ${position}`, before, after, change: difference(before, after) };
    }),
  );
  protected readonly change = computed(() => {
    const preview = this.preview.value();
    return preview ? difference(preview.before, preview.after) : null;
  });
  /** The day asked for when the quote runs on, else the usual month from now. */
  protected readonly validUntil = inject(NonNullableFormBuilder).control(this.firstDay(), [Validators.required]);
  protected readonly earliest = this.today;
  protected readonly problem = signal<ProblemError | null>(null);
  protected readonly taking = signal(false);

  protected async take(): Promise<void> {
    const preview = this.preview.value();
    if (!preview || this.taking()) return;
    this.validUntil.markAsTouched();
    if (this.validUntil.hasError('required')) return;
    this.taking.set(true);
    const problem = await this.desk.rePrice(preview.after.amount, this.validUntil.value);
    this.taking.set(false);
    if (problem === null) this.dialog.close(true);
    this.problem.set(problem && showAtFields(problem, { '/validUntil': this.validUntil }) ? null : problem);
    // The list changed once more between looking and taking: show what it is now.
    if (problem?.code === 'price-changed') this.preview.reload();
  }

  /** A rise is written with its sign too. */
  protected sign(change: Money | null): string {
    return change && !change.amount.startsWith('-') ? '+' : '';
  }

  private firstDay(): string {
    const held = this.desk.quote()?.validUntil ?? '';
    const usual = addDays(this.today, 30);
    return held > usual ? held : usual;
  }
}

/** A change of price with its sign; null where there is none. */
function difference(before: Money, after: Money): Money | null {
  const change = minorOf(after.amount, after.currency) - minorOf(before.amount, before.currency);
  return change === 0 ? null : money(change, after.currency);
}
