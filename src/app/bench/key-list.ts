import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatDialogModule } from '@angular/material/dialog';

/** The keys of the Bench. */
@Component({
  selector: 'app-key-list',
  imports: [MatButton, MatDialogModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 mat-dialog-title>Keys of the Bench</h2>
    <mat-dialog-content>
      <dl>
        @for (key of keys; track key.does) {
          <dt>
            @for (name of key.names; track name) {
              <kbd>{{ name }}</kbd>
            }
          </dt>
          <dd>{{ key.does }}</dd>
        }
      </dl>
    </mat-dialog-content>
    <mat-dialog-actions align="end"><button matButton type="button" mat-dialog-close>Close</button></mat-dialog-actions>
  `,
  styles: `
    dl {
      display: grid;
      grid-template-columns: auto 1fr;
      gap: 10px 18px;
      margin: 0;
    }
    dd {
      margin: 0;
    }
    kbd {
      padding: 1px 7px;
      margin-right: 4px;
      border: 1px solid var(--sy-edge);
      border-radius: 4px;
      color: var(--sy-ink);
      font: inherit;
      font-size: 13px;
      white-space: nowrap;
    }
  `,
})
export class KeyList {
  protected readonly keys = [
    { names: ['Enter'], does: 'In size, number or tag: add the line, keep the make-up, and back to the width' },
    { names: ['Ctrl', 'Enter'], does: 'Anywhere: the same' },
    { names: ['↑', '↓'], does: 'In a size: a sixteenth of an inch or a millimetre more or less' },
    { names: ['Shift', '↑', '↓'], does: 'In a size: an inch or ten millimetres more or less' },
    { names: ['↑', '↓'], does: 'On a layer of the make-up: to the next layer' },
    { names: ['?'], does: 'Outside of fields: this list' },
  ];
}
