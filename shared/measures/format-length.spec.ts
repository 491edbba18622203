import fc from 'fast-check';
import { exact } from '../money/exact';
import { formatLength, formatLengthBoth, formatLengthNumber, lengthForEditing, otherMeasure } from './format-length';
import { parseLength } from './parse-length';

describe('formatLength', () => {
  it.each([
    ['927.1', '36 1/2 in', '927.1 mm'],
    ['914.4', '36 in', '914.4 mm'],
    ['1.5875', '1/16 in', '≈ 1.59 mm'],
    ['1000', '≈ 39 3/8 in', '1000 mm'],
    ['915.9875', '36 1/16 in', '≈ 915.99 mm'],
    ['0.1', '≈ 0 in', '0.1 mm'],
    ['25.3', '≈ 1 in', '25.3 mm'],
  ])('writes %s mm', (mm, imperial, metric) => {
    expect(formatLength(mm, 'imperial')).toBe(imperial);
    expect(formatLength(mm, 'metric')).toBe(metric);
  });

  it('gives the number alone, and both systems together', () => {
    expect(formatLengthNumber('927.1', 'imperial')).toBe('36 1/2');
    expect(formatLengthBoth('1000', 'metric')).toBe('1000 mm (≈ 39 3/8 in)');
    expect(otherMeasure(otherMeasure('metric'))).toBe('metric');
  });

  it('never strays by more than half of what it rounds to', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 9_999_999 }), (hundredths) => {
        const mm = exact(String(hundredths)).dividedBy(1000).toFixed();
        const read = parseLength(formatLengthNumber(mm, 'imperial'), 'imperial');
        if ('problem' in read) return expect(exact(mm).toNumber()).toBeLessThan(0.8);
        return expect(exact(read.mm).minus(mm).abs().toNumber()).toBeLessThanOrEqual(1.5875 / 2);
      }),
    );
  });
});

describe('lengthForEditing', () => {
  it('is read back as exactly the same length', () => {
    const lengths = fc.oneof(
      fc.integer({ min: 1, max: 250_000 }).map((parts) => exact('0.396875').times(parts).toFixed()),
      fc.integer({ min: 1, max: 99_999_999 }).map((parts) => exact(String(parts)).dividedBy(1000).toFixed()),
    );
    fc.assert(
      fc.property(lengths, fc.constantFrom('imperial' as const, 'metric' as const), (mm, system) => {
        expect(parseLength(lengthForEditing(mm, system), system)).toEqual({ mm });
      }),
    );
  });

  it('prefers a fraction in the imperial system', () => {
    expect(lengthForEditing('927.1', 'imperial')).toBe('36 1/2');
    expect(lengthForEditing('927', 'imperial')).toBe('927 mm');
  });
});
