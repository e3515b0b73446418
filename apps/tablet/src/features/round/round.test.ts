import { shownBed } from '@windrow/ventilation/board/shown-bed';
import type { Bed, BedStay } from '@windrow/ventilation/contract/board';
import { DEFAULT_POLICY } from '@windrow/ventilation/policy/policy';
import { describe, expect, it } from 'vitest';
import { roundOf } from './round-order.ts';
import { isDone, whatIsDue } from './what-is-due.ts';

const now = Date.parse('2026-03-05T11:20:00Z');
const ago = (minutes: number) => new Date(now - minutes * 60_000).toISOString();

function aStay({ checkAgo, ...rest }: { checkAgo: number | null } & Partial<BedStay>): BedStay {
  const stamp = { observationId: 'o', recordedAt: ago(0), recordedByInitials: 'AO', changedSinceAt: null };
  return {
    stayId: 's',
    version: 1,
    admittedAt: ago(60),
    patient: null,
    predictedBodyWeightKg: null,
    difficultAirway: false,
    precautions: null,
    careLimits: null,
    orders: { checkEveryMinutes: null, gasEveryMinutes: null },
    support: null,
    proneSinceAt: null,
    away: null,
    trial: null,
    lastTrial: null,
    screen: null,
    device: null,
    airway: null,
    gas: null,
    flags: [],
    ladder: DEFAULT_POLICY.freshness,
    plateauLimitCmH2O: 30,
    withdrawn: { check: null, airway: null, gas: null },
    check:
      checkAgo === null
        ? null
        : {
            ...stamp,
            observedAt: ago(checkAgo),
            mode: 'cpap',
            settings: {},
            readings: {},
            limits: {},
            interface: null,
            passive: null,
            derived: {
              vtPerKgMl: null,
              drivingPressureCmH2O: null,
              staticComplianceMlCmH2O: null,
              mechanicalPowerJMin: null,
              minuteVolumeLMin: null,
              roxIndex: null,
              rsbiPerMinL: null,
            },
          },
    ...rest,
  };
}

function aBed({
  label,
  stay,
  personId = null,
  startedAgo = 120,
}: {
  label: string;
  stay: BedStay | null;
  personId?: string | null;
  startedAgo?: number;
}) {
  const assignments =
    personId === null
      ? []
      : [
          {
            shiftId: 'sh',
            startsAt: ago(startedAgo),
            endsAt: ago(-600),
            personId,
            initials: 'AO',
            displayName: 'Ama Osei',
            coverInitials: null,
          },
        ];
  const bed: Bed = {
    bedId: label,
    unitId: 'u',
    label,
    row: 1,
    column: 1,
    isOpen: true,
    revision: 1,
    stay,
    assignments,
    ventilator: null,
  };
  return shownBed({ bed, now });
}

const due = (stay: BedStay) =>
  whatIsDue({ shown: aBed({ label: '01', stay }), now }).map(({ words }) => words);

describe('whatIsDue', () => {
  it('says how long until a check is overdue, and for how long it has been', () => {
    expect(due(aStay({ checkAgo: 220 }))).toEqual(['check due in 0h20']);
    expect(due(aStay({ checkAgo: 275 }))).toEqual(['check overdue 0h35']);
  });

  it('does not stand at zero before the time, nor after it', () => {
    expect(due(aStay({ checkAgo: 239.5 }))).toEqual(['check due in 0h01']);
    expect(due(aStay({ checkAgo: 240 }))).toEqual(['check overdue 0h00']);
  });

  it('owes a first check since the patient came', () => {
    const [first] = whatIsDue({
      shown: aBed({ label: '01', stay: aStay({ checkAgo: null, admittedAt: ago(45) }) }),
      now,
    });
    expect(first).toEqual({ group: 'check', minutes: -45, words: 'no check yet' });
  });

  it('asks for the airway where a device is in place, and for a gas where one was ordered', () => {
    const device = {
      observationId: 'd',
      placedAt: ago(900),
      kind: 'oral-tube',
      sizeMm: 7.5,
      depthCm: 22,
      depthMark: 'lip',
      cuffed: true,
      subglotticPort: null,
    };
    const stay = aStay({ checkAgo: 10, device, orders: { checkEveryMinutes: null, gasEveryMinutes: 240 } });
    expect(due(stay)).toEqual(['no airway check yet', 'no gas yet', 'check due in 3h50']);
  });
});

describe('a breathing trial', () => {
  const flag = (id: string, holds: { from: string | null; until: string | null }) => ({
    id,
    level: 'note' as const,
    short: '',
    sentence: '',
    source: '',
    from: [],
    inputs: [],
    fingerprint: '',
    acknowledged: null,
    holds,
  });
  const young = { checkAgo: 10 };

  it('is owed from the hour that the screen gave it', () => {
    const ready = flag('ready-to-try', { from: null, until: ago(-65) });
    expect(due(aStay({ ...young, flags: [ready] }))).toEqual([
      'breathing trial due in 1h05',
      'check due in 3h50',
    ]);
    const isDue = flag('trial-due', { from: ago(25), until: ago(-600) });
    expect(due(aStay({ ...young, flags: [isDue] }))[0]).toBe('breathing trial due since 0h25');
  });

  it('that runs is to be ended after the time that was planned', () => {
    const trial = (startedAgo: number, plannedMinutes: number | null) =>
      due(aStay({ ...young, trial: { startedAt: ago(startedAgo), method: 't-piece', plannedMinutes } }));
    expect(trial(12, 30)[0]).toBe('trial to end in 0h18');
    expect(trial(34, 30)[0]).toBe('trial over by 0h04');
    expect(trial(34, null)).toEqual(['check due in 3h50']);
  });
});

describe('isDone', () => {
  it('wants a current check that was made since the shift began', () => {
    const done = (checkAgo: number, startedAgo: number) =>
      isDone(aBed({ label: '01', stay: aStay({ checkAgo }), personId: 'me', startedAgo }));
    expect([done(30, 120), done(120, 120), done(121, 120), done(215, 300)]).toEqual([
      true,
      true,
      false,
      false,
    ]);
  });
});

describe('roundOf', () => {
  it('puts what is owed first on top, and counts what is done', () => {
    const beds = [
      aBed({ label: '10', stay: aStay({ checkAgo: 10 }), personId: 'me' }),
      aBed({ label: '02', stay: aStay({ checkAgo: 275 }), personId: 'me' }),
      aBed({ label: '03', stay: aStay({ checkAgo: 100 }), personId: 'other' }),
      aBed({ label: '04', stay: null }),
      aBed({ label: '05', stay: aStay({ checkAgo: 230 }) }),
    ];
    const round = roundOf({ beds, personId: 'me', now });
    const labels = (list: readonly { bed: Bed }[]) => list.map(({ bed }) => bed.label);
    expect(labels(round.mine)).toEqual(['02', '10']);
    expect(labels(round.others)).toEqual(['05', '03']);
    expect(labels(round.empty)).toEqual(['04']);
    expect(round.done).toBe(1);
  });

  it('orders equal needs by the number of the bed', () => {
    const beds = ['12', '2', '1'].map((label) => aBed({ label, stay: aStay({ checkAgo: 50 }) }));
    expect(roundOf({ beds, personId: 'me', now }).others.map(({ bed }) => bed.label)).toEqual([
      '1',
      '2',
      '12',
    ]);
  });
});
