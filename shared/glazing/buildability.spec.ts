import fc from 'fast-check';
import { catalogueFactory, narrowMaker, tripleFactory, unitFactory, wideMaker } from '../../test/factories/catalogue-factory';
import type { Capabilities, FabricatorItem } from '../contracts/catalogue';
import { unitSchema, type Unit, type UnitInput } from '../contracts/units';
import { evaluateUnit } from './evaluate-unit';

const base = catalogueFactory();
const at = (unit: Unit, fabricator: FabricatorItem) => evaluateUnit(unit, { ...base, fabricators: [fabricator] }).buildability[0]!;
const four = { glass: 'clear-4', treatment: 'tempered' };
/** A unit that the narrow maker can build. */
const narrowUnit = (overrides: Partial<UnitInput> = {}) =>
  unitFactory({ lites: [four, { ...four, coating: { id: 'low-e-soft', surface: 3 } }], ...overrides });
const narrow = (overrides: Partial<UnitInput> = {}) => at(narrowUnit(overrides), narrowMaker());
const codes = (overrides: Partial<UnitInput>) => narrow(overrides).reasons.map(({ code }) => code);
const cavity = { width: '16', gas: 'argon', spacer: 'stainless' };
const wideWith = (unit: Partial<Capabilities['unit']>): FabricatorItem => {
  const maker = wideMaker();
  return { ...maker, capabilities: { ...maker.capabilities, unit: { ...maker.capabilities.unit, ...unit } } };
};

/** Writes each nearest value where its reason points. */
function mend(unit: Unit, reasons: { pointer: string; nearestValue: string | null }[]): Unit {
  const copy = structuredClone(unit) as unknown as Record<string, unknown>;
  for (const { pointer, nearestValue } of reasons) {
    if (nearestValue === null) continue;
    const keys = pointer.slice(1).split('/');
    const last = keys.pop()!;
    const holder = keys.reduce<Record<string, unknown>>((part, key) => part[key] as Record<string, unknown>, copy);
    holder[last] = nearestValue;
  }
  return unitSchema.parse(copy);
}

describe('buildabilityOf', () => {
  it('has no reason against a unit within every limit', () => {
    expect(narrow()).toEqual({ fabricator: { id: 'narrow', name: 'Narrow Works' }, canBuild: true, reasons: [], advice: [] });
  });

  it('takes each limit itself as still within', () => {
    expect(codes({ width: '1219.2', height: '2133.6' })).toEqual([]);
    expect(codes({ width: '355.6', height: '355.6' })).toEqual([]);
  });

  it.each<[string, Partial<UnitInput>, string[], string | null]>([
    ['too narrow', { width: '300' }, ['width-min', 'treatment-edge-min'], '355.6'],
    ['too low', { height: '300' }, ['height-min', 'treatment-edge-min'], '355.6'],
    ['too long for the oven', { height: '2200' }, ['treatment-long-edge-max'], '2133.6'],
    ['too long for all', { width: '600', height: '2500' }, ['long-edge-max', 'glass-long-edge-max', 'treatment-long-edge-max'], '2133.6'],
    ['short edge too long', { width: '1300', height: '1400' }, ['treatment-short-edge-max'], '1219.2'],
    ['too slender', { width: '360', height: '2000' }, ['aspect-max'], '1800'],
  ])('names the limit and the nearest size: %s', (_name, overrides, expected, nearest) => {
    const { reasons } = narrow(overrides);
    expect(reasons.map(({ code }) => code)).toEqual(expected);
    for (const reason of reasons) expect(reason.nearestValue).toBe(nearest);
  });

  it('says the limit in the maker’s measure with the other beside it', () => {
    expect(narrow({ height: '2200' }).reasons[0]).toEqual({
      code: 'treatment-long-edge-max',
      detail: 'tempered: long edge up to 84 in (2133.6 mm), not ≈ 86 5/8 in (2200 mm)',
      limit: '2133.6 mm',
      actual: '2200 mm',
      nearest: '2133.6 mm',
      nearestValue: '2133.6',
      pointer: '/height',
    });
  });

  it('limits area and weight, and finds sizes that keep both', () => {
    const unit = narrowUnit({ width: '1900', height: '1900' });
    const maker = wideWith({ maxAreaM2: 3, maxWeightKg: 50 });
    const { reasons } = at(unit, maker);
    expect(reasons.map(({ code }) => code)).toEqual(['area-max', 'weight-max']);
    expect(reasons[0]).toMatchObject({ limit: '3 m²', actual: '3.61 m²' });
    expect(new Set(reasons.map(({ pointer, nearestValue }) => `${pointer} ${nearestValue}`)).size).toBe(1);
    expect(at(mend(unit, reasons), maker).reasons).toEqual([]);
    // One millimetre more would be too much.
    const more = { ...mend(unit, reasons) };
    more.height = String(Number(more.height) + 1);
    expect(at(more, maker).reasons).toHaveLength(1);
  });

  it('knows no nearest size where shrinking would break a minimum', () => {
    const { reasons } = at(narrowUnit({ width: '600', height: '3000' }), wideWith({ maxAspect: 2, minHeight: '1500' }));
    expect(reasons).toEqual([expect.objectContaining({ code: 'aspect-max', nearest: null, nearestValue: null, pointer: '/height' })]);
  });

  it('knows none where the edge that comes in would become too short for the other', () => {
    const maker = wideWith({ maxAreaM2: 0.15, maxAspect: 2 });
    expect(at(narrowUnit({ width: '600', height: '600' }), maker).reasons).toEqual([
      expect.objectContaining({ code: 'area-max', nearestValue: null }),
    ]);
    expect(at(narrowUnit({ width: '600', height: '600' }), wideWith({ maxAreaM2: 0.15, maxAspect: 3 })).reasons[0]?.nearestValue).toBe(
      '250',
    );
  });

  it.each<[string, Partial<UnitInput>, string, string, string | null]>([
    [
      'a glass it does not work',
      { lites: [{ glass: 'clear-3', treatment: 'annealed' }, { ...four }] },
      'glass-not-made',
      '/lites/0/glass',
      'clear-4',
    ],
    [
      'a treatment it has no oven for',
      { lites: [{ glass: 'clear-4', treatment: 'heat-strengthened' }, four] },
      'treatment-not-made',
      '/lites/0/treatment',
      'tempered',
    ],
    [
      'a coating it does not apply',
      { lites: [{ ...four, coating: { id: 'low-e-solar', surface: 2 } }, four] },
      'coating-not-made',
      '/lites/0/coating/id',
      'low-e-soft',
    ],
    [
      'one coating too many',
      {
        lites: [
          { ...four, coating: { id: 'low-e-soft', surface: 2 } },
          { ...four, coating: { id: 'low-e-soft', surface: 3 } },
        ],
      },
      'coating-max',
      '/lites/1/coating',
      null,
    ],
    ['a spacer it does not bend', { cavities: [{ ...cavity, spacer: 'warm-edge' }] }, 'spacer-not-made', '/cavities/0/spacer', 'stainless'],
    ['a cavity width without a bar', { cavities: [{ ...cavity, width: '14' }] }, 'cavity-width', '/cavities/0/width', '12'],
    ['a gas it does not fill', { cavities: [{ ...cavity, gas: 'krypton' }] }, 'gas-not-made', '/cavities/0/gas', 'air'],
    [
      'a tube it does not fit',
      { cavities: [{ ...cavity, gas: 'air', capillary: true }] },
      'capillary-not-made',
      '/cavities/0/capillary',
      null,
    ],
    ['a bar it does not have', { grid: { bar: 'flat-25', across: 1, down: 1 } }, 'grid-not-made', '/grid/bar', 'flat-16'],
    ['edges it does not work', { lites: [{ ...four, edgeWork: 'polished' }, four] }, 'edge-work-not-made', '/lites/0/edgeWork', 'seamed'],
    ['a shape it does not cut', { shape: { class: 'ellipse' } }, 'shape-not-made', '/shape/class', null],
  ])('refuses %s', (_name, overrides, code, pointer, nearest) => {
    const { canBuild, reasons } = narrow(overrides);
    expect(canBuild).toBe(false);
    expect(reasons).toEqual([expect.objectContaining({ code, pointer, nearestValue: nearest })]);
    for (const { detail, limit, actual } of reasons) for (const text of [detail, limit, actual]) expect(text).toMatch(/\w/);
  });

  it('keeps thin glass out of the oven, with the glass that would do', () => {
    const maker = narrowMaker();
    maker.capabilities.glass.push({ glass: 'clear-3', maxLong: '2000', maxShort: '1000' });
    const [reason] = at(unitFactory(), maker).reasons;
    expect(reason).toMatchObject({
      code: 'treatment-thickness-min',
      limit: '4 mm',
      actual: '3 mm',
      nearestValue: 'clear-4',
      pointer: '/lites/0/glass',
    });
  });

  it('takes the row of a treatment for the thickness at hand', () => {
    const maker = wideMaker();
    const row = maker.capabilities.treatments.find(({ treatment }) => treatment === 'tempered')!;
    maker.capabilities.treatments = [
      { ...row, maxNominalMm: 3, maxLong: '1000', maxShort: '1000' },
      { ...row, minNominalMm: 4, maxLong: '3000' },
    ];
    expect(at(unitFactory(), maker).reasons.map(({ code }) => code)).toEqual(['treatment-long-edge-max']);
    expect(at(narrowUnit(), maker).reasons).toEqual([]);
  });

  it('finds one cavity width that suits spacer and gas together', () => {
    const { reasons } = narrow({ cavities: [{ ...cavity, width: '9' }] });
    expect(reasons.map(({ code, nearestValue }) => [code, nearestValue])).toEqual([
      ['cavity-width', '12'],
      ['gas-cavity-min', '12'],
    ]);
  });

  it('finds a glass that it both works and can treat', () => {
    const maker = narrowMaker();
    maker.capabilities.glass = ['clear-4', 'clear-6'].map((glass) => ({ glass, maxLong: '2438.4', maxShort: '1524' }));
    maker.capabilities.treatments = maker.capabilities.treatments.map((row) => ({ ...row, minNominalMm: 5 }));
    const { reasons } = at(unitFactory(), maker);
    expect(reasons.map(({ code, nearestValue }) => [code, nearestValue])).toEqual(
      [1, 2].flatMap(() => [
        ['glass-not-made', 'clear-6'],
        ['treatment-thickness-min', 'clear-6'],
      ]),
    );
  });

  it('finds a cavity that is not too wide for the gas', () => {
    const maker = narrowMaker();
    maker.capabilities.spacers = [{ spacer: 'stainless', widths: ['12', '16', '18', '20'] }];
    const { reasons } = at(narrowUnit({ cavities: [{ ...cavity, width: '20' }] }), maker);
    expect(reasons).toEqual([expect.objectContaining({ code: 'gas-cavity-max', limit: '16 mm', actual: '20 mm', nearestValue: '16' })]);
  });

  it('finds a cavity width that suits the grid too', () => {
    const maker = narrowMaker();
    maker.capabilities.grids = [{ bar: 'flat-16', minCavity: '14' }];
    const { reasons } = at(narrowUnit({ grid: { bar: 'flat-16', across: 1, down: 1 }, cavities: [{ ...cavity, width: '12' }] }), maker);
    expect(reasons).toEqual([
      expect.objectContaining({ code: 'grid-cavity-min', limit: '14 mm', nearestValue: '16', pointer: '/cavities/0/width' }),
    ]);
  });

  it('counts lites and overall thickness', () => {
    const { reasons } = at(tripleFactory(), narrowMaker());
    expect(reasons.map(({ code }) => code)).toEqual(['lites-max', 'coating-max', 'spacer-not-made', 'spacer-not-made', 'overall-max']);
    expect(reasons.at(-1)).toMatchObject({ limit: '32 mm', actual: '35.34 mm' });
  });

  it('passes, once every nearest size is taken, for any size and limits', () => {
    const mm = (min: number, max: number) => fc.integer({ min, max }).map((tenths) => String(tenths / 10));
    const limits = fc.record({
      maxLong: mm(8000, 30_000),
      maxShort: mm(5000, 8000),
      maxAreaM2: fc.integer({ min: 4, max: 40 }).map((n) => n / 10),
      maxAspect: fc.integer({ min: 2, max: 8 }),
      maxWeightKg: fc.integer({ min: 10, max: 60 }),
      minWidth: mm(1500, 3000),
      minHeight: mm(1500, 3000),
    });
    let mended = 0;
    fc.assert(
      fc.property(mm(500, 50_000), mm(500, 50_000), limits, (width, height, own) => {
        const maker = wideWith(own);
        const unit = unitFactory({ width, height });
        const { reasons } = at(unit, maker);
        if (reasons.length === 0 || reasons.some(({ nearestValue }) => nearestValue === null)) return;
        mended++;
        expect(at(mend(unit, reasons), maker).reasons).toEqual([]);
      }),
      { numRuns: 500 },
    );
    expect(mended).toBeGreaterThan(100);
  });
});

describe('advice on altitude', () => {
  const site = (altitude: number, overrides: Partial<UnitInput> = {}) =>
    at(narrowUnit({ place: { altitude }, ...overrides }), wideMaker()).advice;
  const air = { ...cavity, gas: 'air' };

  it('comes above the maker’s threshold, up and down', () => {
    expect(site(800)).toEqual([]);
    expect(site(801)).toHaveLength(1);
    expect(at(narrowUnit({ place: { altitude: 0 } }), { ...wideMaker(), plantAltitude: 1500 }).advice[0]).toMatch(/1500 m below the plant/);
  });

  it('is a tube with air, and not with a gas', () => {
    expect(site(1800, { cavities: [air] })[0]).toMatch(/1700 m above the plant of Wide Works\. A capillary tube is advised\./);
    expect(site(1800)[0]).toMatch(/exclude each other/);
    expect(site(1800, { cavities: [{ ...air, capillary: true }] })).toEqual([]);
    expect(at(narrowUnit({ place: { altitude: 1800 }, cavities: [air] }), narrowMaker()).advice[0]).toMatch(/offers none/);
  });
});
