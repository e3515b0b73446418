import { dayFromNumber, dayNumber } from '../units/calendar-day.ts';
import { requireNumber, shown } from '../units/require-number.ts';
import { requireList } from '../units/require-word.ts';
import { type EventWindow, eventWindow } from './event-window.ts';
import { isTemperatureSign, isWhiteCellSign } from './infection-limits.ts';
import { QUALIFYING_DAYS_NEEDED, qualifyingDaysOf, runFromWindow } from './qualifying-days.ts';
import type { VentilatorEvent } from './ventilator-events.ts';

/**
 * Whether a ventilator-associated condition is infection-related.
 *
 * @title Infection-related condition
 * @formula in the window from two days before to two days after onset, never before the third day of
 *   ventilation: a temperature `> 38.0` or `< 36.0 °C`, or white cells `≥ 12,000` or `≤ 4,000` per mm³; and a
 *   new antimicrobial with at least four qualifying days in a row that begin in the window.
 * @valid for an event of the same rule. New means started in the window and not given on either of the two days
 *   before the start. Every day of a new agent qualifies, also after the window, and one day left out between
 *   two days of the same agent; new agents add up.
 *
 * @param input.event record of the event, with `onset` and `ventilationDayOne` as YYYY-MM-DD.
 * @param input.temperatures list of `day` and `celsius` °C (20 to 46).
 * @param input.whiteCells list of `day` and `perMm3` cells per mm³ (0 to 1000000).
 * @param input.antimicrobialDays list of each `agent` with the `days` on which it was given, also those before
 *   the window.
 * @returns record: `ivac` whether the condition is infection-related; `qualifyingDays` all qualifying days in
 *   order.
 * @throws RangeError on missing, non-finite or impossible input, naming the place in the list.
 * @example { "event": { "onset": "2026-03-08", "ventilationDayOne": "2026-03-01" }, "temperatures": [{ "day":
 *   "2026-03-08", "celsius": 38.4 }], "whiteCells": [], "antimicrobialDays": [{ "agent": "A", "days":
 *   ["2026-03-08", "2026-03-09", "2026-03-10", "2026-03-11"] }] }
 *
 * @source CDC NHSN, ventilator-associated event protocol (that the four days begin in the window not compared
 *   with the print).
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
  const window = eventWindow(event);
  const qualifying = qualifyingDaysOf({ window, courses: toCourses(antimicrobialDays) });
  // Both are checked before either answers, so that a wrong row is never passed over.
  const signs = [temperatureSign(temperatures, window), whiteCellSign(whiteCells, window)];
  return {
    ivac: signs.includes(true) && runFromWindow(qualifying, window) >= QUALIFYING_DAYS_NEEDED,
    qualifyingDays: qualifying.map(dayFromNumber),
  };
}

function temperatureSign(
  rows: readonly { day: string; celsius: number }[],
  { first, last }: EventWindow,
): boolean {
  requireList('temperatures', rows);
  return rows
    .map((row, index) => {
      const day = dayNumber(`temperatures[${index}].day`, row?.day);
      requireNumber(`temperatures[${index}].celsius`, row.celsius, [20, 46]);
      return day >= first && day <= last && isTemperatureSign(row.celsius);
    })
    .includes(true);
}

function whiteCellSign(
  rows: readonly { day: string; perMm3: number }[],
  { first, last }: EventWindow,
): boolean {
  requireList('whiteCells', rows);
  return rows
    .map((row, index) => {
      const day = dayNumber(`whiteCells[${index}].day`, row?.day);
      requireNumber(`whiteCells[${index}].perMm3`, row.perMm3, [0, 1_000_000]);
      return day >= first && day <= last && isWhiteCellSign(row.perMm3);
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
