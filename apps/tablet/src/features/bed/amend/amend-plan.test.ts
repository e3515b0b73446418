import type { RecordEntry } from '@windrow/ventilation/contract/observations';
import { describe, expect, it } from 'vitest';
import { entryBody } from '../entry/entry-body.ts';
import { judgeEntry, obstaclesOf } from '../entry/judge-entry.ts';
import { reviewOf } from '../entry/review.ts';
import { amendPlan, textsOf } from './amend-plan.ts';

function anEntry(kind: RecordEntry['kind'], body: Record<string, unknown>): RecordEntry {
  return {
    observationId: 'o',
    kind,
    observedAt: '2026-03-05T09:40:21.000Z',
    recordedAt: '2026-03-05T09:41:00.000Z',
    recordedBy: { personId: 'p', displayName: 'Ama Osei', initials: 'AO' },
    source: 'hand',
    amends: null,
    amendedBy: null,
    body,
  };
}

function amended(entry: RecordEntry, changes: Record<string, string>) {
  const values = { ...textsOf(entry.body), ...changes };
  const plan = amendPlan({ entry, values, ageMinutes: 100 });
  const draft = {
    values,
    kept: {},
    left: [],
    active: null,
    typing: null,
    time: null,
    mayStand: false,
    startedFrom: null,
  };
  return { plan, judged: judgeEntry({ plan, draft, weightKg: null }) };
}

const CHECK = anEntry('check', {
  mode: 'ac-vc',
  settings: { vtSetMl: 430, rateSetPerMin: 18, peepCmH2O: 8, fio2Percent: 45 },
  readings: { spo2Percent: 95 },
  limits: { highPressureCmH2O: 'off' },
  passive: true,
});

describe('amendPlan', () => {
  it('opens with what stands in the record, and shows only what differs as changed', () => {
    const { plan, judged } = amended(CHECK, { peepCmH2O: '10', reason: 'misread', spo2Percent: '' });
    const review = reviewOf({ plan, judged, ageMinutes: 0 });
    expect(review.leavesBoard).toEqual([]);
    expect(review.changed.map(({ label, before, now }) => [label, before, now])).toEqual([
      ['PEEP', '8\u00a0cmH2O', '10\u00a0cmH2O'],
    ]);
    expect(review.confirmed.map(({ key }) => key)).toEqual([
      'mode',
      'vtSetMl',
      'rateSetPerMin',
      'fio2Percent',
      'passive',
      'highPressureCmH2O',
    ]);
  });

  it('gives back the whole fact, without the reason, which stands beside it', () => {
    const { plan, judged } = amended(CHECK, { peepCmH2O: '10', reason: 'misread' });
    expect(entryBody({ plan, judged, observedAt: Date.parse(CHECK.observedAt) })).toEqual({
      state: 'ready',
      body: {
        observedAt: CHECK.observedAt,
        mode: 'ac-vc',
        settings: { vtSetMl: 430, rateSetPerMin: 18, peepCmH2O: 10, fio2Percent: 45 },
        readings: { spo2Percent: 95 },
        limits: { highPressureCmH2O: 'off' },
        passive: true,
      },
    });
    expect(judged.values.reason).toBe('misread');
  });

  it('wants a reason', () => {
    const { judged } = amended(CHECK, { peepCmH2O: '10' });
    expect(obstaclesOf(judged).map(({ message }) => message)).toEqual(['Why it is amended is needed']);
  });

  it.each([
    ['gas', { site: 'arterial', ph: 7.4, pco2MmHg: 40, po2MmHg: 80 }],
    [
      'airway',
      { event: 'placed', kind: 'oral-tube', sizeMm: 7.5, depthCm: 22, depthMark: 'lip', cuffed: true },
    ],
    ['airway', { event: 'removed' }],
    ['airway-check', { cuffCmH2O: 26, secured: false }],
    ['happening', { kind: 'trial-failed', detail: 'tired' }],
    ['happening', { kind: 'trial-failed', criteria: ['rate', 'effort'] }],
    ['happening', { kind: 'trial-started', method: 't-piece', plannedMinutes: 30 }],
    ['happening', { kind: 'trial-passed', minutes: 34 }],
    ['happening', { kind: 'screened', screen: { coughAdequate: true, causeImproving: false } }],
  ] as const)('gives a %s back as it was when nothing is changed', (kind, body) => {
    const entry = anEntry(kind, body);
    const { plan, judged } = amended(entry, { reason: 'looked at again' });
    const made = entryBody({ plan, judged, observedAt: Date.parse(entry.observedAt) });
    expect(made).toEqual({ state: 'ready', body: { observedAt: entry.observedAt, ...body } });
  });
});
