import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { freshness } from './freshness.ts';

const OBSERVED = '2024-03-31T00:30:00+01:00';
const OBSERVED_MS = Date.parse(OBSERVED);
const LADDER = { dueFrom: 210, overdueFrom: 240, withdrawFrom: 480 };
const ORDER = ['current', 'due', 'overdue', 'withdrawn'] as const;

const after = (ageMs: number, ladder = LADDER) =>
  freshness({
    kind: 'check',
    observedAt: OBSERVED,
    now: new Date(OBSERVED_MS + ageMs).toISOString(),
    policy: { check: ladder, gas: LADDER },
  });

describe('freshness', () => {
  it.each([
    [0, 'current'],
    [210 * 60_000 - 1, 'current'],
    [210 * 60_000, 'due'],
    [240 * 60_000 - 1, 'due'],
    [240 * 60_000, 'overdue'],
    [480 * 60_000 - 1, 'overdue'],
    [480 * 60_000, 'withdrawn'],
    [1e10, 'withdrawn'],
  ])('at an age of %d ms is %s: a boundary belongs to the older state', (ageMs, state) => {
    expect(after(ageMs)).toBe(state);
  });

  it('takes an age below zero as zero', () => {
    expect(after(-120_000)).toBe('current');
    expect(after(-120_000, { dueFrom: 0, overdueFrom: 240, withdrawFrom: 480 })).toBe('due');
  });

  it('is never when nothing was recorded', () => {
    const now = '2024-03-31T12:00:00Z';
    expect(freshness({ kind: 'gas', observedAt: null, now, policy: { gas: LADDER } })).toBe('never');
  });

  it('leaves a state out where two ages are equal', () => {
    const onlyWithdrawn = { dueFrom: 1440, overdueFrom: 1440, withdrawFrom: 1440 };

    expect(after(1440 * 60_000 - 1, onlyWithdrawn)).toBe('current');
    expect(after(1440 * 60_000, onlyWithdrawn)).toBe('withdrawn');
  });

  it('never grows younger as time passes', () => {
    const ages = fc.tuple(fc.nat(40_000_000), fc.nat(40_000_000));
    fc.assert(
      fc.property(ages, ([one, more]) => {
        expect(ORDER.indexOf(after(one + more) as 'due')).toBeGreaterThanOrEqual(
          ORDER.indexOf(after(one) as 'due'),
        );
      }),
    );
  });
});
