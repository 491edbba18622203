import fc from 'fast-check';
import { evaluateUnit } from '@shared/glazing/evaluate-unit';
import { catalogueFactory, unitFactory, wideMaker } from '../../../test/factories/catalogue-factory';
import { heightsAt, limitsFor, sizeArea, unitLimits } from './size-area';

const catalogue = catalogueFactory({ fabricators: [wideMaker()] });
const { capabilities } = wideMaker();
const clear4 = catalogue.glasses.find(({ id }) => id === 'clear-4')!;
const plain = { glass: 'clear-4', treatment: 'annealed' };

/** Whether the engineering finds nothing wrong with the size; a pane too heavy is another matter. */
function sizeIsFine(width: number, height: number): boolean {
  const unit = unitFactory({ width: String(width), height: String(height), lites: [plain, plain] });
  const { reasons } = evaluateUnit(unit, catalogue).buildability[0]!;
  return reasons.every(({ code }) => code === 'weight-max');
}

/** Whether a point lies within a polygon, by counting the edges to its right. */
function within(corners: readonly [number, number][], [x, y]: [number, number]): boolean {
  let inside = false;
  corners.forEach(([x1, y1], i) => {
    const [x2, y2] = corners[(i + 1) % corners.length]!;
    if (y1 > y !== y2 > y && x < x1 + ((y - y1) / (y2 - y1)) * (x2 - x1)) inside = !inside;
  });
  return inside;
}

describe('the area of sizes that a maker can make', () => {
  const limits = limitsFor(capabilities, clear4, 'annealed')!;

  it('holds exactly the sizes that the engineering lets pass', () => {
    let passed = 0;
    fc.assert(
      fc.property(fc.integer({ min: 50, max: 4500 }), fc.integer({ min: 50, max: 4500 }), (width, height) => {
        const heights = heightsAt(width, limits);
        const drawn = heights !== null && heights[0] <= height && height <= heights[1];
        if (drawn) passed += 1;
        expect(drawn).toBe(sizeIsFine(width, height));
      }),
      { numRuns: 400 },
    );
    expect(passed).toBeGreaterThan(40);
  });

  it('is drawn as it is reckoned, to the step of its curve', () => {
    const corners = sizeArea(limits);
    fc.assert(
      fc.property(fc.integer({ min: 100, max: 4300 }), fc.integer({ min: 100, max: 4300 }), (width, height) => {
        const heights = heightsAt(width + 0.3, limits);
        const distance = heights ? Math.min(...heights.map((each) => Math.abs(each - height))) : Infinity;
        // Beside an upright edge both answers are right.
        const besideEdge = [limits.minWidth, limits.maxShort, limits.maxLong].some((edge) => Math.abs(edge - width) < 26);
        if (distance < 30 || besideEdge) return;
        expect(within(corners, [width + 0.3, height + 0.3])).toBe(heights !== null && heights[0] <= height && height <= heights[1]);
      }),
      { numRuns: 400 },
    );
  });

  it('lets thin glass and small ovens take their part of it, and knows what is not made', () => {
    const whole = unitLimits(capabilities);
    const made = structuredClone(capabilities);
    made.glass = [{ glass: 'clear-4', maxLong: '2000', maxShort: '1500' }];
    made.treatments = [{ treatment: 'annealed', minNominalMm: 3, maxNominalMm: 6, minEdge: '200', maxLong: '1800', maxShort: '1600' }];
    expect(limitsFor(made, clear4, 'annealed')).toEqual({ ...whole, minWidth: 200, minHeight: 200, maxLong: 1800, maxShort: 1500 });
    expect(limitsFor(made, clear4, 'tempered')).toBeNull();
    expect(limitsFor(made, { id: 'clear-8', nominalMm: 8 }, 'annealed')).toBeNull();
    expect(limitsFor(made, { id: 'clear-4', nominalMm: 8 }, 'annealed')).toBeNull();
  });
});
