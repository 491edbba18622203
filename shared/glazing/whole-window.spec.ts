import fc from 'fast-check';
import { catalogueFactory } from '../../test/factories/catalogue-factory';
import { rankSpacers } from './rank-spacers';
import { wholeWindowU } from './whole-window';

describe('wholeWindowU', () => {
  const size = fc.double({ min: 0.1, max: 4, noNaN: true });

  it('lies between glass and frame without an edge, and rises with it', () => {
    fc.assert(
      fc.property(size, size, size, size, (glassArea, frameArea, glassU, frameU) => {
        const plain = wholeWindowU({ glassArea, frameArea, glassU, frameU, edgeLength: 5, psi: 0 });
        expect(plain).toBeGreaterThanOrEqual(Math.min(glassU, frameU) - 1e-12);
        expect(plain).toBeLessThanOrEqual(Math.max(glassU, frameU) + 1e-12);
        expect(wholeWindowU({ glassArea, frameArea, glassU, frameU, edgeLength: 5, psi: 0.08 })).toBeGreaterThan(plain);
      }),
    );
  });

  it('refuses a window without area', () => {
    expect(() => wholeWindowU({ glassArea: 0, frameArea: 0, glassU: 1, frameU: 1, edgeLength: 0, psi: 0 })).toThrow(RangeError);
  });
});

describe('rankSpacers', () => {
  it('puts the warm edge first and aluminium last, in every frame', () => {
    for (const frame of ['wood or plastic', 'metal with thermal break', 'metal without thermal break'] as const) {
      const ranked = rankSpacers(catalogueFactory().spacers, frame, true);
      expect(ranked.map(({ spacer }) => spacer.id)).toEqual(['warm-edge', 'stainless', 'aluminium']);
      expect(ranked.at(-1)!.psi).toBeGreaterThan(ranked[0]!.psi);
    }
  });
});
