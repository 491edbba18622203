import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';

export interface ReasonQuestion {
  title: string;
  /** who will read the reason, and what happens */
  text: string;
  confirm: string;
  cancel?: string;
}

/** Asks why before a move that needs a reason. Closes with the reason, or with nothing. */
@Component({
  selector: 'app-reason-dialog',
  imports: [MatDialogModule, MatButton, ReactiveFormsModule, MatFormFieldModule, MatInput],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form (submit)="give($event)">
      <h2 mat-dialog-title>{{ question.title }}</h2>
      <mat-dialog-content>
        <p class="text">{{ question.text }}</p>
        <mat-form-field appearance="outline">
          <mat-label>Reason</mat-label>
          <textarea matInput rows="3" maxlength="300" cdkFocusInitial required [formControl]="reason"></textarea>
          <mat-error>Say why, in a sentence.</mat-error>
        </mat-form-field>
      </mat-dialog-content>
      <mat-dialog-actions align="end">
        <button matButton type="button" mat-dialog-close>{{ question.cancel ?? 'Keep it as it is' }}</button>
        <button matButton="filled" type="submit">{{ question.confirm }}</button>
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
export class ReasonDialog {
  protected readonly question = inject<ReasonQuestion>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<ReasonDialog, string>>(MatDialogRef);
  protected readonly reason = inject(NonNullableFormBuilder).control('', [Validators.required, Validators.pattern(/\S/)]);

  protected give(event: Event): void {
    event.preventDefault();
    this.reason.markAsTouched();
    // The reason is one line on paper; line breaks typed into the box become spaces.
    if (this.reason.valid) this.dialog.close(this.reason.value.replace(/\s+/g, ' ').trim());
  }
}
