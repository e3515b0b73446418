import { dayNumber } from '../units/calendar-day.ts';
import { instantMs } from '../units/instant.ts';
import { requireNumber } from '../units/require-number.ts';
import { requireList } from '../units/require-word.ts';
import { calendarInZone } from './calendar-in-zone.ts';

const HOUR_MS = 3_600_000;

type Charted = { ms: number; value: number };
/** Consecutive equal values. */
type Run = { value: number; fromMs: number; lastMs: number };

/**
 * The lowest setting (PEEP or FiO2) of a calendar day that was held for more than an hour; when none was, the lowest of the day.
 * A charted value is held until the next one charted that day, and the day's last for as long as the interval
 * before it. So it takes 5 equal values in a row at every 15 min, 3 at 30, 2 at 60, and one when charted less often.
 * Give only samples from hours on conventional ventilation, weaning included.
 *
 * @param input.samples what was charted, in any order: `at` an ISO 8601 instant with offset, `value` in cmH2O or % (0 to 1000).
 * @param input.day the calendar day, 'YYYY-MM-DD', in the zone; it may have 23 or 25 hours.
 * @param input.timeZone IANA name of the unit's zone.
 * @returns in the unit of the samples; `null` when nothing was charted that day.
 * @throws RangeError on missing, non-finite or impossible input, naming the place in the list.
 *
 * @source CDC NHSN, ventilator-associated event protocol (the rule of an hour and the row counts from memory).
 */
export function dailyMinimum({
  samples,
  day,
  timeZone,
}: {
  samples: readonly { at: string; value: number }[];
  day: string;
  timeZone: string;
}): number | null {
  requireList('samples', samples);
  dayNumber('day', day);
  const dayOf = calendarInZone('timeZone', timeZone);
  const charted = samples
    .map(toCharted)
    .filter(({ ms }) => dayOf(ms) === day)
    .sort((a, b) => a.ms - b.ms || a.value - b.value);
  if (charted.length === 0) return null;

  const held = heldOverAnHour(charted);
  return lowest(held.length > 0 ? held : charted);
}

function toCharted(sample: { at: string; value: number }, index: number): Charted {
  requireNumber(`samples[${index}].value`, sample?.value, [0, 1000]);
  return { ms: instantMs(`samples[${index}].at`, sample.at), value: sample.value };
}

function heldOverAnHour(charted: readonly Charted[]): Run[] {
  const runs = toRuns(charted);
  return runs.filter((run, index) => {
    const untilMs = runs[index + 1]?.fromMs ?? run.lastMs + lastInterval(charted);
    return untilMs - run.fromMs > HOUR_MS;
  });
}

function toRuns(charted: readonly Charted[]): Run[] {
  const runs: Run[] = [];
  for (const { ms, value } of charted) {
    const run = runs.at(-1);
    if (run?.value === value) run.lastMs = ms;
    else runs.push({ value, fromMs: ms, lastMs: ms });
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
