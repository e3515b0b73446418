import { READING_FIELDS, type ReadingKey, type SettingKey } from '@windrow/ventilation/entry/fields';
import { saturationOf } from './blood.ts';
import type { Lung, Phase } from './plan.ts';
import type { Random } from './random.ts';

export type Settings = Partial<Record<SettingKey, number>>;
export type Readings = Partial<Record<ReadingKey, number>>;
type Breath = { phase: Phase; settings: Settings; lung: Lung; weightKg: number; random: Random };

/** What somebody would read from the ventilator: pressures follow from volume, compliance, resistance and flow. */
export function readingsOf(breath: Breath): Readings {
  return rounded({ ...pressuresAndVolumes(breath), spo2Percent: saturationRead(breath) });
}

/** The oxygen that is really breathed, also where nobody sets it. */
export function breathedOxygenPercent({ mode, settings }: Pick<Phase, 'mode' | 'settings'>): number {
  if (mode === 'room-air') return 21;
  return settings.fio2Percent ?? Math.min(44, 20 + 4 * (settings.flowLMin ?? 0));
}

/** The volume that is set, to the nearest press of a key. */
export function setVolume(phase: Phase, weightKg: number): number | undefined {
  const isSet = phase.mode === 'ac-vc' || phase.mode === 'ac-vtpc' || phase.mode === 'simv-vc';
  return isSet && phase.perKgMl !== undefined ? Math.round((phase.perKgMl * weightKg) / 10) * 10 : undefined;
}

function pressuresAndVolumes(breath: Breath): Readings {
  const { phase, settings } = breath;
  switch (phase.mode) {
    case 'ac-vc':
      return volumeControlled(breath);
    case 'simv-vc':
      return withOwnBreaths(breath, withoutPause(volumeControlled(breath)));
    case 'ac-pc':
      return pressureControlled(breath, settings.pInspCmH2O ?? 0);
    case 'simv-pc':
      return withOwnBreaths(breath, withoutPause(pressureControlled(breath, settings.pInspCmH2O ?? 0)));
    case 'ac-vtpc':
      return volumeTargeted(breath);
    case 'psv':
      return spontaneous(breath, settings.psCmH2O ?? 0);
    case 'cpap':
      return spontaneous(breath, 0);
    case 'aprv':
      return released(breath);
    case 'niv-st':
    case 'niv-cpap':
      return masked(breath);
    case 'hfov':
      return {};
    default:
      return { rateTotalPerMin: rateRead(breath) };
  }
}

function volumeControlled({ settings, phase, lung, random }: Breath): Readings {
  const vtExhaledMl = Math.round((settings.vtSetMl ?? 0) * (0.985 + random.around(0.01)));
  const flowLS = (settings.inspiratoryFlowLMin ?? 60) / 60;
  const intrinsic = lung.intrinsicPeepCmH2O ?? random.whole(0, 1);
  const peep = settings.peepCmH2O ?? 0;
  const plateau = peep + intrinsic + vtExhaledMl / lung.complianceMlCmH2O;
  const inspired = (vtExhaledMl / 1000 / flowLS) * (phase.ratePerMin / 60);
  return {
    vtExhaledMl,
    rateTotalPerMin: phase.ratePerMin,
    minuteVolumeLMin: (vtExhaledMl * phase.ratePerMin) / 1000,
    peakCmH2O: Math.round(plateau) + Math.round(lung.resistanceCmH2OPerLS * flowLS),
    plateauCmH2O: plateau,
    meanAirwayCmH2O: peep + (plateau - peep) * Math.min(0.6, inspired) + 1,
    intrinsicPeepCmH2O: intrinsic,
  };
}

function pressureControlled(
  { settings, phase, lung, weightKg, random }: Breath,
  abovePeep: number,
): Readings {
  const peep = settings.peepCmH2O ?? 0;
  const intrinsic = lung.intrinsicPeepCmH2O ?? random.whole(0, 1);
  const fromLung = lung.complianceMlCmH2O * (abovePeep - intrinsic) * (1 + random.around(0.015));
  const vtExhaledMl = phase.perKgMl === undefined ? fromLung : phase.perKgMl * weightKg;
  const inspired = Math.min(0.6, ((settings.inspiratoryTimeS ?? 0.9) * phase.ratePerMin) / 60);
  return {
    vtExhaledMl,
    rateTotalPerMin: phase.ratePerMin,
    minuteVolumeLMin: (Math.round(vtExhaledMl) * phase.ratePerMin) / 1000,
    peakCmH2O: peep + abovePeep + 1,
    plateauCmH2O: peep + abovePeep,
    meanAirwayCmH2O: peep + abovePeep * inspired,
    intrinsicPeepCmH2O: intrinsic,
  };
}

/** The ventilator takes the pressure that the volume needs. */
function volumeTargeted(breath: Breath): Readings {
  const { settings, lung, random } = breath;
  const vtExhaledMl = Math.round((settings.vtSetMl ?? 0) * (1 + random.around(0.03)));
  const above = Math.max(5, Math.round(vtExhaledMl / lung.complianceMlCmH2O) + 1);
  return {
    ...pressureControlled(breath, above),
    vtExhaledMl,
    minuteVolumeLMin: (vtExhaledMl * breath.phase.ratePerMin) / 1000,
  };
}

/** A pause tells nothing while the patient breathes in between. */
function withoutPause({
  plateauCmH2O: _plateau,
  intrinsicPeepCmH2O: _intrinsic,
  ...rest
}: Readings): Readings {
  return rest;
}

function withOwnBreaths(breath: Breath, mandatory: Readings): Readings {
  const { phase, settings, weightKg } = breath;
  const rateTotalPerMin = rateRead(breath);
  const set = settings.rateSetPerMin ?? 0;
  const vtSpontaneousMl = Math.round((phase.ownPerKgMl ?? 4) * weightKg * (1 + breath.random.around(0.05)));
  const own = Math.max(0, rateTotalPerMin - set) * vtSpontaneousMl;
  return {
    ...mandatory,
    vtSpontaneousMl,
    rateTotalPerMin,
    minuteVolumeLMin: (set * (mandatory.vtExhaledMl ?? 0) + own) / 1000,
  };
}

function spontaneous(breath: Breath, support: number): Readings {
  const peep = breath.settings.peepCmH2O ?? 0;
  const rateTotalPerMin = rateRead(breath);
  const vtExhaledMl = ownVolume(breath);
  return {
    vtExhaledMl,
    rateTotalPerMin,
    minuteVolumeLMin: (rateTotalPerMin * vtExhaledMl) / 1000,
    peakCmH2O: peep + support + 1,
    meanAirwayCmH2O: peep + support / 3,
  };
}

function released(breath: Breath): Readings {
  const { pHighCmH2O: high = 0, pLowCmH2O: low = 0, tHighS = 1, tLowS = 1 } = breath.settings;
  const vtReleaseMl = ownVolume(breath);
  const releases = 60 / (tHighS + tLowS);
  const rateTotalPerMin = rateRead(breath);
  const own = Math.max(0, rateTotalPerMin - releases) * (breath.phase.ownPerKgMl ?? 0) * breath.weightKg;
  return {
    vtReleaseMl,
    rateTotalPerMin,
    minuteVolumeLMin: (releases * vtReleaseMl + own) / 1000,
    meanAirwayCmH2O: (high * tHighS + low * tLowS) / (tHighS + tLowS),
  };
}

function masked(breath: Breath): Readings {
  const vtExhaledMl = ownVolume(breath);
  const rateTotalPerMin = rateRead(breath);
  return {
    vtExhaledMl,
    rateTotalPerMin,
    minuteVolumeLMin: (rateTotalPerMin * vtExhaledMl) / 1000,
    leakLMin: (breath.phase.leakLMin ?? 15) + breath.random.whole(-3, 3),
  };
}

function ownVolume({ phase, weightKg, random }: Breath): number {
  return Math.round((phase.perKgMl ?? 6) * weightKg * (1 + random.around(0.02)));
}

function rateRead({ phase, random }: Breath): number {
  return phase.ratePerMin + random.whole(-1, 1);
}

function saturationRead({ phase, lung, random }: Breath): number {
  const pressure = (lung.pfMmHg * breathedOxygenPercent(phase)) / 100;
  return Math.min(100, Math.max(84, Math.round(saturationOf(pressure)) + random.whole(-1, 1)));
}

function rounded(readings: Readings): Readings {
  const kept: Readings = {};
  for (const key of READING_KEYS) {
    const value = readings[key];
    if (value !== undefined) kept[key] = Number(value.toFixed(READING_FIELDS[key].decimals));
  }
  return kept;
}

const READING_KEYS = [
  'vtExhaledMl',
  'vtSpontaneousMl',
  'vtReleaseMl',
  'rateTotalPerMin',
  'minuteVolumeLMin',
  'peakCmH2O',
  'plateauCmH2O',
  'meanAirwayCmH2O',
  'intrinsicPeepCmH2O',
  'leakLMin',
  'spo2Percent',
] as const satisfies readonly ReadingKey[];
