import { describe, expect, it } from 'vitest';
import type { Check } from '../contract/observations.ts';
import { DEFAULT_POLICY } from '../policy/policy.ts';
import { bedBoard } from './bed-board.ts';
import { NOTHING_ACKNOWLEDGED, type Stamped, type StayFacts } from './facts.ts';

const NOON = Date.parse('2026-03-05T12:00:00Z');
const at = (minutes: number) => new Date(NOON + minutes * 60_000).toISOString();
const stamp = (minutes: number, recordedMinutes = minutes) => ({
  observationId: `o${minutes}`,
  observedAt: at(minutes),
  recordedAt: at(recordedMinutes),
  recordedByInitials: 'AO',
});

/** A check in pressure control without a low volume limit, while another limit is recorded. */
function aCheck(minutes: number, vtExhaledMl: number, recordedMinutes = minutes): Stamped<Check> {
  const observedAt = at(minutes);
  const settings = { pInspCmH2O: 15, rateSetPerMin: 18, peepCmH2O: 8, fio2Percent: 40 };
  const body = {
    observedAt,
    mode: 'ac-pc',
    settings,
    readings: { vtExhaledMl },
    limits: { highPressureCmH2O: 40 },
  } as const;
  return { ...stamp(minutes, recordedMinutes), body };
}

const STAY: StayFacts = {
  stayId: 's',
  version: 1,
  admittedAt: at(-600),
  details: {
    patient: {
      hospitalNumber: 'H1',
      familyName: 'Varga',
      givenName: 'Ilse',
      bornOn: '1961-03-04',
      sex: 'female',
      heightCm: 165,
    },
    difficultAirway: false,
    precautions: null,
    careLimits: null,
    orders: { checkEveryMinutes: null, gasEveryMinutes: null },
  },
  checks: [],
  gas: null,
  airway: null,
  airwayChecks: [],
  happenings: [],
  support: { id: 'ac-pc', sinceAt: at(-300), observedAt: at(-300) },
  ...NOTHING_ACKNOWLEDGED,
};

const FLAG = 'limit-missing-low-vt';

function flagOf(facts: StayFacts) {
  const place = { bedId: 'b', unitId: 'u', label: '01', row: 1, column: 1, isOpen: true };
  const row = { place, revision: 1, facts, policy: DEFAULT_POLICY, assignments: [], ventilator: null };
  return bedBoard(row).stay?.flags.find(({ id }) => id === FLAG);
}

/** The stay with these checks, newest first, and the flag of `seen` acknowledged at minute 5. */
function acknowledged(checks: Stamped<Check>[], seen = aCheck(0, 420)): StayFacts {
  const fingerprint = flagOf({ ...STAY, checks: [seen] })?.fingerprint ?? '';
  const body = { observedAt: at(5), flagId: FLAG, fingerprint, note: 'limit is set on the monitor' };
  return {
    ...STAY,
    checks,
    acknowledgements: [{ ...stamp(5), body }],
    sinceAcknowledged: { checks, gases: [], airwayChecks: [] },
  };
}

describe('an acknowledged flag', () => {
  it('carries who, when and the note, and stays a flag', () => {
    expect(flagOf(acknowledged([aCheck(0, 420)]))).toMatchObject({
      level: 'attention',
      acknowledged: { by: 'AO', at: at(5), note: 'limit is set on the monitor' },
    });
  });

  it('stays so through new checks that found the same', () => {
    const checks = [aCheck(480, 420), aCheck(240, 420), aCheck(0, 420)];
    expect(flagOf(acknowledged(checks))?.acknowledged).not.toBeNull();
  });

  it('is raised again by a reading that changed', () => {
    expect(flagOf(acknowledged([aCheck(240, 380), aCheck(0, 420)]))?.acknowledged).toBeNull();
  });

  it('stays raised when the reading comes back to what it was', () => {
    const checks = [aCheck(480, 420), aCheck(240, 380), aCheck(0, 420)];
    expect(flagOf(acknowledged(checks))?.acknowledged).toBeNull();
  });

  it('is not touched by what lay before it, nor by an earlier check that is entered late', () => {
    const before = [aCheck(240, 420), aCheck(0, 420), aCheck(-240, 300)];
    expect(flagOf(acknowledged(before))?.acknowledged).not.toBeNull();
    const late = [aCheck(240, 420), aCheck(0, 420), aCheck(-120, 300, 30)];
    expect(flagOf(acknowledged(late))?.acknowledged).not.toBeNull();
  });

  it('is not acknowledged by a note about other values', () => {
    const other = acknowledged([aCheck(0, 420)], aCheck(0, 421));
    expect(flagOf(other)?.acknowledged).toBeNull();
  });
});
