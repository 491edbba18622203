import { type PlantCalendar } from '../database/schema/companies';

/**
 * Working days of the plant for a lead-time class; without a class the maker's first, its usual one.
 * Null when the maker has no such class.
 */
export function leadTimeDays({ leadTimes }: PlantCalendar, leadTimeClass: string | null): number | null {
  const found = leadTimeClass === null ? leadTimes[0] : leadTimes.find((offered) => offered.class === leadTimeClass);
  return found?.workingDays ?? null;
}
