import { type Credit } from '@shared/contracts/trade-accounts';
import { creditShares } from './credit-shares';

const usd = (amount: string) => ({ amount, currency: 'USD' as const });

function credit(limit: string, receivable: string, reserved: string, unapplied = '0.00'): Credit {
  const cents = (text: string) => Math.round(Number(text) * 100);
  const exposure = cents(receivable) + cents(reserved) - cents(unapplied);
  const words = (value: number) => (value / 100).toFixed(2);
  return {
    limit: usd(limit),
    receivable: usd(receivable),
    reserved: usd(reserved),
    unapplied: usd(unapplied),
    exposure: usd(words(exposure)),
    available: usd(words(cents(limit) - exposure)),
    overdue: usd('0.00'),
    onHold: false,
  };
}

const sum = ({ share }: ReturnType<typeof creditShares>) =>
  Object.values(share).reduce((total, part) => total + Math.round(Number(part) * 100), 0);

describe('the parts of a credit bar', () => {
  it('are in proportion to the limit', () => {
    const shares = creditShares(credit('40000.00', '18400.00', '5600.00'));
    expect(shares.share).toEqual({ used: '46', reserved: '14', adding: '0', free: '40' });
    expect(shares.free).toEqual(usd('16000.00'));
  });

  it('show what an order would take of what is free', () => {
    const shares = creditShares(credit('40000.00', '18400.00', '5600.00'), usd('4000.00'));
    expect(shares.share).toEqual({ used: '46', reserved: '14', adding: '10', free: '30' });
    expect(shares.free).toEqual(usd('12000.00'));
    expect(shares.over).toBe(false);
  });

  it('are in proportion to the whole when that passes the limit, and nothing is free', () => {
    const shares = creditShares(credit('1000.00', '1200.00', '600.00'), usd('200.00'));
    expect(shares.share).toEqual({ used: '60', reserved: '30', adding: '10', free: '0' });
    expect(shares.free).toEqual(usd('-1000.00'));
    expect(shares.over).toBe(true);
  });

  it('count unapplied cash against what is owed first, then against what is reserved', () => {
    const shares = creditShares(credit('1000.00', '100.00', '300.00', '150.00'));
    expect(shares.used).toEqual(usd('0.00'));
    expect(shares.reserved).toEqual(usd('250.00'));
    expect(shares.share).toEqual({ used: '0', reserved: '25', adding: '0', free: '75' });
  });

  it('always fill the bar, whatever the thirds', () => {
    for (const limit of ['3.00', '7.00', '999.99', '0.00']) {
      expect(sum(creditShares(credit(limit, '1.00', '1.00')))).toBeGreaterThanOrEqual(9999);
      expect(sum(creditShares(credit(limit, '1.00', '1.00')))).toBeLessThanOrEqual(10001);
    }
  });
});
