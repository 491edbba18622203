import { type Place } from '@shared/contracts/units';
import { evaluateUnit } from '@shared/glazing/evaluate-unit';
import { catalogueFactory, unitFactory } from '../../../test/factories/catalogue-factory';
import { loadCaution, placeCautions } from './cautions';

const catalogue = catalogueFactory();
const annealed = { glass: 'clear-4', treatment: 'annealed' };

function cautions(place: Place, overrides: Parameters<typeof unitFactory>[0] = {}) {
  const unit = unitFactory({ ...overrides, place });
  const evaluation = evaluateUnit(unit, catalogue);
  return [loadCaution(evaluation), ...placeCautions(evaluation, place.altitude, catalogue, 'imperial')];
}
const safety = (...given: Parameters<typeof cautions>) => cautions(...given).find(({ lead }) => lead === 'Safety glazing.')!;
const low: Place = { bottomEdge: 0.3556, topEdge: 1.58, walkingSurface: 0.5 };
const nothing: Place = {
  door: false,
  nearDoor: false,
  wetArea: false,
  stairs: false,
  footOfStairs: false,
  bottomEdge: 1.2,
  walkingSurface: 5,
};

describe('cautions', () => {
  it('cannot tell while nothing is known, and says so as a caution', () => {
    const { text, tone } = safety({});
    expect(tone).toBe('caution');
    expect(text).toContain('Cannot tell yet: 6 of the 6 rules of R308.4');
  });

  it('names the rule, its edition, the answer behind it and what would do', () => {
    const { text } = safety(low, { lites: [annealed, annealed] });
    expect(text).toContain('R308.4.3 windows (IRC 2015 to 2021) asks for it');
    expect(text).toContain('bottom edge 14.0 in above the floor, under 18 in');
    expect(text).toContain('This unit is not. What would do: tempered or laminated safety glass, Category II of 16 CFR 1201');
  });

  it('never says that a unit is safe, and always defers', () => {
    for (const place of [{}, low, nothing, { door: true }]) {
      for (const lites of [[annealed, annealed], unitFactory().lites]) {
        const { text, details } = safety(place, { lites });
        expect(text).toContain('the local code and a licensed professional decide');
        expect(text).not.toMatch(/\b(is|are) (safe|fine|allowed|compliant|certified)\b/);
        expect(details).toHaveLength(7);
      }
    }
    expect(safety(nothing).text).toContain('that alone does not make it safe');
  });

  it('says one thing once for all makers: how high, and what to do', () => {
    const altitude = cautions({ altitude: 1800 }).filter(({ lead }) => lead === 'Altitude.');
    expect(altitude).toHaveLength(1);
    expect(altitude[0]!.text).toMatch(
      /^The site lies 5577 ft above Wide Works, 5085 ft above Narrow Works\. An open capillary tube and a gas fill/,
    );
    expect(cautions({ altitude: 300 }).some(({ lead }) => lead === 'Altitude.')).toBe(false);
  });

  it('calls the loads a screen, and warns where a lite is overloaded', () => {
    const loads = (place: Place) => cautions(place, { lites: [annealed, annealed] }).find(({ lead }) => lead === 'Loads.')!;
    expect(loads({}).tone).toBe('remark');
    expect(loads({}).text).toContain('A screen, not a design: local codes and a licensed professional decide.');
    expect(loads({ windPressure: 9000 })).toMatchObject({ tone: 'caution' });
    expect(loads({ windPressure: 9000 }).text).toMatch(/Lite 1: [\d.]+ MPa is above the 23.3 MPa allowed/);
  });
});
