import { Decimal } from 'decimal.js';

/**
 * The decimal arithmetic of the whole product: 40 significant digits, halves away from zero.
 * A quotient such as area ÷ 144 that does not end is cut after 40 digits, far beyond the
 * distance at which a rounding to the minor unit could be decided wrongly.
 */
export const Exact = Decimal.clone({ precision: 40, rounding: Decimal.ROUND_HALF_UP, toExpNeg: -40, toExpPos: 40 });
export type Exact = Decimal;

/**
 * Reads a decimal string. decimal.js itself takes floats, `NaN`, hexadecimal and exponents
 * without a word, so everything enters through here.
 *
 * @throws TypeError unless `text` is a plain decimal string such as `-12.50`
 */
export function exact(text: string): Exact {
  if (typeof text !== 'string' || !/^-?\d{1,24}(\.\d{1,20})?$/.test(text)) {
    throw new TypeError(`not a decimal string: ${String(text)}`);
  }
  return new Exact(text);
}
