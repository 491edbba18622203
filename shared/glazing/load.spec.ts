import fc from 'fast-check';
import { catalogueFactory, tripleFactory, unitFactory } from '../../test/factories/catalogue-factory';
import type { Unit, UnitInput } from '../contracts/units';
import { cavityPressures, insulatingUnitFactor, isochoricPressure, summer } from './climate-load';
import { loadOf } from './load';
import { displacedVolume } from './plates';
import { resolveUnit } from './resolve-unit';

const catalogue = catalogueFactory();
const resolved = (unit: Unit) => {
  const found = resolveUnit(unit, catalogue);
  if ('problems' in found) throw new Error(JSON.stringify(found.problems));
  return found.resolved;
};
const load = (overrides: Partial<UnitInput> = {}, absorptance: number[] = [], altitude: { up: number; down: number } | null = null) =>
  loadOf(resolved(unitFactory(overrides)), absorptance, altitude);

describe('cavityPressures', () => {
  const two = fc.record({
    a: fc.double({ min: 200, max: 2000, noNaN: true }),
    s: fc.double({ min: 6, max: 24, noNaN: true }),
    d1: fc.double({ min: 2, max: 12, noNaN: true }),
    d2: fc.double({ min: 2, max: 12, noNaN: true }),
    ratio: fc.double({ min: 1, max: 8, noNaN: true }),
  });
  const stiffnessOf = (d: number, a: number, bv: number) => (28.9 ** 4 * d ** 3) / (bv * a ** 4);

  it('gives two lites what the insulating-unit factor gives: φ·p₀ of the weather, (1 − φ)·δ₂ of the load', () => {
    fc.assert(
      fc.property(two, ({ a, s, d1, d2, ratio }) => {
        const bv = displacedVolume(ratio, 0.23);
        const stiffness = [stiffnessOf(d1, a, bv), stiffnessOf(d2, a, bv)];
        const factor = insulatingUnitFactor(a, s, d1, d2, bv);
        expect(cavityPressures(stiffness, [s], [16], 0)[0]).toBeCloseTo(factor * 16, 9);
        const part = d2 ** 3 / (d1 ** 3 + d2 ** 3);
        expect(cavityPressures(stiffness, [s], [0], 1)[0]).toBeCloseTo((1 - factor) * part, 9);
      }),
    );
  });

  it('holds any number of lites in balance: the lites together carry the load', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0.001, max: 10, noNaN: true }), { minLength: 2, maxLength: 4 }), (stiffness) => {
        const widths = stiffness.slice(1).map(() => 12);
        const all = [1, ...cavityPressures(stiffness, widths, widths.map(() => 0), 1), 0]; // prettier-ignore
        const nets = stiffness.map((_, i) => all[i]! - all[i + 1]!);
        expect(nets.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 9);
        for (const net of nets) expect(net).toBeGreaterThanOrEqual(-1e-9);
      }),
    );
  });
});

describe('loadOf', () => {
  it('takes the weather of the standard when the site is not known', () => {
    expect(load().climate).toEqual({ summer: expect.closeTo(16, 9), winter: expect.closeTo(-16.1, 9) });
  });

  it('takes the climb and the descent to the site where they are greater', () => {
    expect(load({}, [], { up: 1700, down: 1500 }).climate!.summer).toBeCloseTo(isochoricPressure({ ...summer, altitude: 1700 }), 9);
    expect(load({}, [], { up: -900, down: -1200 }).climate!.winter).toBeCloseTo(-8.5 - 4 - 14.4, 9);
    expect(load({}, [], { up: 100, down: 100 }).climate).toEqual(load().climate);
  });

  it('takes height out of the load where a tube is open on the way', () => {
    const cavities = [{ width: '16', gas: 'air', spacer: 'stainless', capillary: true }];
    expect(load({ cavities }, [], { up: 1700, down: 1500 }).climate).toEqual({
      summer: expect.closeTo(8.8, 9),
      winter: expect.closeTo(-12.5, 9),
    });
  });

  it('loads small stiff units more than large ones, and warns', () => {
    const small = load({ width: '300', height: '300' });
    const large = load({ width: '1200', height: '1200' });
    expect(small.insulatingUnitFactor!).toBeGreaterThan(large.insulatingUnitFactor!);
    expect(small.warnings.join()).toMatch(/500 mm/);
    expect(large.warnings.join()).not.toMatch(/500 mm/);
  });

  it('says when wind is not in the stress, and puts it in when it is given', () => {
    expect(load().statement).toMatch(/No wind load is given/);
    const windy = load({ place: { windPressure: 2000 } });
    expect(windy.statement).not.toMatch(/No wind/);
    expect(windy.stress[0]!.stressMpa).toBeGreaterThan(load().stress[0]!.stressMpa * 2);
  });

  it('warns first of a lite above its allowable stress', () => {
    const lites = [1, 2].map(() => ({ glass: 'clear-3', treatment: 'annealed' }));
    const { warnings, stress } = load({ lites, width: '1500', height: '2000', place: { windPressure: 6000 } });
    expect(stress[0]!.stressMpa).toBeGreaterThan(23.3);
    expect(warnings[0]).toMatch(/Lite [12]: .* above the 23.3 MPa/);
  });

  it('always defers to codes and a professional', () => {
    for (const result of [load(), load({ shape: { class: 'ellipse' } })]) {
      expect(result.statement).toMatch(/licensed professional/);
      expect(result.warnings.join()).toMatch(/local codes and a licensed professional decide/);
    }
  });

  it('gives no stress for other shapes, but the climate load', () => {
    const result = load({ shape: { class: 'gable', eaves: '900' } });
    expect(result).toMatchObject({ applies: false, insulatingUnitFactor: null, stress: [] });
    expect(result.climate!.summer).toBeCloseTo(16, 9);
  });

  it('shares among three lites without a factor that is defined for two', () => {
    const result = loadOf(resolved(tripleFactory({ place: { windPressure: 1500 } })), [], null);
    expect(result.insulatingUnitFactor).toBeNull();
    expect(result.stress).toHaveLength(3);
    expect(result.statement).toMatch(/two lites/);
  });

  it('warns of hot annealed glass and of glass overhead', () => {
    const lites = [1, 2].map(() => ({ glass: 'clear-4', treatment: 'annealed' }));
    expect(load({ lites }, [0.6, 0.1]).warnings.join()).toMatch(/Lite 1 is annealed and takes up 60 %/);
    expect(load({}, [0.6, 0.1]).warnings.join()).not.toMatch(/annealed/);
    expect(load({ place: { slope: 30 } }).warnings.join()).toMatch(/R308\.6/);
  });

  it('adds snow on a slope and none on a wall', () => {
    const stress = (place: UnitInput['place']) => load({ place: { windPressure: 0, ...place } }).stress[0]!.stressMpa;
    expect(stress({ snowLoad: 3000 })).toBeCloseTo(stress({}), 9);
    // Snow lies on the ground plan and presses at right angles: 60° from level, a quarter of it.
    expect(stress({ snowLoad: 3000, slope: 60 })).toBeCloseTo(stress({ windPressure: 750, slope: 60 }), 9);
  });
});
