import { Exact, exact } from '../money/exact';
import { MM_PER_INCH } from './constants';
import type { MeasureSystem } from './parse-length';

/** The system beside the company's own. */
export function otherMeasure(system: MeasureSystem): MeasureSystem {
  return system === 'imperial' ? 'metric' : 'imperial';
}

/**
 * A length of `mm` (decimal string) in words: `36 1/2 in`, to the nearest 1/16, or `927.1 mm`, to
 * the nearest 0.01. A leading `≈` says that it had to be rounded.
 */
export function formatLength(mm: string, system: MeasureSystem): string {
  const { text, rounded } = numberPart(mm, system);
  return `${rounded ? '≈ ' : ''}${text} ${unitName(system)}`;
}

/** The number alone, as `formatLength` writes it: `36 1/2` or `927.1`. */
export function formatLengthNumber(mm: string, system: MeasureSystem): string {
  return numberPart(mm, system).text;
}

/** A length in the system asked for, with the other beside it: `36 1/2 in (927.1 mm)`. */
export function formatLengthBoth(mm: string, system: MeasureSystem): string {
  return `${formatLength(mm, system)} (${formatLength(mm, otherMeasure(system))})`;
}

/**
 * Text for a form field that `parseLength` reads back as exactly the same length: a fraction where
 * one down to 1/64 in is exact, else millimetres.
 */
export function lengthForEditing(mm: string, system: MeasureSystem): string {
  const plain = trimmed(exact(mm));
  if (system === 'metric') return plain;
  const parts = exact(mm).dividedBy(MM_PER_INCH).times(64);
  return parts.isInteger() ? fractionText(parts, 64) : `${plain} mm`;
}

function unitName(system: MeasureSystem): string {
  return system === 'imperial' ? 'in' : 'mm';
}

function numberPart(mm: string, system: MeasureSystem): { text: string; rounded: boolean } {
  const length = exact(mm);
  if (system === 'metric') {
    const shown = length.toDecimalPlaces(2);
    return { text: trimmed(shown), rounded: !shown.equals(length) };
  }
  const sixteenths = length.dividedBy(MM_PER_INCH).times(16);
  const shown = sixteenths.toDecimalPlaces(0);
  return { text: fractionText(shown, 16), rounded: !shown.equals(sixteenths) };
}

/** Whole parts of `1/of` as a mixed number in lowest terms. */
function fractionText(parts: Exact, of: number): string {
  const whole = parts.dividedToIntegerBy(of);
  let top = parts.minus(whole.times(of)).toNumber();
  let bottom = of;
  if (top === 0) return whole.toFixed();
  while (top % 2 === 0) {
    top /= 2;
    bottom /= 2;
  }
  return whole.isZero() ? `${top}/${bottom}` : `${whole.toFixed()} ${top}/${bottom}`;
}

function trimmed(value: Exact): string {
  return new Exact(value).toFixed();
}
