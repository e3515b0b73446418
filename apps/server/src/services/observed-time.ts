import { invalid } from '../errors.ts';

const AHEAD_MINUTES = 2;

/** Refuses a fact from the future: a tablet's clock may run ahead a little, and no more. */
export function requireObservedTime({ observedAt, now }: { observedAt: string; now: string }): void {
  if (Date.parse(observedAt) > Date.parse(now) + AHEAD_MINUTES * 60_000) {
    throw invalid([
      {
        path: 'observedAt',
        message: `must be at most ${AHEAD_MINUTES} minutes ahead of the server's time, ${now}, not ${observedAt}`,
      },
    ]);
  }
}
