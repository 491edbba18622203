import { formatLength, lengthForEditing, otherMeasure } from '@shared/measures/format-length';
import { type MeasureSystem, parseLength } from '@shared/measures/parse-length';

/** What a length field may hold besides a size above zero. */
export interface LengthRules {
  /** an empty field is an answer: not known */
  optional?: boolean;
  /** zero is a length, such as a bottom edge on the floor */
  zero?: boolean;
}

/** mm as a decimal string, null for an empty optional field, or a sentence that says what to write instead. */
export type ReadLength = { mm: string | null } | { problem: string };

/** Reads the text of a length field by `parseLength` and the field's own rules. */
export function readLength(text: string, system: MeasureSystem, { optional, zero }: LengthRules = {}): ReadLength {
  if (optional && text.trim() === '') return { mm: null };
  if (zero && /^0+(\.0+)?\s*(mm|cm|m|in|ft|["'″′])?$/i.test(text.trim())) return { mm: '0' };
  return parseLength(text, system);
}

/** The measures that a text is written in: its own where it names a unit, else the reader's. */
export function writtenIn(text: string, system: MeasureSystem): MeasureSystem {
  if (/\d\s*(mm|cm|m)\s*$/i.test(text)) return 'metric';
  if (/["'″′”’]|in(ch(es)?)?\.?\s*$|ft|feet|foot/i.test(text)) return 'imperial';
  return system;
}

/** What stands beside the text of a length: its unit where the text names none, and the other measure. */
export function besideLength(text: string, mm: string, system: MeasureSystem): { unit: string; other: string } {
  const own = writtenIn(text, system);
  const named = /[a-z"'″′”’]/i.test(text);
  return { unit: named ? '' : own === 'imperial' ? 'in' : 'mm', other: formatLength(mm, otherMeasure(own)) };
}

/** The text by which a length in mm is edited; zero too. */
export function lengthText(mm: string, system: MeasureSystem): string {
  return /[1-9]/.test(mm) ? lengthForEditing(mm, system) : '0';
}

/**
 * The text one step away, for the arrow keys: to the next 1/16 in or 1 mm, with `large` 1 in or
 * 10 mm. Keeps to the measures the text is written in; null below zero.
 */
export function stepLength(mm: string, text: string, system: MeasureSystem, by: 1 | -1, large: boolean): string | null {
  const own = writtenIn(text, system);
  const step = own === 'imperial' ? (large ? 25.4 : 1.5875) : large ? 10 : 1;
  const steps = Math.round(Number(mm) / step) + by;
  if (steps <= 0) return null;
  // A whole number of sixteenths or millimetres: exact in four decimals.
  const next = (steps * step).toFixed(4).replace(/\.?0+$/, '');
  const written = lengthForEditing(next, own);
  return own === system || /[a-z]/i.test(written) ? written : `${written} ${own === 'imperial' ? 'in' : 'mm'}`;
}
