import type { Load } from '@windrow/ventilation/assignment/loads';

/** Room after the longest row, so that its end mark and an overload are seen to end. */
const HEADROOM = 1.04;
/** The part of a tablet's row that the narrowest block takes, since a finger needs that much. */
const NARROWEST = 0.07;

/**
 * How many minutes the whole width stands for: as many as the longest row needs, the same in every row.
 * Blocks too small to touch are drawn wider than they are, and need that room too.
 */
export function scaleOf({
  loads,
  minutesByBed,
}: {
  loads: readonly Load[];
  minutesByBed: ReadonlyMap<string, number>;
}): number {
  const longest = Math.max(
    60,
    ...loads.map(({ minutes, person }) => Math.max(minutes, person.minutesAvailable)),
  );
  const drawn = Math.max(
    longest,
    ...loads.map(({ bedIds }) =>
      drawnMinutes({
        beds: bedIds.map((bedId) => minutesByBed.get(bedId) ?? 0),
        narrowest: NARROWEST * longest,
      }),
    ),
  );
  return drawn * HEADROOM;
}

function drawnMinutes({ beds, narrowest }: { beds: readonly number[]; narrowest: number }): number {
  return beds.reduce((sum, minutes) => sum + Math.max(minutes, narrowest), 0);
}
