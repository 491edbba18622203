import fc from 'fast-check';
import { catalogueFactory, tripleFactory, unitFactory } from '../../test/factories/catalogue-factory';
import { evaluationSchema } from '../contracts/evaluation';
import type { UnitInput } from '../contracts/units';
import { evaluateUnit } from './evaluate-unit';
import { glassDensity } from './weight';

const catalogue = catalogueFactory();

describe('evaluateUnit', () => {
  it.each<[string, Partial<UnitInput>]>([
    ['a rectangle', {}],
    ['a gable', { shape: { class: 'gable', eaves: '900' } }],
    ['an ellipse', { shape: { class: 'ellipse' } }],
    ['a unit of 1 mm', { width: '1', height: '1' }],
    ['a unit of 100 m', { width: '100000', height: '100000' }],
    ['a needle', { width: '1', height: '100000' }],
    [
      'a place in full',
      { place: { altitude: 1800, slope: 30, door: true, bottomEdge: 0, insideHumidity: 1, windPressure: 900, snowLoad: 2000 } },
    ],
  ])('answers by its contract, with finite numbers, for %s', (_name, overrides) => {
    const evaluation = evaluateUnit(unitFactory(overrides), catalogue);
    expect(evaluationSchema.parse(evaluation)).toEqual(evaluation);
    // JSON has no infinity: what is not finite would come back as null.
    expect(JSON.parse(JSON.stringify(evaluation))).toEqual(evaluation);
  });

  it('says the same of the same unit, and leaves unit and catalogue as they were', () => {
    const [unit, held] = [tripleFactory(), catalogueFactory()];
    expect(evaluateUnit(unit, held)).toEqual(evaluateUnit(unit, held));
    expect([unit, held]).toEqual([tripleFactory(), catalogueFactory()]);
  });

  it('names method, boundary and what each result leaves out', () => {
    const evaluation = evaluateUnit(unitFactory(), catalogue);
    for (const part of ['thermal', 'solar', 'condensation', 'load'] as const) {
      for (const text of Object.values(evaluation[part].method)) expect(text.length).toBeGreaterThan(8);
    }
    expect(evaluation.thermal.method.name).toBe('EN 673:2011');
  });

  it('asks every maker', () => {
    expect(evaluateUnit(unitFactory(), catalogue).buildability.map(({ fabricator, canBuild }) => [fabricator.id, canBuild])).toEqual([
      ['wide', true],
      ['narrow', false],
    ]);
  });

  it('will not evaluate what the catalogue does not hold', () => {
    const unknown = unitFactory({ cavities: [{ width: '16', gas: 'neon', spacer: 'stainless' }] });
    expect(() => evaluateUnit(unknown, catalogue)).toThrow(/\/cavities\/0\/gas.*“neon”/);
  });
});

describe('weight', () => {
  const size = fc.integer({ min: 100, max: 3000 }).map(String);

  it('is the sum of its parts, and glass weighs 2.5 kg/m² for each mm', () => {
    fc.assert(
      fc.property(size, size, (width, height) => {
        const { weight, weightParts, geometry } = evaluateUnit(unitFactory({ width, height }), catalogue);
        expect(weight).toBeCloseTo(weightParts.glass + weightParts.interlayer + weightParts.edge, 9);
        expect(weightParts.glass).toBeCloseTo(2 * 2.92 * 2.5 * geometry.area, 9);
        expect(weightParts.glass).toBeCloseTo(glassDensity * 0.00584 * geometry.area, 9);
      }),
    );
  });

  it('adds the interlayer of a laminate', () => {
    const lites = [
      { glass: 'laminated-clear-6', treatment: 'annealed' },
      { glass: 'clear-4', treatment: 'annealed' },
    ];
    const { weightParts, geometry } = evaluateUnit(unitFactory({ lites }), catalogue);
    expect(weightParts.interlayer).toBeCloseTo(0.00038 * 1070 * geometry.area, 9);
    expect(weightParts.glass).toBeCloseTo((2 * 2.92 + 3.78) * 2.5 * geometry.area, 9);
  });

  it('grows with a wider cavity by its edge alone', () => {
    const at = (width: string) =>
      evaluateUnit(unitFactory({ cavities: [{ width, gas: 'argon', spacer: 'stainless' }] }), catalogue).weightParts;
    expect(at('12').edge).toBeCloseTo(0.25 * 4.2093, 9);
    expect(at('18').edge).toBeCloseTo(1.5 * at('12').edge, 9);
    expect(at('18').glass).toBe(at('12').glass);
  });
});
