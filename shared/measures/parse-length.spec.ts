import fc from 'fast-check';
import { exact } from '../money/exact';
import { parseLength } from './parse-length';

const mm = (text: string, system: 'imperial' | 'metric' = 'imperial') => {
  const read = parseLength(text, system);
  return 'mm' in read ? read.mm : `refused: ${read.problem}`;
};

describe('parseLength', () => {
  it.each([
    ['36 1/2', '927.1'],
    ['36-1/2"', '927.1'],
    ['36.5', '927.1'],
    ['36½', '927.1'],
    ['36 1⁄2 in.', '927.1'],
    ['3\' 0 1/2"', '927.1'],
    ['3′ 0½″', '927.1'],
    ["3'-0 1/2''", '927.1'],
    ['3ft 0.5in', '927.1'],
    ['3 feet 1/2 inch', '927.1'],
    ['3’6', '1066.8'],
    ['3 ft', '914.4'],
    ['1/16', '1.5875'],
    ['1/64"', '0.396875'],
    ['927 mm', '927'],
    ['927.1mm', '927.1'],
    ['92.7 cm', '927'],
    ['0.927 m', '927'],
    ['.5 m', '500'],
    ['  36   1/2  ', '927.1'],
  ])('reads %s in the imperial system', (text, expected) => {
    expect(mm(text)).toBe(expected);
  });

  it.each([
    ['927', '927'],
    ['927.10', '927.1'],
    ['36 1/2 in', '927.1'],
    ["3'", '914.4'],
    ['92.7cm', '927'],
  ])('reads %s in the metric system', (text, expected) => {
    expect(mm(text, 'metric')).toBe(expected);
  });

  it.each([
    ['', /Write a size/],
    ['0', /above zero/],
    ['0 mm', /above zero/],
    ['-36', /leave out the minus/],
    ['−36', /leave out the minus/],
    ['36,5', /36\.5 rather than 36,5/],
    ['1,225.55', /no comma/],
    ['1e3', /without an exponent/],
    ['1E+3 mm', /without an exponent/],
    ['NaN', /not a size/],
    ['Infinity', /not a size/],
    ['0x24', /not a size/],
    ['thirty', /not a size/],
    ['36 1/3', /halves down to 64ths; 1\/3/],
    ['36⅓', /1\/3/],
    ['36 1/128', /64ths/],
    ['36 5/4', /not a fraction below one/],
    ['36 4/4', /not a fraction below one/],
    ['36.5 1/2', /not both/],
    ['1/0', /64ths/],
    ['4000', /more than 100 m/],
    ['100001 mm', /more than 100 m/],
    ['36.1234567891', /more decimals/],
    ['36 mm 1', /not a size/],
    ['9'.repeat(80), /too long/],
  ])('refuses %s and says what would be right', (text, message) => {
    expect(mm(text)).toMatch(message);
  });

  it('does not guess what a bare fraction means in the metric system', () => {
    expect(mm('36 1/2', 'metric')).toMatch(/write 36 1\/2 in/);
  });

  it('is exact for every 64th of an inch, in each of its spellings', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 200 }), fc.integer({ min: 1, max: 63 }), (whole, top) => {
        const expected = exact('25.4').times(whole).plus(exact('25.4').times(top).dividedBy(64)).toFixed();
        for (const text of [`${whole} ${top}/64`, `${whole}-${top}/64"`, `${whole} ${top}/64 in`, `0' ${whole} ${top}/64"`])
          expect(mm(text)).toBe(expected);
      }),
    );
  });

  it('answers with a length the contract takes, or a problem, for any text', () => {
    fc.assert(
      fc.property(
        fc.oneof(fc.string(), fc.stringMatching(/^[\d '"/.,ftinmc½-]{0,14}$/)),
        fc.constantFrom('imperial', 'metric'),
        (text, system) => {
          const read = parseLength(text, system);
          if ('mm' in read) expect(read.mm).toMatch(/^(?=.*[1-9])\d{1,6}(\.\d{1,8})?$/);
          else expect(read.problem.length).toBeGreaterThan(10);
        },
      ),
      { numRuns: 2000 },
    );
  });
});
