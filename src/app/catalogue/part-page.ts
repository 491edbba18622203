import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { type Catalogue } from '@shared/contracts/catalogue';
import { type PartSlug } from '@shared/contracts/catalogue-parts';
import { cataloguePicture } from '@shared/drawings/catalogue-pictures';
import { Drawing } from '../ui/drawing/drawing';
import { CatalogueFrame } from './catalogue-frame';
import { chartOf } from './chart-of';
import { ComparisonTable } from './comparison-table';
import { FactTable } from './fact-table';
import { itemsOf, partOf, viewOf } from './parts/part-views';

/** One part of a unit: what it does, what there is of it, side by side. */
@Component({
  selector: 'app-part-page',
  imports: [RouterLink, CatalogueFrame, FactTable, ComparisonTable, Drawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './part-page.html',
  styleUrls: ['./catalogue.scss', './part-page.scss'],
})
export class PartPage {
  readonly catalogue = input.required<Catalogue>();
  readonly part = input.required<PartSlug>();

  protected readonly trail = [{ name: 'Catalogue', path: '/catalogue' }];
  protected readonly own = computed(() => partOf(this.part()));
  protected readonly view = computed(() => viewOf(this.part()));
  protected readonly base = computed(() => `/catalogue/${this.part()}`);
  protected readonly items = computed(() =>
    itemsOf(this.part(), this.catalogue()).map((item) => ({
      ...item,
      picture: cataloguePicture(this.part(), item),
      facts: this.view().facts(item, this.catalogue()),
      source: this.view().source(item),
    })),
  );
  protected readonly comparison = computed(() => this.view().comparison?.(this.catalogue()));
  protected readonly chart = computed(() => chartOf(this.part(), this.catalogue(), null));
}
