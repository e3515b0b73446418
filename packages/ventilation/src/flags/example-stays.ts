import { deriveCheck } from '../board/derive-check.ts';
import { deriveGas } from '../board/derive-gas.ts';
import type { BedAirway, BedCheck, BedGas, BedStay, Flag } from '../contract/board.ts';
import { DEFAULT_POLICY } from '../policy/policy.ts';
import { type SupportId, supportEntry } from '../support/catalogue.ts';
import { bedFlags } from './bed-flags.ts';

// Stays with one thing in them, for the tests of the rules.

export const AT = '2026-03-05T10:00:00Z';
export const STAMP = {
  observationId: 'o1',
  observedAt: AT,
  recordedAt: AT,
  recordedByInitials: 'AO',
  changedSinceAt: null,
};
/** A hundred, so that a volume in mL is a hundred times its volume per kg. */
export const WEIGHT_KG = 100;

export const EMPTY: Omit<BedStay, 'flags'> = {
  stayId: 's1',
  version: 1,
  admittedAt: AT,
  patient: null,
  predictedBodyWeightKg: WEIGHT_KG,
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
  gas: null,
  ladder: DEFAULT_POLICY.freshness,
  plateauLimitCmH2O: 30,
  withdrawn: { check: null, airway: null, gas: null },
};

export type CheckParts = Partial<
  Pick<BedCheck, 'mode' | 'settings' | 'readings' | 'limits' | 'passive' | 'changedSinceAt'>
>;

export const QUIET_LIMITS: BedCheck['limits'] = {
  highPressureCmH2O: 120,
  lowVtMl: 5,
  lowMinuteVolumeLMin: 0.1,
  highRatePerMin: 150,
  apnoeaS: 20,
};

export function check(parts: CheckParts): Omit<BedStay, 'flags'> {
  const mode = parts.mode ?? 'ac-vc';
  const core = {
    mode,
    settings: parts.settings ?? {},
    readings: parts.readings ?? {},
    passive: parts.passive ?? null,
  };
  return {
    ...EMPTY,
    support: { id: mode, shortName: supportEntry(mode).shortName, sinceAt: AT },
    check: {
      ...STAMP,
      changedSinceAt: parts.changedSinceAt ?? null,
      ...core,
      limits: parts.limits ?? QUIET_LIMITS,
      interface: null,
      derived: deriveCheck({ check: core, predictedBodyWeightKg: WEIGHT_KG }),
    },
  };
}

export function gas(
  values: BedGas['values'],
  { site = 'arterial', changedSinceAt = null as string | null } = {},
) {
  const { pco2MmHg = 40, po2MmHg = 200, fio2Percent } = values;
  const derived = deriveGas({
    gas: { site, pco2MmHg, po2MmHg, fio2Percent },
    predictedBodyWeightKg: null,
    minuteVolumeLMin: null,
  });
  return { ...EMPTY, gas: { ...STAMP, changedSinceAt, site, values, ...derived } };
}

export function airway(found: Partial<BedAirway>, device: Partial<NonNullable<BedStay['device']>> = {}) {
  return {
    ...EMPTY,
    device: {
      observationId: 'd1',
      placedAt: AT,
      kind: 'oral-tube',
      sizeMm: 7.5,
      depthCm: 22,
      depthMark: 'lip',
      cuffed: true,
      subglotticPort: null,
      ...device,
    },
    airway: {
      ...STAMP,
      depthCm: null,
      cuffCmH2O: null,
      cuffMethod: null,
      position: null,
      secured: null,
      ...found,
    },
  };
}

export function flagsOf(stay: Omit<BedStay, 'flags'>): Flag[] {
  return bedFlags({ stay, thresholds: DEFAULT_POLICY.thresholds });
}

export function ids(stay: Omit<BedStay, 'flags'>): string[] {
  return flagsOf(stay).map(({ id }) => id);
}

export const VC = { vtSetMl: 450, rateSetPerMin: 18, peepCmH2O: 5, fio2Percent: 40 };
export const PSV = { psCmH2O: 8, peepCmH2O: 5, fio2Percent: 40 };

export function vt(vtExhaledMl: number, mode: SupportId = 'ac-vc') {
  return check({ mode, settings: mode === 'psv' ? PSV : VC, readings: { vtExhaledMl } });
}
export function pause(plateauCmH2O: number, more: CheckParts = {}) {
  const settings = { ...VC, peepCmH2O: 20 };
  return check({ settings, readings: { plateauCmH2O, vtExhaledMl: 400 }, passive: true, ...more });
}
/** Power is 0.098 × rate × volume × 25 cmH2O here. */
export function power(ratePerMin: number) {
  return check({
    mode: 'ac-pc',
    settings: { pInspCmH2O: 15, peepCmH2O: 10, fio2Percent: 40, rateSetPerMin: 18 },
    readings: { vtExhaledMl: 400, rateTotalPerMin: ratePerMin },
    passive: true,
  });
}
export function readings(values: BedCheck['readings'], more: CheckParts = {}) {
  return check({ settings: VC, readings: values, ...more });
}
export function limited(
  limits: BedCheck['limits'],
  values: BedCheck['readings'] = {},
  more: CheckParts = {},
) {
  return check({ settings: VC, readings: values, limits: { ...QUIET_LIMITS, ...limits }, ...more });
}
/** Resistance 10, compliance 50: a time constant of half a second, so 1.5 s are needed; 0.5 s to breathe in. */
export function emptying(ratePerMin: number) {
  return check({
    settings: { ...VC, vtSetMl: 500, inspiratoryFlowLMin: 60, inspiratoryTimeS: 0.5 },
    readings: { vtExhaledMl: 500, plateauCmH2O: 15, peakCmH2O: 25, rateTotalPerMin: ratePerMin },
    passive: true,
  });
}
