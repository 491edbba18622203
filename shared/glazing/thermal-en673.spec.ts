import fc from 'fast-check';
import { catalogueFactory, tripleFactory, unitFactory } from '../../test/factories/catalogue-factory';
import type { Unit } from '../contracts/units';
import { resolveUnit } from './resolve-unit';
import { liteResistance, type ThermalCavity, thermalResultOf, uValueEn673 } from './thermal-en673';
import { uCurve } from './u-curve';

const catalogue = catalogueFactory();
const resolved = (unit: Unit) => {
  const found = resolveUnit(unit, catalogue);
  if ('problems' in found) throw new Error(JSON.stringify(found.problems));
  return found.resolved;
};
const uOf = (unit: Unit) => thermalResultOf(resolved(unit)).u;

const emissivity = fc.double({ min: 0.02, max: 0.9, noNaN: true });
const cavities = fc.array(
  fc.record({
    widthMm: fc.double({ min: 6, max: 24, noNaN: true }),
    gas: fc.constantFrom('air' as const, 'argon' as const, 'krypton' as const, 'xenon' as const),
    fill: fc.double({ min: 0.5, max: 1, noNaN: true }),
    emissivities: fc.tuple(emissivity, emissivity),
  }),
  { minLength: 1, maxLength: 3 },
);
const panes = (n: number) => Array.from({ length: n + 1 }, () => 0.004);

describe('uValueEn673', () => {
  it('is the same seen from either side', () => {
    const mirrored = (all: ThermalCavity[]): ThermalCavity[] =>
      [...all].reverse().map((one) => ({ ...one, emissivities: [one.emissivities[1], one.emissivities[0]] }));
    fc.assert(
      fc.property(cavities, (all) => {
        expect(uValueEn673(panes(all.length), mirrored(all)).u).toBeCloseTo(uValueEn673(panes(all.length), all).u, 9);
      }),
    );
  });

  it('falls when a narrow cavity of air gains argon, and when a face gains a coating', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 6, max: 15, noNaN: true }),
        emissivity,
        emissivity,
        fc.double({ min: 0.5, max: 1, noNaN: true }),
        (widthMm, e1, e2, fill) => {
          const u = (cavity: Partial<ThermalCavity>) =>
            uValueEn673(panes(1), [{ widthMm, gas: 'air', fill: 1, emissivities: [e1, e2], ...cavity }]).u;
          expect(u({ gas: 'argon', fill })).toBeLessThan(u({}));
          expect(u({ emissivities: [e1, e2 / 2] })).toBeLessThan(u({}));
        },
      ),
    );
  });

  it('shares 15 K over the cavities in proportion to their resistance', () => {
    fc.assert(
      fc.property(cavities, (all) => {
        const found = uValueEn673(panes(all.length), all).cavities;
        expect(found.reduce((sum, { deltaT }) => sum + deltaT, 0)).toBeCloseTo(15, 6);
        const flows = found.map(({ hs, deltaT }) => hs * deltaT);
        for (const flow of flows) expect(flow).toBeCloseTo(flows[0]!, 4);
      }),
    );
  });

  it('rises as glass leans back, steadily', () => {
    const wide: ThermalCavity = { widthMm: 16, gas: 'argon', fill: 0.9, emissivities: [0.837, 0.03] };
    const slopes = [90, 75, 60, 45, 30, 15, 0].map((slope) => uValueEn673(panes(1), [wide], slope).u);
    expect(slopes).toEqual([...slopes].sort((a, b) => a - b));
    // Halfway between two given slopes the conductance is halfway too.
    const hs = (slope: number) => uValueEn673(panes(1), [wide], slope).cavities[0]!.hs;
    expect(hs(67.5)).toBeCloseTo((hs(45) + hs(90)) / 2, 9);
    expect(hs(22.5)).toBeCloseTo((hs(0) + hs(45)) / 2, 9);
  });
});

describe('thermalResultOf', () => {
  it('counts a coating on the face where it is, and nowhere else', () => {
    const lites = unitFactory().lites.map(({ glass, treatment }) => ({ glass, treatment }));
    const bare = uOf(unitFactory({ lites }));
    const coated = (surface: number) =>
      uOf(
        unitFactory({
          lites: lites.map((lite, i) => (Math.ceil(surface / 2) === i + 1 ? { ...lite, coating: { id: 'low-e-hard', surface } } : lite)),
        }),
      );
    expect(coated(2)).toBeCloseTo(coated(3), 12);
    expect(coated(2)).toBeLessThan(bare - 0.5);
    expect(coated(1)).toBe(bare);
    // On the room's face the inside resistance grows, by less.
    expect(coated(4)).toBeLessThan(bare);
    expect(coated(4)).toBeGreaterThan(coated(3));
  });

  it('takes nominal thickness of one ply, and plies and interlayer of a laminate', () => {
    const glass = (id: string) => ({ glass: catalogue.glasses.find((item) => item.id === id)! });
    expect(liteResistance(glass('clear-4'))).toBeCloseTo(0.004, 12);
    expect(liteResistance(glass('laminated-clear-6'))).toBeCloseTo(0.00584 + 0.00038 / 0.2, 12);
  });

  it('is lower with three lites than with two of the same', () => {
    expect(uOf(tripleFactory())).toBeLessThan(uOf(unitFactory({ cavities: [{ width: '12', gas: 'argon', spacer: 'stainless' }] })));
  });
});

describe('uCurve', () => {
  it('goes through the U-value of the unit itself and has its least in between', () => {
    const unit = resolved(unitFactory());
    const curve = uCurve(unit, 0);
    expect(curve.find(({ widthMm }) => widthMm === 16)?.u).toBe(thermalResultOf(unit).u);
    const least = curve.reduce((best, point) => (point.u < best.u ? point : best));
    expect(least.widthMm).toBeGreaterThan(10);
    expect(least.widthMm).toBeLessThan(20);
    expect(uCurve(unit, 0, [9])).toEqual([
      { widthMm: 9, u: uOf(unitFactory({ cavities: [{ width: '9', gas: 'argon', spacer: 'stainless' }] })) },
    ]);
  });
});
