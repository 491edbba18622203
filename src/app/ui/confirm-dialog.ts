import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule } from '@angular/material/dialog';

export interface ConfirmQuestion {
  /** names the thing: `Remove Q-000012?` */
  title: string;
  /** what happens, and what does not */
  text: string;
  /** the words on the button that does it */
  confirm: string;
  /** the words on the button that does not; `Keep it as it is` where absent */
  cancel?: string;
}

/** Asks once before something that cannot be undone. Closes with true or nothing. */
@Component({
  selector: 'app-confirm-dialog',
  imports: [MatDialogModule, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 mat-dialog-title>{{ question.title }}</h2>
    <mat-dialog-content>
      <p>{{ question.text }}</p>
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton type="button" mat-dialog-close cdkFocusInitial>{{ question.cancel ?? 'Keep it as it is' }}</button>
      <button matButton="filled" type="button" [mat-dialog-close]="true">{{ question.confirm }}</button>
    </mat-dialog-actions>
  `,
})
export class ConfirmDialog {
  protected readonly question = inject<ConfirmQuestion>(MAT_DIALOG_DATA);
}
