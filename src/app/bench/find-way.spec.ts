import { type Unit } from '@shared/contracts/units';
import { evaluateUnit } from '@shared/glazing/evaluate-unit';
import { catalogueFactory, tripleFactory, unitFactory } from '../../../test/factories/catalogue-factory';
import { findWay } from './find-way';
import { takesWords } from './reason-words';

const catalogue = catalogueFactory();
const plain = (glass: string) => [
  { glass, treatment: 'annealed' },
  { glass, treatment: 'annealed' },
];
const canBuild = (unit: Unit) => evaluateUnit(unit, catalogue).buildability.find(({ fabricator }) => fabricator.id === 'narrow')!.canBuild;

describe('the nearest that a maker can build', () => {
  it.each<[string, Unit, string]>([
    ['glass', unitFactory(), 'clear 4 mm'],
    ['size', unitFactory({ width: '2600', height: '1300', lites: plain('clear-6') }), '≈ 90 13/16 in wide'],
    ['cavity', unitFactory({ cavities: [{ width: '20', gas: 'krypton', spacer: 'warm-edge' }], lites: plain('clear-4') }), ''],
    ['third lite, spacer and coating', tripleFactory(), ''],
    ['capillary tube', unitFactory({ cavities: [{ width: '16', gas: 'air', spacer: 'aluminium', capillary: true }] }), ''],
    ['edge work', unitFactory({ lites: [{ glass: 'clear-4', treatment: 'annealed', edgeWork: 'polished' }, ...plain('clear-4').slice(1)] }), 'seamed edges'],
  ])('%s', (_, unit, words) => {
    expect(canBuild(unit)).toBe(false);
    const way = findWay(unit, 'narrow', catalogue)!;
    expect(canBuild({ ...unit, ...way.unit })).toBe(true);
    const said = takesWords(way.met, catalogue, 'imperial');
    expect(said).not.toBe('');
    if (words) expect(said).toBe(words);
  }); // prettier-ignore

  it('is nothing where no value would do, and where nothing has to change', () => {
    expect(findWay(unitFactory({ shape: { class: 'circle' }, height: '927.1' }), 'narrow', catalogue)).toBeNull();
    expect(findWay(unitFactory(), 'wide', catalogue)).toBeNull();
    expect(findWay(unitFactory(), 'nobody', catalogue)).toBeNull();
  });
});
