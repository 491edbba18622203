import { makeUpKey } from '@shared/glazing/make-up-key';
import { unitFactory as unit } from '../../../test/factories/catalogue-factory';
import { priceListFactory, pricedUnitFactory as priced, priceTermsFactory, rowOf } from '../../../test/factories/price-list-factory';
import { type LineToPrice, type PricedUnit } from './price-unit';

const amounts = (of: PricedUnit) => of.charges.map(({ label, listMinor, netMinor }) => [label, listMinor, netMinor]);

describe('terms', () => {
  const from = '2026-01-01';
  const makeUp = makeUpKey(unit());
  const line: LineToPrice = { unit: unit(), quantity: 6 };

  it('put a contract before the tier, family by family, while it holds', () => {
    const contract = { id: 'c1', kind: 'percent', family: 'glass', percent: '20', from, until: '2026-09-15' } as const;
    const found = priced(line, priceListFactory(), priceTermsFactory({ contracts: [contract] }));
    expect(rowOf(found, 'glass, lite 1')).toMatchObject({
      listMinor: 2771,
      discountPercent: '20',
      discountReason: 'contract',
      netMinor: 2217,
    });
    expect(rowOf(found, 'assembly').discountReason).toBe('tier B');
    for (const on of ['2025-12-31', '2026-09-16']) {
      const before = priced(line, priceListFactory(), priceTermsFactory({ contracts: [contract], on }));
      expect(rowOf(before, 'glass, lite 1').discountReason).toBe('tier B');
    }
  });

  it('let a contract of 0 % take the tier’s discount away, and the later of two hold', () => {
    const older = { id: 'c1', kind: 'percent', family: 'glass', percent: '20', from, until: null } as const;
    const newer = { ...older, id: 'c2', percent: '0', from: '2026-06-01' };
    for (const contracts of [
      [older, newer],
      [newer, older],
    ]) {
      const row = rowOf(priced(line, priceListFactory(), priceTermsFactory({ contracts })), 'glass, lite 1');
      expect(row).toMatchObject({ discountPercent: '0', discountReason: null, netMinor: 2771 });
    }
  });

  it('put one row at the net rate in place of the area charges of that make-up', () => {
    const terms = priceTermsFactory({ contracts: [{ id: 'n1', kind: 'net rate', makeUp, rate: '9.80', from, until: null }] });
    const found = priced(line, priceListFactory(), terms);
    expect(amounts(found)).toEqual([
      ['net rate for this make-up', 17681, 12931],
      ['stainless steel spacer', 909, 909],
      ['non-standard size, 6 %', 1061, 1061],
      ['over 80 united inches, 8 %', 1414, 1414],
      ['5 or more, 3 %', 0, -489],
    ]);
    expect(found.charges[0]).toMatchObject({ family: 'net rate', rate: '9.80', unit: 'ft²', rule: 'contract/n1' });
    const other = { ...line, unit: unit({ cavities: [{ width: '14', gas: 'argon', spacer: 'stainless' }] }) };
    expect(priced(other, priceListFactory(), terms).charges[0]?.family).toBe('glass');
  });

  const promotion = {
    id: 'p1',
    name: 'Autumn',
    code: null,
    percents: { all: '10' },
    from,
    until: '2026-12-31',
    minimumArea: null,
    tiers: [],
  };

  it('take a promotion on the price left by the quantity break', () => {
    const found = priced(line, priceListFactory(), priceTermsFactory({ promotions: [promotion] }));
    expect(found.charges.at(-1)).toMatchObject({
      family: 'promotion',
      label: 'Autumn, 10 %',
      quantity: '184.23',
      rate: '-0.1',
      netMinor: -1842,
      rule: 'promotion/p1',
    });
    expect(found.unitPriceMinor).toBe(16581);
  });

  it('take a promotion by family on what the families cost after the quantity break', () => {
    const byFamily = { ...promotion, percents: { glass: '10', coating: '20' } };
    const found = priced(line, priceListFactory(), priceTermsFactory({ promotions: [byFamily] }));
    // (48.76 × 10 % + 15.67 × 20 %) × 97 % = 7.7697
    const row = rowOf(found, 'Autumn, 10 % off glass, 20 % off coating');
    expect(row.netMinor).toBe(-777);
    expect(Number(row.quantity) * Number(row.rate)).toBeCloseTo(-7.7697, 9);
  });

  it('take the promotion that takes most off, and none whose conditions are not met', () => {
    const cases: [Partial<typeof promotion> | Record<string, unknown>, boolean][] = [
      [{}, true],
      [{ code: 'AUTUMN' }, false],
      [{ code: 'SPRING' }, true],
      [{ tiers: ['A', 'C'] }, false],
      [{ tiers: ['B'] }, true],
      [{ from: '2026-09-16' }, false],
      [{ until: '2026-09-14' }, false],
      [{ until: '2026-09-15' }, true],
      [{ minimumArea: '13.2' }, false],
      [{ minimumArea: '13.19444' }, true],
      [{ percents: { grid: '50' } }, false],
    ];
    const small = { ...promotion, id: 'p0', percents: { all: '1' } };
    for (const [change, applies] of cases) {
      const promotions = [small, { ...promotion, ...change }];
      const found = priced(line, priceListFactory(), priceTermsFactory({ promotions, promotionCode: 'SPRING' }));
      expect([change, found.charges.at(-1)?.rule]).toEqual([change, applies ? 'promotion/p1' : 'promotion/p0']);
    }
  });

  it('take nothing off for a tier that the list does not know', () => {
    const found = priced(line, priceListFactory(), priceTermsFactory({ tier: 'Z' }));
    expect(rowOf(found, 'glass, lite 1')).toMatchObject({ discountPercent: '0', discountReason: null, netMinor: 2771 });
  });

  it('give the highest quantity break that is reached', () => {
    const label = (quantity: number) => priced({ unit: unit(), quantity }).charges.find(({ family }) => family === 'quantity break')?.label;
    expect([4, 5, 19, 20, 60].map(label)).toEqual([undefined, '5 or more, 3 %', '5 or more, 3 %', '20 or more, 5 %', '60 or more, 7.5 %']);
  });
});
