import { invalid } from '../errors.ts';

const AHEAD_MINUTES = 2;

/** Before this no fact of a present stay was observed; a year typed with a digit missing is refused. */
const FIRST_YEAR = '2000-01-01T00:00:00.000Z';

/** Refuses a fact from the future: a tablet's clock may run ahead a little, and no more. */
export function requireObservedTime({ observedAt, now }: { observedAt: string; now: string }): void {
  if (observedAt < FIRST_YEAR) {
    throw invalid([{ path: 'observedAt', message: `must not be before the year 2000, not ${observedAt}` }]);
  }
  if (Date.parse(observedAt) > Date.parse(now) + AHEAD_MINUTES * 60_000) {
    throw invalid([
      {
        path: 'observedAt',
        message: `must be at most ${AHEAD_MINUTES} minutes ahead of the server's time, ${now}, not ${observedAt}`,
      },
    ]);
  }
}
