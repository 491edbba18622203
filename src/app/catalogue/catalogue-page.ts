import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { type Catalogue } from '@shared/contracts/catalogue';
import { catalogueParts } from '@shared/contracts/catalogue-parts';
import { cataloguePicture } from '@shared/drawings/catalogue-pictures';
import { Drawing } from '../ui/drawing/drawing';
import { CatalogueFrame } from './catalogue-frame';
import { itemsOf, viewOf } from './parts/part-views';

/** The way into the catalogue: every part, and the pages that explain. */
@Component({
  selector: 'app-catalogue-page',
  imports: [RouterLink, CatalogueFrame, Drawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-catalogue-frame [trail]="[]">
      <h1>Catalogue</h1>
      <p class="lead">
        What a sealed unit is made of, part by part: what each does, its figures and where they come from, and who makes it.
      </p>
      <ul class="parts">
        @for (part of parts(); track part.slug) {
          <li>
            @if (part.picture; as picture) {
              <app-drawing [drawing]="picture" />
            }
            <div>
              <h2>
                <a [routerLink]="['/catalogue', part.slug]">{{ part.name }}</a>
              </h2>
              <p>{{ part.lead }}</p>
              <p class="items">
                @for (item of part.items; track item.id) {
                  <a [routerLink]="['/catalogue', part.slug, item.id]">{{ item.name }}</a>
                }
              </p>
            </div>
          </li>
        }
      </ul>
      <h2>Good to know</h2>
      <ul class="guides">
        <li><a routerLink="/catalogue/how-a-unit-is-made">How a unit is made</a> and how moisture gets in and fogs it</li>
        <li><a routerLink="/catalogue/sizes">Sizes and measuring</a>, from the opening to the unit</li>
        <li><a routerLink="/catalogue/makers">Makers</a> and the sizes each of them can make</li>
        <li><a routerLink="/catalogue/questions">Questions</a>, answered as far as one honestly can</li>
      </ul>
    </app-catalogue-frame>
  `,
  styleUrl: './catalogue.scss',
  styles: `
    .parts {
      display: grid;
      grid-template-columns: repeat(auto-fill, minmax(400px, 1fr));
      gap: 0 44px;
      list-style: none;
      margin: 28px 0 0;
      padding: 0;
    }
    .parts li {
      display: grid;
      grid-template-columns: 124px minmax(0, 1fr);
      gap: 22px;
      align-items: start;
      padding: 22px 0;
      border-top: 1px solid var(--sy-line);
    }
    .parts h2 {
      margin: 0 0 4px;
    }
    .items {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 14px;
      font-size: 14px;
    }
    .guides {
      margin: 0;
      padding: 0;
      list-style: none;
    }
    .guides li {
      padding: 4px 0;
    }
    @media (max-width: 560px) {
      .parts {
        grid-template-columns: minmax(0, 1fr);
      }
      .parts li {
        grid-template-columns: 88px minmax(0, 1fr);
        gap: 16px;
      }
    }
  `,
})
export class CataloguePage {
  readonly catalogue = input.required<Catalogue>();

  protected readonly parts = computed(() =>
    catalogueParts.map((part) => {
      const items = itemsOf(part.slug, this.catalogue());
      const shown = items[1] ?? items[0];
      return { ...part, lead: viewOf(part.slug).lead, items, picture: shown ? cataloguePicture(part.slug, shown) : null };
    }),
  );
}
