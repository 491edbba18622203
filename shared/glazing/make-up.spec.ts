import fc from 'fast-check';
import { catalogueFactory, tripleFactory, unitFactory } from '../../test/factories/catalogue-factory';
import type { Unit } from '../contracts/units';
import { makeUpKey } from './make-up-key';
import { makeUpText } from './make-up-text';
import { parseMakeUp } from './parse-make-up';

const catalogue = catalogueFactory();
const unit = unitFactory();
const ids = (items: { id: string }[]) => fc.constantFrom(...items.map(({ id }) => id));

/** Make-ups of every product of the catalogue. */
const makeUps: fc.Arbitrary<Pick<Unit, 'lites' | 'cavities'>> = fc.integer({ min: 2, max: 4 }).chain((count) =>
  fc.record({
    lites: fc.tuple(
      ...Array.from({ length: count }, (_, i) =>
        fc
          .record({
            glass: ids(catalogue.glasses),
            treatment: ids(catalogue.treatments),
            coating: fc.option(ids(catalogue.coatings)),
            inner: fc.boolean(),
          })
          .map(({ glass, treatment, coating, inner }) => ({
            glass,
            treatment,
            ...(coating ? { coating: { id: coating, surface: 2 * i + (inner ? 2 : 1) } } : {}),
          })),
      ),
    ),
    cavities: fc.tuple(
      ...Array.from({ length: count - 1 }, () =>
        fc
          .record({
            width: fc.constantFrom('6', '12.5', '16', '20'),
            gas: ids(catalogue.gases),
            spacer: ids(catalogue.spacers),
            tube: fc.boolean(),
          })
          .map(({ tube, ...cavity }) => ({ ...cavity, ...(tube ? { capillary: true } : {}) })),
      ),
    ),
  }),
);

describe('makeUpText and parseMakeUp', () => {
  it('writes as the trade does', () => {
    expect(makeUpText(unit, catalogue)).toBe('3 temp / 16 argon / 3 temp low-e 3');
    expect(makeUpText(tripleFactory(), catalogue)).toBe('4 low-e 2 / 12 argon / 4 / 12 argon / 4 low-e 5');
  });

  it('reads back whatever it writes', () => {
    fc.assert(
      fc.property(makeUps, (makeUp) => {
        expect(parseMakeUp(makeUpText(makeUp, catalogue), catalogue, makeUp)).toEqual(makeUp);
      }),
    );
  });

  it.each([
    ['4 / 16 argon / 4 low-e 3', '4 / 16 argon / 4 low-e 3'],
    ['4/16/4', '4 / 16 air / 4'],
    ['4mm toughened / 12 mm Ar / 4 Low E', '4 temp / 12 argon / 4 low-e 3'],
    ['4 low e / 12 argon / 4', '4 low-e 2 / 12 argon / 4'],
    ['6 bronze heat strengthened / 12 air / 6 lam low-e on surface 3', '6 bronze hs / 12 air / 6 lam low-e 3'],
    ['6 laminated clear / 12 air tube / 4 obscured low-e-hard #4', '6 lam / 12 air tube / 4 obscured low-e-hard 4'],
  ])('reads %s', (text, expected) => {
    const read = parseMakeUp(text, catalogue, unit);
    if ('problem' in read) throw new Error(read.problem);
    expect(makeUpText(read, catalogue)).toBe(expected);
  });

  it('takes spacer and edge work from the unit at hand unless the text names a spacer', () => {
    const at = unitFactory({ lites: unit.lites.map((lite) => ({ ...lite, edgeWork: 'ground' })) });
    expect(parseMakeUp('4 / 12 air warm edge / 4', catalogue, at)).toEqual({
      lites: [1, 2].map(() => ({ glass: 'clear-4', treatment: 'annealed', edgeWork: 'ground' })),
      cavities: [{ width: '12', gas: 'air', spacer: 'warm-edge' }],
    });
    expect(parseMakeUp('4 / 12 air / 4', catalogue, at)).toMatchObject({ cavities: [{ spacer: 'stainless' }] });
  });

  it.each([
    ['', null, /from outside in/],
    ['4', null, /two to four lites/],
    ['4/12', null, /in turn/],
    ['4//4', null, /Part 2 is empty/],
    ['7/12/4', '7', /comes in 2.5, 3, 4/],
    ['4 bronze/12/4', '4', /bronze glass comes in 6 mm/],
    ['4/12 helium/4', 'helium', /neither a gas nor a spacer/],
    ['4/twelve/4', 'twelve', /cavity width/],
    ['4/12/4 shiny', 'shiny', /neither a glass/],
    ['4 temp hs/12/4', 'hs', /second treatment/],
    ['4/12/4 low-e 7', '7', /surfaces 3 and 4/],
    ['4/12/4 low-e/12/4', 'low-e', /which surface of lite 2/],
    ['4/0/4', '0', /cavity width/],
  ])('refuses %s and names the word', (text, word, message) => {
    expect(parseMakeUp(text, catalogue, unit)).toEqual({ word, problem: expect.stringMatching(message) });
  });
});

describe('makeUpKey', () => {
  it('is the canonical text of what the unit is made of', () => {
    expect(makeUpKey(unit)).toBe('clear-3:tempered|16:argon:stainless|clear-3:tempered:low-e-soft@3');
  });

  it('looks at neither size, place, grid, edge work nor the way a width is written', () => {
    const other = unitFactory({
      width: '500',
      height: '600',
      place: { altitude: 1800 },
      grid: { bar: 'flat-16', across: 1, down: 1 },
      lites: unit.lites.map((lite) => ({ ...lite, edgeWork: 'ground' })),
      cavities: [{ width: '16.00', gas: 'argon', spacer: 'stainless' }],
    });
    expect(makeUpKey(other)).toBe(makeUpKey(unit));
  });

  it('differs for every two make-ups that differ', () => {
    const plain = ({ lites, cavities }: Pick<Unit, 'lites' | 'cavities'>) =>
      JSON.stringify([lites, cavities.map(({ width, gas, spacer }) => [width, gas, spacer])]);
    fc.assert(
      fc.property(makeUps, makeUps, (a, b) => {
        expect(makeUpKey(a) === makeUpKey(b)).toBe(plain(a) === plain(b));
      }),
    );
  });
});
