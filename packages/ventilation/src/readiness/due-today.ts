import { holdsAt } from '../board/shown-bed.ts';
import type { BedStay } from '../contract/board.ts';
import type { Policy } from '../policy/policy.ts';
import { hoursAfter } from './ready-to-try.ts';
import type { Screening } from './screening.ts';

/** What is owed on the way off the ventilator, as an instant and what it is the instant of. */
export type DueToday =
  | { what: 'screen' }
  | { what: 'trial'; at: string }
  | { what: 'end-of-trial'; at: string | null }
  | { what: 'screen-again'; at: string }
  | { what: 'nothing'; why: 'no-tube' | 'not-ready' | 'passed' };

/**
 * What comes next for one patient: the screen, the trial after a screen that is met, the end of a trial that
 * runs, or the next screen after a trial. One thing at a time, in that order of need.
 *
 * @param input.stay as it may be shown at `at`, epoch milliseconds.
 * @param input.screening null without a tube.
 */
export function dueToday({
  stay,
  screening,
  thresholds,
  at,
}: {
  stay: Pick<BedStay, 'trial' | 'lastTrial' | 'screen' | 'flags'>;
  screening: Screening | null;
  thresholds: Policy['thresholds'];
  at: number;
}): DueToday {
  const { trial, lastTrial, screen } = stay;
  if (trial) {
    const { startedAt, plannedMinutes } = trial;
    return {
      what: 'end-of-trial',
      at: plannedMinutes === null ? null : hoursAfter(startedAt, plannedMinutes / 60),
    };
  }
  if (!screening) return { what: 'nothing', why: 'no-tube' };
  const again = lastTrial && hoursAfter(lastTrial.startedAt ?? lastTrial.endedAt, thresholds.trialAgainHours);
  if (again !== null && at < Date.parse(again)) {
    return lastTrial?.outcome === 'passed'
      ? { what: 'nothing', why: 'passed' }
      : { what: 'screen-again', at: again };
  }
  const flags = stay.flags.filter((flag) => holdsAt({ flag, at }));
  const due =
    flags.find(({ id }) => id === 'trial-due')?.holds?.from ??
    flags.find(({ id }) => id === 'ready-to-try')?.holds?.until;
  if (due) return { what: 'trial', at: due };
  // A screen from before the last trial has had its trial; the next one is owed.
  const isUsed = again !== null && screen !== null && screen.observedAt < again;
  return screen === null || isUsed ? { what: 'screen' } : { what: 'nothing', why: 'not-ready' };
}
