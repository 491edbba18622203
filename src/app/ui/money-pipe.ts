import { inject, Pipe, type PipeTransform } from '@angular/core';
import { type Money } from '@shared/money/money';
import { Session } from '../session/session';

const formats = new Map<string, Intl.NumberFormat>();

/** `$1,105.38` in the reader's locale. The decimal string goes in as it is: no float on the way. */
@Pipe({ name: 'money' })
export class MoneyPipe implements PipeTransform {
  private readonly session = inject(Session);

  /** @param style 'bare' leaves the currency out, for columns under a head that names it */
  transform(money: Money | null | undefined, style: 'whole' | 'bare' = 'whole'): string {
    if (!money) return '';
    const locale = this.session.user()?.company.locale ?? 'en-US';
    const key = `${locale} ${money.currency} ${style}`;
    let format = formats.get(key);
    if (!format) {
      const digits = new Intl.NumberFormat(locale, { style: 'currency', currency: money.currency }).resolvedOptions().maximumFractionDigits;
      format =
        style === 'whole'
          ? new Intl.NumberFormat(locale, { style: 'currency', currency: money.currency })
          : new Intl.NumberFormat(locale, { minimumFractionDigits: digits, maximumFractionDigits: digits });
      formats.set(key, format);
    }
    return format.format(money.amount as unknown as number).replace(/^-/, '−');
  }
}
