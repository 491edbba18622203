import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { type Money } from '@shared/money/money';

export interface LimitQuestion {
  limit: Money;
  dealer: string;
}

/** Asks for a new credit limit and why. Closes with both, or with nothing. */
@Component({
  selector: 'app-limit-dialog',
  imports: [MatDialogModule, MatButton, MatFormFieldModule, MatInput, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form [formGroup]="form" (ngSubmit)="give()">
      <h2 mat-dialog-title>Credit limit of {{ question.dealer }}</h2>
      <mat-dialog-content>
        <p class="text">Counts open invoices and orders on account with tax and delivery, less unapplied cash.</p>
        <mat-form-field appearance="outline">
          <mat-label>Limit, {{ question.limit.currency }}</mat-label>
          <input matInput inputmode="decimal" formControlName="limit" cdkFocusInitial />
          <mat-error>Type a plain amount, such as 60000.</mat-error>
        </mat-form-field>
        <mat-form-field appearance="outline">
          <mat-label>Reason</mat-label>
          <textarea matInput rows="2" maxlength="300" formControlName="reason"></textarea>
          <mat-error>Say why, in a sentence.</mat-error>
        </mat-form-field>
      </mat-dialog-content>
      <mat-dialog-actions align="end">
        <button matButton type="button" mat-dialog-close>Keep it as it is</button>
        <button matButton="filled" type="submit">Set limit</button>
      </mat-dialog-actions>
    </form>
  `,
  styles: `
    .text {
      margin-bottom: 14px;
    }
    mat-form-field {
      width: 100%;
    }
  `,
})
export class LimitDialog {
  protected readonly question = inject<LimitQuestion>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<LimitDialog, { limit: string; reason: string }>>(MatDialogRef);
  protected readonly form = inject(NonNullableFormBuilder).group({
    limit: [this.question.limit.amount, [Validators.required, Validators.pattern(/^\s*\d{1,12}(\.\d{1,3})?\s*$/)]],
    reason: ['', [Validators.required, Validators.pattern(/\S/)]],
  });

  protected give(): void {
    this.form.markAllAsTouched();
    const { limit, reason } = this.form.getRawValue();
    if (this.form.valid) this.dialog.close({ limit: limit.trim(), reason: reason.replace(/\s+/g, ' ').trim() });
  }
}
