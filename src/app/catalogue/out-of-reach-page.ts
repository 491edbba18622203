import { ChangeDetectionStrategy, Component, inject, RESPONSE_INIT } from '@angular/core';

/** The catalogue could not be read: what to do then. */
@Component({
  selector: 'app-out-of-reach-page',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="sy-page">
      <h1>The catalogue cannot be read just now</h1>
      <p class="lead">Nothing is lost. Look whether you are connected, then try again.</p>
      <p><a class="do" href="/catalogue">Try again</a></p>
    </div>
  `,
  styleUrl: './catalogue.scss',
  styles: `
    .do {
      margin-top: 18px;
    }
  `,
})
export class OutOfReachPage {
  constructor() {
    const response = inject(RESPONSE_INIT, { optional: true });
    if (response) response.status = 503;
  }
}
