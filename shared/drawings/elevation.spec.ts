import fc from 'fast-check';
import { shapeClasses, type Shape } from '../contracts/units';
import { catalogueFactory, unitFactory } from '../../test/factories/catalogue-factory';
import { boxOfText, textsOf, touch } from '../../test/factories/drawing-boxes';
import { elevation } from './elevation';
import { type Drawing, type PathItem } from './drawing';

const catalogue = catalogueFactory();

/** Extent of the corners of a path of straight lines. */
function extent({ items }: Drawing, part: string) {
  const path = items.find((item): item is PathItem => item.kind === 'path' && item.part === part);
  const points = [...(path?.d.matchAll(/[ML]([\d.-]+) ([\d.-]+)/g) ?? [])].map(([, x, y]) => [Number(x), Number(y)] as const);
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  return { left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys) };
}

/** A size for each shape class that its own rules allow. */
const sized: Record<(typeof shapeClasses)[number], { width: string; height: string; shape: Shape }> = {
  rectangle: { width: '900', height: '1200', shape: { class: 'rectangle' } },
  'raked-head': { width: '900', height: '1200', shape: { class: 'raked-head', lowHeight: '700', high: 'left' } },
  gable: { width: '900', height: '1200', shape: { class: 'gable', eaves: '800' } },
  'segment-arch': { width: '900', height: '1200', shape: { class: 'segment-arch', rise: '200' } },
  'half-round': { width: '900', height: '450', shape: { class: 'half-round' } },
  circle: { width: '900', height: '900', shape: { class: 'circle' } },
  ellipse: { width: '900', height: '500', shape: { class: 'ellipse' } },
  triangle: { width: '900', height: '700', shape: { class: 'triangle', apex: '300' } },
  octagon: { width: '900', height: '900', shape: { class: 'octagon', cut: '200' } },
  polygon: {
    width: '900',
    height: '900',
    shape: { class: 'polygon', points: [{ x: '0', y: '0' }, { x: '900', y: '0' }, { x: '900', y: '900' }, { x: '400', y: '500' }, { x: '0', y: '900' }] }, // prettier-ignore
  },
};

describe('elevation', () => {
  it('is to scale both ways, with the sightline inside at its depth', () => {
    const drawing = elevation(unitFactory(), catalogue, { system: 'metric' });
    const unit = extent(drawing, 'unit');
    const sightline = extent(drawing, 'sightline');
    const scale = (unit.right - unit.left) / 927.1;
    expect((unit.bottom - unit.top) / scale).toBeCloseTo(1225.55, -0.5);
    expect((sightline.left - unit.left) / scale).toBeCloseTo(12, 0);
    expect((unit.bottom - sightline.bottom) / scale).toBeCloseTo(12, 0);
  });

  it('keeps the proportion of any size to the rounding of its coordinates', () => {
    const mm = fc.integer({ min: 150, max: 4000 });
    fc.assert(
      fc.property(mm, mm, (width, height) => {
        const unit = extent(
          elevation(unitFactory({ width: String(width), height: String(height) }), catalogue, { system: 'metric' }),
          'unit',
        );
        expect(Math.abs((unit.right - unit.left) * height - (unit.bottom - unit.top) * width)).toBeLessThan(0.02 * (width + height));
      }),
    );
  });

  it('writes width above and height at the left, in the reader’s system', () => {
    const dimensions = textsOf(elevation(unitFactory(), catalogue, { system: 'imperial' }).items).filter(
      ({ part }) => part === 'dimension',
    );
    expect(dimensions.map(({ text, upward }) => [text, upward ?? false])).toEqual([
      ['36 1/2 in', false],
      ['48 1/4 in', true],
    ]);
  });

  it('says in words what it shows', () => {
    expect(elevation(unitFactory(), catalogue, { system: 'imperial', tag: 'Bay, left' }).description).toBe(
      'To scale, seen from outside: a rectangle 36 1/2 in (927.1 mm) wide and 48 1/4 in (1225.55 mm) high, tagged “Bay, left”.',
    );
  });

  it('draws as many bars as the grid has, within the sightline', () => {
    const drawing = elevation(unitFactory({ grid: { bar: 'flat-16', across: 2, down: 1 } }), catalogue, { system: 'metric' });
    const sightline = extent(drawing, 'sightline');
    const bars = drawing.items.filter((item) => item.kind === 'rect' && item.part === 'bar');
    expect(bars).toHaveLength(3);
    for (const bar of bars) {
      if (bar.kind !== 'rect') continue;
      expect(bar.x).toBeGreaterThanOrEqual(sightline.left - 0.02);
      expect(bar.x + bar.width).toBeLessThanOrEqual(sightline.right + 0.02);
      expect(bar.y + bar.height).toBeLessThanOrEqual(sightline.bottom + 0.02);
    }
  });

  it.each(shapeClasses)('draws a %s within its sheet, with no text on another', (shapeClass) => {
    const tag = fc.constantFrom('A', 'Bay, left', 'Kitchen over the sink, second from the left, north wall of the annexe');
    const grid = fc.option(fc.constant({ bar: 'flat-25', across: 1, down: 2 }), { nil: undefined });
    fc.assert(
      fc.property(tag, grid, fc.constantFrom('metric' as const, 'imperial' as const), (mark, withGrid, system) => {
        const drawing = elevation(unitFactory({ ...sized[shapeClass], grid: withGrid }), catalogue, { system, tag: mark });
        const boxes = textsOf(drawing.items).map(boxOfText);
        for (const [i, box] of boxes.entries()) {
          expect(Math.min(box.left, box.top)).toBeGreaterThanOrEqual(0);
          expect(box.right).toBeLessThanOrEqual(drawing.width);
          expect(box.bottom).toBeLessThanOrEqual(drawing.height);
          for (const other of boxes.slice(i + 1)) expect(touch(box, other)).toBe(false);
        }
        expect(JSON.stringify(drawing)).not.toMatch(/NaN|null|Infinity/);
      }),
      { numRuns: 30 },
    );
  });
});
