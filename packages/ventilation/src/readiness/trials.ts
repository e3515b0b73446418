import type { Happening, HappeningKind, TrialMethod } from '../contract/observations.ts';
import type { FailureCriterion } from './trial-failure.ts';

/** What trials are told from: happenings of one stay, in any order. */
export type TrialHappening = Pick<
  Happening,
  'kind' | 'method' | 'plannedMinutes' | 'minutes' | 'criteria' | 'detail'
>;
export type StampedHappening = { observationId: string; observedAt: string; body: TrialHappening };

/** One breathing trial. `ended`: something else ended it, and nobody said how it went. */
export type BreathingTrial = {
  /** Of the fact that it is first known by. */
  observationId: string;
  /** Null where only its end was recorded. */
  startedAt: string | null;
  method: TrialMethod | null;
  plannedMinutes: number | null;
  outcome: 'running' | 'passed' | 'failed' | 'ended';
  endedAt: string | null;
  /** As recorded with the end, else from start to end. Null while it runs. */
  minutes: number | null;
  criteria: readonly FailureCriterion[];
  detail: string | null;
};

const OUTCOMES: Partial<Record<HappeningKind, 'passed' | 'failed' | 'ended'>> = {
  'trial-passed': 'passed',
  'trial-failed': 'failed',
  'extubated-planned': 'ended',
  'extubated-unplanned': 'ended',
  'trial-started': 'ended',
};

const MINUTE_MS = 60_000;

/** How long a trial has run at an instant, in whole minutes; a clock that is behind its start counts as zero. */
export function trialMinutes({ startedAt, at }: { startedAt: string; at: number }): number {
  return Math.max(0, Math.floor((at - Date.parse(startedAt)) / MINUTE_MS));
}

/**
 * The breathing trials of a stay, newest first. A start is ended by the first of: passed, failed, an
 * extubation, or another start. An end without a start is a trial whose start nobody recorded.
 */
export function trialsOf(happenings: readonly StampedHappening[]): BreathingTrial[] {
  const inOrder = [...happenings].sort((one, other) => one.observedAt.localeCompare(other.observedAt));
  const trials: BreathingTrial[] = [];
  for (const fact of inOrder) {
    const outcome = OUTCOMES[fact.body.kind];
    if (outcome === undefined) continue;
    const last = trials.at(-1);
    if (last?.outcome === 'running') trials[trials.length - 1] = ended(last, fact, outcome);
    else if (outcome !== 'ended') trials.push(ended(begun(fact, null), fact, outcome));
    if (fact.body.kind === 'trial-started') trials.push(begun(fact, fact.observedAt));
  }
  return trials.reverse();
}

function begun({ observationId, body }: StampedHappening, startedAt: string | null): BreathingTrial {
  return {
    observationId,
    startedAt,
    method: body.method ?? null,
    plannedMinutes: body.plannedMinutes ?? null,
    outcome: 'running',
    endedAt: null,
    minutes: null,
    criteria: [],
    detail: startedAt === null ? null : (body.detail ?? null),
  };
}

function ended(
  trial: BreathingTrial,
  { observedAt, body }: StampedHappening,
  outcome: 'passed' | 'failed' | 'ended',
): BreathingTrial {
  const lasted =
    trial.startedAt === null
      ? null
      : trialMinutes({ startedAt: trial.startedAt, at: Date.parse(observedAt) });
  const saysHow = outcome !== 'ended';
  return {
    ...trial,
    outcome,
    endedAt: observedAt,
    minutes: (saysHow ? body.minutes : undefined) ?? lasted,
    criteria: (saysHow ? body.criteria : undefined) ?? [],
    detail: (saysHow ? body.detail : undefined) ?? trial.detail,
  };
}
