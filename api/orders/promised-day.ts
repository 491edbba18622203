import { addWorkingDays, isWorkingDay, type WorkingDays } from '@shared/calendar/days';
import { type FieldError } from '@shared/contracts/problems';
import { type PlantCalendar } from '../database/schema/companies';
import { leadTimeDays } from '../pricing/lead-time';

/**
 * The first day on which an order placed on `today` can be ready: the lead time of its class in
 * working days of the plant; of the usual class where it has none, or one no longer offered.
 */
export function promisedDay(today: string, leadTimeClass: string | null, calendar: PlantCalendar): string {
  const days = leadTimeDays(calendar, leadTimeClass) ?? leadTimeDays(calendar, null) ?? 0;
  return addWorkingDays(today, days, calendar);
}

/** What is wrong with a required day, if anything, naming the nearest day that would do. */
export function judgeRequiredDay(requiredOn: string, earliest: string, calendar: WorkingDays): FieldError | null {
  const pointer = '/requiredOn';
  if (requiredOn < earliest) return { pointer, detail: `the earliest day is ${earliest}` };
  if (!isWorkingDay(requiredOn, calendar)) {
    return { pointer, detail: `the plant is closed on that day; the next working day is ${addWorkingDays(requiredOn, 1, calendar)}` };
  }
  return null;
}
