import { dayIn } from '@shared/calendar/days';
import { type Dependencies } from '../dependencies';
import { promisedDay } from './promised-day';

/** The first day on which an order placed now can be ready, by the maker's calendar and clock. */
export function earliestDayOf(
  fabricatorId: string,
  leadTimeClass: string | null,
  { stores, clock }: Pick<Dependencies, 'stores' | 'clock'>,
): string {
  const maker = stores.orders.maker(fabricatorId);
  return promisedDay(dayIn(maker.timeZone, clock()), leadTimeClass, maker.calendar);
}
