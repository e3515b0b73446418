import { describe, expect, it } from 'vitest';
import type { BedStay } from '../contract/board.ts';
import { bedFlags } from '../flags/bed-flags.ts';
import { AT, check, EMPTY, PSV } from '../flags/example-stays.ts';
import { DEFAULT_POLICY } from '../policy/policy.ts';
import { dueToday } from './due-today.ts';
import { hoursAfter } from './ready-to-try.ts';
import { SCREEN_ANSWER_KEYS } from './screen-answers.ts';
import { screening } from './screening.ts';

const { thresholds } = DEFAULT_POLICY;
const readings = { vtExhaledMl: 600, rateTotalPerMin: 20, spo2Percent: 95 };
const STAY = check({ mode: 'psv', settings: PSV, readings });
const screen = (answer: boolean): BedStay['screen'] => ({
  observationId: 's1',
  observedAt: AT,
  recordedByInitials: 'AO',
  answers: Object.fromEntries(SCREEN_ANSWER_KEYS.map((key) => [key, answer])),
  holdsUntil: hoursAfter(AT, 24),
});
const failed: BedStay['lastTrial'] = { startedAt: AT, endedAt: hoursAfter(AT, 0.5), outcome: 'failed' };
const trial: BedStay['trial'] = { startedAt: AT, method: 't-piece', plannedMinutes: 30 };

const due = (change: Partial<BedStay>, hours = 1, base = STAY) => {
  const stay = { ...base, ...change };
  return dueToday({
    stay: { ...stay, flags: bedFlags({ stay, thresholds }) },
    screening: screening({ stay, phLow: 7.25 }),
    thresholds,
    at: Date.parse(hoursAfter(AT, hours)),
  });
};

describe('dueToday', () => {
  it.each<[string, Partial<BedStay>, number, ReturnType<typeof dueToday>]>([
    ['a screen, where none stands', {}, 1, { what: 'screen' }],
    [
      'the trial, after a screen that is met',
      { screen: screen(true) },
      1,
      { what: 'trial', at: hoursAfter(AT, 4) },
    ],
    ['the same when it is overdue', { screen: screen(true) }, 6, { what: 'trial', at: hoursAfter(AT, 4) }],
    [
      'nothing, where an item is not met',
      { screen: screen(false) },
      1,
      { what: 'nothing', why: 'not-ready' },
    ],
    ['the end of a trial that runs', { trial }, 1, { what: 'end-of-trial', at: hoursAfter(AT, 0.5) }],
    [
      'the next screen, after a trial that failed',
      { lastTrial: failed },
      1,
      { what: 'screen-again', at: hoursAfter(AT, 12) },
    ],
    ['a screen again the next day', { lastTrial: failed }, 12, { what: 'screen' }],
    [
      'a screen again, where the one that stands has had its trial',
      { screen: screen(true), lastTrial: failed },
      14,
      { what: 'screen' },
    ],
    [
      'no trial after one that was passed',
      { lastTrial: { ...failed, outcome: 'passed' } },
      1,
      { what: 'nothing', why: 'passed' },
    ],
  ])('is %s', (_, change, hours, expected) => {
    expect(due(change, hours)).toEqual(expected);
  });

  it('is nothing without a tube', () => {
    expect(due({}, 1, EMPTY)).toEqual({ what: 'nothing', why: 'no-tube' });
  });
});
