import type { ShownBed } from '@windrow/ventilation/board/shown-bed';
import { isDone, whatIsDue } from './what-is-due.ts';

export type Round = {
  mine: readonly ShownBed[];
  others: readonly ShownBed[];
  empty: readonly ShownBed[];
  done: number;
};

/** The beds of a unit as one person goes round them: what is owed first comes first. */
export function roundOf({
  beds,
  personId,
  now,
}: {
  beds: readonly ShownBed[];
  personId: string;
  now: number;
}): Round {
  const taken = beds.filter(({ bed }) => bed.stay !== null);
  const mine = taken.filter(({ assignment }) => assignment?.personId === personId);
  return {
    mine: byNeed(mine, now),
    others: byNeed(
      taken.filter((shown) => !mine.includes(shown)),
      now,
    ),
    empty: beds.filter(({ bed }) => bed.stay === null),
    done: mine.filter(isDone).length,
  };
}

function byNeed(beds: readonly ShownBed[], now: number): ShownBed[] {
  const need = (shown: ShownBed) => whatIsDue({ shown, now })[0]?.minutes ?? Number.POSITIVE_INFINITY;
  return [...beds].sort(
    (a, b) => need(a) - need(b) || a.bed.label.localeCompare(b.bed.label, 'en', { numeric: true }),
  );
}
