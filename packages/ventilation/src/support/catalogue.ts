import type { LimitKey, ReadingKey, SettingKey } from '../entry/fields.ts';

/** What a mode is for the census: only `invasive` and `mask` count as "on a ventilator". */
export type SupportKind = 'invasive' | 'mask' | 'high-flow' | 'oxygen' | 'none';

/** What the ventilator fixes from breath to breath; decides which alarm limits must be set. */
export type Control = 'volume' | 'pressure' | 'adaptive-pressure' | 'oscillation' | 'none';

export type SupportEntry = {
  /** Stable for ever; sites may relabel and hide, never renumber. */
  id: string;
  shortName: string;
  fullName: string;
  kind: SupportKind;
  /** Breath sequence, in the words of ISO 19223 and the published mode taxonomy. */
  sequence: 'CMV' | 'IMV' | 'CSV' | 'oscillation' | null;
  control: Control;
  required: readonly SettingKey[];
  optional: readonly SettingKey[];
  readings: readonly ReadingKey[];
  /** The readings that this mode does not fix, so that somebody must watch them. */
  watched: readonly ReadingKey[];
  limits: readonly LimitKey[];
  /** Limits without which the mode must not run unattended; the limit audit asks for them. */
  requiredLimits: readonly LimitKey[];
  /** Whether a plateau read in this mode can mean anything (a pause needs a passive patient). */
  wantsInterface: boolean;
};

const PRESSURE_LIMITS = [
  'highPressureCmH2O',
  'lowVtMl',
  'lowMinuteVolumeLMin',
  'highMinuteVolumeLMin',
  'highRatePerMin',
] as const;
const CONTROLLED_READINGS = [
  'vtExhaledMl',
  'rateTotalPerMin',
  'minuteVolumeLMin',
  'peakCmH2O',
  'plateauCmH2O',
  'meanAirwayCmH2O',
  'intrinsicPeepCmH2O',
  'spo2Percent',
] as const;
const SPONTANEOUS_READINGS = [
  'vtExhaledMl',
  'rateTotalPerMin',
  'minuteVolumeLMin',
  'peakCmH2O',
  'meanAirwayCmH2O',
  'spo2Percent',
] as const;
const MASK_READINGS = [
  'vtExhaledMl',
  'rateTotalPerMin',
  'minuteVolumeLMin',
  'leakLMin',
  'spo2Percent',
] as const;
const OXYGEN_READINGS = ['rateTotalPerMin', 'spo2Percent'] as const;

const NO_LIMITS = { limits: [], requiredLimits: [] } as const;

/**
 * Everything that a patient can breathe with here, in the order in which staff choose it.
 *
 * @source mode classes: Chatburn, mode taxonomy (VC/PC – CMV/IMV/CSV); scope words from ISO 19223:2019.
 */
export const SUPPORT_CATALOGUE = [
  {
    id: 'ac-vc',
    shortName: 'AC/VC',
    fullName: 'Assist-control, volume',
    kind: 'invasive',
    sequence: 'CMV',
    control: 'volume',
    required: ['vtSetMl', 'rateSetPerMin', 'peepCmH2O', 'fio2Percent'],
    optional: ['inspiratoryFlowLMin', 'inspiratoryTimeS', 'triggerLMin'],
    readings: CONTROLLED_READINGS,
    watched: ['peakCmH2O', 'plateauCmH2O'],
    limits: [...PRESSURE_LIMITS, 'apnoeaS'],
    requiredLimits: ['highPressureCmH2O'],
    wantsInterface: false,
  },
  {
    id: 'ac-pc',
    shortName: 'AC/PC',
    fullName: 'Assist-control, pressure',
    kind: 'invasive',
    sequence: 'CMV',
    control: 'pressure',
    required: ['pInspCmH2O', 'rateSetPerMin', 'peepCmH2O', 'fio2Percent'],
    optional: ['inspiratoryTimeS', 'riseS', 'triggerLMin'],
    readings: CONTROLLED_READINGS,
    watched: ['vtExhaledMl', 'minuteVolumeLMin'],
    limits: [...PRESSURE_LIMITS, 'apnoeaS'],
    requiredLimits: ['lowVtMl', 'lowMinuteVolumeLMin'],
    wantsInterface: false,
  },
  {
    id: 'ac-vtpc',
    shortName: 'AC/PC-VT',
    fullName: 'Assist-control, pressure, volume-targeted',
    kind: 'invasive',
    sequence: 'CMV',
    control: 'adaptive-pressure',
    required: ['vtSetMl', 'rateSetPerMin', 'peepCmH2O', 'fio2Percent'],
    optional: ['inspiratoryTimeS', 'pressureCeilingCmH2O', 'triggerLMin'],
    readings: CONTROLLED_READINGS,
    watched: ['vtExhaledMl', 'peakCmH2O'],
    limits: [...PRESSURE_LIMITS, 'apnoeaS'],
    requiredLimits: ['highPressureCmH2O', 'lowVtMl'],
    wantsInterface: false,
  },
  {
    id: 'simv-vc',
    shortName: 'SIMV/VC',
    fullName: 'Synchronised intermittent mandatory, volume',
    kind: 'invasive',
    sequence: 'IMV',
    control: 'volume',
    required: ['vtSetMl', 'rateSetPerMin', 'psCmH2O', 'peepCmH2O', 'fio2Percent'],
    optional: ['inspiratoryFlowLMin', 'inspiratoryTimeS', 'triggerLMin'],
    readings: [...CONTROLLED_READINGS, 'vtSpontaneousMl'],
    watched: ['rateTotalPerMin', 'vtSpontaneousMl', 'peakCmH2O'],
    limits: [...PRESSURE_LIMITS, 'apnoeaS'],
    requiredLimits: ['highPressureCmH2O', 'highRatePerMin'],
    wantsInterface: false,
  },
  {
    id: 'simv-pc',
    shortName: 'SIMV/PC',
    fullName: 'Synchronised intermittent mandatory, pressure',
    kind: 'invasive',
    sequence: 'IMV',
    control: 'pressure',
    required: ['pInspCmH2O', 'rateSetPerMin', 'psCmH2O', 'peepCmH2O', 'fio2Percent'],
    optional: ['inspiratoryTimeS', 'riseS', 'triggerLMin'],
    readings: [...CONTROLLED_READINGS, 'vtSpontaneousMl'],
    watched: ['vtExhaledMl', 'rateTotalPerMin'],
    limits: [...PRESSURE_LIMITS, 'apnoeaS'],
    requiredLimits: ['lowVtMl', 'lowMinuteVolumeLMin'],
    wantsInterface: false,
  },
  {
    id: 'psv',
    shortName: 'PSV',
    fullName: 'Pressure support',
    kind: 'invasive',
    sequence: 'CSV',
    control: 'pressure',
    required: ['psCmH2O', 'peepCmH2O', 'fio2Percent'],
    optional: ['cyclePercent', 'riseS', 'triggerLMin'],
    readings: SPONTANEOUS_READINGS,
    watched: ['vtExhaledMl', 'rateTotalPerMin'],
    limits: [...PRESSURE_LIMITS, 'apnoeaS'],
    requiredLimits: ['apnoeaS', 'lowVtMl'],
    wantsInterface: false,
  },
  {
    id: 'cpap',
    shortName: 'CPAP',
    fullName: 'Continuous positive airway pressure, tube',
    kind: 'invasive',
    sequence: 'CSV',
    control: 'none',
    required: ['peepCmH2O', 'fio2Percent'],
    optional: ['triggerLMin'],
    readings: SPONTANEOUS_READINGS,
    watched: ['rateTotalPerMin'],
    limits: [...PRESSURE_LIMITS, 'apnoeaS'],
    requiredLimits: ['apnoeaS'],
    wantsInterface: false,
  },
  {
    id: 'aprv',
    shortName: 'APRV',
    fullName: 'Airway pressure release',
    kind: 'invasive',
    sequence: 'IMV',
    control: 'pressure',
    required: ['pHighCmH2O', 'pLowCmH2O', 'tHighS', 'tLowS', 'fio2Percent'],
    optional: [],
    readings: ['vtReleaseMl', 'rateTotalPerMin', 'minuteVolumeLMin', 'meanAirwayCmH2O', 'spo2Percent'],
    watched: ['vtReleaseMl', 'minuteVolumeLMin'],
    limits: [...PRESSURE_LIMITS, 'apnoeaS'],
    requiredLimits: ['lowMinuteVolumeLMin'],
    wantsInterface: false,
  },
  {
    id: 'hfov',
    shortName: 'HFOV',
    fullName: 'High-frequency oscillation',
    kind: 'invasive',
    sequence: 'oscillation',
    control: 'oscillation',
    required: ['meanPressureCmH2O', 'amplitudeCmH2O', 'frequencyHz', 'fio2Percent'],
    optional: ['biasFlowLMin'],
    readings: ['spo2Percent'],
    watched: [],
    ...NO_LIMITS,
    wantsInterface: false,
  },
  {
    id: 'niv-st',
    shortName: 'Mask S/T',
    fullName: 'Mask, spontaneous-timed',
    kind: 'mask',
    sequence: 'IMV',
    control: 'pressure',
    required: ['ipapCmH2O', 'epapCmH2O', 'rateSetPerMin', 'fio2Percent'],
    optional: ['inspiratoryTimeS', 'riseS'],
    readings: MASK_READINGS,
    watched: ['leakLMin', 'vtExhaledMl'],
    limits: ['highPressureCmH2O', 'lowVtMl', 'lowMinuteVolumeLMin', 'highRatePerMin', 'apnoeaS'],
    requiredLimits: ['lowMinuteVolumeLMin'],
    wantsInterface: true,
  },
  {
    id: 'niv-cpap',
    shortName: 'Mask CPAP',
    fullName: 'Mask, continuous positive airway pressure',
    kind: 'mask',
    sequence: 'CSV',
    control: 'none',
    required: ['cpapCmH2O', 'fio2Percent'],
    optional: [],
    readings: MASK_READINGS,
    watched: ['leakLMin'],
    limits: ['highRatePerMin', 'apnoeaS'],
    requiredLimits: [],
    wantsInterface: true,
  },
  {
    id: 'hfnc',
    shortName: 'HFNC',
    fullName: 'High-flow nasal',
    kind: 'high-flow',
    sequence: null,
    control: 'none',
    required: ['flowLMin', 'fio2Percent'],
    optional: [],
    readings: OXYGEN_READINGS,
    watched: ['rateTotalPerMin', 'spo2Percent'],
    ...NO_LIMITS,
    wantsInterface: false,
  },
  {
    id: 'tpiece',
    shortName: 'T-piece',
    fullName: 'T-piece',
    kind: 'oxygen',
    sequence: null,
    control: 'none',
    required: ['fio2Percent'],
    optional: ['flowLMin'],
    readings: OXYGEN_READINGS,
    watched: ['rateTotalPerMin'],
    ...NO_LIMITS,
    wantsInterface: false,
  },
  {
    id: 'trach-collar',
    shortName: 'Collar',
    fullName: 'Tracheostomy collar',
    kind: 'oxygen',
    sequence: null,
    control: 'none',
    required: ['fio2Percent'],
    optional: ['flowLMin'],
    readings: OXYGEN_READINGS,
    watched: ['rateTotalPerMin'],
    ...NO_LIMITS,
    wantsInterface: false,
  },
  {
    id: 'low-flow',
    shortName: 'Oxygen',
    fullName: 'Low-flow oxygen',
    kind: 'oxygen',
    sequence: null,
    control: 'none',
    required: ['flowLMin'],
    optional: ['fio2Percent'],
    readings: OXYGEN_READINGS,
    watched: ['spo2Percent'],
    ...NO_LIMITS,
    wantsInterface: false,
  },
  {
    id: 'room-air',
    shortName: 'Room air',
    fullName: 'Room air',
    kind: 'none',
    sequence: null,
    control: 'none',
    required: [],
    optional: [],
    readings: OXYGEN_READINGS,
    watched: ['spo2Percent'],
    ...NO_LIMITS,
    wantsInterface: false,
  },
] as const satisfies readonly SupportEntry[];

export type SupportId = (typeof SUPPORT_CATALOGUE)[number]['id'];

export const SUPPORT_IDS = SUPPORT_CATALOGUE.map((entry) => entry.id) as readonly SupportId[];

const byId: ReadonlyMap<string, SupportEntry> = new Map(SUPPORT_CATALOGUE.map((entry) => [entry.id, entry]));

/** The catalogue's entry for an id. Throws `RangeError` on an id that never was in the catalogue. */
export function supportEntry(id: SupportId): SupportEntry {
  const entry = byId.get(id);
  if (!entry) throw new RangeError(`support must be one of ${SUPPORT_IDS.join(', ')}, not ${String(id)}`);
  return entry;
}

/** Invasive and mask ventilation; what every count of "on a ventilator" means. */
export function isOnVentilator(id: SupportId): boolean {
  const { kind } = supportEntry(id);
  return kind === 'invasive' || kind === 'mask';
}
