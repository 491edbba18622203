import { LiveAnnouncer } from '@angular/cdk/a11y';
import { ChangeDetectionStrategy, Component, DOCUMENT, inject, input, signal } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { Icon } from './icon';

/** Copies a text, such as a payment reference, and says so. */
@Component({
  selector: 'app-copy-button',
  imports: [MatIconButton, Icon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <button matIconButton type="button" [attr.aria-label]="'Copy ' + what()" [title]="'Copy ' + what()" (click)="copy()">
      <app-icon [name]="done() ? 'check' : 'content_copy'" />
    </button>
  `,
})
export class CopyButton {
  readonly text = input.required<string>();
  /** what it is, in words: `the reference` */
  readonly what = input.required<string>();
  private readonly announcer = inject(LiveAnnouncer);
  private readonly document = inject(DOCUMENT);
  protected readonly done = signal(false);

  protected async copy(): Promise<void> {
    try {
      await this.document.defaultView?.navigator.clipboard.writeText(this.text());
      this.done.set(true);
      await this.announcer.announce(`Copied ${this.what()}`);
    } catch {
      // Without leave to use the clipboard the text stays on the screen, to be marked by hand.
      await this.announcer.announce(`${this.what()} could not be copied; mark it and copy it by hand`);
    }
  }
}
