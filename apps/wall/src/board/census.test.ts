import type { Bed, BedStay } from '@windrow/ventilation/contract/board';
import { type SupportId, supportEntry } from '@windrow/ventilation/support/catalogue';
import { describe, expect, it } from 'vitest';
import { census } from './census.ts';

const NOW = Date.parse('2026-03-05T11:20:00Z');
const ago = (minutes: number) => new Date(NOW - minutes * 60_000).toISOString();

function aBed(mode: SupportId | null, checkMinutes: number | null = 60, isOpen = true): Bed {
  const stay: BedStay | null = mode && {
    stayId: 's',
    version: 1,
    admittedAt: ago(9000),
    patient: null,
    predictedBodyWeightKg: null,
    difficultAirway: false,
    precautions: null,
    careLimits: null,
    orders: { checkEveryMinutes: null, gasEveryMinutes: null },
    support: { id: mode, shortName: supportEntry(mode).shortName, sinceAt: ago(5000) },
    proneSinceAt: null,
    away: null,
    trial: null,
    lastTrial: null,
    screen: null,
    device: null,
    airway: null,
    gas: null,
    flags: [],
    check: null,
    ladder: {
      check: { dueFrom: 210, overdueFrom: 240, withdrawFrom: 480 },
      airway: { dueFrom: 420, overdueFrom: 480, withdrawFrom: 960 },
      gas: { dueFrom: 1440, overdueFrom: 1440, withdrawFrom: 1440 },
    },
    plateauLimitCmH2O: 30,
    withdrawn: { check: null, airway: null, gas: null },
  };
  if (stay && checkMinutes !== null) {
    stay.check = {
      observationId: 'o',
      observedAt: ago(checkMinutes),
      recordedAt: ago(checkMinutes),
      recordedByInitials: 'AO',
      changedSinceAt: null,
      mode: mode ?? 'room-air',
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
    };
  }
  return {
    bedId: 'b',
    unitId: 'u',
    label: '01',
    row: 1,
    column: 1,
    isOpen,
    revision: 1,
    stay,
    assignments: [],
    ventilator: null,
  };
}

describe('census', () => {
  it('counts masks among the ventilators, and says how many they are', () => {
    const counts = census(
      [aBed('ac-vc'), aBed('hfov'), aBed('niv-cpap'), aBed('hfnc'), aBed('room-air')],
      NOW,
    );
    expect(counts).toMatchObject({ onVentilators: 3, byMask: 1, highFlow: 1, bedsEmpty: 0, notKnown: 0 });
  });

  it('counts only open beds as empty', () => {
    expect(census([aBed(null), aBed(null, null, false)], NOW).bedsEmpty).toBe(1);
  });

  it('counts overdue and withdrawn checks, and a withdrawn one as support not known', () => {
    const counts = census([aBed('ac-vc', 239), aBed('ac-vc', 240), aBed('ac-vc', 480)], NOW);
    expect(counts).toMatchObject({ onVentilators: 2, checksOverdue: 2, notKnown: 1 });
  });
});
