import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { DomSanitizer } from '@angular/platform-browser';
import { type IconName, icons } from './icons';

/** An icon; decoration only, so that the word beside it carries the meaning. */
@Component({
  selector: 'app-icon',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: '',
  styles: `
    :host {
      display: inline-flex;
      width: 1.35em;
      height: 1.35em;
      vertical-align: -0.3em;
      flex: none;
    }
    /* In a round button it stands in the middle, not on a line of text. */
    :host-context(.mat-mdc-icon-button) {
      display: block;
      width: 22px;
      height: 22px;
      margin: auto;
    }
    :host ::ng-deep svg {
      width: 100%;
      height: 100%;
      fill: currentColor;
    }
  `,
  host: { 'aria-hidden': 'true', '[innerHTML]': 'svg()' },
})
export class Icon {
  readonly name = input.required<IconName>();
  private readonly sanitizer = inject(DomSanitizer);
  /** Trusted: the text of a file of ours, chosen by a name of ours. */
  protected readonly svg = computed(() => this.sanitizer.bypassSecurityTrustHtml(icons[this.name()]));
}
