import { describe, expect, it } from 'vitest';
import { type SurveyedFacts, staySurveillance } from './stay-surveillance.ts';

const ADMITTED = '2026-03-02T08:00:00Z';

/** Admitted on 2 March, checked then and a day later. */
function firstDayWith({
  checkedAt,
  airways = [],
  happenings = [],
}: {
  checkedAt: string;
} & Partial<Pick<SurveyedFacts, 'airways' | 'happenings'>>) {
  const { dayTable } = staySurveillance({
    facts: {
      checks: [checkedAt, '2026-03-02T09:00:00Z', '2026-03-03T09:00:00Z'].map((observedAt) => ({
        observedAt,
        body: { mode: 'ac-vc', settings: { peepCmH2O: 8, fio2Percent: 40 } },
      })),
      ...{ airways, happenings, signs: [] },
    },
    timeZone: 'UTC',
    chartingIntervalMinutes: 240,
    admittedAt: ADMITTED,
    until: '2026-03-03T10:00:00Z',
    isPresent: true,
  });
  return dayTable[0]?.day;
}

const placed = (observedAt: string) => ({ airways: [{ observedAt, body: { event: 'placed' as const } }] });

describe('a check from before the stay', () => {
  it('counts up to three days back without an airway', () => {
    expect(firstDayWith({ checkedAt: '2026-02-27T08:00:00Z' })).toBe('2026-02-27');
    expect(firstDayWith({ checkedAt: '2026-02-27T07:59:00Z' })).toBe('2026-03-02');
    expect(firstDayWith({ checkedAt: '2025-03-02T09:00:00Z' })).toBe('2026-03-02');
  });

  it('counts from the first placement on', () => {
    const early = { checkedAt: '2026-02-20T08:00:00Z' };
    expect(firstDayWith({ ...early, ...placed('2026-02-19T08:00:00Z') })).toBe('2026-02-19');
    const happenings = [{ observedAt: '2026-02-19T08:00:00Z', body: { kind: 'intubated' as const } }];
    expect(firstDayWith({ ...early, happenings })).toBe('2026-02-19');
    // A later placement takes nothing off the three days.
    expect(firstDayWith({ checkedAt: '2026-02-28T08:00:00Z', ...placed('2026-03-02T08:30:00Z') })).toBe(
      '2026-02-28',
    );
  });

  it('never counts from more than thirty days back, whatever the placement says', () => {
    const slip = placed('2025-03-02T08:00:00Z');
    expect(firstDayWith({ checkedAt: '2026-01-31T08:00:00Z', ...slip })).toBe('2026-01-31');
    expect(firstDayWith({ checkedAt: '2026-01-31T07:59:00Z', ...slip })).toBe('2026-03-02');
  });
});
