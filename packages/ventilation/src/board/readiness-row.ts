import type { BedStay } from '../contract/board.ts';
import { hoursAfter } from '../readiness/ready-to-try.ts';
import type { StayFacts } from './facts.ts';
import { latestOf } from './latest-of.ts';

type Happenings = Pick<StayFacts, 'happenings'>;

const OUT = ['extubated-planned', 'extubated-unplanned'] as const;

/** The trial that runs: begun, and since then neither told of nor ended by an extubation. */
export function trialNow({ happenings }: Happenings): BedStay['trial'] {
  const latest = latestOf(happenings, ['trial-started', 'trial-passed', 'trial-failed', ...OUT]);
  if (latest?.body.kind !== 'trial-started') return null;
  return {
    startedAt: latest.observedAt,
    method: latest.body.method ?? null,
    plannedMinutes: latest.body.plannedMinutes ?? null,
  };
}

/** How the last trial ended. Its start is the latest one before its end. */
export function lastTrialOf({ happenings }: Happenings): BedStay['lastTrial'] {
  const end = latestOf(happenings, ['trial-passed', 'trial-failed']);
  if (!end) return null;
  const start = latestOf(happenings, ['trial-started']);
  return {
    startedAt: start && start.observedAt <= end.observedAt ? start.observedAt : null,
    endedAt: end.observedAt,
    outcome: end.body.kind === 'trial-passed' ? 'passed' : 'failed',
  };
}

/** The latest screen, unless the patient was extubated since: then it was of another state. */
export function screenNow({ happenings }: Happenings, holdsHours: number): BedStay['screen'] {
  const latest = latestOf(happenings, ['screened', ...OUT]);
  if (latest?.body.kind !== 'screened' || !latest.body.screen) return null;
  const answers: Record<string, boolean> = {};
  for (const [key, answer] of Object.entries(latest.body.screen)) {
    if (answer !== undefined) answers[key] = answer;
  }
  const { observationId, observedAt, recordedByInitials } = latest;
  return {
    observationId,
    observedAt,
    recordedByInitials,
    answers,
    holdsUntil: hoursAfter(observedAt, holdsHours),
  };
}
