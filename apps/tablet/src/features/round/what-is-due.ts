import type { ShownBed } from '@windrow/ventilation/board/shown-bed';
import type { FactGroup } from '@windrow/ventilation/contract/board';
import { formatAge } from '@windrow/ventilation/format/age';

export type Due = {
  group: FactGroup;
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
  return owed
    .map((group) => dueOf({ shown, group, sinceAt: stay.admittedAt, now }))
    .sort((a, b) => a.minutes - b.minutes);
}

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
