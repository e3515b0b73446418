import type { Policy } from '@windrow/ventilation/policy/policy';
import { policyValues } from './policy-fields.ts';

export type PolicyDifference = { path: string; label: string; theirs: string; mine: string };

/** Value by value, where two policies differ. */
export function policyDifferences({ theirs, mine }: { theirs: Policy; mine: Policy }): PolicyDifference[] {
  const other = new Map(policyValues(theirs).map(({ path, value }) => [path, value]));
  return policyValues(mine)
    .map(({ path, label, value }) => ({ path, label, theirs: other.get(path) ?? '', mine: value }))
    .filter((pair) => pair.theirs !== pair.mine);
}

/** What I changed since `base`, put on what stands now: all else stays as the others left it. */
export function policyOnTop({ base, mine, theirs }: { base: Policy; mine: Policy; theirs: Policy }): Policy {
  return {
    freshness: mapValues(theirs.freshness, (ladder, kind) =>
      changedOver(base.freshness[kind], mine.freshness[kind], ladder),
    ),
    thresholds: changedOver(base.thresholds, mine.thresholds, theirs.thresholds),
    tasks: mapValues(theirs.tasks, (task, name) => changedOver(base.tasks[name], mine.tasks[name], task)),
    ...changedOver(hoursOf(base), hoursOf(mine), hoursOf(theirs)),
  };
}

function hoursOf({ nightFrom, nightTo }: Policy): Pick<Policy, 'nightFrom' | 'nightTo'> {
  return { nightFrom, nightTo };
}

function changedOver<T extends Record<string, number | string>>(base: T, mine: T, theirs: T): T {
  return mapValues(theirs, (value, key) => (mine[key] === base[key] ? value : mine[key]));
}

function mapValues<T extends object>(object: T, change: <K extends keyof T>(value: T[K], key: K) => T[K]): T {
  const result = { ...object };
  for (const key in object) result[key] = change(object[key], key);
  return result;
}
