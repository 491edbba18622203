import fc from 'fast-check';
import ISO11649 from 'iso-11649';
import { creditorReference, isCreditorReference } from './reference';

describe('creditor references (ISO 11649)', () => {
  const numbers = fc.stringMatching(/^[A-Z0-9]{1,21}$/);

  it('agree with the package iso-11649 1.0.1 on made and on tampered references', () => {
    fc.assert(
      fc.property(numbers, fc.nat(), fc.constantFrom(...'0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZ'), (number, place, character) => {
        const reference = creditorReference(number);
        expect(reference).toBe(ISO11649.generate(number));
        expect(isCreditorReference(reference)).toBe(true);
        const i = 4 + (place % number.length);
        const tampered = reference.slice(0, i) + character + reference.slice(i + 1);
        expect(isCreditorReference(tampered)).toBe(ISO11649.validate(tampered));
        // A digit for a digit or a letter for a letter is always noticed; one for the other shifts the number and may not be.
        if (/\d/.test(character) === /\d/.test(reference[i] ?? '')) {
          expect(isCreditorReference(tampered)).toBe(tampered === reference);
        }
      }),
    );
  });

  it('makes one of an invoice number, whatever stands between its letters and digits', () => {
    expect(creditorReference('NM-INV000042')).toBe(ISO11649.generate('NMINV000042'));
    expect(isCreditorReference(`${creditorReference('NM-INV000042').replace(/(.{4})/g, '$1 ')}`)).toBe(true);
  });

  it('knows a transposition', () => {
    const reference = creditorReference('NMINV000142');
    expect(isCreditorReference(reference.replace('142', '124'))).toBe(false);
  });

  it.each(['', '---', 'A'.repeat(22)])('makes none of %j', (number) => {
    expect(() => creditorReference(number)).toThrow(RangeError);
  });

  it.each(['RF', 'RF18', 'XX18ABC', 'RF1AABC', `RF18${'A'.repeat(22)}`, 'RF18AB-C'])('takes %j for none', (text) => {
    expect(isCreditorReference(text)).toBe(false);
  });
});
