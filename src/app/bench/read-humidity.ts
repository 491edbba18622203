/** Reads a relative humidity in percent as a share from 0 to 1; null for an empty text. */
export function readHumidity(text: string): { value: number | null } | { problem: string } {
  const plain = text.replace('%', '').trim();
  if (plain === '') return { value: null };
  const value = /^\d{1,3}(\.\d{1,2})?$/.test(plain) ? Number(plain) / 100 : NaN;
  return value >= 0 && value <= 1 ? { value } : { problem: 'A humidity from 0 to 100 %.' };
}
