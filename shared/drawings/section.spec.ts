import fc from 'fast-check';
import { type Unit, type UnitInput } from '../contracts/units';
import { catalogueFactory, tripleFactory, unitFactory } from '../../test/factories/catalogue-factory';
import { boxOfCircle, boxOfText, textsOf, touch } from '../../test/factories/drawing-boxes';
import { type CircleItem, type Drawing } from './drawing';
import { section, sectionSheet } from './section';

const catalogue = catalogueFactory();
const metric = { system: 'metric' } as const;

/** Left and right edge of a lite, read from its path. */
function liteEdges({ items }: Drawing, number: number): [number, number] {
  const lite = items.find((item) => item.part === `lite ${number}`);
  if (lite?.kind !== 'path') throw new Error(`no lite ${number}`);
  const left = Number(/^M([\d.-]+) /.exec(lite.d)?.[1]);
  const width = Number(/t([\d.-]+) 0V/.exec(lite.d)?.[1]) * 2;
  return [left, left + width];
}

const idOf = (items: readonly { id: string }[]) => fc.constantFrom(...items.map(({ id }) => id));

/** Units of two to four lites with anything on them that a unit may have, buildable or not. */
const anyUnit: fc.Arbitrary<Unit> = fc.integer({ min: 2, max: 4 }).chain((count) =>
  fc
    .record({
      lites: fc.tuple(
        ...Array.from({ length: count }, (_, i) =>
          fc.record({
            glass: idOf(catalogue.glasses),
            treatment: idOf(catalogue.treatments),
            coating: fc.option(fc.record({ id: idOf(catalogue.coatings), surface: fc.constantFrom(2 * i + 1, 2 * i + 2) }), {
              nil: undefined,
            }),
          }),
        ),
      ),
      cavities: fc.array(
        fc.record({
          width: fc.oneof(fc.constantFrom('6', '12', '16', '20'), fc.integer({ min: 1, max: 60 }).map(String), fc.constant('0.5')),
          gas: idOf(catalogue.gases),
          spacer: idOf(catalogue.spacers),
          capillary: fc.boolean(),
        }),
        { minLength: count - 1, maxLength: count - 1 },
      ),
      grid: fc.option(fc.record({ bar: idOf(catalogue.grids), across: fc.constant(1), down: fc.constant(1) }), { nil: undefined }),
    })
    .map((parts) => unitFactory(parts as Partial<UnitInput>)),
);

describe('section', () => {
  it('draws every layer to one scale', () => {
    // 2.92 + 16 + 2.92 = 21.84 mm: thicknesses of the catalogue.
    const drawing = section(unitFactory(), catalogue, metric);
    const [outside, first] = liteEdges(drawing, 1);
    const [second, inside] = liteEdges(drawing, 2);
    const scale = (inside - outside) / 21.84;
    expect((first - outside) / scale).toBeCloseTo(2.92, 1);
    expect((second - first) / scale).toBeCloseTo(16, 1);
    const dimension = textsOf(drawing.items).find(({ part }) => part === 'dimension');
    expect(dimension?.text).toBe('21.84 mm');
    const spacer = drawing.items.find(({ part }) => part === 'secondary seal');
    const bottom = sectionSheet.height - 2.4 * sectionSheet.textSize;
    const edge = drawing.items.filter(({ part }) => part === 'spacer')[0];
    const top = edge?.kind === 'path' ? Number(/^M[\d.]+ ([\d.]+)/.exec(edge.d)?.[1]) : NaN;
    expect((bottom - top) / scale).toBeCloseTo(12, 1); // the sightline of the stainless spacer
    expect(spacer?.kind === 'rect' ? spacer.y + spacer.height : NaN).toBeCloseTo(bottom, 1);
  });

  it('keeps to scale whatever the make-up', () => {
    fc.assert(
      fc.property(anyUnit, (unit) => {
        const drawing = section(unit, catalogue, metric);
        const thickness = unit.lites.map(({ glass }) => catalogue.glasses.find(({ id }) => id === glass)!.actualMm);
        const overall = thickness.reduce((sum, mm) => sum + mm, 0) + unit.cavities.reduce((sum, { width }) => sum + Number(width), 0);
        const scale = (liteEdges(drawing, unit.lites.length)[1] - liteEdges(drawing, 1)[0]) / overall;
        for (const [i, mm] of thickness.entries()) {
          const [left, right] = liteEdges(drawing, i + 1);
          // Coordinates are rounded to a hundredth; a path adds four of them.
          expect(Math.abs(right - left - mm * scale)).toBeLessThan(0.06);
        }
      }),
    );
  });

  it('lets no text touch another, a numbered circle or the edge of the sheet, nor a leader cross a text', () => {
    fc.assert(
      fc.property(anyUnit, fc.constantFrom('metric' as const, 'imperial' as const), (unit, system) => {
        const drawing = section(unit, catalogue, { system });
        const texts = textsOf(drawing.items);
        const boxes = texts.map(boxOfText);
        const circles = drawing.items.filter(
          (item): item is CircleItem => item.kind === 'circle' && item.part?.startsWith('surface') === true,
        );
        for (const [i, box] of boxes.entries()) {
          expect(Math.min(box.left, box.top)).toBeGreaterThanOrEqual(0);
          expect(box.right).toBeLessThanOrEqual(drawing.width);
          expect(box.bottom).toBeLessThanOrEqual(drawing.height);
          for (const [j, other] of boxes.entries()) {
            if (i < j && touch(box, other)) throw new Error(`“${texts[i]!.text}” touches “${texts[j]!.text}”`);
          }
          for (const circle of circles) {
            if (texts[i]!.part !== 'surface number' && touch(box, boxOfCircle(circle)))
              throw new Error(`“${texts[i]!.text}” touches a circle`);
          }
          for (const leader of leadersOf(drawing)) {
            if (touch(box, leader)) throw new Error(`a leader crosses “${texts[i]!.text}”`);
          }
        }
        for (const [i, a] of circles.entries()) {
          for (const b of circles.slice(i + 1)) if (touch(boxOfCircle(a), boxOfCircle(b))) throw new Error('circles touch');
        }
      }),
      { numRuns: 400 },
    );
  });

  it('numbers the surfaces from outside in, two to a lite', () => {
    const drawing = section(tripleFactory(), catalogue, metric);
    const numbers = textsOf(drawing.items).filter(({ part }) => part === 'surface number');
    expect(numbers.map(({ text }) => text)).toEqual(['1', '2', '3', '4', '5', '6']);
    expect(numbers.map(({ x }) => x)).toEqual(numbers.map(({ x }) => x).sort((a, b) => a - b));
  });

  it('puts a coating on the free side of its surface, and takes a soft one off above the seals', () => {
    const coated = (id: string, surface: number) =>
      unitFactory({ lites: [{ glass: 'clear-3', treatment: 'tempered' }, { glass: 'clear-3', treatment: 'tempered', coating: { id, surface } }] }); // prettier-ignore
    const lineOf = (unit: Unit, surface: number) => {
      const drawing = section(unit, catalogue, metric);
      const line = drawing.items.find(({ part }) => part === `coating on ${surface}`);
      if (line?.kind !== 'line') throw new Error('no coating');
      return { line, lite: liteEdges(drawing, 2) };
    };
    const third = lineOf(coated('low-e-soft', 3), 3);
    const fourth = lineOf(coated('low-e-hard', 4), 4);
    expect(third.line.x1).toBeLessThan(third.lite[0]);
    expect(fourth.line.x1).toBeGreaterThan(fourth.lite[1]);
    expect(fourth.line.y2 - third.line.y2).toBeGreaterThan(50);
  });

  it('says in words what it shows', () => {
    expect(section(unitFactory(), catalogue, { system: 'imperial' }).description).toBe(
      'To scale, from outside in: lite 1, clear 3 mm, tempered, 2.92 mm thick; 16 mm of argon with a stainless spacer; lite 2, clear 3 mm, tempered, 2.92 mm thick, soft low-e on surface 3. The spacer holds desiccant; butyl seals its flanks, the secondary seal closes the edge. Surfaces are numbered 1 to 4; overall thickness 0.86 in.',
    );
  });

  it('refuses a product that the catalogue does not hold', () => {
    const unit = unitFactory({ cavities: [{ width: '16', gas: 'neon', spacer: 'stainless' }] });
    expect(() => section(unit, catalogue, metric)).toThrow(TypeError);
  });

  it('is the same every time', () => {
    expect(section(tripleFactory(), catalogue, metric)).toEqual(section(tripleFactory(), catalogue, metric));
  });
});

/** The level part of each leader, as thin boxes. */
function leadersOf({ items }: Drawing) {
  return items.flatMap((item) => {
    const level = item.kind === 'path' && item.part === 'leader' ? /^M([\d.-]+) ([\d.-]+)H([\d.-]+)/.exec(item.d) : null;
    if (!level) return [];
    const [left, y, right] = level.slice(1).map(Number) as [number, number, number];
    return [{ left, right, top: y - 0.3, bottom: y + 0.3 }];
  });
}
