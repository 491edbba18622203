import { Exact, exact } from '../money/exact';
import { MM_PER_FOOT, MM_PER_INCH } from './constants';

export type MeasureSystem = 'imperial' | 'metric';

/** A length read, as a decimal string of millimetres, or a sentence that says what to write instead. */
export type ParsedLength = { mm: string } | { problem: string };

const denominators = [2, 4, 8, 16, 32, 64];
const largest = 100_000;
const decimals = 8;

const vulgar: Record<string, string> = {
  '¼': '1/4', '½': '1/2', '¾': '3/4', '⅛': '1/8', '⅜': '3/8', '⅝': '5/8', '⅞': '7/8',
  '⅓': '1/3', '⅔': '2/3', '⅕': '1/5', '⅖': '2/5', '⅗': '3/5', '⅘': '4/5', '⅙': '1/6', '⅚': '5/6', '⅐': '1/7', '⅑': '1/9', '⅒': '1/10',
}; // prettier-ignore

const number = String.raw`\d+(?:\.\d+)?|\.\d+`;
const inches = String.raw`(?:(?<whole>${number})(?:[\s-]+(?<fraction>\d+\/\d+))?|(?<only>\d+\/\d+))`;
const feetAndInches = new RegExp(String.raw`^(?:(?<feet>${number})\s*ft[\s-]*)?(?:${inches}\s*(?<inch>in)?)?$`);
const metric = new RegExp(String.raw`^(?<value>${number})\s*(?<unit>mm|cm|m)$`);
const perMetric = { mm: '1', cm: '10', m: '1000' };

/**
 * Reads a size as people write it: `36 1/2`, `36-1/2"`, `36.5`, `927 mm`, `92.7 cm`, `3' 0 1/2"`.
 * A bare number is inches in the imperial system and millimetres in the metric. Exact: 1/16 in is
 * 1.5875 mm. The result fits the contract of lengths: above 0, up to 100 m, at most 8 decimals.
 */
export function parseLength(text: string, system: MeasureSystem): ParsedLength {
  const example = system === 'imperial' ? '36 1/2 or 927 mm' : '927.1 or 36 1/2 in';
  const written = tidy(text);
  if (written === '') return { problem: `Write a size, such as ${example}.` };
  if (written.length > 60) return { problem: `That is too long for a size. Write one such as ${example}.` };
  const strange = notPlain(written);
  if (strange) return { problem: strange };

  const inMetric = metric.exec(written)?.groups;
  if (inMetric) return checked(plain(inMetric['value']!).times(perMetric[inMetric['unit'] as 'mm']));

  const parts = feetAndInches.exec(written)?.groups;
  if (!parts) return { problem: `“${text.trim()}” is not a size. Write one such as ${example}.` };
  const { feet, whole, only, inch } = parts;
  const fraction = parts['fraction'] ?? only;
  if (system === 'metric' && !feet && !inch) {
    if (fraction) return { problem: `A fraction is in inches: write ${written} in, or a decimal number of millimetres.` };
    return checked(plain(whole!));
  }
  let total = new Exact(0);
  if (feet) total = total.plus(plain(feet).times(MM_PER_FOOT));
  if (whole) total = total.plus(plain(whole).times(MM_PER_INCH));
  if (fraction) {
    if (whole?.includes('.')) return { problem: `Write either decimals or a fraction, not both: “${whole} ${fraction}”.` };
    const [top, bottom] = fraction.split('/').map(Number) as [number, number];
    if (!denominators.includes(bottom))
      return { problem: `Fractions go by halves down to 64ths; ${fraction} is not one. Write the nearest, or decimals.` };
    if (top >= bottom) return { problem: `${fraction} is not a fraction below one. Write the whole inches before it.` };
    total = total.plus(new Exact(top).dividedBy(bottom).times(MM_PER_INCH));
  }
  return checked(total);
}

/** One way to write marks and spaces: primes, quotes, unit names and vulgar fractions. */
function tidy(text: string): string {
  return text
    .trim()
    .toLowerCase()
    .replace(/[¼-¾⅐-⅞]/g, (sign) => ` ${vulgar[sign] ?? sign} `)
    .replace(/⁄|∕/g, '/')
    .replace(/\s*\/\s*/g, '/')
    .replace(/[‐‑‒–]/g, '-')
    .replace(/″|“|”|"|''|′′|’’|\binch(?:es)?\b|(?<=[\d\s])inch(?:es)?\b/g, ' in ')
    .replace(/′|’|'|(?<=[\d\s])(?:feet|foot)\b/g, ' ft ')
    .replace(/(?<=\d)(mm|cm|m|in|ft)(?=[\s\d.-]|$)/g, ' $1 ')
    .replace(/(?<=\bin|\bft)\./g, '')
    .replace(/\s+/g, ' ')
    .trim();
}

/** What to write instead of a sign, comma or exponent; null for text without them. */
function notPlain(written: string): string | null {
  const comma = /^\D*(\d+),(\d+)/.exec(written);
  if (comma) return `Write decimals with a point and no comma: ${comma[1]}.${comma[2]} rather than ${comma[1]},${comma[2]}.`;
  if (/^[-−]/.test(written)) return 'A size is above zero: leave out the minus.';
  if (/\d\s*e\s*[+-]?\d/.test(written)) return 'Write the number out in full, without an exponent.';
  return null;
}

function plain(digits: string): Exact {
  return exact(digits.startsWith('.') ? `0${digits}` : digits.slice(0, 24));
}

function checked(mm: Exact): ParsedLength {
  if (mm.isZero()) return { problem: 'A size must be above zero.' };
  if (mm.greaterThan(largest)) return { problem: 'That is more than 100 m (3 937 in).' };
  if (mm.decimalPlaces() > decimals) return { problem: 'That has more decimals than anyone can measure. Round it.' };
  return { mm: mm.toFixed() };
}
