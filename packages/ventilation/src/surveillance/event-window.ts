import { dayFromNumber, dayNumber } from '../units/calendar-day.ts';

const DAYS_AROUND_ONSET = 2;
const FIRST_VENTILATION_DAY_THAT_COUNTS = 3;

/** First and last day, as numbers of `dayNumber`, both included. */
export type EventWindow = { first: number; last: number };

/**
 * The days around an onset in which signs of infection are looked for: two before to two after, never before
 * the third day of ventilation.
 *
 * @throws RangeError on what is no day, and on an onset before the third day of ventilation.
 * @source CDC NHSN, ventilator-associated event protocol.
 */
export function eventWindow(event: { onset: string; ventilationDayOne: string }): EventWindow {
  const onset = dayNumber('event.onset', event?.onset);
  const firstDay =
    dayNumber('event.ventilationDayOne', event.ventilationDayOne) + FIRST_VENTILATION_DAY_THAT_COUNTS - 1;
  if (onset < firstDay) {
    throw new RangeError(`event.onset must be ${dayFromNumber(firstDay)} or later, not ${event.onset}`);
  }
  return { first: Math.max(firstDay, onset - DAYS_AROUND_ONSET), last: onset + DAYS_AROUND_ONSET };
}
