import { describe, expect, it } from 'vitest';
import { type StampedHappening, type TrialHappening, trialMinutes, trialsOf } from './trials.ts';

const at = (time: string) => `2026-03-05T${time}:00.000Z`;
let count = 0;
const fact = (time: string, body: TrialHappening): StampedHappening => {
  count += 1;
  return { observationId: `o${count}`, observedAt: at(time), body };
};

describe('trialsOf', () => {
  it('tells a trial from its start to its end, newest first, in whatever order the facts come', () => {
    const facts = [
      fact('09:30', { kind: 'trial-failed', criteria: ['rate', 'effort'], detail: 'tired' }),
      fact('08:00', { kind: 'trial-started', method: 't-piece', plannedMinutes: 30 }),
      fact('14:00', { kind: 'trial-started', method: 'pressure-support', plannedMinutes: 60 }),
      fact('15:02', { kind: 'trial-passed', minutes: 60 }),
    ];
    expect(trialsOf(facts)).toMatchObject([
      {
        startedAt: at('14:00'),
        outcome: 'passed',
        minutes: 60,
        method: 'pressure-support',
        plannedMinutes: 60,
      },
      {
        startedAt: at('08:00'),
        endedAt: at('09:30'),
        outcome: 'failed',
        minutes: 90,
        method: 't-piece',
        criteria: ['rate', 'effort'],
        detail: 'tired',
      },
    ]);
  });

  it('has a trial running until something ends it', () => {
    expect(trialsOf([fact('08:00', { kind: 'trial-started' })])).toMatchObject([
      { outcome: 'running', endedAt: null, minutes: null, method: null, plannedMinutes: null },
    ]);
  });

  it('lets an extubation or another start end a trial of which nobody said how it went', () => {
    const facts = [
      fact('08:00', { kind: 'trial-started' }),
      fact('10:00', { kind: 'trial-started' }),
      fact('10:40', { kind: 'extubated-planned' }),
      fact('11:00', { kind: 'proned' }),
    ];
    expect(trialsOf(facts).map(({ outcome, minutes }) => [outcome, minutes])).toEqual([
      ['ended', 40],
      ['ended', 120],
    ]);
  });

  it('keeps an end whose start nobody recorded', () => {
    expect(trialsOf([fact('08:00', { kind: 'trial-failed', detail: 'rate 38' })])).toMatchObject([
      { startedAt: null, endedAt: at('08:00'), outcome: 'failed', minutes: null, detail: 'rate 38' },
    ]);
  });

  it('makes no trial of an extubation alone', () => {
    expect(trialsOf([fact('08:00', { kind: 'extubated-planned' })])).toEqual([]);
  });
});

describe('trialMinutes', () => {
  it('counts whole minutes, and none before the start', () => {
    const startedAt = at('08:00');
    expect(trialMinutes({ startedAt, at: Date.parse(at('08:12')) + 59_999 })).toBe(12);
    expect(trialMinutes({ startedAt, at: Date.parse(at('07:59')) })).toBe(0);
  });
});
