import { evaluateUnit } from '@shared/glazing/evaluate-unit';
import { catalogueFactory, tripleFactory, unitFactory } from '../../test/factories/catalogue-factory';
import { checkUnits } from './check-units';

const catalogue = catalogueFactory();
const shapes = [
  unitFactory(),
  tripleFactory(),
  unitFactory({ width: '3000', height: '200' }),
  unitFactory({ grid: { bar: 'flat-16', across: 2, down: 1 } }),
  unitFactory({ shape: { class: 'half-round' } }),
];

describe('units as a price needs them', () => {
  it.each(shapes)('are what the engineering says of them', (unit) => {
    const [checked] = checkUnits([unit], catalogue);
    const { weight, buildability } = evaluateUnit(unit, catalogue);
    expect(checked!.weightKg).toBe(weight.toFixed(3));
    for (const fabricator of catalogue.fabricators) {
      expect(checked!.reasonsAt(fabricator)).toEqual(buildability.find((one) => one.fabricator.id === fabricator.id)!.reasons);
    }
  });

  it.each(shapes)('are at another size what a unit of that size is', (unit) => {
    for (const [width, height] of [
      ['300', '250'],
      ['1016', '1574.8'],
      ['5000', '4000'],
    ] as const) {
      const tried = checkUnits([unit], catalogue)[0]!.at(width, height);
      const [fresh] = checkUnits([{ ...unit, width, height }], catalogue);
      expect(tried.weightKg).toBe(fresh!.weightKg);
      for (const fabricator of catalogue.fabricators) expect(tried.reasonsAt(fabricator)).toEqual(fresh!.reasonsAt(fabricator));
    }
  });

  it('are looked at once where they are equal, wherever they go', () => {
    const place = { altitude: 1800 };
    const [here, there, other] = checkUnits([unitFactory(), unitFactory({ place }), unitFactory({ width: '500' })], catalogue);
    expect(there).toBe(here);
    expect(other).not.toBe(here);
  });
});
