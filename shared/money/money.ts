import { type Currency, minorDigits } from './currencies';
import { Exact, exact } from './exact';

/** Money as it travels: a decimal string with exactly the currency's decimals. */
export interface Money {
  amount: string;
  currency: Currency;
}

/** Whole minor units (cents) as money on the wire. @throws RangeError unless `minor` is a safe integer */
export function money(minor: number, currency: Currency): Money {
  return { amount: amountOf(minor, currency), currency };
}

/** Whole minor units as a decimal string: 110538 USD → `1105.38`. @throws RangeError unless `minor` is a safe integer */
export function amountOf(minor: number, currency: Currency): string {
  if (!Number.isSafeInteger(minor)) throw new RangeError(`not whole minor units: ${minor}`);
  const digits = minorDigits[currency];
  if (digits === 0) return String(minor);
  const text = String(Math.abs(minor)).padStart(digits + 1, '0');
  return `${minor < 0 ? '-' : ''}${text.slice(0, -digits)}.${text.slice(-digits)}`;
}

/**
 * A decimal string as whole minor units: `1105.38` USD → 110538.
 *
 * @throws TypeError for anything but a plain decimal string
 * @throws RangeError when it has more decimals than the currency, or is too large to be exact
 */
export function minorOf(amount: string, currency: Currency): number {
  const minor = exact(amount).times(Exact.pow(10, minorDigits[currency]));
  if (!minor.isInteger()) throw new RangeError(`${amount} has more decimals than ${currency}`);
  const whole = minor.toNumber();
  if (!Number.isSafeInteger(whole)) throw new RangeError(`${amount} ${currency} is too large`);
  return whole === 0 ? 0 : whole;
}

/** Rounds an exact amount in whole currency units to minor units, halves away from zero. */
export function roundToMinor(amount: Exact, currency: Currency): number {
  const minor = amount.times(Exact.pow(10, minorDigits[currency])).toDecimalPlaces(0, Exact.ROUND_HALF_UP).toNumber();
  if (!Number.isSafeInteger(minor)) throw new RangeError(`${amount.toString()} ${currency} is too large`);
  return minor === 0 ? 0 : minor;
}

/** Percent of an amount in minor units, rounded once, halves away from zero. `percent` is a decimal: 12 means 12 %. */
export function percentOf(minor: number, percent: Exact): number {
  const part = percent.times(minor).dividedBy(100).toDecimalPlaces(0, Exact.ROUND_HALF_UP).toNumber();
  return part === 0 ? 0 : part;
}

/**
 * Spreads `total` minor units over weights so that the parts sum to it exactly (largest
 * remainder first, then the earlier part). Mirrors for negatives, so that a refund undoes
 * a charge part by part.
 *
 * @throws RangeError when there is nothing to spread over
 */
export function spread(total: number, weights: readonly number[]): number[] {
  const sum = weights.reduce((a, b) => a + b, 0);
  if (sum <= 0 || weights.some((w) => w < 0)) throw new RangeError('weights must not be negative, nor all zero');
  const sign = total < 0 ? -1 : 1;
  const whole = BigInt(Math.abs(total));
  const parts = weights.map((w) => Number((whole * BigInt(w)) / BigInt(sum)));
  const remainders = weights.map((w, i) => ({ i, left: (whole * BigInt(w)) % BigInt(sum) }));
  let missing = Math.abs(total) - parts.reduce((a, b) => a + b, 0);
  remainders.sort((a, b) => (a.left === b.left ? a.i - b.i : a.left > b.left ? -1 : 1));
  for (const { i } of remainders) {
    if (missing === 0) break;
    parts[i] = (parts[i] ?? 0) + 1;
    missing -= 1;
  }
  return parts.map((part) => (part === 0 ? 0 : sign * part));
}
