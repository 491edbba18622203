/** Calendar days as `YYYY-MM-DD`; arithmetic in UTC, where every day has 24 hours. */

const DAY_MS = 86_400_000;

const formats = new Map<string, Intl.DateTimeFormat>();

/** The day it is at an instant (UTC epoch ms) in an IANA time zone. @throws RangeError for an unknown zone */
export function dayIn(timeZone: string, at: number): string {
  let format = formats.get(timeZone);
  if (!format) {
    format = new Intl.DateTimeFormat('en-CA', { timeZone, year: 'numeric', month: '2-digit', day: '2-digit' });
    formats.set(timeZone, format);
  }
  return format.format(at);
}

/** `days` after (or, negative, before) a day. */
export function addDays(day: string, days: number): string {
  return new Date(Date.parse(`${day}T00:00:00Z`) + days * DAY_MS).toISOString().slice(0, 10);
}

/** Whole days from one day to another; negative when `to` is earlier. */
export function daysBetween(from: string, to: string): number {
  return Math.round((Date.parse(`${to}T00:00:00Z`) - Date.parse(`${from}T00:00:00Z`)) / DAY_MS);
}

/** The last day of the month of a day. */
export function endOfMonth(day: string): string {
  const [year = 0, month = 0] = day.split('-').map(Number);
  return new Date(Date.UTC(year, month, 0)).toISOString().slice(0, 10);
}

/** ISO weekday: 1 is Monday, 7 is Sunday. */
export function weekday(day: string): number {
  return new Date(`${day}T00:00:00Z`).getUTCDay() || 7;
}

/** A plant's working days. */
export interface WorkingDays {
  /** ISO weekdays worked */
  workingDays: readonly number[];
  /** days closed all the same */
  closed: readonly string[];
}

export function isWorkingDay(day: string, calendar: WorkingDays): boolean {
  return calendar.workingDays.includes(weekday(day)) && !calendar.closed.includes(day);
}

/**
 * The day `count` working days after `day`, which itself does not count.
 *
 * @throws RangeError when the calendar has no working day within ten years
 */
export function addWorkingDays(day: string, count: number, calendar: WorkingDays): string {
  let at = day;
  let left = count;
  for (let guard = 0; left > 0; guard++) {
    if (guard > 3660) throw new RangeError('the calendar has no working days');
    at = addDays(at, 1);
    if (isWorkingDay(at, calendar)) left--;
  }
  return at;
}
