import { DEFAULT_POLICY, Policy } from '@windrow/ventilation/policy/policy';
import { describe, expect, it } from 'vitest';
import { policyValues } from './policy-fields.ts';
import { policyDifferences, policyOnTop } from './policy-merge.ts';

function changed(change: (policy: Policy) => void): Policy {
  const policy = structuredClone(DEFAULT_POLICY);
  change(policy);
  return policy;
}

/** Every leaf of a policy, found without the table under test. */
function leaves(value: unknown, path = ''): string[] {
  if (typeof value !== 'object' || value === null) return [path];
  return Object.entries(value).flatMap(([key, inner]) => leaves(inner, path ? `${path}.${key}` : key));
}

describe('policyValues', () => {
  it('names every value that a policy has, so that no difference can hide', () => {
    expect(
      policyValues(DEFAULT_POLICY)
        .map(({ path }) => path)
        .sort(),
    ).toEqual(leaves(DEFAULT_POLICY).sort());
  });
});

describe('policyOnTop', () => {
  const base = DEFAULT_POLICY;
  const mine = changed((policy) => {
    policy.freshness.check.dueFrom = 100;
    policy.nightTo = '06:30';
    policy.tasks.maskCare.minutes = 20;
  });
  const theirs = changed((policy) => {
    policy.freshness.check.dueFrom = 180;
    policy.freshness.check.overdueFrom = 235;
    policy.thresholds.phLow = 7.2;
  });

  it('keeps what I changed, and theirs in everything that I did not touch', () => {
    expect(policyOnTop({ base, mine, theirs })).toEqual(
      changed((policy) => {
        policy.freshness.check.dueFrom = 100;
        policy.freshness.check.overdueFrom = 235;
        policy.thresholds.phLow = 7.2;
        policy.tasks.maskCare.minutes = 20;
        policy.nightTo = '06:30';
      }),
    );
  });

  it('stays a policy that the schema takes', () => {
    expect(Policy.safeParse(policyOnTop({ base, mine, theirs })).success).toBe(true);
  });
});

describe('policyDifferences', () => {
  it('names what differs, with both values', () => {
    const theirs = changed((policy) => {
      policy.thresholds.phLow = 7.2;
    });
    expect(policyDifferences({ theirs, mine: DEFAULT_POLICY })).toEqual([
      { path: 'thresholds.phLow', label: 'pH below', theirs: '7.2', mine: '7.25' },
    ]);
  });
});
