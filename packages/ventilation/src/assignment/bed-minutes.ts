import type { Bed, BedStay } from '../contract/board.ts';
import type { Policy } from '../policy/policy.ts';
import { supportEntry } from '../support/catalogue.ts';

/** The tasks that a unit prices in minutes, in the order in which they are told. */
export const TASK_LABELS = {
  check: 'checks',
  airwayCare: 'airway care',
  inhaledTreatment: 'inhaled treatments',
  maskCare: 'mask care',
  oxygenRound: 'oxygen rounds',
} as const satisfies Record<keyof Policy['tasks'], string>;
export type Task = keyof typeof TASK_LABELS;

/** One task's share of a bed's minutes: how often it falls in the shift, and what that takes. */
export type MinutesPart = { task: Task; times: number; minutes: number };
export type BedMinutes = { total: number; parts: MinutesPart[] };

const TASKS: readonly Task[] = ['check', 'airwayCare', 'inhaledTreatment', 'maskCare', 'oxygenRound'];

/**
 * What a bed asks of one person in a shift, in minutes, and what that is made of. An empty bed asks nothing.
 * An interval that has begun counts as a whole visit: somebody has to be free for it.
 *
 * @param input.policy the unit's policy, which prices the tasks.
 * @param input.shiftMinutes the length of the shift, minutes.
 *
 * @source our own; each unit sets the minutes and intervals.
 */
export function bedMinutes({
  bed,
  policy,
  shiftMinutes,
}: {
  bed: Bed;
  policy: Policy;
  shiftMinutes: number;
}): BedMinutes {
  const { stay } = bed;
  if (!stay) return { total: 0, parts: [] };
  const parts = TASKS.flatMap((task) => {
    const everyMinutes = intervalOf({ task, stay, policy });
    if (everyMinutes === null) return [];
    const times = Math.ceil(shiftMinutes / everyMinutes);
    return [{ task, times, minutes: times * policy.tasks[task].minutes }];
  }).filter((part) => part.minutes > 0);
  return { total: parts.reduce((sum, part) => sum + part.minutes, 0), parts };
}

/** How often a stay needs a task; null: not at all. */
function intervalOf({ task, stay, policy }: { task: Task; stay: BedStay; policy: Policy }): number | null {
  const { everyMinutes } = policy.tasks[task];
  // Nothing recorded yet is planned as a ventilated patient's checks: the first round has to find out.
  const kind = stay.support ? supportEntry(stay.support.id).kind : 'unknown';
  const onVentilator = kind === 'invasive' || kind === 'mask';
  switch (task) {
    case 'check': {
      const ordered = stay.orders.checkEveryMinutes;
      if (onVentilator || kind === 'unknown') return Math.min(everyMinutes, ordered ?? everyMinutes);
      return ordered;
    }
    case 'airwayCare':
      return stay.device ? everyMinutes : null;
    case 'inhaledTreatment':
      return onVentilator ? everyMinutes : null;
    case 'maskCare':
      return kind === 'mask' ? everyMinutes : null;
    case 'oxygenRound':
      return kind === 'high-flow' || kind === 'oxygen' ? everyMinutes : null;
  }
}
