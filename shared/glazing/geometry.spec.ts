import fc from 'fast-check';
import { tripleFactory, catalogueFactory, unitFactory } from '../../test/factories/catalogue-factory';
import type { Shape, Unit } from '../contracts/units';
import { areaOf, ellipsePerimeter, geometryOf, insetPerimeter, perimeterOf } from './geometry';
import { outlineOf, svgPath } from './outline';
import { resolveUnit } from './resolve-unit';

const catalogue = catalogueFactory();
const resolved = (unit: Unit) => {
  const found = resolveUnit(unit, catalogue);
  if ('problems' in found) throw new Error(JSON.stringify(found.problems));
  return found.resolved;
};
const shaped = (width: string, height: string, shape: Shape) => outlineOf({ width, height, shape });

describe('geometryOf', () => {
  it('measures a rectangle in metres, with the actual thickness of the glass', () => {
    const geometry = geometryOf(resolved(unitFactory({ width: '640', height: '1010' })));
    expect(geometry.area).toBeCloseTo(0.6464, 12);
    expect(geometry.perimeter).toBeCloseTo(3.3, 12);
    expect(geometry.aspect).toBeCloseTo(1010 / 640, 12);
    expect(geometry.unitedMeasure).toBeCloseTo(1.65, 12);
    expect(geometry.overallThickness).toBeCloseTo(0.02184, 12);
    // Stainless, 12 mm inside each edge: eight times that shorter than the edge.
    expect(geometry.spacerLength).toBeCloseTo(3.3 - 8 * 0.012, 12);
  });

  it('adds the spacers of every cavity', () => {
    const unit = tripleFactory({ width: '640', height: '1010' });
    expect(geometryOf(resolved(unit)).spacerLength).toBeCloseTo(2 * (3.3 - 8 * 0.013), 12);
  });
});

describe('areas and perimeters', () => {
  it.each<[string, string, string, Shape, number, number]>([
    ['right trapezoid', '1000', '800', { class: 'raked-head', lowHeight: '500', high: 'left' }, 650_000, 2300 + Math.hypot(1000, 300)],
    ['gable', '1000', '900', { class: 'gable', eaves: '500' }, 700_000, 2000 + 2 * Math.hypot(500, 400)],
    ['triangle, apex at the left', '300', '400', { class: 'triangle' }, 60_000, 1200],
    ['triangle, apex inside', '600', '400', { class: 'triangle', apex: '300' }, 120_000, 600 + 1000],
    ['octagon', '400', '400', { class: 'octagon', cut: '100' }, 140_000, 800 + 4 * Math.hypot(100, 100)],
    ['half-round', '1000', '500', { class: 'half-round' }, (Math.PI * 500 ** 2) / 2, 1000 + Math.PI * 500],
    ['circle', '800', '800', { class: 'circle' }, Math.PI * 400 ** 2, 2 * Math.PI * 400],
    ['arch of half a circle', '1000', '1500', { class: 'segment-arch', rise: '500' }, 1e6 + (Math.PI * 500 ** 2) / 2, 3000 + Math.PI * 500],
  ])('are right for a %s', (_name, width, height, shape, area, perimeter) => {
    expect(areaOf(shaped(width, height, shape))).toBeCloseTo(area, 6);
    expect(perimeterOf(shaped(width, height, shape))).toBeCloseTo(perimeter, 6);
  });

  it('is the same for a polygon given either way round', () => {
    const points = [['0', '0'], ['900', '0'], ['900', '700'], ['300', '800']].map(([x, y]) => ({ x: x!, y: y! })); // prettier-ignore
    const there = shaped('900', '800', { class: 'polygon', points });
    const back = shaped('900', '800', { class: 'polygon', points: [...points].reverse() });
    expect(areaOf(there)).toBeCloseTo(areaOf(back), 9);
    expect(areaOf(there)).toBeGreaterThan(0);
  });

  it('does not change when a polygon is turned', () => {
    const corners = fc.array(fc.integer({ min: 200, max: 900 }), { minLength: 3, maxLength: 10 });
    fc.assert(
      fc.property(corners, fc.double({ min: 0, max: 2 * Math.PI, noNaN: true }), (radii, turn) => {
        const around = (by: number) => {
          const at = radii.map((r, i) => [
            1000 + r * Math.cos(by + (2 * Math.PI * i) / radii.length),
            1000 + r * Math.sin(by + (2 * Math.PI * i) / radii.length),
          ]);
          return shaped('2000', '2000', { class: 'polygon', points: at.map(([x, y]) => ({ x: x!.toFixed(8), y: y!.toFixed(8) })) });
        };
        expect(areaOf(around(turn))).toBeCloseTo(areaOf(around(0)), 2);
        expect(perimeterOf(around(turn))).toBeCloseTo(perimeterOf(around(0)), 3);
      }),
    );
  });

  it('keeps an ellipse between the circles of its radii, and a flat one at four radii', () => {
    expect(ellipsePerimeter(300, 300)).toBeCloseTo(2 * Math.PI * 300, 9);
    expect(ellipsePerimeter(1000, 1e-7)).toBeCloseTo(4000, 6);
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 2000 }), fc.integer({ min: 1, max: 2000 }), (a, b) => {
        const length = ellipsePerimeter(a, b);
        expect(length).toBeGreaterThanOrEqual(2 * Math.PI * Math.min(a, b) - 1e-9);
        expect(length).toBeLessThanOrEqual(2 * Math.PI * Math.max(a, b) + 1e-9);
        expect(length).toBeCloseTo(ellipsePerimeter(b, a), 6);
      }),
    );
  });
});

describe('insetPerimeter', () => {
  it('is the perimeter of the shape that is left inside', () => {
    expect(insetPerimeter(shaped('640', '1010', { class: 'rectangle' }), 12)).toBeCloseTo(2 * (616 + 986), 9);
    expect(insetPerimeter(shaped('800', '800', { class: 'circle' }), 12)).toBeCloseTo(2 * Math.PI * 388, 9);
    // A 3-4-5 triangle has an inscribed circle of 100: 12 mm inside, every edge is 88 % as long.
    expect(insetPerimeter(shaped('300', '400', { class: 'triangle' }), 12)).toBeCloseTo(1200 * 0.88, 9);
    // A half-round, 12 mm inside: an arc of 488 and its chord, by Pythagoras. Off by the square of the inset.
    const inner = 488 * (Math.PI - 2 * Math.asin(12 / 488)) + 2 * Math.sqrt(488 ** 2 - 12 ** 2);
    expect(Math.abs(insetPerimeter(shaped('1000', '500', { class: 'half-round' }), 12) - inner)).toBeLessThan(12 ** 2 / 400);
  });
});

describe('svgPath', () => {
  it('draws from the top of the bounding rectangle', () => {
    expect(svgPath(shaped('640', '1010', { class: 'rectangle' }), 1010)).toBe('M0 1010L640 1010L640 0L0 0L0 1010Z');
    expect(svgPath(shaped('800', '800', { class: 'circle' }), 800)).toBe('M800 400A400 400 0 0 0 0 400A400 400 0 0 0 800 400Z');
  });
});
