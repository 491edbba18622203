import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink, RouterLinkActive } from '@angular/router';
import { catalogueParts } from '@shared/contracts/catalogue-parts';

interface Step {
  name: string;
  path: string;
}

const parts: readonly Step[] = catalogueParts.map(({ slug, name }) => ({ name, path: `/catalogue/${slug}` }));
const pages: readonly Step[] = [
  { name: 'How a unit is made', path: '/catalogue/how-a-unit-is-made' },
  { name: 'Sizes and measuring', path: '/catalogue/sizes' },
  { name: 'Questions', path: '/catalogue/questions' },
  { name: 'Makers', path: '/catalogue/makers' },
];

/** What stands round every page of the catalogue: where one is, where else one can go, and what the figures are not. */
@Component({
  selector: 'app-catalogue-frame',
  imports: [RouterLink, RouterLinkActive],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './catalogue-frame.html',
  styleUrl: './catalogue-frame.scss',
})
export class CatalogueFrame {
  /** the pages above this one, outermost first */
  readonly trail = input.required<readonly Step[]>();
  protected readonly parts = parts;
  protected readonly pages = pages;
}
