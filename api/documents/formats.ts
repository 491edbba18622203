import { type Unit } from '@shared/contracts/units';
import { formatLength, formatLengthNumber, otherMeasure } from '@shared/measures/format-length';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { minorDigits } from '@shared/money/currencies';
import { type Money } from '@shared/money/money';

/** How figures and days stand on paper, in the locale of the company that sends it. */
export function formats({ locale, timeZone }: { locale: string; timeZone: string }) {
  const kept = new Map<string, Intl.NumberFormat>();
  const numberFormat = (options: Intl.NumberFormatOptions) => {
    const key = JSON.stringify(options);
    const format = kept.get(key) ?? new Intl.NumberFormat(locale, options);
    kept.set(key, format);
    return format;
  };
  const dayFormat = new Intl.DateTimeFormat(locale, { dateStyle: 'long', timeZone: 'UTC' });
  const instantFormat = new Intl.DateTimeFormat(locale, { dateStyle: 'long', timeZone });
  // Intl takes a decimal string without making a float of it; the types know only number.
  const write = (format: Intl.NumberFormat, amount: string) => format.format(amount as `${number}`).replace('-', '−');
  return {
    /** `1,105.38`, for columns whose head names the currency */
    amount: ({ amount, currency }: Money): string => {
      const digits = { minimumFractionDigits: minorDigits[currency], maximumFractionDigits: minorDigits[currency] };
      return write(numberFormat(digits), amount);
    },
    /** `$1,105.38` */
    money: ({ amount, currency }: Money): string => write(numberFormat({ style: 'currency', currency }), amount),
    /** a decimal string of any length, cut to at most `digits` decimals */
    number: (value: string, digits: number): string => write(numberFormat({ maximumFractionDigits: digits }), value),
    /** `YYYY-MM-DD` in words */
    day: (day: string): string => dayFormat.format(new Date(`${day}T00:00:00Z`)),
    /** the day of an instant at the company */
    dayOf: (at: number): string => instantFormat.format(new Date(at)),
  };
}
export type Formats = ReturnType<typeof formats>;

/** Width before height: the company's own measures first, then the other. */
export function sizeLines({ width, height }: Pick<Unit, 'width' | 'height'>, system: MeasureSystem): [string, string] {
  return [size(width, height, system), size(width, height, otherMeasure(system))];
}

function size(width: string, height: string, system: MeasureSystem): string {
  const full = [width, height].map((mm) => formatLength(mm, system));
  const text = `${formatLengthNumber(width, system)} × ${formatLengthNumber(height, system)} ${system === 'imperial' ? 'in' : 'mm'}`;
  return full.some((each) => each.startsWith('≈')) ? `about ${text}` : text;
}
