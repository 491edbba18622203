import { inject, Pipe, type PipeTransform } from '@angular/core';
import { Session } from '../session/session';

/** A day, `YYYY-MM-DD`, in the reader's locale: `15 Sep 2026` or `Sep 15, 2026`. */
@Pipe({ name: 'day' })
export class DayPipe implements PipeTransform {
  private readonly session = inject(Session);

  transform(day: string | null | undefined): string {
    if (!day) return '';
    const locale = this.session.user()?.company.locale ?? 'en-US';
    return new Date(`${day}T00:00:00Z`).toLocaleDateString(locale, { timeZone: 'UTC', day: 'numeric', month: 'short', year: 'numeric' });
  }
}

/** An instant (ISO, UTC) in the company's time zone, to the minute. */
@Pipe({ name: 'instant' })
export class InstantPipe implements PipeTransform {
  private readonly session = inject(Session);

  transform(instant: string | null | undefined): string {
    if (!instant) return '';
    const { locale, timeZone } = this.session.user()?.company ?? { locale: 'en-US', timeZone: 'UTC' };
    return new Date(instant).toLocaleString(locale, {
      timeZone,
      day: 'numeric',
      month: 'short',
      year: 'numeric',
      hour: '2-digit',
      minute: '2-digit',
    });
  }
}
