import fc from 'fast-check';
import { findPublishingProblem, versionInForce } from './in-force';

const DAY = 86_400_000;
const published = [{ effectiveFrom: 10 * DAY }, { effectiveFrom: 30 * DAY }, { effectiveFrom: 20 * DAY }];

describe('the version in force', () => {
  it('is the published one that began last', () => {
    const at = (day: number) => versionInForce([...published, { effectiveFrom: null }], day * DAY)?.effectiveFrom;
    expect([9, 10, 19, 20, 29, 30, 99].map((day) => at(day) && at(day)! / DAY)).toEqual([undefined, 10, 10, 20, 20, 30, 30]);
    expect(versionInForce(published, 10 * DAY - 1)).toBeUndefined();
  });

  it('at an instant that has passed never changes by what is published later', () => {
    const day = fc.integer({ min: 0, max: 1000 });
    fc.assert(
      fc.property(fc.array(day, { maxLength: 8 }), fc.array(day, { maxLength: 8 }), day, day, (earlier, later, now, asked) => {
        const before = [...new Set(earlier)].map((from) => ({ effectiveFrom: from * DAY }));
        const after = [...before];
        for (const from of later) {
          if (findPublishingProblem(from * DAY, now * DAY, after) === null) after.push({ effectiveFrom: from * DAY });
        }
        const past = Math.min(asked, now) * DAY - 1;
        expect(versionInForce(after, past)).toBe(versionInForce(before, past));
      }),
    );
  });

  it('may begin now, but not before, and not together with another', () => {
    expect(findPublishingProblem(40 * DAY, 40 * DAY, published)).toBeNull();
    expect(findPublishingProblem(40 * DAY - 1, 40 * DAY, published)).toBe('a list cannot take effect in the past');
    expect(findPublishingProblem(30 * DAY, 12 * DAY, published)).toBe('another version takes effect at the same instant');
  });
});
