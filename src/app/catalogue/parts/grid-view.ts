import { type GridItem } from '@shared/contracts/catalogue';
import { decimals } from '../facts';
import { type PartView } from './part-view';

/** The window in which the covered share is reckoned, mm, and its bars. */
const example = { width: 900, height: 1200, across: 2, down: 3 };

export const gridView: PartView<GridItem> = {
  slug: 'grids',
  kind: 'grid bar for sealed units',
  lead: 'Bars inside the cavity that make one pane look like many. They are sealed in, so the glass stays flat to clean.',
  guide: [
    'A bar needs room on both sides: if it touches the lites, it carries heat across and may rattle or mark a coating. The cavity must be deeper than the bar by what the maker asks for.',
    'Bars are counted upright and level: two upright and three level bars make twelve fields.',
    'U-values here are those of the glass between the bars. The bars themselves let a little more heat through.',
  ],
  facts: ({ widthMm, depthMm }) => [
    { label: 'Width seen', value: String(widthMm), unit: 'mm' },
    { label: 'Depth', value: String(depthMm), unit: 'mm', note: 'the cavity must be deeper than this' },
  ],
  source: () => null,
  comparison: ({ grids, fabricators }) => ({
    title: 'Bars side by side',
    intro: `In a pane of ${example.width} × ${example.height} mm with ${example.across} upright and ${example.down} level bars.`,
    columns: [
      { label: 'Width', unit: 'mm' },
      { label: 'Depth', unit: 'mm' },
      { label: 'Narrowest cavity offered', unit: 'mm' },
      { label: 'Glass covered', unit: '%' },
    ],
    rows: grids.map(({ id, name, widthMm, depthMm }) => {
      const cavities = fabricators.flatMap(({ capabilities }) =>
        capabilities.grids.filter(({ bar }) => bar === id).map(({ minCavity }) => Number(minCavity)),
      );
      return {
        item: id,
        name,
        cells: [
          String(widthMm),
          String(depthMm),
          cavities.length > 0 ? String(Math.min(...cavities)) : 'none',
          decimals(coveredShare(widthMm) * 100, 1),
        ],
      };
    }),
    method: 'Covered share by geometry: the bars, less where they cross, over the whole pane.',
  }),
  offer: (grid) => (maker) => {
    const own = maker.capabilities.grids.find(({ bar }) => bar === grid.id);
    return own ? `cavities from ${own.minCavity} mm` : null;
  },
};

function coveredShare(bar: number): number {
  const { width, height, across, down } = example;
  return (across * bar * height + down * bar * width - across * down * bar * bar) / (width * height);
}
