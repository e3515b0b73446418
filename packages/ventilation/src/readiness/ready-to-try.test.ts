import { describe, expect, it } from 'vitest';
import { bedForAudience } from '../board/for-audience.ts';
import { shownBed } from '../board/shown-bed.ts';
import { tileView } from '../board/tile/tile-view.ts';
import type { Bed, BedStay } from '../contract/board.ts';
import { bedFlags } from '../flags/bed-flags.ts';
import { AT, check, PSV } from '../flags/example-stays.ts';
import { DEFAULT_POLICY } from '../policy/policy.ts';
import { hoursAfter, readyToTry } from './ready-to-try.ts';
import { SCREEN_ANSWER_KEYS } from './screen-answers.ts';

const thresholds = DEFAULT_POLICY.thresholds;
const STAY: Omit<BedStay, 'flags'> = {
  ...check({
    mode: 'psv',
    settings: PSV,
    readings: { vtExhaledMl: 600, rateTotalPerMin: 20, spo2Percent: 95 },
  }),
  screen: {
    observationId: 's1',
    observedAt: AT,
    recordedByInitials: 'AO',
    answers: Object.fromEntries(SCREEN_ANSWER_KEYS.map((key) => [key, true])),
    holdsUntil: hoursAfter(AT, 24),
  },
};

const readiness = ['ready-to-try', 'trial-due'];
const bedOf = (stay: Omit<BedStay, 'flags'>): Bed => ({
  bedId: 'b',
  unitId: 'u',
  label: '01',
  row: 1,
  column: 1,
  isOpen: true,
  revision: 1,
  stay: { ...stay, flags: bedFlags({ stay, thresholds }) },
  assignments: [],
  ventilator: null,
});
/** The check is kept young, so that only the clock of the screen is seen. */
const shownAfter = (hours: number, stay = STAY) => {
  const now = hoursAfter(AT, hours);
  const young = stay.check && { ...stay, check: { ...stay.check, observedAt: now } };
  return shownBed({ bed: bedOf(young ?? stay), now }).bed.stay;
};
const idsAfter = (hours: number, stay = STAY) =>
  shownAfter(hours, stay)?.flags.flatMap(({ id }) => (readiness.includes(id) ? [id] : []));

describe('readyToTry', () => {
  it('holds from the screen, and says when the trial is due and until when', () => {
    expect(readyToTry({ stay: STAY, thresholds })).toEqual({
      screenId: 's1',
      screenedAt: AT,
      dueAt: hoursAfter(AT, 4),
      until: hoursAfter(AT, 24),
      from: ['check'],
    });
  });

  it.each<[string, Partial<BedStay>]>([
    ['without a screen', { screen: null }],
    ['while a trial runs', { trial: { startedAt: AT, method: null, plannedMinutes: null } }],
    ['after a trial since the screen', { lastTrial: ended(1) }],
    ['after a trial shortly before it', { lastTrial: ended(-11.9) }],
  ])('does not hold %s', (_, change) => {
    expect(readyToTry({ stay: { ...STAY, ...change }, thresholds })).toBeNull();
  });

  it("holds again by the next day's screen", () => {
    expect(readyToTry({ stay: { ...STAY, lastTrial: ended(-12) }, thresholds })).not.toBeNull();
  });
});

function ended(hours: number): BedStay['lastTrial'] {
  return { startedAt: hoursAfter(AT, hours), endedAt: hoursAfter(AT, hours + 0.5), outcome: 'failed' };
}

describe('the flags of readiness', () => {
  it('turn from ready to due, and are gone with the screen, by the clock of the screen alone', () => {
    expect([0, 3.99, 4, 23.9, 24].map((hours) => idsAfter(hours))).toEqual([
      ['ready-to-try'],
      ['ready-to-try'],
      ['trial-due'],
      ['trial-due'],
      [],
    ]);
    expect(shownAfter(23.9)?.screen).not.toBeNull();
    expect(shownAfter(24)?.screen).toBeNull();
  });

  it('are gone with the check that they rest on', () => {
    expect(shownBed({ bed: bedOf(STAY), now: hoursAfter(AT, 8) }).bed.stay?.flags).toEqual([]);
  });

  it('are sent on before they hold, so that a wall can show them without another message', () => {
    const sent = bedForAudience({ bed: bedOf(STAY), audience: 'display', now: AT });
    expect(sent.stay?.flags.map(({ id }) => id)).toEqual(readiness);
  });
});

describe('a running trial on the tile', () => {
  it.each([
    [12.9, 'On trial 12 min'],
    [239, 'On trial 239 min'],
    [1500, 'On trial 25h'],
  ])('of %d minutes says "%s"', (minutes, words) => {
    const bed = bedOf({ ...STAY, trial: { startedAt: AT, method: 't-piece', plannedMinutes: 30 } });
    const now = Date.parse(AT) + minutes * 60_000;
    const view = tileView({ bed, reader: { now, timeZone: 'Europe/London' } });
    expect(view.content).toMatchObject({ chips: [{ id: 'on-trial', short: words, level: 'note' }] });
    expect(words.length).toBeLessThanOrEqual(16);
  });
});
