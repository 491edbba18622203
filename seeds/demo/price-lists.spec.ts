import { priceListContent } from '@shared/contracts/price-lists';
import { aldersund, demoFabricators, kestrelFord, northmere } from './fabricators';
import { aldersundList, kestrelFordList, northmereList, raise } from './price-lists';

/** With the glasses that the maker can seal and has no rate for, so that the demo shows a list refusing. */
const pairs = [
  [northmere, northmereList, []],
  [kestrelFord, kestrelFordList, ['obscured-4']],
  [aldersund, aldersundList, ['clear-12', 'bronze-6', 'grey-6']],
] as const;

describe('the demo lists', () => {
  it.each(pairs)('follow the contract: %#', (maker, list) => {
    expect(priceListContent.parse(list)).toEqual(list);
    expect(list.currency).toBe(maker.currency);
    expect(list.measure).toBe(maker.measureSystem);
  });

  it.each(pairs)('have a rate for what their maker can build: %#', (maker, list, withoutRate) => {
    const { glass, treatments, coatings, spacers, gases, grids, edgeWork, shapes, lites, capillary } = maker.capabilities;
    const rated = list.glass.map((row) => row.glass);
    expect(glass.map((row) => row.glass).filter((id) => !rated.includes(id))).toEqual(withoutRate);
    expect(list.treatments.map((row) => row.treatment)).toEqual(
      expect.arrayContaining(treatments.map((row) => row.treatment).filter((treatment) => treatment !== 'annealed')),
    );
    expect(list.coatings.map((row) => row.coating)).toEqual(expect.arrayContaining(coatings.map((row) => row.coating)));
    expect(list.spacers.map((row) => row.spacer)).toEqual(expect.arrayContaining(spacers.map((row) => row.spacer)));
    expect(list.gases.map((row) => row.gas)).toEqual(expect.arrayContaining(gases.map((row) => row.gas)));
    expect(list.grids.map((row) => row.bar)).toEqual(expect.arrayContaining(grids.map((row) => row.bar)));
    expect(list.edgeWork.map((row) => row.edgeWork)).toEqual(expect.arrayContaining(edgeWork));
    expect(list.shapes.map((row) => row.shape)).toEqual(expect.arrayContaining(shapes.filter((shape) => shape !== 'rectangle')));
    expect(list.assembly.map((row) => row.cavity)).toEqual(Array.from({ length: lites.max - 1 }, (_, i) => i + 1));
    expect(list.extras.some(({ applies }) => applies === 'capillary')).toBe(capillary.offered);
  });

  it('belong to the three makers', () => expect(pairs.map(([maker]) => maker)).toEqual(demoFabricators));

  it('change by a percentage, to the cent', () => {
    const raised = raise(northmereList, '-3');
    expect(raised.glass[1]).toEqual({ glass: 'clear-3', rate: '2.04' });
    expect(raised.gases[1]).toEqual({ gas: 'argon', rate: '0.53', minimum: '1.94' });
    expect(raised.sizeCharges).toEqual(northmereList.sizeCharges);
    expect(priceListContent.safeParse(raised).success).toBe(true);
  });
});
