import fc from 'fast-check';
import { type InvoiceItem } from '@shared/contracts/receivables';
import { amountOf } from '@shared/money/money';
import { fillOldest, sumShares, typedMinor } from './shares';

const invoice = (id: string, openMinor: number, dueOn = '2026-10-01') =>
  ({ id, dueOn, open: { amount: amountOf(openMinor, 'USD'), currency: 'USD' } }) as InvoiceItem;

describe('typed amounts', () => {
  it.each([
    ['1105.38', 110538],
    [' 12 ', 1200],
    ['', 0],
    ['1,105.38', null],
    ['1e3', null],
    ['-5', null],
    ['1.005', null],
  ])('%j is %s', (text, minor) => expect(typedMinor(text, 'USD')).toBe(minor));
});

describe('the sum of shares', () => {
  it('says what stays unapplied', () => {
    const sum = sumShares('100.00', [{ invoice: 'a', amount: '60.10', discount: '' }], [invoice('a', 6010)], 'USD');
    expect(sum).toMatchObject({ receivedMinor: 10000, appliedMinor: 6010, unappliedMinor: 3990 });
    expect(sum.wrong.size).toBe(0);
  });
  it('names what is above the open amount, discount included', () => {
    const sum = sumShares('100', [{ invoice: 'a', amount: '59.00', discount: '1.20' }], [invoice('a', 6000)], 'USD');
    expect(sum.wrong.get('a')).toContain('60.00');
  });
  it('goes below zero when more is applied than received', () => {
    expect(sumShares('10', [{ invoice: 'a', amount: '20', discount: '' }], [invoice('a', 6000)], 'USD').unappliedMinor).toBe(-1000);
  });
});

describe('filling the oldest first', () => {
  it('never applies more than there is, nor more than is open, and leaves nothing while something is open', () => {
    fc.assert(
      fc.property(fc.nat(1_000_000), fc.array(fc.integer({ min: 1, max: 200_000 }), { maxLength: 12 }), (available, open) => {
        const invoices = open.map((minor, i) => invoice(String(i), minor, `2026-10-${String((i % 28) + 1).padStart(2, '0')}`));
        const filled = fillOldest(available, invoices, 'USD');
        const sum = [...filled.values()].reduce((a, b) => a + b, 0);
        const total = open.reduce((a, b) => a + b, 0);
        expect(sum).toBe(Math.min(available, total));
        for (const [id, share] of filled) expect(share).toBeLessThanOrEqual(open[Number(id)]!);
      }),
    );
  });
});
