import { type UnitInput } from '@shared/contracts/units';
import { kestrelFordList } from '@seeds/demo/price-lists';
import { catalogueFactory, unitFactory } from '../../../test/factories/catalogue-factory';
import { priceListFactory, priceTermsFactory } from '../../../test/factories/price-list-factory';
import { compileList } from './compile-list';
import { findHints } from './hints';
import { createPricer } from './price-lines';
import { type LineToPrice, priceUnit } from './price-unit';

const catalogue = catalogueFactory();
const terms = priceTermsFactory();

function hintsFor(overrides: Partial<UnitInput>, version = priceListFactory(), tryUnit?: Parameters<typeof findHints>[4]) {
  const line: LineToPrice = { unit: unitFactory(overrides), quantity: 6 };
  const answer = priceUnit(line, version, terms, catalogue);
  if ('refusals' in answer) throw new Error(JSON.stringify(answer.refusals));
  const list = compileList(version, catalogue);
  return findHints(line, answer.priced.unitPriceMinor, list, createPricer(list, terms), tryUnit);
}

describe('what would make it cheaper', () => {
  it('names the nearest standard size with its saving, as in the worked example', () => {
    expect(hintsFor({})[0]).toEqual({ kind: 'standard size', width: '914.4', height: '1219.2', unitPriceMinor: 15860, savesMinor: 2563 });
  });

  it('names a larger standard size that costs less', () => {
    const [hint] = hintsFor({ width: '908.05', height: '1212.85' });
    expect(hint).toMatchObject({ kind: 'standard size', width: '914.4', height: '1219.2' });
    expect(hint!.savesMinor).toBeGreaterThan(0);
  });

  it('names the next increment down in height, in width and in both', () => {
    const below = hintsFor({ width: '1016', height: '1574.8' }).filter(({ kind }) => kind === 'increment below');
    expect(below.map(({ width, height }) => [width, height])).toEqual([
      ['1016', '1524'],
      ['965.2', '1574.8'],
      ['965.2', '1524'],
    ]);
  });

  it('knows no standard sizes where the list has none', () => {
    const hints = hintsFor({}, priceListFactory(kestrelFordList));
    expect(hints.map(({ kind, width, height }) => [kind, width, height])).toEqual([
      ['increment below', '927.1', '1219.2'],
      ['increment below', '914.4', '1225.55'],
      ['increment below', '914.4', '1219.2'],
    ]);
  });

  it('tells only what saves, at the price that size really has', () => {
    for (const [width, height] of [
      ['927.1', '1225.55'],
      ['914.4', '1219.2'],
      ['304.8', '304.8'],
      ['254', '2540'],
    ] as const) {
      for (const hint of hintsFor({ width, height })) {
        expect(hint.savesMinor).toBeGreaterThan(0);
        const line = { unit: unitFactory({ width: hint.width, height: hint.height }), quantity: 6 };
        expect(priceUnit(line, priceListFactory(), terms, catalogue)).toMatchObject({ priced: { unitPriceMinor: hint.unitPriceMinor } });
      }
    }
    // Both billed at the minimum and the gas at its own: a smaller one costs less by its perimeter alone.
    expect(hintsFor({ width: '508', height: '406.4' }, priceListFactory({ spacers: [{ spacer: 'stainless', rate: '0' }] }))).toEqual([]);
  });

  it('names no other standard size for a standard size, and no size for another shape', () => {
    expect(hintsFor({ width: '914.4', height: '1219.2' }).filter(({ kind }) => kind === 'standard size')).toEqual([]);
    expect(hintsFor({ shape: { class: 'half-round' } })).toEqual([]);
  });

  it('names no size that the maker cannot build', () => {
    const hints = hintsFor({}, priceListFactory(), ({ width, height }) => ({ canBuild: !(width === '914.4' && height === '1219.2') }));
    expect(hints.some(({ width, height }) => width === '914.4' && height === '1219.2')).toBe(false);
    expect(hints.length).toBeGreaterThan(0);
  });
});
