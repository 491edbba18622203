import { type ChargeRow } from '@shared/contracts/prices';
import { Exact, exact } from '@shared/money/exact';
import { type Currency, isCurrency, minorDigits } from '@shared/money/currencies';
import { type Money } from '@shared/money/money';

/** The list a row was priced from, in words. */
export interface ListInWords {
  name: string;
  /** ISO instant, UTC */
  effectiveFrom: string;
}

/** Where and how the reader reads numbers and days. */
export interface Reader {
  locale: string;
  timeZone: string;
}

/** A row of a charge sheet told in sentences: the sum, what comes off it and why, and the rule behind it. */
export interface ChargeWords {
  sum: string;
  discount: string;
  rule: string;
}

/**
 * Tells how a row came about: basis × rate, the rounding, the discount with its reason, and the
 * rule with its list. Every figure is computed from the unrounded strings of the row.
 */
export function chargeWords(row: ChargeRow, list: ListInWords | null, reader: Reader): ChargeWords {
  return { sum: sumWords(row, reader), discount: discountWords(row, reader), rule: ruleWords(row, list, reader) };
}

/** A decimal fraction as a percentage in the reader's locale: `0.06` → `6 %`. */
export function percentWords(percent: Exact, { locale }: Reader): string {
  return `${number(percent, locale, 4)} %`;
}

function sumWords(row: ChargeRow, reader: Reader): string {
  const { family, basis, rate } = row;
  const { locale } = reader;
  const currency = row.list.currency;
  const product = unrounded(basis.quantity).times(unrounded(rate));
  if (family === 'quantity break' || family === 'promotion') {
    const part = percentWords(unrounded(rate).times(-100), reader);
    const taken = rounding(product.abs(), opposite(row.net), reader);
    return `${part} of ${amount(basis.quantity, currency, locale)}, the net price so far, is ${taken}, taken off.`;
  }
  if (isCurrency(basis.unit)) {
    const part = percentWords(unrounded(rate).times(100), reader);
    return `${part} of ${amount(basis.quantity, currency, locale)}, the charges by area at list, is ${rounding(product, row.list, reader)}.`;
  }
  const counted = `${number(unrounded(basis.quantity), locale, 4)} ${basis.unit}`;
  const at = `${counted} at ${amount(rate, currency, locale)} per ${basis.unit}`;
  if (family === 'net rate') {
    return `${at} make ${rounding(product, row.net, reader)}. This agreed net rate stands in place of the charges by area, ${amount(row.list.amount, currency, locale)} at list.`;
  }
  return `${at} make ${rounding(product, row.list, reader)}.`;
}

/** `$27.7083, rounded to $27.71`; without the rounding where the product is exact. */
function rounding(product: Exact, rounded: Money, { locale }: Reader): string {
  const shown = amount(rounded.amount, rounded.currency, locale);
  if (product.equals(exact(rounded.amount))) return shown;
  return `${amount(product, rounded.currency, locale)}, rounded to ${shown}`;
}

function discountWords(row: ChargeRow, reader: Reader): string {
  const { family, list, net } = row;
  if (family === 'quantity break' || family === 'promotion' || family === 'net rate') return '';
  const percent = exact(row.discountPercent);
  if (percent.isZero()) return 'Nothing comes off this charge on your terms.';
  const left = exact(list.amount).times(new Exact(100).minus(percent)).dividedBy(100);
  const reason = row.discountReason ? ` for ${row.discountReason}` : '';
  return `Less ${percentWords(percent, reader)}${reason}: ${rounding(left, net, reader)}.`;
}

function ruleWords({ rule }: ChargeRow, list: ListInWords | null, { locale, timeZone }: Reader): string {
  if (rule.startsWith('contract/')) return `Rule ${rule}: a price agreed with you.`;
  if (rule.startsWith('promotion/')) return `Rule ${rule}.`;
  if (!list) return `Rule ${rule}.`;
  const day = new Date(list.effectiveFrom).toLocaleDateString(locale, { timeZone, day: 'numeric', month: 'long', year: 'numeric' });
  return `Rule ${rule} of ${list.name}, in force from ${day}.`;
}

/** Reads an unrounded figure of a row, which carries up to forty digits: more than `exact` takes from people. */
function unrounded(text: string): Exact {
  if (!/^-?\d{1,40}(\.\d{1,60})?$/.test(text)) throw new TypeError(`not a decimal string: ${text}`);
  return new Exact(text);
}

function opposite({ amount: text, currency }: Money): Money {
  return { amount: text.startsWith('-') ? text.slice(1) : `-${text}`, currency };
}

/** Money of any exactness, at most six decimals; a decimal string goes in as it is. */
function amount(value: Exact | string, currency: Currency, locale: string): string {
  const text = typeof value === 'string' ? value : value.toDecimalPlaces(6).toFixed();
  const format = new Intl.NumberFormat(locale, {
    style: 'currency',
    currency,
    minimumFractionDigits: minorDigits[currency],
    maximumFractionDigits: 6,
  });
  return format.format(text as unknown as number).replace(/^-/, '−');
}

function number(value: Exact, locale: string, digits: number): string {
  const text = value.toDecimalPlaces(digits).toFixed();
  return new Intl.NumberFormat(locale, { maximumFractionDigits: digits }).format(text as unknown as number).replace(/^-/, '−');
}
