import { unitFactory } from './catalogue-factory';

type Parts = Record<string, unknown>;

const good = () => structuredClone(unitFactory()) as unknown as Parts & { lites: Parts[]; cavities: Parts[] };
const withLite = (index: number, change: Parts) => {
  const unit = good();
  unit.lites[index] = { ...unit.lites[index], ...change };
  return unit;
};
const withCavity = (change: Parts) => {
  const unit = good();
  unit.cavities[0] = { ...unit.cavities[0], ...change };
  return unit;
};

/** Sizes that are no size. */
export const badSizes: unknown[] = [
  '0',
  '0.000',
  '-1',
  '-0',
  'NaN',
  'Infinity',
  '1e3',
  '12,5',
  '0x10',
  '',
  ' 927',
  '100000.1',
  '9'.repeat(400),
  '1.123456789',
  927.1,
  null,
  true,
  {},
  [],
];

/** Units that cannot be: what is wrong, the unit, and the pointer of the field within the unit. */
export const badUnits: [what: string, unit: unknown, pointer: string][] = [
  ...badSizes.map((size): [string, unknown, string] => [
    `a width of ${JSON.stringify(size).slice(0, 20)}`,
    { ...good(), width: size },
    '/width',
  ]),
  ['no height', { ...good(), height: undefined }, '/height'],
  ['an unknown glass', withLite(0, { glass: 'no-such-glass' }), '/lites/0/glass'],
  ['a glass that is no identity', withLite(1, { glass: '../../etc' }), '/lites/1/glass'],
  ['an unknown treatment', withLite(0, { treatment: 'hammered' }), '/lites/0/treatment'],
  ['an unknown coating', withLite(1, { coating: { id: 'gold-leaf', surface: 3 } }), '/lites/1/coating/id'],
  ['unknown edge work', withLite(1, { edgeWork: 'bitten' }), '/lites/1/edgeWork'],
  ['an unknown gas', withCavity({ gas: 'helium' }), '/cavities/0/gas'],
  ['an unknown spacer', withCavity({ spacer: 'oak' }), '/cavities/0/spacer'],
  ['an unknown grid bar', { ...good(), grid: { bar: 'rope', across: 1, down: 1 } }, '/grid/bar'],
  ['a coating on surface 7', withLite(1, { coating: { id: 'low-e-soft', surface: 7 } }), '/lites/1/coating/surface'],
  ['a coating on surface 0', withLite(1, { coating: { id: 'low-e-soft', surface: 0 } }), '/lites/1/coating/surface'],
  ['a coating on the other lite’s surface', withLite(1, { coating: { id: 'low-e-soft', surface: 2 } }), '/lites/1/coating/surface'],
  ['a soft coat that faces the weather', withLite(0, { coating: { id: 'low-e-soft', surface: 1 } }), '/lites/0/coating/surface'],
  ['a soft coat that faces the room', withLite(1, { coating: { id: 'low-e-soft', surface: 4 } }), '/lites/1/coating/surface'],
  ['no lites', { ...good(), lites: [] }, '/lites'],
  ['one lite', { ...good(), lites: [good().lites[0]] }, '/lites'],
  ['five lites', { ...good(), lites: Array.from({ length: 5 }, () => good().lites[0]) }, '/lites'],
  ['no cavities', { ...good(), cavities: [] }, '/cavities'],
  ['two cavities between two lites', { ...good(), cavities: [good().cavities[0], good().cavities[0]] }, '/cavities'],
  ['a cavity without width', withCavity({ width: '0' }), '/cavities/0/width'],
  ['an open tube with a gas fill', withCavity({ capillary: true }), '/cavities/0/capillary'],
  ['a tube that is no yes or no', withCavity({ capillary: 'yes' }), '/cavities/0/capillary'],
  ['a grid without bars', { ...good(), grid: { bar: 'flat-16', across: 0, down: 0 } }, '/grid/across'],
  ['half a grid bar', { ...good(), grid: { bar: 'flat-16', across: 1.5, down: 0 } }, '/grid/across'],
  ['an unknown shape', { ...good(), shape: { class: 'heart' } }, '/shape/class'],
  ['a shape without its dimensions', { ...good(), shape: { class: 'raked-head', high: 'left' } }, '/shape/lowHeight'],
  ['a low side above the high one', { ...good(), shape: { class: 'raked-head', lowHeight: '2000', high: 'left' } }, '/shape/lowHeight'],
  ['a field nobody knows', { ...good(), colour: 'red' }, '/colour'],
  ['a place that is no place', { ...good(), place: { altitude: 1e9 } }, '/place/altitude'],
  ['no unit but a word', 'unit', ''],
  ['nothing', null, ''],
];

/** Quantities that are none. */
export const badQuantities: unknown[] = [0, -1, 1.5, 10_000_000, '3', null];
