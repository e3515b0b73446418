import { formatDay } from '../format/clock.ts';
import { instantMs } from '../units/instant.ts';
import { calendarInZone } from './calendar-in-zone.ts';
import { type JudgedDays, judgeDays } from './judge-days.ts';
import { type SurveyedStay, surveyedDays } from './surveyed-days.ts';

/**
 * The day table of one stay: a row for each day of ventilation through an artificial airway, with the minima of
 * set PEEP and FiO2, what the day is to the rule, and why; and the ventilator-associated conditions found.
 *
 * @param stay.checks the checks that hold, in any order: instant, mode, set PEEP (cmH2O) and FiO2 (%).
 * @param stay.airways devices placed and removed; an extubation is a removal.
 * @param stay.extracorporealDays calendar days wholly on extracorporeal support, entered by hand.
 * @param stay.timeZone the unit's zone, whose calendar counts, summer time included.
 * @param stay.chartingIntervalMinutes how often the unit charts, for how long the last value of a day is taken to be held at the most.
 * @param stay.until the end of the stay, or now: what was last charted holds until then.
 * @param stay.isPresent whether the day of `until` is still going on.
 * @throws RangeError on missing or impossible input, naming it.
 * @source CDC NHSN, definitions of ventilator-associated events for adult locations; see `edition.ts` for what is
 *   from memory.
 */
export function dayTable(stay: SurveyedStay & { isPresent: boolean }): JudgedDays {
  const openDay = stay.isPresent
    ? calendarInZone('timeZone', stay.timeZone)(instantMs('until', stay.until))
    : null;
  return judgeDays({ days: surveyedDays(stay), openDay, nameOf: formatDay });
}
