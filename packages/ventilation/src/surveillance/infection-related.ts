import { dayFromNumber, dayNumber } from '../units/calendar-day.ts';
import { requireNumber, shown } from '../units/require-number.ts';
import { requireList } from '../units/require-word.ts';
import { qualifyingDaysOf } from './qualifying-days.ts';
import type { VentilatorEvent } from './ventilator-events.ts';

const DAYS_AROUND_ONSET = 2;
const FIRST_VENTILATION_DAY_THAT_COUNTS = 3;
const QUALIFYING_DAYS_NEEDED = 4;

type Window = { first: number; last: number };

/**
 * Whether a ventilator-associated condition is infection-related. In the window from two days before to two days after onset,
 * never before the third day of ventilation: a temperature above 38.0 or below 36.0 °C, or white cells ≥ 12,000 or
 * ≤ 4,000 per mm³; and a new antimicrobial with at least four qualifying days in a row that begin in the window.
 * New means started in the window and not given on either of the two days before the start. Every day of a new agent
 * qualifies, also after the window, and one day left out between two days of the same agent; new agents add up.
 *
 * @param input.event the event, with `onset` and `ventilationDayOne` as 'YYYY-MM-DD'.
 * @param input.temperatures `day` and `celsius` °C (20 to 46).
 * @param input.whiteCells `day` and `perMm3` cells per mm³ (0 to 1000000).
 * @param input.antimicrobialDays for each listed `agent` the `days` on which it was given, also those before the window.
 * @returns the verdict, and all qualifying days in order.
 * @throws RangeError on missing, non-finite or impossible input, naming the place in the list.
 *
 * @source CDC NHSN, ventilator-associated event protocol (that the four days begin in the window from memory).
 */
export function infectionRelated({
  event,
  temperatures,
  whiteCells,
  antimicrobialDays,
}: {
  event: Pick<VentilatorEvent, 'onset'> & Partial<VentilatorEvent> & { ventilationDayOne: string };
  temperatures: readonly { day: string; celsius: number }[];
  whiteCells: readonly { day: string; perMm3: number }[];
  antimicrobialDays: readonly { agent: string; days: readonly string[] }[];
}): { ivac: boolean; qualifyingDays: string[] } {
  const window = windowAround(event);
  const qualifying = qualifyingDaysOf({ window, courses: toCourses(antimicrobialDays) });
  // Both are checked before either answers, so that a wrong row is never passed over.
  const signs = [temperatureSign(temperatures, window), whiteCellSign(whiteCells, window)];
  return {
    ivac: signs.includes(true) && runFromWindow(qualifying, window) >= QUALIFYING_DAYS_NEEDED,
    qualifyingDays: qualifying.map(dayFromNumber),
  };
}

function windowAround(event: { onset: string; ventilationDayOne: string }): Window {
  const onset = dayNumber('event.onset', event?.onset);
  const firstDay =
    dayNumber('event.ventilationDayOne', event.ventilationDayOne) + FIRST_VENTILATION_DAY_THAT_COUNTS - 1;
  if (onset < firstDay) {
    throw new RangeError(`event.onset must be ${dayFromNumber(firstDay)} or later, not ${event.onset}`);
  }
  return { first: Math.max(firstDay, onset - DAYS_AROUND_ONSET), last: onset + DAYS_AROUND_ONSET };
}

function temperatureSign(
  rows: readonly { day: string; celsius: number }[],
  { first, last }: Window,
): boolean {
  requireList('temperatures', rows);
  return rows
    .map((row, index) => {
      const day = dayNumber(`temperatures[${index}].day`, row?.day);
      requireNumber(`temperatures[${index}].celsius`, row.celsius, [20, 46]);
      return day >= first && day <= last && (row.celsius > 38 || row.celsius < 36);
    })
    .includes(true);
}

function whiteCellSign(rows: readonly { day: string; perMm3: number }[], { first, last }: Window): boolean {
  requireList('whiteCells', rows);
  return rows
    .map((row, index) => {
      const day = dayNumber(`whiteCells[${index}].day`, row?.day);
      requireNumber(`whiteCells[${index}].perMm3`, row.perMm3, [0, 1_000_000]);
      return day >= first && day <= last && (row.perMm3 >= 12_000 || row.perMm3 <= 4000);
    })
    .includes(true);
}

/** Days of each agent; the same agent listed twice is one agent. */
function toCourses(rows: readonly { agent: string; days: readonly string[] }[]): ReadonlySet<number>[] {
  requireList('antimicrobialDays', rows);
  const byAgent = new Map<string, Set<number>>();
  for (const [index, row] of rows.entries()) {
    const key = `antimicrobialDays[${index}]`;
    if (typeof row?.agent !== 'string' || row.agent === '') {
      throw new RangeError(`${key}.agent must be a name, not ${shown(row?.agent)}`);
    }
    requireList(`${key}.days`, row.days);
    const days = byAgent.get(row.agent) ?? new Set();
    row.days.forEach((day, at) => {
      days.add(dayNumber(`${key}.days[${at}]`, day));
    });
    byAgent.set(row.agent, days);
  }
  return [...byAgent.values()];
}

/** The longest run of days in a row that begins within the window. */
function runFromWindow(days: readonly number[], { last }: Window): number {
  const given = new Set(days);
  const starts = days.filter((day) => day <= last && !given.has(day - 1));
  return starts.reduce((longest, start) => {
    let end = start;
    while (given.has(end)) end += 1;
    return Math.max(longest, end - start);
  }, 0);
}
