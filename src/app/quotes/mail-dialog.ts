import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatRadioModule } from '@angular/material/radio';
import { type ProblemError } from '../api-client/problem-error';
import { Session } from '../session/session';
import { fits, showAtFields } from '../ui/field-problems';
import { customer } from '@shared/contracts/quotes';
import { ProblemNote } from '../ui/problem-note';
import { type QuoteDesk } from './quote-desk';

/** A mail to the customer with the quote as PDF. Closes with true once it is in the outbox. */
@Component({
  selector: 'app-mail-dialog',
  imports: [MatDialogModule, MatButton, MatFormFieldModule, MatInput, MatRadioModule, ReactiveFormsModule, ProblemNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form [formGroup]="form" (ngSubmit)="send()">
      <h2 mat-dialog-title>Mail {{ desk.quote()?.number }}</h2>
      <mat-dialog-content>
        <div class="fields">
          <mat-form-field appearance="outline">
            <mat-label>To</mat-label>
            <input matInput type="email" formControlName="to" autocomplete="email" required />
            <mat-error>{{ form.controls.to.getError('said') ?? 'Write an e-mail address such as name@company.example.' }}</mat-error>
          </mat-form-field>
          <mat-form-field appearance="outline">
            <mat-label>Subject</mat-label>
            <input matInput formControlName="subject" maxlength="200" required />
            <mat-error>{{ form.controls.subject.getError('said') ?? 'Write a subject.' }}</mat-error>
          </mat-form-field>
          <mat-form-field appearance="outline">
            <mat-label>Message</mat-label>
            <textarea matInput formControlName="message" rows="6" maxlength="4000"></textarea>
            <mat-error>{{ form.controls.message.getError('said') }}</mat-error>
          </mat-form-field>
          <fieldset>
            <legend>Prices in the PDF</legend>
            <mat-radio-group formControlName="prices" aria-label="Prices in the PDF">
              <mat-radio-button value="retail">retail, with your mark-up of {{ markUp }} %</mat-radio-button>
              <mat-radio-button value="wholesale">wholesale, what you pay</mat-radio-button>
            </mat-radio-group>
          </fieldset>
          @if (form.controls.prices.value === 'wholesale') {
            <p class="sy-note">The PDF will show your own prices and the maker.</p>
          } @else if (!hasMarkUp) {
            <p class="sy-note">No mark-up is set, so the retail prices are your own.</p>
          }
          @if (problem(); as wrong) {
            <app-problem-note [problem]="wrong" (retry)="send()" />
          }
        </div>
      </mat-dialog-content>
      <mat-dialog-actions align="end">
        <button matButton type="button" mat-dialog-close>Do not send</button>
        <button matButton="filled" type="submit" [disabled]="sending()">{{ sending() ? 'Sending…' : 'Send' }}</button>
      </mat-dialog-actions>
    </form>
  `,
  styles: `
    .fields {
      display: grid;
      gap: 4px;
      padding-top: 6px;
    }
    fieldset {
      margin: 0;
      padding: 0;
      border: 0;
    }
    legend {
      padding: 0;
      color: var(--sy-soft);
    }
    mat-radio-group {
      display: flex;
      flex-wrap: wrap;
      gap: 0 18px;
    }
  `,
})
export class MailDialog {
  protected readonly desk = inject<QuoteDesk>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<MailDialog, boolean>>(MatDialogRef);
  private readonly from = inject(Session).user()?.company.name ?? '';
  protected readonly markUp = this.desk.quote()?.markUpPercent ?? '0';
  protected readonly hasMarkUp = /[1-9]/.test(this.markUp);
  protected readonly form = inject(NonNullableFormBuilder).group({
    to: [this.desk.quote()?.customer?.email ?? '', [Validators.required, fits(customer.shape.email.unwrap())]],
    subject: [`Quote ${this.desk.quote()?.number} from ${this.from}`, [Validators.required, Validators.pattern(/\S/)]],
    message: [this.firstMessage()],
    prices: ['retail' as 'retail' | 'wholesale'],
  });
  protected readonly problem = signal<ProblemError | null>(null);
  protected readonly sending = signal(false);

  protected async send(): Promise<void> {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.sending()) return;
    this.sending.set(true);
    const { to, subject, message, prices } = this.form.getRawValue();
    const problem = await this.desk.mail({ to: to.trim(), subject: subject.trim(), message: message.trim(), prices });
    this.sending.set(false);
    if (problem === null) this.dialog.close(true);
    const { controls } = this.form;
    const placed = problem && showAtFields(problem, { '/to': controls.to, '/subject': controls.subject, '/message': controls.message });
    this.problem.set(placed ? null : problem);
  }

  private firstMessage(): string {
    const name = this.desk.quote()?.customer?.name;
    return `${name ? `Dear ${name},` : 'Good day,'}\n\nHere is our quote with a drawing of every unit. Please ask if anything is unclear.\n\n${this.from}`;
  }
}
