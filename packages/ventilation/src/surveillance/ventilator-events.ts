import { dayFromNumber, dayNumber } from '../units/calendar-day.ts';
import { requireNumber } from '../units/require-number.ts';
import { requireBoolean, requireList } from '../units/require-word.ts';

export type SurveillanceDay = {
  day: string;
  minPeep: number | null;
  minFio2Percent: number | null;
  excluded?: boolean;
};

export type EventParameter = 'peep' | 'fio2';

export type VentilatorEvent = { onset: string; kind: 'VAC'; by: EventParameter[] };

/** Daily minima, one map from day number to value for each parameter. */
type Minima = Readonly<Record<EventParameter, ReadonlyMap<number, number>>>;

/** PEEP of 0 to 5 counts as 5. */
const PEEP_FLOOR = 5;
/** Lasting rise over the first baseline day: cmH2O, and points of oxygen. */
const RISE = { peep: 3, fio2: 20 } as const;
const PARAMETERS = ['peep', 'fio2'] as const;
/** The onset is day 1 of an event's 14 days. */
const EVENT_PERIOD_DAYS = 14;
/** 58 % computed as 0.58 × 100 is a hair below 58. */
const HAIR = 1e-6;

/**
 * Ventilator-associated conditions in a list of days. The onset is the first worse day, so never before the
 * third day of ventilation. Another onset needs 14 days from the last.
 *
 * @title Ventilator-associated events
 * @formula two days of stable or falling daily minimum, then two days of which each is at least `3 cmH2O`
 *   (PEEP) or `20 points` (FiO2) above the first of them, all four in a row and in one parameter; PEEP of 0 to
 *   5 counts as 5.
 * @valid for days of mechanical ventilation through an artificial airway. A day that is not listed, an excluded
 *   day and a missing minimum break a baseline.
 *
 * @param input.days list of the days, in any order, each at most once: `day` YYYY-MM-DD; `minPeep` cmH2O (0 to
 *   40), `null` on a day wholly on alternating pressure levels; `minFio2Percent` % (20 to 100); `excluded` true
 *   for a day wholly on high-frequency ventilation or extracorporeal support.
 * @returns list of the events in the order of their onset, each with the parameters that met the rule on that
 *   day.
 * @throws RangeError on missing, non-finite or impossible input, naming the place in the list.
 * @example { "days": [{ "day": "2026-03-01", "minPeep": 5, "minFio2Percent": 40 }, { "day": "2026-03-02",
 *   "minPeep": 5, "minFio2Percent": 40 }, { "day": "2026-03-03", "minPeep": 8, "minFio2Percent": 40 }, { "day":
 *   "2026-03-04", "minPeep": 9, "minFio2Percent": 45 }] }
 *
 * @source CDC NHSN, ventilator-associated event protocol and its calculator (first baseline day as reference).
 */
export function ventilatorEvents({ days }: { days: readonly SurveillanceDay[] }): VentilatorEvent[] {
  requireList('days', days);
  const minima = toMinima(days);
  const events: VentilatorEvent[] = [];
  let earliest = Number.NEGATIVE_INFINITY;
  for (const day of [...new Set([...minima.peep.keys(), ...minima.fio2.keys()])].sort((a, b) => a - b)) {
    if (day < earliest) continue;
    const by = PARAMETERS.filter((parameter) => worsensOn(day, minima[parameter], RISE[parameter]));
    if (by.length === 0) continue;
    events.push({ onset: dayFromNumber(day), kind: 'VAC', by });
    earliest = day + EVENT_PERIOD_DAYS;
  }
  return events;
}

function worsensOn(day: number, minimum: ReadonlyMap<number, number>, rise: number): boolean {
  const [first, second, third, fourth] = [day - 2, day - 1, day, day + 1].map((each) => minimum.get(each));
  if (first === undefined || second === undefined || third === undefined || fourth === undefined)
    return false;
  return second <= first + HAIR && Math.min(third, fourth) >= first + rise - HAIR;
}

function toMinima(days: readonly SurveillanceDay[]): Minima {
  const seen = new Set<number>();
  const minima = { peep: new Map<number, number>(), fio2: new Map<number, number>() };
  for (const [index, row] of days.entries()) {
    const number = requireDay(`days[${index}]`, row);
    if (seen.has(number))
      throw new RangeError(`days[${index}].day must be listed once, not ${row.day} again`);
    seen.add(number);
    if (row.excluded) continue;
    if (row.minPeep !== null) minima.peep.set(number, Math.max(PEEP_FLOOR, row.minPeep));
    if (row.minFio2Percent !== null) minima.fio2.set(number, row.minFio2Percent);
  }
  return minima;
}

function requireDay(key: string, row: SurveillanceDay): number {
  const number = dayNumber(`${key}.day`, row?.day);
  if (row.minPeep !== null) requireNumber(`${key}.minPeep`, row.minPeep, [0, 40]);
  if (row.minFio2Percent !== null) requireNumber(`${key}.minFio2Percent`, row.minFio2Percent, [20, 100]);
  if (row.excluded !== undefined) requireBoolean(`${key}.excluded`, row.excluded);
  return number;
}
