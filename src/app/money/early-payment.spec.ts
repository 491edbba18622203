import { earlyPaymentOf } from './early-payment';

const usd = (amount: string) => ({ amount, currency: 'USD' as const });
const terms = { netDays: 30, endOfMonth: false, discountPercent: '2', discountDays: 10 };
const invoice = { state: 'open' as const, issuedOn: '2026-03-02', total: usd('1105.38'), open: usd('1105.38') };

describe('early payment', () => {
  it('earns the discount up to and including its last day', () => {
    expect(earlyPaymentOf(invoice, terms, '2026-03-05')).toEqual({ percent: '2', until: '2026-03-12', daysLeft: 7 });
    expect(earlyPaymentOf(invoice, terms, '2026-03-12')?.daysLeft).toBe(0);
    expect(earlyPaymentOf(invoice, terms, '2026-03-13')).toBeNull();
  });

  it('earns none where the terms have none, or a part is paid already', () => {
    expect(earlyPaymentOf(invoice, { ...terms, discountPercent: null }, '2026-03-05')).toBeNull();
    expect(earlyPaymentOf({ ...invoice, open: usd('5.00') }, terms, '2026-03-05')).toBeNull();
    expect(earlyPaymentOf({ ...invoice, state: 'paid', open: usd('0.00') }, terms, '2026-03-05')).toBeNull();
  });
});
