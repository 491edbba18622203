/**
 * Currencies a trade account may be kept in, with the number of decimals of their minor unit.
 * Source: ISO 4217:2015, list one (amendments to 2024), from memory.
 */
export const minorDigits = {
  USD: 2,
  CAD: 2,
  EUR: 2,
  GBP: 2,
  CHF: 2,
  NOK: 2,
  SEK: 2,
  DKK: 2,
  AUD: 2,
  NZD: 2,
  JPY: 0,
  KWD: 3,
} as const;

export type Currency = keyof typeof minorDigits;

export const currencies = Object.keys(minorDigits) as [Currency, ...Currency[]];

/** Whether `code` is a currency of the table above. */
export function isCurrency(code: string): code is Currency {
  return Object.hasOwn(minorDigits, code);
}
