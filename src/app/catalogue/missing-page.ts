import { ChangeDetectionStrategy, Component } from '@angular/core';
import { CatalogueFrame } from './catalogue-frame';
import { MissingItem } from './missing-item';

/** An address below the catalogue that leads nowhere. */
@Component({
  selector: 'app-missing-page',
  imports: [CatalogueFrame, MissingItem],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-catalogue-frame [trail]="trail">
      <app-missing-item />
    </app-catalogue-frame>
  `,
})
export class MissingPage {
  protected readonly trail = [{ name: 'Catalogue', path: '/catalogue' }];
}
