import { ChangeDetectionStrategy, Component, inject, input, RESPONSE_INIT } from '@angular/core';
import { RouterLink } from '@angular/router';
import { catalogueParts } from '@shared/contracts/catalogue-parts';

/** For an address that names nothing in the catalogue. On the server the answer is 404. */
@Component({
  selector: 'app-missing-item',
  imports: [RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h1>The catalogue holds no such {{ what() }}</h1>
    <p class="lead">The address is wrong, or it was taken out. Look among what there is:</p>
    <ul>
      @for (part of parts; track part.slug) {
        <li>
          <a [routerLink]="['/catalogue', part.slug]">{{ part.name }}</a>
        </li>
      }
      <li><a routerLink="/catalogue/makers">Makers</a></li>
    </ul>
  `,
  styleUrl: './catalogue.scss',
})
export class MissingItem {
  readonly what = input('page');
  protected readonly parts = catalogueParts;

  constructor() {
    const response = inject(RESPONSE_INIT, { optional: true });
    if (response) response.status = 404;
  }
}
