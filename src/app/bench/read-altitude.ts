import { MM_PER_FOOT } from '@shared/measures/constants';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { Exact, exact } from '@shared/money/exact';

const metresPerFoot = new Exact(MM_PER_FOOT).dividedBy(1000);

/** Reads an altitude: `5,900`, `5900 ft` or `1798 m`; a bare number is feet in the imperial system. Metres; null for an empty text. */
export function readAltitude(text: string, system: MeasureSystem): { value: number | null } | { problem: string } {
  const plain = text.trim().toLowerCase().replace(/[−–]/, '-');
  if (plain === '') return { value: null };
  const [, digits, unit] = /^(-?\d{1,3}(?:[ ,]\d{3})+|-?\d{1,6}(?:\.\d{1,5})?)\s*(m|metres?|meters?|ft|feet|')?$/.exec(plain) ?? [];
  if (digits === undefined) {
    return {
      problem: `“${text.trim()}” is not an altitude. Write one such as ${system === 'imperial' ? '5900 or 1800 m' : '1800 or 5900 ft'}.`,
    };
  }
  const inFeet = unit === undefined ? system === 'imperial' : !unit.startsWith('m');
  const value = exact(digits.replace(/[ ,]/g, '')).times(inFeet ? metresPerFoot : 1);
  if (value.lessThan(-100) || value.greaterThan(9000)) return { problem: 'An altitude is between −100 and 9 000 m (−328 and 29 527 ft).' };
  return { value: value.toNumber() };
}

/** Text for the field that reads back as the same altitude, in the system where that is exact. @param metres decimal string */
export function altitudeText(metres: string, system: MeasureSystem): string {
  if (system === 'metric') return exact(metres).toFixed();
  const feet = exact(metres).dividedBy(metresPerFoot);
  return feet.decimalPlaces() <= 3 ? feet.toFixed() : `${exact(metres).toFixed()} m`;
}
