import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Session } from './session/session';

@Component({
  selector: 'app-not-found-page',
  imports: [RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="sy-page">
      <h1>There is nothing here</h1>
      <p class="text">
        The address is wrong, the thing is gone, or it is not for
        {{ session.user() ? 'your role' : 'visitors' }}.
      </p>
      <p>
        <a routerLink="/">Front page</a>
        @if (!session.user()) {
          · <a routerLink="/sign-in">Sign in</a>
        }
      </p>
    </div>
  `,
  styles: `
    .text {
      margin: 12px 0;
    }
  `,
})
export class NotFoundPage {
  protected readonly session = inject(Session);
}
