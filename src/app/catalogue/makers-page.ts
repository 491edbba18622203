import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { type Catalogue } from '@shared/contracts/catalogue';
import { formatArea } from '@shared/measures/format-quantity';
import { Drawing } from '../ui/drawing/drawing';
import { CatalogueFrame } from './catalogue-frame';
import { drawSizeChart } from './draw-size-chart';
import { sizeWords } from './parts/offer-words';
import { unitLimits } from './size-area';

/** The makers, each with the sizes that it can make, at one scale. */
@Component({
  selector: 'app-makers-page',
  imports: [RouterLink, CatalogueFrame, Drawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-catalogue-frame [trail]="trail">
      <h1>Makers</h1>
      <p class="lead">
        The fabricators on Sealyard. Each makes what its machines can; the Bench asks all of them at once and says who can build a unit and,
        if not, why.
      </p>
      @for (maker of makers(); track maker.id) {
        <article>
          <app-drawing [drawing]="maker.chart" />
          <div>
            <h2>
              <a [routerLink]="['/catalogue/makers', maker.id]">{{ maker.name }}</a>
            </h2>
            <p class="sy-soft">{{ maker.town }}</p>
            <p>{{ maker.about }}</p>
            <p>Up to {{ maker.largest }}, {{ maker.area }}; {{ maker.lites }}. Tempers glass {{ maker.tempers }}.</p>
          </div>
        </article>
      } @empty {
        <p>No maker has been admitted yet.</p>
      }
    </app-catalogue-frame>
  `,
  styleUrl: './catalogue.scss',
  styles: `
    article {
      display: grid;
      grid-template-columns: 190px minmax(0, 1fr);
      gap: 12px 36px;
      align-items: start;
      padding: 26px 0;
      border-top: 1px solid var(--sy-line);
    }
    .lead {
      margin-bottom: 24px;
    }
    h2 {
      margin: 0;
    }
    @media (max-width: 560px) {
      article {
        grid-template-columns: minmax(0, 1fr);
      }
      article > app-drawing {
        max-width: 190px;
      }
    }
  `,
})
export class MakersPage {
  readonly catalogue = input.required<Catalogue>();
  protected readonly trail = [{ name: 'Catalogue', path: '/catalogue' }];

  protected readonly makers = computed(() => {
    const { fabricators, treatments } = this.catalogue();
    const upTo = Math.max(...fabricators.map(({ capabilities }) => Number(capabilities.unit.maxLong)));
    const tempered = treatments.filter(({ kind }) => kind === 'tempered').map(({ id }) => id);
    return fabricators.map(({ id, name, town, about, measureSystem, capabilities }) => {
      const { unit, lites, treatments: ovens } = capabilities;
      const least = Math.min(...ovens.filter(({ treatment }) => tempered.includes(treatment)).map(({ minNominalMm }) => minNominalMm));
      return {
        id,
        name,
        town,
        about,
        largest: sizeWords(unit.maxLong, unit.maxShort, measureSystem),
        area: formatArea(unit.maxAreaM2, measureSystem),
        lites: lites.max > 2 ? 'double and triple units' : 'double units',
        tempers: Number.isFinite(least) ? `from ${least} mm up` : 'elsewhere',
        chart: drawSizeChart([{ name, limits: unitLimits(capabilities), look: 'filled' }], {
          system: measureSystem,
          title: `Sizes that ${name} can make`,
          side: 190,
          upTo,
          labelled: false,
        }),
      };
    });
  });
}
