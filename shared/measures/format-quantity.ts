import { KG_PER_POUND, MM_PER_FOOT } from './constants';
import type { MeasureSystem } from './parse-length';

/** Results of calculation, rounded for reading. Exact lengths have `format-length`. */

const kilogramsPerPound = Number(KG_PER_POUND);
const metresPerFoot = Number(MM_PER_FOOT) / 1000;

/** Kilograms as `36.6 lb` or `16.6 kg`. */
export function formatWeight(kg: number, system: MeasureSystem): string {
  return system === 'imperial' ? `${(kg / kilogramsPerPound).toFixed(1)} lb` : `${kg.toFixed(1)} kg`;
}

/** Square metres as `12.23 ft²` or `1.14 m²`. */
export function formatArea(m2: number, system: MeasureSystem): string {
  return system === 'imperial' ? `${(m2 / metresPerFoot ** 2).toFixed(2)} ft²` : `${m2.toFixed(2)} m²`;
}

/** Metres of height or altitude as `5900 ft` or `1798 m`. */
export function formatAltitude(m: number, system: MeasureSystem): string {
  return system === 'imperial' ? `${Math.round(m / metresPerFoot)} ft` : `${Math.round(m)} m`;
}
