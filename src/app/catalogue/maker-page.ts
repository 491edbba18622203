import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { type Catalogue } from '@shared/contracts/catalogue';
import { formatLengthBoth, otherMeasure } from '@shared/measures/format-length';
import { formatAltitude, formatArea, formatWeight } from '@shared/measures/format-quantity';
import { Drawing } from '../ui/drawing/drawing';
import { CatalogueFrame } from './catalogue-frame';
import { drawSizeChart, type SizeRegion } from './draw-size-chart';
import { FactTable } from './fact-table';
import { type Fact } from './facts';
import { MissingItem } from './missing-item';
import { sizeWords, widthsWords } from './parts/offer-words';
import { limitsFor, unitLimits } from './size-area';

type Maker = Catalogue['fabricators'][number];

/** One maker: the sizes it can make, drawn and in words, and what it offers. */
@Component({
  selector: 'app-maker-page',
  imports: [RouterLink, CatalogueFrame, FactTable, MissingItem, Drawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './maker-page.html',
  styleUrls: ['./catalogue.scss', './maker-page.scss'],
})
export class MakerPage {
  readonly catalogue = input.required<Catalogue>();
  /** the maker's identity, from the address */
  readonly id = input.required<string>();

  protected readonly trail = [
    { name: 'Catalogue', path: '/catalogue' },
    { name: 'Makers', path: '/catalogue/makers' },
  ];
  protected readonly maker = computed(() => this.catalogue().fabricators.find(({ id }) => id === this.id()));

  protected readonly shown = computed(() => {
    const maker = this.maker();
    if (!maker) return null;
    const catalogue = this.catalogue();
    return {
      limits: limitFacts(maker),
      whole: wholeChart(maker),
      byThickness: thicknessCharts(maker, catalogue),
      offers: offersOf(maker, catalogue),
    };
  });
}

function limitFacts({ capabilities: { unit, lites, capillary }, measureSystem, plantAltitude }: Maker): Fact[] {
  const both = (mm: string) => formatLengthBoth(mm, measureSystem);
  return [
    { label: 'Smallest', value: sizeWords(unit.minWidth, unit.minHeight, measureSystem) },
    { label: 'Long edge up to', value: both(unit.maxLong) },
    { label: 'Short edge up to', value: both(unit.maxShort) },
    {
      label: 'Area up to',
      value: `${formatArea(unit.maxAreaM2, measureSystem)} (${formatArea(unit.maxAreaM2, otherMeasure(measureSystem))})`,
    },
    { label: 'Long edge against the short, up to', value: `${unit.maxAspect} ×` },
    {
      label: 'Weight up to',
      value: `${formatWeight(unit.maxWeightKg, measureSystem)} (${formatWeight(unit.maxWeightKg, otherMeasure(measureSystem))})`,
    },
    { label: 'Overall thickness up to', value: both(unit.maxOverall) },
    { label: 'Lites in a unit, up to', value: String(lites.max) },
    {
      label: 'Capillary tubes',
      value: capillary.offered ? 'fitted' : 'not fitted',
      note: `advised from ${formatAltitude(capillary.adviseAboveM, measureSystem)} between plant and site`,
    },
    { label: 'The plant lies at', value: formatAltitude(plantAltitude, measureSystem) },
  ];
}

function wholeChart({ name, capabilities, measureSystem }: Maker) {
  return drawSizeChart([{ name: 'Any unit', limits: unitLimits(capabilities), look: 'filled' }], {
    system: measureSystem,
    title: `Sizes that ${name} can make`,
    side: 460,
    upTo: Number(capabilities.unit.maxLong),
    labelled: true,
  });
}

/** A small chart for each thickness of clear glass: annealed filled, tempered dashed. */
function thicknessCharts({ capabilities, measureSystem }: Maker, { glasses, treatments }: Catalogue) {
  const kinds = (['annealed', 'tempered'] as const).flatMap((kind) =>
    treatments.filter((treatment) => treatment.kind === kind).slice(0, 1),
  );
  return glasses
    .filter(({ tint, construction }) => tint === null && construction === 'monolithic')
    .flatMap((glass) => {
      const regions = kinds.flatMap(({ id, name, kind }): SizeRegion[] => {
        const limits = limitsFor(capabilities, glass, id);
        return limits ? [{ name, limits, look: kind === 'annealed' ? 'filled' : 'dashed' }] : [];
      });
      if (regions.length === 0) return [];
      const options = {
        system: measureSystem,
        title: `Sizes in ${glass.name}`,
        side: 170,
        upTo: Number(capabilities.unit.maxLong),
        labelled: false,
      };
      return [
        {
          name: glass.name,
          chart: drawSizeChart(regions, options),
          sizes: regions.map(({ name, limits }) => ({
            name,
            size: sizeWords(String(limits.maxLong), String(limits.maxShort), measureSystem),
          })),
        },
      ];
    });
}

/** What a maker offers of one part: a line for each item with its limits, or names alone. */
interface Offer {
  name: string;
  path: string;
  lines: { name: string; words: string }[];
  plain?: string;
}

function offersOf({ capabilities }: Maker, catalogue: Catalogue): Offer[] {
  const named = (items: readonly { id: string; name: string }[], id: string) => items.find((item) => item.id === id)?.name ?? id;
  const offers: Offer[] = [
    {
      name: 'Treatments',
      path: '/catalogue/treatments',
      lines: capabilities.treatments.map(({ treatment, minNominalMm, maxNominalMm }) => ({
        name: named(catalogue.treatments, treatment),
        words: `glass of ${minNominalMm} to ${maxNominalMm} mm`,
      })),
    },
    {
      name: 'Coatings',
      path: '/catalogue/coatings',
      lines: capabilities.coatings.map(({ coating, maxPerUnit }) => ({
        name: named(catalogue.coatings, coating),
        words: maxPerUnit === 1 ? 'one in a unit' : `up to ${maxPerUnit} in a unit`,
      })),
    },
    {
      name: 'Spacers',
      path: '/catalogue/spacers',
      lines: capabilities.spacers.map(({ spacer, widths }) => ({ name: named(catalogue.spacers, spacer), words: widthsWords(widths) })),
    },
    {
      name: 'Gases',
      path: '/catalogue/gases',
      lines: capabilities.gases.map(({ gas, minCavity, maxCavity }) => ({
        name: named(catalogue.gases, gas),
        words: `cavities of ${minCavity} to ${maxCavity} mm`,
      })),
    },
    {
      name: 'Grids',
      path: '/catalogue/grids',
      lines: capabilities.grids.map(({ bar, minCavity }) => ({
        name: named(catalogue.grids, bar),
        words: `cavities from ${minCavity} mm`,
      })),
    },
    {
      name: 'Shapes',
      path: '/catalogue/shapes',
      lines: [],
      plain: catalogue.shapes
        .filter((shape) => capabilities.shapes.includes(shape.class))
        .map(({ name }) => name)
        .join(', '),
    },
    {
      name: 'Edge work',
      path: '/catalogue/edge-work',
      lines: [],
      plain: capabilities.edgeWork.map((id) => named(catalogue.edgeWork, id)).join(', '),
    },
  ];
  return offers.filter(({ lines, plain }) => lines.length > 0 || plain);
}
