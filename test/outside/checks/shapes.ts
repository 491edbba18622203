import { det, distance } from 'mathjs';
import { areaOf, perimeterOf } from '@shared/glazing/geometry';
import { outlineOf } from '@shared/glazing/outline';
import type { Shape } from '@shared/contracts/units';
import { glassDensity } from '@shared/glazing/weight';
import { catalogueData } from '../../../seeds/reference/catalogue-data';
import type { Check } from '../check';
import { integrate } from '../integrate';

interface Shaped {
  name: string;
  width: number;
  height: number;
  shape: Shape;
  /** height of the upper edge over the lower at x, mm */
  rise: (x: number) => number;
}

/** Where edges bend, the pieces are integrated apart. */
const bends: Record<string, number[]> = { gable: [450], octagon: [200, 700], triangle: [300] };
const radius = 900 ** 2 / (8 * 250) + 125;

const shapes: Shaped[] = [
  {
    name: 'raked head',
    width: 900,
    height: 1200,
    shape: { class: 'raked-head', lowHeight: '700', high: 'right' },
    rise: (x) => 700 + (500 * x) / 900,
  },
  { name: 'gable', width: 900, height: 1200, shape: { class: 'gable', eaves: '700' }, rise: (x) => 1200 - (500 * Math.abs(x - 450)) / 450 },
  { name: 'triangle', width: 900, height: 1200, shape: { class: 'triangle', apex: '300' }, rise: (x) => (x < 300 ? 4 * x : 2 * (900 - x)) },
  {
    name: 'octagon',
    width: 900,
    height: 1200,
    shape: { class: 'octagon', cut: '200' },
    rise: (x) => 1200 - 2 * Math.max(0, 200 - x, x - 700),
  },
  {
    name: 'segment arch',
    width: 900,
    height: 1200,
    shape: { class: 'segment-arch', rise: '250' },
    rise: (x) => 1200 - radius + Math.sqrt(radius ** 2 - (x - 450) ** 2),
  },
];

const areas: Check[] = shapes.map(({ name, width, height, shape, rise }) => {
  const ends = [0, ...(bends[name] ?? []), width];
  return {
    what: `Area, ${name}, mm²`,
    source: 'its upper edge integrated by Simpson’s rule',
    mark: 'another way' as const,
    expected: ends.slice(1).reduce((sum, end, i) => sum + integrate(rise, ends[i]!, end), 0),
    tolerance: 0.01,
    ours: () => areaOf(outlineOf({ width: String(width), height: String(height), shape })),
  };
});

const ellipse = () => outlineOf({ width: '1000', height: '600', shape: { class: 'ellipse' } });
const arch = () => outlineOf({ width: '900', height: '1200', shape: { class: 'segment-arch', rise: '250' } });
const corners: [number, number][] = [
  [0, 0],
  [820, 130],
  [900, 700],
  [350, 1000],
  [40, 610],
];
const polygon = () =>
  outlineOf({
    width: '900',
    height: '1000',
    shape: { class: 'polygon', points: corners.map(([x, y]) => ({ x: String(x), y: String(y) })) },
  });

const curves: Check[] = [
  {
    what: 'Area of an ellipse of 1 000 × 600, mm²',
    source: 'π·a·b, integrated by Simpson’s rule over its angle',
    mark: 'another way',
    expected: integrate((t) => 500 * 300 * Math.cos(t) ** 2 * 2, 0, Math.PI),
    tolerance: 0.01,
    ours: () => areaOf(ellipse()),
  },
  {
    what: 'Perimeter of an ellipse of 1 000 × 600, mm',
    source: 'its arc integrated by Simpson’s rule',
    mark: 'another way',
    expected: integrate((t) => Math.hypot(500 * Math.sin(t), 300 * Math.cos(t)), 0, 2 * Math.PI),
    tolerance: 1e-6,
    ours: () => perimeterOf(ellipse()),
  },
  {
    what: 'Perimeter of a segment arch of 900 × 1 200 rising 250, mm',
    source: 'its arc integrated by Simpson’s rule',
    mark: 'another way',
    expected: 900 + 2 * 950 + integrate((x) => radius / Math.sqrt(radius ** 2 - (x - 450) ** 2), 0, 900),
    tolerance: 1e-6,
    ours: () => perimeterOf(arch()),
  },
  {
    what: 'Area of a polygon of five corners, mm²',
    source: 'triangles from its first corner by determinants, mathjs 15',
    mark: 'another way',
    expected: [1, 2, 3].reduce((sum, i) => sum + det([corners[i]!, corners[i + 1]!]) / 2, 0),
    tolerance: 1e-6,
    ours: () => areaOf(polygon()),
  },
  {
    what: 'Perimeter of a polygon of five corners, mm',
    source: 'distances, mathjs 15',
    mark: 'another way',
    expected: corners.reduce((sum, corner, i) => sum + Number(distance(corner, corners[(i + 1) % corners.length]!)), 0),
    tolerance: 1e-6,
    ours: () => perimeterOf(polygon()),
  },
];

const astmC1036: [nominal: number, least: number][] = [
  [2.5, 2.16],
  [3, 2.92],
  [4, 3.78],
  [5, 4.57],
  [6, 5.56],
  [8, 7.42],
  [10, 9.02],
  [12, 11.91],
];

export const shapeChecks: Check[] = [
  ...areas,
  ...curves,
  ...astmC1036.map(([nominal, expected]): Check => ({
    what: `Least thickness of nominal ${nominal} mm glass, mm`,
    source: 'ASTM C1036',
    mark: 'from memory',
    expected,
    tolerance: 0,
    ours: () => catalogueData.glasses.find(({ id }) => id === `clear-${nominal}`)!.actualMm,
  })),
  {
    what: 'Weight of glass for each m² and mm, kg',
    source: 'EN 572-1: 2 500 kg/m³',
    mark: 'from memory',
    expected: 2.5,
    tolerance: 0,
    ours: () => glassDensity / 1000,
  },
];
