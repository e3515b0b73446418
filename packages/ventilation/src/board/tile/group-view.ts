import type { FactGroup } from '../../contract/board.ts';
import { ageInWords, formatAge } from '../../format/age.ts';
import { formatDate, formatTime } from '../../format/clock.ts';
import type { Freshness } from '../../freshness/freshness.ts';
import type { ShownGroup } from '../shown-bed.ts';
import type { TileCell } from '../tile-cells.ts';

/** A group of facts on a tile: values, or the words that stand where no value may. */
export type GroupView = {
  state: Freshness;
  /** For the rail, `3h40`; null where there is nothing to be old. */
  age: string | null;
  /** "check overdue 4 hours 35 minutes". */
  ageWords: string;
  body: { rows: readonly (readonly TileCell[])[] } | { title: string; detail: string | null };
  /** "before change 14:20", "venous": what must be read with the values. */
  remarks: readonly string[];
};

/** The time at the place, and the wall of which it is read. */
export type Reader = { now: number; timeZone: string };

const DAY_MIN = 1_440;

export function aged(
  group: FactGroup,
  { state, ageMinutes }: ShownGroup,
): Pick<GroupView, 'state' | 'age' | 'ageWords'> {
  if (ageMinutes === null) return { state, age: null, ageWords: `no ${group} yet` };
  return { state, age: formatAge(ageMinutes), ageWords: `${group} ${state} ${ageInWords(ageMinutes)}` };
}

/** Within a day the time says it, for the age stands beside it; after that the day does. */
export function lastAt(
  { observedAt, ageMinutes }: ShownGroup,
  { timeZone }: Pick<Reader, 'timeZone'>,
): string {
  if (observedAt === null) return '';
  return (ageMinutes ?? 0) < DAY_MIN ? formatTime(observedAt, timeZone) : formatDate(observedAt, timeZone);
}

export function beforeChange(changedSinceAt: string | null, { timeZone }: Reader): readonly string[] {
  return changedSinceAt === null ? [] : [`before change ${formatTime(changedSinceAt, timeZone)}`];
}
