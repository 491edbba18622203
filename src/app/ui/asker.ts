import { inject, Injectable, Injector, type Type } from '@angular/core';
import { firstValueFrom } from 'rxjs';
import { type ConfirmQuestion } from './confirm-dialog';
import { type ReasonQuestion } from './reason-dialog';

/** Opens dialogs, whose code is fetched when the first of them is asked for. Focus returns to where it was. */
@Injectable({ providedIn: 'root' })
export class Asker {
  private readonly injector = inject(Injector);

  /** true when the person said so */
  async confirm(question: ConfirmQuestion): Promise<boolean> {
    const answer = await this.open<boolean>(async () => (await import('./confirm-dialog')).ConfirmDialog, question);
    return answer === true;
  }

  /** the reason given, or undefined when the person let it be */
  async reason(question: ReasonQuestion): Promise<string | undefined> {
    return this.open<string>(async () => (await import('./reason-dialog')).ReasonDialog, question);
  }

  /**
   * @param find fetches the dialog's component
   * @param data reaches it as MAT_DIALOG_DATA
   * @param width of the dialog on a wide screen, CSS pixels
   * @returns what it was closed with
   */
  async open<Answer>(find: () => Promise<Type<unknown>>, data?: unknown, width = 480): Promise<Answer | undefined> {
    const [component, { MatDialog }] = await Promise.all([find(), import('@angular/material/dialog')]);
    const dialog = this.injector.get(MatDialog).open<unknown, unknown, Answer>(component, {
      data,
      width: `${width}px`,
      maxWidth: 'calc(100vw - 24px)',
      restoreFocus: true,
      autoFocus: 'first-tabbable',
    });
    return firstValueFrom(dialog.afterClosed());
  }
}
