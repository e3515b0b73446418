import type { ShownBed } from '@windrow/ventilation/board/shown-bed';
import type { BedStay, FactGroup, Flag } from '@windrow/ventilation/contract/board';
import { formatAge } from '@windrow/ventilation/format/age';

export type Due = {
  group: FactGroup | 'trial';
  /** Minutes until it is overdue; below zero it has been for so long. */
  minutes: number;
  words: string;
};

const NAMES: Record<FactGroup, string> = { check: 'check', airway: 'airway check', gas: 'gas' };

/**
 * What is owed at a bed, the most pressing first. A check is owed at every bed, an airway check where a
 * device is in place, a gas only where it was ordered.
 */
export function whatIsDue({ shown, now }: { shown: ShownBed; now: number }): Due[] {
  const { stay } = shown.bed;
  if (!stay) return [];
  const owed: FactGroup[] = ['check'];
  if (stay.device) owed.push('airway');
  if (stay.orders.gasEveryMinutes !== null) owed.push('gas');
  return [
    ...owed.map((group) => dueOf({ shown, group, sinceAt: stay.admittedAt, now })),
    ...trialDue({ stay, now }),
  ].sort((a, b) => a.minutes - b.minutes);
}

/** A breathing trial: owed after a screen that was met, and to be ended after the time that was planned. */
function trialDue({ stay: { trial, flags }, now }: { stay: BedStay; now: number }): Due[] {
  const until = (instant: string) => (Date.parse(instant) - now) / 60_000;
  if (trial) {
    if (trial.plannedMinutes === null) return [];
    const minutes = until(trial.startedAt) + trial.plannedMinutes;
    const words =
      minutes > 0
        ? `trial to end in ${formatAge(Math.ceil(minutes))}`
        : `trial over by ${formatAge(-minutes)}`;
    return [{ group: 'trial', minutes, words }];
  }
  // Of the two flags only the one that holds now is in a row that may be shown.
  const flag = flags.find(({ id, acknowledged }) => id in DUE_AT && acknowledged === null);
  const dueAt = flag && DUE_AT[flag.id]?.(flag);
  if (!dueAt) return [];
  const minutes = until(dueAt);
  const words =
    minutes > 0
      ? `breathing trial due in ${formatAge(Math.ceil(minutes))}`
      : `breathing trial due since ${formatAge(-minutes)}`;
  return [{ group: 'trial', minutes, words }];
}

const DUE_AT: Readonly<Record<string, (flag: Flag) => string | null | undefined>> = {
  'ready-to-try': ({ holds }) => holds?.until,
  'trial-due': ({ holds }) => holds?.from,
};

function dueOf({
  shown,
  group,
  sinceAt,
  now,
}: {
  shown: ShownBed;
  group: FactGroup;
  sinceAt: string;
  now: number;
}): Due {
  const { ageMinutes } = shown.groups[group];
  const overdueFrom = shown.bed.stay?.ladder[group].overdueFrom ?? 0;
  if (ageMinutes === null) {
    // Nothing yet: owed since the patient came.
    return {
      group,
      minutes: -Math.max(0, (now - Date.parse(sinceAt)) / 60_000),
      words: `no ${NAMES[group]} yet`,
    };
  }
  const minutes = overdueFrom - ageMinutes;
  // Rounded up, so that "0h00" never stands beside something that is not overdue yet.
  const words =
    minutes > 0
      ? `${NAMES[group]} due in ${formatAge(Math.ceil(minutes))}`
      : `${NAMES[group]} overdue ${formatAge(-minutes)}`;
  return { group, minutes, words };
}

/** A bed is done in this shift when its check is current and was made since the shift began. */
export function isDone(shown: ShownBed): boolean {
  const { state, observedAt } = shown.groups.check;
  return (
    state === 'current' &&
    observedAt !== null &&
    shown.assignment !== null &&
    observedAt >= shown.assignment.startsAt
  );
}
