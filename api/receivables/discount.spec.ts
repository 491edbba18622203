import fc from 'fast-check';
import { judgeDiscount, wholeDiscountMinor } from './discount';

const invoice = { totalMinor: 100_000, discountPercent: '2', discountUntil: '2026-10-10' };
const taken = { amountMinor: 98_000, discountMinor: 2_000, takenBeforeMinor: 0, receivedOn: '2026-10-10' };

describe('the early-payment discount', () => {
  it('is taken in full by the last day', () => {
    expect(wholeDiscountMinor(invoice)).toBe(2_000);
    expect(judgeDiscount(invoice, taken)).toBeNull();
    expect(judgeDiscount(invoice, { ...taken, receivedOn: '2026-10-11' })).toContain('until 2026-10-10');
  });

  it('is none where the terms have none', () => {
    expect(wholeDiscountMinor({ ...invoice, discountPercent: null })).toBe(0);
    expect(judgeDiscount({ ...invoice, discountPercent: null, discountUntil: null }, taken)).toContain('no early-payment discount');
  });

  it('is in proportion to what it settles', () => {
    expect(judgeDiscount(invoice, { ...taken, amountMinor: 49_000, discountMinor: 1_000 })).toBeNull();
    expect(judgeDiscount(invoice, { ...taken, amountMinor: 49_000, discountMinor: 1_021 })).toContain('more than 2 %');
  });

  it('never comes to more than that of the whole invoice, in however many parts', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 1, max: 9_000 }), { maxLength: 40 }), (amounts) => {
        let takenBeforeMinor = 0;
        for (const amountMinor of amounts) {
          const discountMinor = Math.ceil(amountMinor / 49);
          if (judgeDiscount(invoice, { ...taken, amountMinor, discountMinor, takenBeforeMinor }) === null)
            takenBeforeMinor += discountMinor;
        }
        expect(takenBeforeMinor).toBeLessThanOrEqual(2_000);
      }),
    );
  });
});
