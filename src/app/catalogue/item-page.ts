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
import { MissingItem } from './missing-item';
import { OfferTable } from './offer-table';
import { itemsOf, partOf, viewOf } from './parts/part-views';

/** One item: its figures, how it compares with the others of its part, and who makes it. */
@Component({
  selector: 'app-item-page',
  imports: [RouterLink, CatalogueFrame, FactTable, ComparisonTable, OfferTable, MissingItem, Drawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './item-page.html',
  styleUrls: ['./catalogue.scss', './item-page.scss'],
})
export class ItemPage {
  readonly catalogue = input.required<Catalogue>();
  readonly part = input.required<PartSlug>();
  /** the item's identity, from the address */
  readonly id = input.required<string>();

  protected readonly own = computed(() => partOf(this.part()));
  protected readonly base = computed(() => `/catalogue/${this.part()}`);
  protected readonly trail = computed(() => [
    { name: 'Catalogue', path: '/catalogue' },
    { name: this.own().name, path: this.base() },
  ]);
  private readonly items = computed(() => itemsOf(this.part(), this.catalogue()));
  protected readonly view = computed(() => viewOf(this.part()));
  protected readonly item = computed(() => this.items().find(({ id }) => id === this.id()));
  protected readonly siblings = computed(() => this.items().filter(({ id }) => id !== this.id()));
  protected readonly comparison = computed(() => this.view().comparison?.(this.catalogue()));
  protected readonly chart = computed(() => chartOf(this.part(), this.catalogue(), this.id()));

  protected readonly shown = computed(() => {
    const item = this.item();
    if (!item) return null;
    const catalogue = this.catalogue();
    const view = this.view();
    const offer = view.offer(item);
    return {
      picture: cataloguePicture(this.part(), item),
      facts: view.facts(item, catalogue),
      source: view.source(item),
      make: view.bench?.(item, catalogue) ?? null,
      offers: catalogue.fabricators.map((maker) => ({ id: maker.id, name: maker.name, words: offer(maker) })),
    };
  });
}
