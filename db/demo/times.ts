import type { Phase, StayPlan } from './plan.ts';
import type { Random } from './random.ts';

/** How much history is written in detail; before it only what began something. */
const DETAILED_MINUTES = 48 * 60;
/** Two rounds closer than this would be one. */
const SAME_ROUND_MINUTES = 50;
/** The first check on a new support comes a little after it was begun. */
const SETTLED_MINUTES = 6;

export function minutes(hours: number): number {
  return Math.round(hours * 60);
}

/** When the patient came, and until when the detailed record reaches back. */
export function spanOf({ admittedHoursAgo, left }: StayPlan): {
  firstMinutesAgo: number;
  lastMinutesAgo: number;
} {
  const lastMinutesAgo = left ? minutes(left.hoursAgo) : 0;
  return {
    firstMinutesAgo: Math.min(minutes(admittedHoursAgo) - 1, lastMinutesAgo + DETAILED_MINUTES),
    lastMinutesAgo,
  };
}

/** Ages of the checks, newest first: rounds back from the newest, and one soon after each change of support or settings. */
export function checkTimes(plan: StayPlan, random: Random): number[] {
  const newest = plan.newest.check;
  if (newest === null) return [];
  const changes = plan.phases
    .map((phase) => minutes(phase.fromHoursAgo) - SETTLED_MINUTES)
    .filter((minutesAgo) => minutesAgo > newest + SAME_ROUND_MINUTES);
  const rounds = every({ newest, interval: plan.checkEveryMinutes ?? 240, spread: 14, plan, random });
  const first = plan.phases[0] ? minutes(plan.phases[0].fromHoursAgo) - SETTLED_MINUTES : 0;
  const apart = rounds.filter(
    (round) =>
      round <= Math.max(first, newest) &&
      (round === newest || changes.every((change) => Math.abs(change - round) > SAME_ROUND_MINUTES)),
  );
  return [...apart, ...changes].sort((one, other) => one - other);
}

export function gasTimes(plan: StayPlan, random: Random): number[] {
  const { gas: newest } = plan.newest;
  if (newest === null) return [];
  return every({ newest, interval: Math.round(1440 / (plan.gasesADay ?? 3)), spread: 55, plan, random });
}

/** Airway checks, within the time that a tube was in. */
export function airwayCheckTimes(plan: StayPlan, random: Random): number[] {
  const { airway: newest } = plan.newest;
  if (newest === null) return [];
  return every({ newest, interval: 480, spread: 20, plan, random }).filter((minutesAgo) =>
    (plan.tubes ?? []).some(
      (tube) =>
        minutesAgo < minutes(tube.placedHoursAgo) &&
        (tube.outHoursAgo === undefined || minutesAgo > minutes(tube.outHoursAgo)),
    ),
  );
}

/** The phase that a fact of this age belongs to. */
export function phaseAt(phases: readonly Phase[], minutesAgo: number): Phase | undefined {
  return phases.findLast((phase) => minutes(phase.fromHoursAgo) >= minutesAgo) ?? phases[0];
}

function every({
  newest,
  interval,
  spread,
  plan,
  random,
}: {
  newest: number;
  interval: number;
  spread: number;
  plan: StayPlan;
  random: Random;
}): number[] {
  const { firstMinutesAgo } = spanOf(plan);
  const times: number[] = [];
  for (let at = newest; at <= firstMinutesAgo; at += interval + Math.round(random.around(spread)))
    times.push(at);
  return times;
}
