import fc from 'fast-check';
import { availableMinor, checkDispatch, checkPlacement, type CreditState, exposureMinor } from './credit-check';

const amount = fc.integer({ min: 0, max: 10_000_000 });
const states: fc.Arbitrary<CreditState> = fc.record({
  limitMinor: amount,
  receivableMinor: amount,
  reservedMinor: amount,
  unappliedMinor: amount,
  onHold: fc.constant(false),
  overdueBeyondGraceMinor: fc.constant(0),
  countsFrom: fc.constantFrom('placement', 'dispatch'),
});
const quiet: CreditState = {
  limitMinor: 100_000,
  receivableMinor: 30_000,
  reservedMinor: 25_000,
  unappliedMinor: 5_000,
  onHold: false,
  overdueBeyondGraceMinor: 0,
  countsFrom: 'placement',
};

describe('the credit check', () => {
  it('reckons exposure and what is free', () => {
    expect(exposureMinor(quiet)).toBe(50_000);
    expect(availableMinor(quiet)).toBe(50_000);
  });

  it('lets an order through up to the last cent and says by how much another is short', () => {
    expect(checkPlacement(quiet, 50_000)).toEqual({ ok: true });
    expect(checkPlacement(quiet, 50_001)).toEqual({ ok: false, code: 'over-credit', availableMinor: 50_000, shortByMinor: 1 });
  });

  it('stops at a hold before all else, then at what is overdue', () => {
    expect(checkPlacement({ ...quiet, onHold: true, overdueBeyondGraceMinor: 1 }, 1)).toMatchObject({
      code: 'account-on-hold',
      shortByMinor: 0,
    });
    expect(checkPlacement({ ...quiet, overdueBeyondGraceMinor: 1 }, 60_000)).toMatchObject({ code: 'overdue', shortByMinor: 10_000 });
    expect(checkPlacement({ ...quiet, countsFrom: 'dispatch', onHold: true }, 1)).toMatchObject({ ok: false });
  });

  it('holds the limit when the account counts, and then alone', () => {
    expect(checkPlacement({ ...quiet, countsFrom: 'dispatch' }, 9_000_000)).toEqual({ ok: true });
    expect(checkDispatch({ ...quiet, countsFrom: 'dispatch' }, 50_001)).toMatchObject({ code: 'over-credit', shortByMinor: 1 });
    expect(checkDispatch(quiet, 9_000_000)).toEqual({ ok: true });
  });

  it('never lets exposure pass the limit, one order after the other, either way of counting', () => {
    fc.assert(
      fc.property(states, fc.array(fc.integer({ min: 1, max: 3_000_000 }), { maxLength: 30 }), (start, totals) => {
        const state = { ...start };
        const counted = state.countsFrom === 'placement' ? 'reservedMinor' : 'receivableMinor';
        const check = state.countsFrom === 'placement' ? checkPlacement : checkDispatch;
        for (const total of totals) {
          const before = availableMinor(state);
          const answer = check(state, total);
          expect(answer.ok).toBe(total <= before);
          if (answer.ok) state[counted] += total;
          else expect(answer.shortByMinor).toBe(total - before);
        }
        expect(exposureMinor(state)).toBeLessThanOrEqual(Math.max(state.limitMinor, exposureMinor(start)));
      }),
    );
  });
});
