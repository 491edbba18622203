import { MM_PER_INCH } from '@shared/measures/constants';
import { type MeasureSystem } from '@shared/measures/parse-length';

/** A thickness that was computed: decimal inches to the hundredth, as a caliper shows, or mm to the tenth. */
export function formatThickness(mm: number, system: MeasureSystem): { value: string; unit: string } {
  return system === 'imperial' ? { value: (mm / Number(MM_PER_INCH)).toFixed(2), unit: 'in' } : { value: mm.toFixed(1), unit: 'mm' };
}
