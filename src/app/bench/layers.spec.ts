import fc from 'fast-check';
import { catalogueFactory, tripleFactory, unitFactory } from '../../../test/factories/catalogue-factory';
import { makeUpText } from '@shared/glazing/make-up-text';
import { addLite, type Layers, removeLite, swapSides } from './layers';

const catalogue = catalogueFactory();
const text = (layers: Layers) => makeUpText(layers, catalogue);
const units = fc.constantFrom(unitFactory(), tripleFactory());

describe('layers', () => {
  it('adds a plain lite on the room side', () => {
    expect(text(addLite(unitFactory()))).toBe('3 temp / 16 argon / 3 temp low-e 3 / 16 argon / 3 temp');
  });

  it('takes out a lite with a cavity; coatings stay on their lites', () => {
    expect(text(removeLite(tripleFactory(), 2))).toBe('4 low-e 2 / 12 argon / 4');
    expect(text(removeLite(tripleFactory(), 1))).toBe('4 low-e 2 / 12 argon / 4 low-e 3');
    expect(text(removeLite(tripleFactory(), 0))).toBe('4 / 12 argon / 4 low-e 3');
  });

  it('undoes what it did', () => {
    fc.assert(
      fc.property(units, (unit) => {
        expect(text(removeLite(addLite(unit), unit.lites.length))).toBe(text(unit));
        expect(swapSides(swapSides(unit))).toEqual({ lites: unit.lites, cavities: unit.cavities });
      }),
    );
  });

  it('turns the unit round', () => {
    expect(text(swapSides(unitFactory()))).toBe('3 temp low-e 2 / 16 argon / 3 temp');
  });
});
