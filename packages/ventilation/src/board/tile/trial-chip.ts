import type { BedStay } from '../../contract/board.ts';
import { formatAge } from '../../format/age.ts';
import { trialMinutes } from '../../readiness/trials.ts';

/** From here on minutes are too many to be read at a glance: somebody forgot to record the end. */
const COUNTED_TO_MIN = 240;

/** A breathing trial that runs, with how long it has: no flag, since it changes by the clock. */
export function trialChip({
  trial,
  now,
}: {
  trial: BedStay['trial'];
  now: number;
}): { id: string; short: string; level: 'note' } | null {
  if (!trial) return null;
  const minutes = trialMinutes({ startedAt: trial.startedAt, at: now });
  const long = minutes < COUNTED_TO_MIN ? `${minutes} min` : formatAge(minutes);
  return { id: 'on-trial', short: `On trial ${long}`, level: 'note' };
}
