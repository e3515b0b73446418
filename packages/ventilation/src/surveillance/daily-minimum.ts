import { dayNumber } from '../units/calendar-day.ts';
import { instantMs } from '../units/instant.ts';
import { requireNumber, shown } from '../units/require-number.ts';
import { requireList } from '../units/require-word.ts';
import { calendarInZone } from './calendar-in-zone.ts';

const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;

type Charted = { ms: number; value: number; untilMs: number };
/** Consecutive equal values, none of them ended before the next. */
type Run = { value: number; fromMs: number; lastMs: number; untilMs: number };

/**
 * The lowest setting (PEEP or FiO2) of a calendar day that was held for more than an hour; when none was, the
 * lowest of the day.
 *
 * @title Daily minimum
 * @formula a charted value is held until the next one charted that day, and the day’s last for as long as the
 *   interval before it; so it takes 5 equal values in a row at every 15 min, 3 at 30, 2 at 60, and one when
 *   charted less often. A value that says until when it was held is not held longer, and ends its row there.
 * @valid for samples from hours on conventional ventilation only, weaning included.
 *
 * @param input.samples list of what was charted, in any order: `at` an ISO 8601 instant with offset, `value` in
 *   cmH2O or % (0 to 1000); optionally `until`, the instant, also of the next day, at which another value, another
 *   manner of ventilation or the removal of the airway ended it.
 * @param input.day calendar day in the zone, text as YYYY-MM-DD; it may have 23 or 25 hours.
 * @param input.timeZone zone of the unit, text, an IANA name.
 * @returns value in the unit of the samples; `null` when nothing was charted that day.
 * @throws RangeError on missing, non-finite or impossible input, naming the place in the list.
 * @example { "samples": [{ "at": "2026-03-05T06:00:00Z", "value": 8 }, { "at": "2026-03-05T08:00:00Z", "value":
 *   5 }, { "at": "2026-03-05T08:30:00Z", "value": 8 }, { "at": "2026-03-05T10:00:00Z", "value": 8 }], "day":
 *   "2026-03-05", "timeZone": "Europe/London" }
 *
 * @source CDC NHSN, ventilator-associated event protocol (the rule of an hour and the row counts not compared
 *   with the print).
 */
export function dailyMinimum({
  samples,
  day,
  timeZone,
  chartingIntervalMinutes,
}: {
  samples: readonly { at: string; value: number; until?: string }[];
  day: string;
  timeZone: string;
  chartingIntervalMinutes?: number;
}): number | null {
  requireList('samples', samples);
  dayNumber('day', day);
  const dayOf = calendarInZone('timeZone', timeZone);
  if (chartingIntervalMinutes !== undefined)
    requireNumber('chartingIntervalMinutes', chartingIntervalMinutes, [1, 1440]);
  const charted = samples
    .map(toCharted)
    .filter(({ ms }) => dayOf(ms) === day)
    .sort((a, b) => a.ms - b.ms || a.value - b.value);
  if (charted.length === 0) return null;

  const held = heldOverAnHour(charted, chartingIntervalMinutes);
  return lowest(held.length > 0 ? held : charted);
}

function toCharted(sample: { at: string; value: number; until?: string }, index: number): Charted {
  const { at, value, until } = sample ?? {};
  requireNumber(`samples[${index}].value`, value, [0, 1000]);
  const ms = instantMs(`samples[${index}].at`, at);
  if (until === undefined) return { ms, value, untilMs: Number.POSITIVE_INFINITY };
  const untilMs = instantMs(`samples[${index}].until`, until);
  if (untilMs >= ms) return { ms, value, untilMs };
  throw new RangeError(`samples[${index}].until must not be before ${at}, not ${shown(until)}`);
}

function heldOverAnHour(charted: readonly Charted[], everyMinutes: number | undefined): Run[] {
  const runs = toRuns(charted);
  const lastHeldMs = everyMinutes === undefined ? lastInterval(charted) : everyMinutes * MINUTE_MS;
  return runs.filter((run, index) => {
    const nextMs = runs[index + 1]?.fromMs ?? run.lastMs + lastHeldMs;
    return Math.min(nextMs, run.untilMs) - run.fromMs > HOUR_MS;
  });
}

function toRuns(charted: readonly Charted[]): Run[] {
  const runs: Run[] = [];
  for (const { ms, value, untilMs } of charted) {
    const run = runs.at(-1);
    if (run?.value === value && run.untilMs >= ms) Object.assign(run, { lastMs: ms, untilMs });
    else runs.push({ value, fromMs: ms, lastMs: ms, untilMs });
  }
  return runs;
}

function lastInterval(charted: readonly Charted[]): number {
  const [before, last] = charted.slice(-2);
  return before && last ? last.ms - before.ms : 0;
}

function lowest(rows: readonly { value: number }[]): number {
  return rows.reduce((least, { value }) => Math.min(least, value), Number.POSITIVE_INFINITY);
}
