import { formatLength, formatLengthNumber, otherMeasure } from '@shared/measures/format-length';
import { type MeasureSystem } from '@shared/measures/parse-length';

/** Without breaks inside a size: `120 × 84 in (3048 × 2134 mm)`: long edge before short, in the maker's measures and in the others. */
export function sizeWords(long: string, short: string, system: MeasureSystem): string {
  const size = (own: MeasureSystem) =>
    `${formatLengthNumber(long, own)} × ${formatLength(short, own).replace(/^≈ /, '')}`.replaceAll(' ', '\u00a0');
  return `${size(system)} (${size(otherMeasure(system))})`;
}

/** A row of cavity widths, mm: `6, 8, 10 mm`. */
export function widthsWords(widths: readonly string[]): string {
  return `${widths.join(', ')} mm`;
}
