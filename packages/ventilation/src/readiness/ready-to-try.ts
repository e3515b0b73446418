import type { BedStay, FactGroup } from '../contract/board.ts';
import type { Policy } from '../policy/policy.ts';
import { screening } from './screening.ts';

const HOUR_MS = 3_600_000;

export type ReadyToTry = {
  /** The screen that found it so. */
  screenId: string;
  screenedAt: string;
  /** From when the trial is due, and until when the screen stands. */
  dueAt: string;
  until: string;
  /** The groups of facts that it rests on. */
  from: readonly FactGroup[];
};

/**
 * Whether a breathing trial may be tried: every needed item of the screen is met, none runs, and none was
 * begun since the screen, nor so shortly before it that a second one the same day would follow. Without a
 * clock: it says between which instants it holds.
 *
 * @source screen and trial once a day: MacIntyre NR et al., Chest 2001;120(6 Suppl):375S–95S (every 24 h after a
 *   failed trial; from memory). The hours are the unit's own.
 */
export function readyToTry({
  stay,
  thresholds,
}: {
  stay: Omit<BedStay, 'flags'>;
  thresholds: Policy['thresholds'];
}): ReadyToTry | null {
  const { screen, trial } = stay;
  if (!screen || trial !== null || wasTriedFor(stay, thresholds.trialAgainHours)) return null;
  const screened = screening({ stay, phLow: thresholds.phLow });
  if (!screened?.isReady) return null;
  const groups = new Set(screened.items.flatMap(({ source }) => source?.group ?? []));
  return {
    screenId: screen.observationId,
    screenedAt: screen.observedAt,
    dueAt: hoursAfter(screen.observedAt, thresholds.trialDueHours),
    until: screen.holdsUntil,
    from: (['check', 'gas'] as const).filter((group) => groups.has(group)),
  };
}

/** A screen that was made soon after a trial, or before it, has had its trial. */
function wasTriedFor({ screen, lastTrial }: Pick<BedStay, 'screen' | 'lastTrial'>, againHours: number) {
  if (!screen || !lastTrial) return false;
  const triedAt = Date.parse(lastTrial.startedAt ?? lastTrial.endedAt);
  return Date.parse(screen.observedAt) - triedAt < againHours * HOUR_MS;
}

export function hoursAfter(instant: string, hours: number): string {
  return new Date(Date.parse(instant) + hours * HOUR_MS).toISOString();
}
