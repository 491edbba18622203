import fc from 'fast-check';
import { spreadApart } from './spread-apart';

describe('spreading apart', () => {
  it('leaves alone what does not collide', () => {
    expect(spreadApart([{ wanted: 10, size: 4 }, { wanted: 30, size: 4 }], 0, 100)).toEqual([10, 30]); // prettier-ignore
  });

  it('moves a collision apart about its middle', () => {
    expect(spreadApart([{ wanted: 20, size: 10 }, { wanted: 20, size: 10 }], 0, 100)).toEqual([15, 25]); // prettier-ignore
  });

  it('keeps within the ends', () => {
    expect(spreadApart([{ wanted: 0, size: 10 }, { wanted: 1, size: 10 }], 0, 100)).toEqual([5, 15]); // prettier-ignore
    expect(spreadApart([{ wanted: 99, size: 10 }, { wanted: 98, size: 10 }], 0, 100)).toEqual([95, 85]); // prettier-ignore
  });

  it('never lets two touch, keeps their order and stays within, for any wishes that have room', () => {
    const thing = fc.record({ wanted: fc.double({ min: -50, max: 350, noNaN: true }), size: fc.double({ min: 1, max: 20, noNaN: true }) });
    fc.assert(
      fc.property(fc.array(thing, { maxLength: 14 }), (things) => {
        const middles = spreadApart(things, 0, 300);
        const spans = middles
          .map((middle, i) => ({ from: middle - things[i]!.size / 2, to: middle + things[i]!.size / 2, wanted: things[i]!.wanted }))
          .sort((a, b) => a.from - b.from);
        for (const [i, span] of spans.entries()) {
          expect(span.from).toBeGreaterThanOrEqual(-1e-6);
          expect(span.to).toBeLessThanOrEqual(300 + 1e-6);
          const next = spans[i + 1];
          if (next) expect(span.to).toBeLessThanOrEqual(next.from + 1e-6);
          if (next) expect(span.wanted).toBeLessThanOrEqual(next.wanted);
        }
      }),
    );
  });
});
