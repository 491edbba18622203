/** ISO 11649:2009 structured creditor references: `RF`, two check digits (ISO 7064 MOD 97-10), up to 21 letters and digits. */

/** The number whose remainder by 97 the check is made of: letters count 10 (A) to 35 (Z). */
function remainder97(text: string): number {
  let remainder = 0;
  for (const character of text) {
    const value = parseInt(character, 36);
    remainder = (remainder * (value > 9 ? 100 : 10) + value) % 97;
  }
  return remainder;
}

/**
 * The reference for an invoice number; what is neither letter nor digit falls away.
 *
 * @throws RangeError when nothing or more than 21 characters are left
 */
export function creditorReference(number: string): string {
  const base = number.toUpperCase().replace(/[^A-Z0-9]/g, '');
  if (base.length < 1 || base.length > 21) throw new RangeError(`no reference can be made of ${number}`);
  return `RF${String(98 - remainder97(`${base}RF00`)).padStart(2, '0')}${base}`;
}

/** Whether a text, printed in groups or not, is a reference with the right check digits. */
export function isCreditorReference(text: string): boolean {
  const compact = text.replace(/\s/g, '').toUpperCase();
  return /^RF\d\d[A-Z0-9]{1,21}$/.test(compact) && remainder97(compact.slice(4) + compact.slice(0, 4)) === 1;
}
