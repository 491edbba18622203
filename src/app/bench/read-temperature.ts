import { type MeasureSystem } from '@shared/measures/parse-length';

/** Reads a temperature: `14`, `14 °F`, `-10 C`; a bare number is °F in the imperial system. °C; null for an empty text. */
export function readTemperature(text: string, system: MeasureSystem): { value: number | null } | { problem: string } {
  const plain = text.trim().toLowerCase().replace(/^[−–]/, '-');
  if (plain === '') return { value: null };
  const [, digits, unit] = /^(-?\d{1,3}(?:\.\d{1,2})?)\s*°?\s*([cf])?$/.exec(plain) ?? [];
  const inFahrenheit = unit === undefined ? system === 'imperial' : unit === 'f';
  const value = digits === undefined ? NaN : inFahrenheit ? ((Number(digits) - 32) * 5) / 9 : Number(digits);
  if (!(value >= -70 && value <= 60)) return { problem: 'A temperature from −70 to 60 °C (−94 to 140 °F).' };
  return { value };
}

/** The text with its unit named, so that it reads the same in either system. */
export function temperatureWithUnit(text: string, system: MeasureSystem): string {
  return /[cf]\s*$/i.test(text) || text.trim() === '' ? text : `${text.trim()} ${system === 'imperial' ? '°F' : '°C'}`;
}
