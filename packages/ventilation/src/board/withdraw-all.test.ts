import { expect, it } from 'vitest';
import { DEFAULT_POLICY } from '../policy/policy.ts';
import { shownBed } from './shown-bed.ts';
import { withdrawAll } from './withdraw-all.ts';

it('takes everything away but the times, and leaves what never was', () => {
  const gas = {
    observationId: 'o',
    observedAt: '2026-03-05T11:00:00.000Z',
    recordedAt: '2026-03-05T11:00:00.000Z',
    recordedByInitials: 'AO',
    changedSinceAt: null,
    site: 'arterial',
    values: { ph: 7.2 },
    pfMmHg: null,
    ventilatoryRatio: null,
    minuteVolumeAtDrawLMin: null,
  };
  const stay = {
    stayId: 's',
    version: 1,
    admittedAt: '2026-03-05T08:00:00.000Z',
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
    check: null,
    device: null,
    airway: null,
    gas,
    ladder: DEFAULT_POLICY.freshness,
    plateauLimitCmH2O: 30,
    flags: [
      {
        id: 'ph-low',
        level: 'attention' as const,
        short: 'pH 7.20',
        sentence: '',
        source: '',
        from: ['gas' as const],
        inputs: [],
        fingerprint: 'f',
        acknowledged: null,
      },
    ],
    withdrawn: { check: '2026-03-05T02:10:00.000Z', airway: null, gas: null },
  };
  const bed = {
    bedId: 'b',
    unitId: 'u',
    label: '01',
    row: 1,
    column: 1,
    isOpen: true,
    revision: 1,
    stay,
    assignments: [],
    ventilator: null,
  };
  const { bed: shown, groups } = withdrawAll(shownBed({ bed, now: '2026-03-05T11:20:00Z' }));
  expect(shown.stay).toMatchObject({
    gas: null,
    flags: [],
    withdrawn: { check: '2026-03-05T02:10:00.000Z', airway: null, gas: '2026-03-05T11:00:00.000Z' },
  });
  expect([groups.check.state, groups.airway.state, groups.gas.state]).toEqual([
    'withdrawn',
    'never',
    'withdrawn',
  ]);
});
