import { type PriceListContent } from '@shared/contracts/price-lists';
import { exact } from '@shared/money/exact';

/** The three invented lists of the demo market, as they stand today. They differ in shape on purpose. */

const glassRates = (rates: Record<string, string>) => Object.entries(rates).map(([glass, rate]) => ({ glass, rate }));
const byThickness = (treatment: string, rates: [nominalMm: number, rate: string][]) =>
  rates.map(([nominalMm, rate]) => ({ treatment, nominalMm, rate }));
const everywhere = ['goods', 'minimum order', 'delivery', 'crates', 'surcharge', 'rush'] as const;

/** Imperial, steps of 2 in, standard sizes, percentages by united inches. */
export const northmereList: PriceListContent = {
  currency: 'USD',
  measure: 'imperial',
  billing: { increment: '2', minimumArea: '3' },
  glass: glassRates({
    'clear-2.5': '1.85',
    'clear-3': '2.10',
    'clear-4': '2.65',
    'clear-5': '3.20',
    'clear-6': '3.85',
    'clear-8': '6.40',
    'clear-10': '8.95',
    'clear-12': '11.80',
    'bronze-6': '5.40',
    'grey-6': '5.40',
    'obscured-4': '3.95',
    'laminated-clear-6': '8.70',
    'laminated-clear-8': '10.90',
  }),
  treatments: [
    ...byThickness('tempered', [
      [3, '1.95'],
      [4, '2.20'],
      [5, '2.45'],
      [6, '2.70'],
      [8, '3.60'],
      [10, '4.80'],
      [12, '6.25'],
    ]),
    ...byThickness('heat-strengthened', [
      [4, '2.05'],
      [5, '2.30'],
      [6, '2.55'],
      [8, '3.40'],
      [10, '4.50'],
    ]),
  ],
  coatings: [
    { coating: 'low-e-soft', rate: '1.35' },
    { coating: 'low-e-solar', rate: '1.95' },
    { coating: 'low-e-hard', rate: '1.05' },
  ],
  assembly: [
    { cavity: 1, rate: '3.40' },
    { cavity: 2, rate: '3.10' },
  ],
  spacers: [
    { spacer: 'aluminium', rate: '0.41' },
    { spacer: 'stainless', rate: '0.62' },
    { spacer: 'warm-edge', rate: '0.88' },
  ],
  gases: [
    { gas: 'air', rate: '0', minimum: '0' },
    { gas: 'argon', rate: '0.55', minimum: '2.00' },
    { gas: 'krypton', rate: '4.75', minimum: '12.00' },
  ],
  grids: [
    { bar: 'flat-16', rate: '0.95', perCrossing: '0.75' },
    { bar: 'profiled-19', rate: '1.40', perCrossing: '1.10' },
  ],
  edgeWork: [
    { edgeWork: 'seamed', rate: '0.12' },
    { edgeWork: 'ground', rate: '0.48' },
  ],
  shapes: [
    { shape: 'raked-head', percent: '25', fixed: '18.00' },
    { shape: 'gable', percent: '30', fixed: '24.00' },
    { shape: 'segment-arch', percent: '45', fixed: '35.00' },
    { shape: 'half-round', percent: '45', fixed: '35.00' },
    { shape: 'circle', percent: '60', fixed: '40.00' },
    { shape: 'ellipse', percent: '70', fixed: '45.00' },
    { shape: 'triangle', percent: '35', fixed: '20.00' },
    { shape: 'octagon', percent: '50', fixed: '28.00' },
    { shape: 'polygon', percent: '50', fixed: '35.00' },
  ],
  extras: [
    { id: 'capillary-tube', name: 'Capillary tube', applies: 'capillary', per: 'cavity', rate: '3.25' },
    { id: 'setting-blocks', name: 'Setting blocks', applies: 'asked', per: 'unit', rate: '0.90' },
  ],
  standardSizes: (
    [
      [24, 36],
      [24, 48],
      [28, 54],
      [28, 62],
      [30, 36],
      [30, 48],
      [30, 60],
      [32, 48],
      [34, 62],
      [36, 36],
      [36, 42],
      [36, 48],
      [36, 54],
      [36, 60],
      [36, 72],
      [42, 42],
      [42, 54],
      [42, 60],
      [46, 76],
      [48, 48],
      [48, 60],
      [48, 72],
      [60, 36],
      [60, 48],
      [60, 60],
    ] as const
  ).map(([width, height]) => ({ width: String(width), height: String(height) })),
  sizeCharges: {
    nonStandard: { percent: '6', fixed: '0' },
    bands: [
      { kind: 'united', above: '80', percent: '8', fixed: '0' },
      { kind: 'united', above: '100', percent: '15', fixed: '0' },
      { kind: 'united', above: '130', percent: '24', fixed: '0' },
      { kind: 'weight', above: '150', percent: '0', fixed: '35.00' },
      { kind: 'weight', above: '250', percent: '0', fixed: '80.00' },
    ],
  },
  tiers: [
    { tier: 'A', percents: { glass: '5', treatment: '5', coating: '5', assembly: '5' } },
    { tier: 'B', percents: { glass: '12', treatment: '12', coating: '12', assembly: '12', gas: '5' } },
    { tier: 'C', percents: { glass: '18', treatment: '16', coating: '15', assembly: '18', gas: '8', spacer: '5' } },
  ],
  quantityBreaks: [
    { atLeast: 5, percent: '3' },
    { atLeast: 20, percent: '5' },
    { atLeast: 60, percent: '7.5' },
  ],
  orderCharges: {
    minimumOrder: '75.00',
    delivery: [
      { zone: 'local', flat: '25.00', perWeight: '0', freeAbove: '500.00' },
      { zone: 'regional', flat: '45.00', perWeight: '0.04', freeAbove: '2500.00' },
      { zone: 'remote', flat: '120.00', perWeight: '0.11', freeAbove: null },
    ],
    crates: null,
    surcharge: { label: 'Energy surcharge', percent: '1.75' },
    rush: [{ leadTimeClass: 'rush', percent: '25' }],
  },
  tax: [
    {
      jurisdiction: 'US-OH',
      label: 'Sales tax, Ohio',
      rate: '7.25',
      on: ['goods', 'minimum order', 'delivery', 'crates', 'surcharge', 'rush'],
    },
    { jurisdiction: 'US-IL', label: 'Sales tax, Illinois', rate: '8.25', on: ['goods', 'minimum order', 'surcharge', 'rush'] },
    { jurisdiction: 'US-CO', label: 'Sales tax, Colorado', rate: '4.75', on: ['goods', 'minimum order', 'surcharge', 'rush'] },
  ],
};

/** Imperial, steps of 1 in, no standard sizes, fixed charges by area and long edge. */
export const kestrelFordList: PriceListContent = {
  ...northmereList,
  billing: { increment: '1', minimumArea: '4' },
  glass: glassRates({
    'clear-3': '2.25',
    'clear-4': '2.70',
    'clear-5': '3.15',
    'clear-6': '3.70',
    'clear-8': '6.05',
    'clear-10': '8.40',
    'clear-12': '10.95',
    'bronze-6': '5.10',
    'grey-6': '5.10',
    'laminated-clear-6': '8.25',
    'laminated-clear-8': '10.20',
  }),
  treatments: [
    ...byThickness('tempered', [
      [3, '2.15'],
      [4, '2.30'],
      [5, '2.40'],
      [6, '2.55'],
      [8, '3.35'],
      [10, '4.35'],
      [12, '5.70'],
    ]),
    ...byThickness('heat-strengthened', [
      [5, '2.20'],
      [6, '2.35'],
      [8, '3.10'],
      [10, '4.05'],
      [12, '5.30'],
    ]),
  ],
  coatings: [
    { coating: 'low-e-soft', rate: '1.42' },
    { coating: 'low-e-solar', rate: '1.80' },
  ],
  assembly: [
    { cavity: 1, rate: '3.55' },
    { cavity: 2, rate: '3.55' },
  ],
  spacers: [
    { spacer: 'aluminium', rate: '0.44' },
    { spacer: 'stainless', rate: '0.60' },
    { spacer: 'warm-edge', rate: '0.95' },
  ],
  gases: [
    { gas: 'air', rate: '0', minimum: '0' },
    { gas: 'argon', rate: '0.48', minimum: '2.50' },
  ],
  grids: [{ bar: 'flat-16', rate: '1.05', perCrossing: '0.60' }],
  edgeWork: [
    { edgeWork: 'seamed', rate: '0' },
    { edgeWork: 'ground', rate: '0.42' },
    { edgeWork: 'polished', rate: '0.95' },
  ],
  shapes: [
    { shape: 'raked-head', percent: '20', fixed: '30.00' },
    { shape: 'triangle', percent: '30', fixed: '30.00' },
    { shape: 'polygon', percent: '40', fixed: '45.00' },
  ],
  extras: [
    { id: 'capillary-tube', name: 'Capillary tube', applies: 'capillary', per: 'cavity', rate: '2.80' },
    { id: 'label', name: 'Label and cork pads', applies: 'always', per: 'unit', rate: '0.35' },
    { id: 'survey', name: 'Site survey', applies: 'asked', per: 'line', rate: '85.00' },
  ],
  standardSizes: [],
  sizeCharges: {
    nonStandard: null,
    bands: [
      { kind: 'area', above: '15', percent: '0', fixed: '8.50' },
      { kind: 'area', above: '25', percent: '0', fixed: '22.00' },
      { kind: 'area', above: '40', percent: '4', fixed: '48.00' },
      { kind: 'long edge', above: '84', percent: '0', fixed: '30.00' },
      { kind: 'long edge', above: '108', percent: '0', fixed: '75.00' },
      { kind: 'weight', above: '300', percent: '0', fixed: '60.00' },
    ],
  },
  tiers: [
    { tier: 'A', percents: { glass: '4', assembly: '6' } },
    { tier: 'B', percents: { glass: '10', treatment: '8', assembly: '14', spacer: '10' } },
    { tier: 'C', percents: { glass: '16', treatment: '15', coating: '10', assembly: '20', spacer: '15', gas: '10', size: '10' } },
  ],
  quantityBreaks: [
    { atLeast: 10, percent: '2.5' },
    { atLeast: 40, percent: '6' },
  ],
  orderCharges: {
    minimumOrder: null,
    delivery: [
      { zone: 'local', flat: '60.00', perWeight: '0.02', freeAbove: null },
      { zone: 'regional', flat: '60.00', perWeight: '0.03', freeAbove: '4000.00' },
      { zone: 'remote', flat: '180.00', perWeight: '0.09', freeAbove: null },
    ],
    crates: { unitsPerCrate: 12, each: '18.00' },
    surcharge: null,
    rush: [{ leadTimeClass: 'rush', percent: '35' }],
  },
};

/** Metric, steps of 50 mm, fixed and percent size charges, VAT on everything. */
export const aldersundList: PriceListContent = {
  currency: 'EUR',
  measure: 'metric',
  billing: { increment: '50', minimumArea: '0.35' },
  glass: glassRates({
    'clear-4': '24.50',
    'clear-5': '29.80',
    'clear-6': '35.40',
    'clear-8': '58.00',
    'clear-10': '79.50',
    'obscured-4': '36.00',
    'laminated-clear-6': '74.00',
    'laminated-clear-8': '92.00',
  }),
  treatments: [
    ...byThickness('tempered', [
      [4, '19.50'],
      [5, '21.00'],
      [6, '23.50'],
      [8, '31.00'],
      [10, '41.00'],
    ]),
    ...byThickness('heat-strengthened', [
      [4, '19.00'],
      [5, '20.50'],
      [6, '22.50'],
      [8, '29.50'],
      [10, '39.00'],
    ]),
  ],
  coatings: [
    { coating: 'low-e-soft', rate: '11.20' },
    { coating: 'low-e-solar', rate: '16.40' },
  ],
  assembly: [
    { cavity: 1, rate: '33.00' },
    { cavity: 2, rate: '27.00' },
  ],
  spacers: [
    { spacer: 'stainless', rate: '1.75' },
    { spacer: 'warm-edge', rate: '2.35' },
  ],
  gases: [
    { gas: 'air', rate: '0', minimum: '0' },
    { gas: 'argon', rate: '4.80', minimum: '1.90' },
    { gas: 'krypton', rate: '38.00', minimum: '11.00' },
  ],
  grids: [{ bar: 'profiled-19', rate: '6.40', perCrossing: '1.50' }],
  edgeWork: [
    { edgeWork: 'seamed', rate: '0.35' },
    { edgeWork: 'polished', rate: '3.60' },
  ],
  shapes: [
    { shape: 'raked-head', percent: '22', fixed: '25.00' },
    { shape: 'gable', percent: '28', fixed: '32.00' },
    { shape: 'segment-arch', percent: '40', fixed: '48.00' },
    { shape: 'half-round', percent: '40', fixed: '48.00' },
    { shape: 'circle', percent: '55', fixed: '55.00' },
    { shape: 'triangle', percent: '30', fixed: '30.00' },
  ],
  extras: [{ id: 'frost-pallet', name: 'Winter packing', applies: 'asked', per: 'line', rate: '14.00' }],
  standardSizes: (
    [
      [588, 1188],
      [588, 1388],
      [788, 988],
      [788, 1188],
      [988, 988],
      [988, 1188],
      [988, 1388],
      [1188, 1188],
      [1188, 1388],
      [1488, 1388],
    ] as const
  ).map(([width, height]) => ({
    width: String(width),
    height: String(height),
  })),
  sizeCharges: {
    nonStandard: { percent: '3', fixed: '2.40' },
    bands: [
      { kind: 'area', above: '2.5', percent: '6', fixed: '0' },
      { kind: 'area', above: '4', percent: '14', fixed: '25.00' },
      { kind: 'long edge', above: '2400', percent: '0', fixed: '28.00' },
      { kind: 'weight', above: '90', percent: '0', fixed: '32.00' },
    ],
  },
  tiers: [
    { tier: 'A', percents: { glass: '6', coating: '6' } },
    { tier: 'B', percents: { glass: '11', treatment: '9', coating: '11', assembly: '8' } },
    { tier: 'C', percents: { glass: '17', treatment: '14', coating: '17', assembly: '15', spacer: '6', gas: '6', size: '20' } },
  ],
  quantityBreaks: [
    { atLeast: 6, percent: '2' },
    { atLeast: 24, percent: '4.5' },
  ],
  orderCharges: {
    minimumOrder: '120.00',
    delivery: [
      { zone: 'local', flat: '190.00', perWeight: '0.35', freeAbove: null },
      { zone: 'regional', flat: '210.00', perWeight: '0.38', freeAbove: null },
      { zone: 'remote', flat: '320.00', perWeight: '0.52', freeAbove: null },
    ],
    crates: { unitsPerCrate: 8, each: '46.00' },
    surcharge: { label: 'Gas and energy surcharge', percent: '2.4' },
    rush: [{ leadTimeClass: 'rush', percent: '30' }],
  },
  tax: ['US-OH', 'US-IL', 'US-CO'].map((jurisdiction) => ({
    jurisdiction,
    label: 'Import VAT, invented',
    rate: '25',
    on: [...everywhere],
  })),
};

/**
 * The same list with every rate for glass, work and material changed by a percentage (`-3` lowers)
 * and rounded half up to the cent. What is itself a percentage stays, and so do order charges.
 */
export function raise(content: PriceListContent, percent: string): PriceListContent {
  const factor = exact(percent).dividedBy(100).plus(1);
  const raised = (rate: string) => exact(rate).times(factor).toFixed(2);
  const rows = <Row extends { rate: string }>(entries: Row[]): Row[] => entries.map((row) => ({ ...row, rate: raised(row.rate) }));
  return {
    ...content,
    glass: rows(content.glass),
    treatments: rows(content.treatments),
    coatings: rows(content.coatings),
    assembly: rows(content.assembly),
    spacers: rows(content.spacers),
    gases: rows(content.gases).map((row) => ({ ...row, minimum: raised(row.minimum) })),
    grids: rows(content.grids).map((row) => ({ ...row, perCrossing: raised(row.perCrossing) })),
    edgeWork: rows(content.edgeWork),
  };
}
