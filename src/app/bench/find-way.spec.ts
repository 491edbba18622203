import { type Unit } from '@shared/contracts/units';
import { evaluateUnit } from '@shared/glazing/evaluate-unit';
import { catalogueFactory, tripleFactory, unitFactory } from '../../../test/factories/catalogue-factory';
import { changeWords } from './change-words';
import { findWay } from './find-way';

const catalogue = catalogueFactory();
const plain = (glass: string) => [
  { glass, treatment: 'annealed' },
  { glass, treatment: 'annealed' },
];
const canBuild = (unit: Unit) => evaluateUnit(unit, catalogue).buildability.find(({ fabricator }) => fabricator.id === 'narrow')!.canBuild;

describe('the nearest that a maker can build', () => {
  it.each<[string, Unit, string]>([
    ['glass', unitFactory(), 'clear 4 mm'],
    ['size', unitFactory({ width: '2600', height: '1200', lites: plain('clear-4') }), '96 in wide'],
    ['cavity', unitFactory({ cavities: [{ width: '20', gas: 'krypton', spacer: 'warm-edge' }], lites: plain('clear-4') }), 'a 16 mm cavity, air and stainless steel spacer'],
    ['third lite, spacer and coating', tripleFactory(), '2 lites and stainless steel spacer'],
    ['capillary tube', unitFactory({ cavities: [{ width: '16', gas: 'air', spacer: 'aluminium', capillary: true }], lites: plain('clear-4') }), 'no capillary tube'],
    ['edge work', unitFactory({ lites: [{ glass: 'clear-4', treatment: 'annealed', edgeWork: 'polished' }, ...plain('clear-4').slice(1)] }), 'seamed edges'],
  ])('%s', (_, unit, words) => {
    expect(canBuild(unit)).toBe(false);
    const way = findWay(unit, 'narrow', catalogue, 'imperial')!;
    expect(canBuild({ ...unit, ...way })).toBe(true);
    expect(changeWords(unit, way, catalogue, 'imperial')).toBe(words);
  }); // prettier-ignore

  it('goes to the sixteenth within a limit in mm, for readers in inches', () => {
    const tooLong = unitFactory({ width: '3100', height: '900', lites: plain('clear-4') });
    const way = (system: 'imperial' | 'metric') => findWay(tooLong, 'narrow', metricLimit, system)!.width;
    const metricLimit = catalogueFactory();
    metricLimit.fabricators[1]!.capabilities.unit.maxLong = '2200';
    expect(way('metric')).toBe('2200');
    expect(way('imperial')).toBe('2198.6875');
    expect(changeWords(tooLong, { ...tooLong, width: way('imperial') }, metricLimit, 'imperial')).toBe('86 9/16 in wide');
  });

  it('is nothing where no value would do, and where nothing has to change', () => {
    expect(findWay(unitFactory({ shape: { class: 'circle' }, height: '927.1' }), 'narrow', catalogue, 'metric')).toBeNull();
    expect(findWay(unitFactory(), 'wide', catalogue, 'metric')).toBeNull();
    expect(findWay(unitFactory(), 'nobody', catalogue, 'metric')).toBeNull();
  });
});
