import { catalogueFactory, tripleFactory, unitFactory } from '../../test/factories/catalogue-factory';
import type { UnitInput } from '../contracts/units';
import { findImpossibilities } from './find-impossibilities';

const catalogue = catalogueFactory();
const found = (overrides: Partial<UnitInput>) => findImpossibilities(unitFactory(overrides), catalogue);
const pane = { glass: 'clear-4', treatment: 'annealed' };
const air = { width: '12', gas: 'air', spacer: 'stainless' };

describe('findImpossibilities', () => {
  it('finds nothing wrong with an ordinary double or triple unit', () => {
    expect(findImpossibilities(unitFactory(), catalogue)).toEqual([]);
    expect(findImpossibilities(tripleFactory(), catalogue)).toEqual([]);
  });

  it('points at every product that the catalogue does not hold', () => {
    const problems = found({
      lites: [
        { glass: 'no-glass', treatment: 'no-treatment' },
        { ...pane, coating: { id: 'no-coating', surface: 3 }, edgeWork: 'no-edge' },
      ],
      cavities: [{ width: '12', gas: 'no-gas', spacer: 'no-spacer' }],
      grid: { bar: 'no-bar', across: 1, down: 1 },
    });
    expect(problems.map(({ pointer }) => pointer)).toEqual([
      '/lites/0/glass',
      '/lites/0/treatment',
      '/lites/1/coating/id',
      '/lites/1/edgeWork',
      '/cavities/0/gas',
      '/cavities/0/spacer',
      '/grid/bar',
    ]);
  });

  it.each([
    [1, 0, 'low-e-soft', 'the weather'],
    [4, 1, 'low-e-solar', 'the room'],
  ])('keeps a soft coat off surface %s', (surface, lite, id, faces) => {
    const lites = [pane, pane].map((own, i) => (i === lite ? { ...own, coating: { id, surface } } : own));
    const [problem, ...others] = found({ lites });
    expect(problem).toMatchObject({ pointer: `/lites/${lite}/coating/surface`, detail: expect.stringContaining(faces) });
    expect(others).toEqual([]);
  });

  it('lets a hard coat face the room', () => {
    expect(found({ lites: [pane, { ...pane, coating: { id: 'low-e-hard', surface: 4 } }] })).toEqual([]);
  });

  it('refuses an open capillary tube with a gas fill, and takes it with air', () => {
    expect(found({ cavities: [{ ...air, gas: 'argon', capillary: true }] })).toEqual([
      { pointer: '/cavities/0/capillary', detail: expect.stringContaining('argon') },
    ]);
    expect(found({ cavities: [{ ...air, capillary: true }] })).toEqual([]);
  });

  it.each([
    [{ bar: 'flat-16', across: 0, down: 0 }, '12', '/grid/across'],
    [{ bar: 'flat-25', across: 20, down: 1 }, '12', null],
    [{ bar: 'profiled-19', across: 1, down: 1 }, '9', '/grid/bar'],
    [{ bar: 'profiled-19', across: 1, down: 1 }, '12', null],
  ])('checks the grid %j in a cavity of %s mm', (grid, width, pointer) => {
    const problems = found({ grid, cavities: [{ ...air, width }] });
    expect(problems.map((problem) => problem.pointer)).toEqual(pointer ? [pointer] : []);
  });

  it('refuses more bars than fit the width', () => {
    expect(found({ width: '300', grid: { bar: 'flat-16', across: 19, down: 0 }, cavities: [air] })[0]?.pointer).toBe('/grid/across');
  });

  it.each<[UnitInput['shape'], string, string, string | null]>([
    [{ class: 'segment-arch', rise: '501' }, '1000', '1500', '/shape/rise'],
    [{ class: 'segment-arch', rise: '500' }, '1000', '1500', null],
    [{ class: 'segment-arch', rise: '450' }, '1000', '400', '/shape/rise'],
    [{ class: 'raked-head', lowHeight: '800', high: 'left' }, '1000', '800', '/shape/lowHeight'],
    [{ class: 'gable', eaves: '900' }, '1000', '800', '/shape/eaves'],
    [{ class: 'half-round' }, '1000', '600', '/height'],
    [{ class: 'half-round' }, '927.1', '463.55', null],
    [{ class: 'circle' }, '800', '820', '/height'],
    [{ class: 'ellipse' }, '800', '820', null],
    [{ class: 'triangle', apex: '900' }, '800', '800', '/shape/apex'],
    [{ class: 'triangle' }, '100', '800', '/shape'],
    [{ class: 'octagon', cut: '400' }, '800', '900', '/shape/cut'],
  ])('checks the shape %j of %s × %s', (shape, width, height, pointer) => {
    expect(found({ shape, width, height }).map((problem) => problem.pointer)).toEqual(pointer ? [pointer] : []);
  });

  it.each<[string, [number, number][], string | null]>([
    ['plain', [[0, 0], [800, 0], [800, 600], [0, 900]], null], // prettier-ignore
    ['re-entrant', [[0, 0], [800, 0], [800, 900], [400, 500], [0, 900]], null], // prettier-ignore
    ['crossing itself', [[0, 0], [800, 900], [800, 0], [0, 900]], '/shape/points/2'], // prettier-ignore
    ['outside', [[0, 0], [801, 0], [800, 900], [0, 900]], '/shape/points/1'], // prettier-ignore
    ['too narrow', [[0, 0], [700, 0], [700, 900], [0, 900]], '/shape/points'], // prettier-ignore
    ['closed by hand', [[0, 0], [800, 0], [800, 900], [0, 0]], '/shape/points/3'], // prettier-ignore
    ['sharp', [[0, 0], [800, 0], [800, 900], [790, 100]], '/shape/points'], // prettier-ignore
  ])('checks a polygon: %s', (_name, corners, pointer) => {
    const points = corners.map(([x, y]) => ({ x: String(x), y: String(y) }));
    const problems = found({ width: '800', height: '900', shape: { class: 'polygon', points } });
    expect(problems.map((problem) => problem.pointer)).toEqual(pointer ? [pointer] : []);
  });
});
