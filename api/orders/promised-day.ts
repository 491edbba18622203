import { addWorkingDays, isWorkingDay, type WorkingDays } from '@shared/calendar/days';
import { type FieldError } from '@shared/contracts/problems';

/** A plant's working days and its lead times by class, the usual one first. */
export interface LeadTimes extends WorkingDays {
  leadTimes: readonly { class: string; workingDays: number }[];
}

/**
 * The first day on which an order placed on `today` can be ready: the lead time of its class
 * (null: the usual one) in working days of the plant.
 */
export function promisedDay(today: string, leadTimeClass: string | null, calendar: LeadTimes): string {
  const leadTime = calendar.leadTimes.find((time) => time.class === leadTimeClass) ?? calendar.leadTimes[0];
  return addWorkingDays(today, leadTime?.workingDays ?? 0, calendar);
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
