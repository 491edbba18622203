import fc from 'fast-check';
import { catalogueFactory } from '../../test/factories/catalogue-factory';
import { liteOptics, type Pane, secondaryHeat, stackPanes } from './solar-en410';

const catalogue = catalogueFactory();
const share = fc.double({ min: 0.02, max: 0.98, noNaN: true });
const pane: fc.Arbitrary<Pane> = fc.tuple(share, share, share).map(([a, b, c]) => {
  const most = 1 - a;
  return { transmittance: a, outside: b * most, inside: c * most };
});

describe('stackPanes', () => {
  it('loses nothing: what passes, comes back and is kept make the whole', () => {
    fc.assert(
      fc.property(fc.array(pane, { minLength: 1, maxLength: 4 }), (panes) => {
        const { transmittance, reflectance, absorptances } = stackPanes(panes);
        expect(transmittance + reflectance + absorptances.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 9);
        for (const value of [transmittance, reflectance, ...absorptances]) expect(value).toBeGreaterThanOrEqual(-1e-12);
      }),
    );
  });

  it('lets through the same from either side', () => {
    fc.assert(
      fc.property(fc.array(pane, { minLength: 1, maxLength: 4 }), (panes) => {
        const turned = [...panes]
          .reverse()
          .map(({ transmittance, outside, inside }) => ({ transmittance, outside: inside, inside: outside }));
        expect(stackPanes(turned).transmittance).toBeCloseTo(stackPanes(panes).transmittance, 9);
      }),
    );
  });
});

describe('secondaryHeat', () => {
  it('sends inward more of what is kept further in', () => {
    expect(secondaryHeat([0, 0.1], [2])).toBeGreaterThan(secondaryHeat([0.1, 0], [2]));
    // One pane alone: 8 of 31 W/(m²·K) lead inward.
    expect(secondaryHeat([0.1], [])).toBeCloseTo((0.1 * 8) / (8 + 23), 12);
  });
});

describe('liteOptics', () => {
  const glass = (id: string) => catalogue.glasses.find((item) => item.id === id)!;
  const coating = (id: string, surface: number) => ({ item: catalogue.coatings.find((item) => item.id === id)!, surface });

  it('turns a coated lite round with its coating', () => {
    const out = liteOptics({ glass: glass('clear-4'), coating: coating('low-e-soft', 3) });
    const inn = liteOptics({ glass: glass('clear-4'), coating: coating('low-e-soft', 2) });
    expect(out.solarReflectanceOutside).toBe(inn.solarReflectanceInside);
    expect(out.solarReflectanceInside).toBe(inn.solarReflectanceOutside);
  });

  it('gives the coating data as they are on the glass they were given for', () => {
    const { optics } = coating('low-e-soft', 3).item;
    const built = liteOptics({ glass: glass('clear-4'), coating: coating('low-e-soft', 3) });
    for (const key of Object.keys(optics) as (keyof typeof optics)[]) expect(built[key]).toBeCloseTo(optics[key], 12);
  });

  it('sends light through tinted glass once on the way in and twice on the way back', () => {
    const { optics } = coating('low-e-soft', 2).item;
    const built = liteOptics({ glass: glass('grey-6'), coating: coating('low-e-soft', 2) });
    const ratio = 0.46 / 0.84;
    expect(built.solarTransmittance).toBeCloseTo(optics.solarTransmittance * ratio, 12);
    expect(built.solarReflectanceOutside).toBeCloseTo(0.04 + (optics.solarReflectanceInside - 0.04) * ratio ** 2, 12);
    expect(built.solarReflectanceInside).toBe(optics.solarReflectanceOutside);
  });

  it('never makes light, with any coating on any glass', () => {
    for (const item of catalogue.glasses) {
      for (const { id } of catalogue.coatings) {
        const o = liteOptics({ glass: item, coating: coating(id, 2) });
        expect(o.visibleTransmittance + Math.max(o.visibleReflectanceOutside, o.visibleReflectanceInside)).toBeLessThanOrEqual(1);
        expect(o.solarTransmittance + Math.max(o.solarReflectanceOutside, o.solarReflectanceInside)).toBeLessThanOrEqual(1);
        expect(Math.min(...Object.values(o))).toBeGreaterThan(0);
      }
    }
  });
});
