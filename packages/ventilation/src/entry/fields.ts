/**
 * Every number that a person can enter: its words, unit, precision and limits.
 * `hard` refuses (the value is impossible or a slip); `soft` asks once, then keeps the answer.
 * The limits are ours (data-entry limits), not published clinical limits.
 */
export type NumberField = {
  label: string;
  /** Under the value where space is short. */
  short: string;
  unit: string;
  decimals: 0 | 1 | 2;
  /** One press of the keypad's − or +. */
  step: number;
  hard: readonly [number, number];
  soft?: readonly [number, number];
  /** The value must be a whole number of these (tube sizes come by 0.5). */
  multipleOf?: number;
  /** Ends in a zero that carries meaning: gases, tube sizes. All others drop trailing zeros. */
  keepsZeros?: true;
};

export const SETTING_FIELDS = {
  vtSetMl: {
    label: 'Tidal volume set',
    short: 'Vt set',
    unit: 'mL',
    decimals: 0,
    step: 10,
    hard: [20, 2000],
  },
  rateSetPerMin: {
    label: 'Rate set',
    short: 'set',
    unit: '/min',
    decimals: 0,
    step: 1,
    hard: [0, 80],
    soft: [8, 35],
  },
  pInspCmH2O: {
    label: 'Pressure above PEEP',
    short: 'P insp',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 120],
    soft: [5, 35],
  },
  psCmH2O: {
    label: 'Pressure support',
    short: 'PS',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 120],
    soft: [0, 25],
  },
  peepCmH2O: {
    label: 'PEEP',
    short: 'PEEP',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 40],
    soft: [5, 20],
  },
  fio2Percent: { label: 'Oxygen (FiO2)', short: '% O2', unit: '%', decimals: 0, step: 5, hard: [21, 100] },
  pHighCmH2O: {
    label: 'P high',
    short: 'P high',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 120],
    soft: [15, 35],
  },
  pLowCmH2O: {
    label: 'P low',
    short: 'P low',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 40],
    soft: [0, 10],
  },
  tHighS: {
    label: 'T high',
    short: 'T high',
    unit: 's',
    decimals: 1,
    step: 0.1,
    hard: [0.1, 30],
    soft: [2, 8],
  },
  tLowS: {
    label: 'T low',
    short: 'T low',
    unit: 's',
    decimals: 2,
    step: 0.05,
    hard: [0.1, 30],
    soft: [0.2, 1.5],
  },
  meanPressureCmH2O: {
    label: 'Mean pressure',
    short: 'mean P',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 120],
    soft: [15, 40],
  },
  amplitudeCmH2O: {
    label: 'Amplitude',
    short: 'ampl.',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 120],
    soft: [30, 100],
  },
  frequencyHz: {
    label: 'Frequency',
    short: 'Hz',
    unit: 'Hz',
    decimals: 1,
    step: 0.5,
    hard: [1, 20],
    soft: [3, 15],
  },
  biasFlowLMin: {
    label: 'Bias flow',
    short: 'bias',
    unit: 'L/min',
    decimals: 0,
    step: 1,
    hard: [0, 60],
    soft: [20, 40],
  },
  ipapCmH2O: {
    label: 'IPAP',
    short: 'IPAP',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 60],
    soft: [8, 25],
  },
  epapCmH2O: {
    label: 'EPAP',
    short: 'EPAP',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 40],
    soft: [4, 15],
  },
  cpapCmH2O: {
    label: 'CPAP',
    short: 'CPAP',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 40],
    soft: [4, 15],
  },
  flowLMin: {
    label: 'Flow',
    short: 'L/min',
    unit: 'L/min',
    decimals: 1,
    step: 1,
    hard: [0, 100],
    soft: [0.5, 60],
  },
  inspiratoryFlowLMin: {
    label: 'Inspiratory flow',
    short: 'flow',
    unit: 'L/min',
    decimals: 0,
    step: 5,
    hard: [5, 180],
    soft: [30, 100],
  },
  inspiratoryTimeS: {
    label: 'Inspiratory time',
    short: 'Ti',
    unit: 's',
    decimals: 2,
    step: 0.05,
    hard: [0.1, 10],
    soft: [0.5, 2],
  },
  riseS: { label: 'Rise time', short: 'rise', unit: 's', decimals: 2, step: 0.05, hard: [0, 2] },
  cyclePercent: {
    label: 'Cycle off',
    short: 'cycle',
    unit: '%',
    decimals: 0,
    step: 5,
    hard: [5, 80],
    soft: [10, 60],
  },
  pressureCeilingCmH2O: {
    label: 'Pressure ceiling',
    short: 'ceiling',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [5, 120],
    soft: [20, 45],
  },
  triggerLMin: {
    label: 'Flow trigger',
    short: 'trigger',
    unit: 'L/min',
    decimals: 1,
    step: 0.5,
    hard: [0.1, 20],
    soft: [0.5, 6],
  },
} as const satisfies Record<string, NumberField>;

export const READING_FIELDS = {
  vtExhaledMl: { label: 'Exhaled Vt', short: 'Vt', unit: 'mL', decimals: 0, step: 10, hard: [20, 2000] },
  vtSpontaneousMl: {
    label: 'Spontaneous Vt',
    short: 'Vt spont',
    unit: 'mL',
    decimals: 0,
    step: 10,
    hard: [20, 2000],
  },
  vtReleaseMl: {
    label: 'Release volume',
    short: 'release',
    unit: 'mL',
    decimals: 0,
    step: 10,
    hard: [20, 2000],
  },
  rateTotalPerMin: {
    label: 'Rate total',
    short: 'rate',
    unit: '/min',
    decimals: 0,
    step: 1,
    hard: [0, 80],
    soft: [8, 35],
  },
  minuteVolumeLMin: {
    label: 'Minute volume',
    short: 'MV',
    unit: 'L/min',
    decimals: 1,
    step: 0.5,
    hard: [0.1, 60],
    soft: [3, 20],
  },
  peakCmH2O: {
    label: 'Peak pressure',
    short: 'peak',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 120],
    soft: [10, 45],
  },
  plateauCmH2O: {
    label: 'Plateau',
    short: 'plateau',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 120],
    soft: [8, 35],
  },
  meanAirwayCmH2O: {
    label: 'Mean airway pressure',
    short: 'mean P',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 120],
    soft: [5, 30],
  },
  intrinsicPeepCmH2O: {
    label: 'Intrinsic PEEP',
    short: 'iPEEP',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 40],
    soft: [0, 10],
  },
  leakLMin: {
    label: 'Leak',
    short: 'leak',
    unit: 'L/min',
    decimals: 0,
    step: 1,
    hard: [0, 150],
    soft: [0, 60],
  },
  spo2Percent: {
    label: 'SpO2',
    short: 'SpO2',
    unit: '%',
    decimals: 0,
    step: 1,
    hard: [20, 100],
    soft: [80, 100],
  },
} as const satisfies Record<string, NumberField>;

/** Alarm limits as set on the ventilator. Each can also be recorded as off. */
export const LIMIT_FIELDS = {
  highPressureCmH2O: {
    label: 'High pressure limit',
    short: 'P high limit',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [5, 120],
    soft: [20, 60],
  },
  lowVtMl: {
    label: 'Low exhaled Vt limit',
    short: 'Vt low limit',
    unit: 'mL',
    decimals: 0,
    step: 10,
    hard: [5, 2000],
  },
  lowMinuteVolumeLMin: {
    label: 'Low minute volume limit',
    short: 'MV low limit',
    unit: 'L/min',
    decimals: 1,
    step: 0.5,
    hard: [0.1, 60],
    soft: [1, 15],
  },
  highMinuteVolumeLMin: {
    label: 'High minute volume limit',
    short: 'MV high limit',
    unit: 'L/min',
    decimals: 1,
    step: 0.5,
    hard: [0.1, 60],
    soft: [5, 30],
  },
  highRatePerMin: {
    label: 'High rate limit',
    short: 'rate high limit',
    unit: '/min',
    decimals: 0,
    step: 1,
    hard: [1, 150],
    soft: [20, 50],
  },
  apnoeaS: {
    label: 'Apnoea time',
    short: 'apnoea',
    unit: 's',
    decimals: 0,
    step: 5,
    hard: [3, 60],
    soft: [10, 30],
  },
} as const satisfies Record<string, NumberField>;

export const GAS_FIELDS = {
  ph: {
    label: 'pH',
    short: 'pH',
    unit: '',
    decimals: 2,
    step: 0.01,
    hard: [6.5, 8],
    soft: [7.1, 7.6],
    keepsZeros: true,
  },
  pco2MmHg: {
    label: 'PCO2',
    short: 'PCO2',
    unit: 'mmHg',
    decimals: 0,
    step: 1,
    hard: [5, 250],
    soft: [20, 100],
  },
  po2MmHg: {
    label: 'PO2',
    short: 'PO2',
    unit: 'mmHg',
    decimals: 0,
    step: 1,
    hard: [10, 700],
    soft: [40, 400],
  },
  bicarbonateMmolL: {
    label: 'HCO3',
    short: 'HCO3',
    unit: 'mmol/L',
    decimals: 1,
    step: 0.5,
    hard: [2, 70],
    soft: [10, 45],
  },
  baseExcessMmolL: {
    label: 'Base excess',
    short: 'BE',
    unit: 'mmol/L',
    decimals: 1,
    step: 0.5,
    hard: [-40, 40],
    soft: [-15, 15],
  },
  sao2Percent: {
    label: 'SaO2',
    short: 'SaO2',
    unit: '%',
    decimals: 0,
    step: 1,
    hard: [20, 100],
    soft: [80, 100],
  },
  lactateMmolL: {
    label: 'Lactate',
    short: 'lactate',
    unit: 'mmol/L',
    decimals: 1,
    step: 0.1,
    hard: [0, 40],
    soft: [0.3, 10],
    keepsZeros: true,
  },
  hbGL: { label: 'Hb', short: 'Hb', unit: 'g/L', decimals: 0, step: 1, hard: [20, 250], soft: [60, 180] },
  fio2Percent: SETTING_FIELDS.fio2Percent,
  peepCmH2O: SETTING_FIELDS.peepCmH2O,
} as const satisfies Record<string, NumberField>;

export const AIRWAY_FIELDS = {
  sizeMm: {
    label: 'Tube size (inner diameter)',
    short: 'tube',
    unit: 'mm',
    decimals: 1,
    step: 0.5,
    hard: [2, 10],
    soft: [6, 9],
    multipleOf: 0.5,
    keepsZeros: true,
  },
  depthCm: {
    label: 'Depth',
    short: 'depth',
    unit: 'cm',
    decimals: 1,
    step: 0.5,
    hard: [5, 35],
    soft: [18, 27],
  },
  cuffCmH2O: {
    label: 'Cuff pressure',
    short: 'cuff',
    unit: 'cmH2O',
    decimals: 0,
    step: 1,
    hard: [0, 120],
    soft: [15, 35],
  },
} as const satisfies Record<string, NumberField>;

export const PATIENT_FIELDS = {
  heightCm: {
    label: 'Height',
    short: 'height',
    unit: 'cm',
    decimals: 0,
    step: 1,
    hard: [120, 230],
    soft: [140, 205],
  },
} as const satisfies Record<string, NumberField>;

/** Of a breathing trial, in whole minutes. @source length: Esteban A et al., Am J Respir Crit Care Med 1999;159:512–8. */
export const TRIAL_FIELDS = {
  plannedMinutes: {
    label: 'Planned for',
    short: 'planned',
    unit: 'min',
    decimals: 0,
    step: 5,
    hard: [5, 720],
    soft: [30, 120],
  },
  minutes: {
    label: 'Went on for',
    short: 'minutes',
    unit: 'min',
    decimals: 0,
    step: 1,
    hard: [1, 1440],
    soft: [30, 120],
  },
} as const satisfies Record<string, NumberField>;

/** Signs of infection that are entered by hand, for surveillance. Limits are ours, for entry. */
export const SIGN_FIELDS = {
  temperatureC: {
    label: 'Temperature',
    short: 'temp',
    unit: '°C',
    decimals: 1,
    step: 0.1,
    hard: [25, 45],
    soft: [34, 41],
    keepsZeros: true,
  },
  whiteCellsPerMm3: {
    label: 'White cells',
    short: 'WBC',
    unit: '/mm3',
    decimals: 0,
    step: 100,
    hard: [0, 500_000],
    soft: [500, 60_000],
  },
} as const satisfies Record<string, NumberField>;

export type SettingKey = keyof typeof SETTING_FIELDS;
export type ReadingKey = keyof typeof READING_FIELDS;
export type LimitKey = keyof typeof LIMIT_FIELDS;
export type GasKey = keyof typeof GAS_FIELDS;

/** "21 to 100 %": how a limit is said to a person. */
export function rangeInWords(field: NumberField): string {
  const [low, high] = field.hard;
  const unit = field.unit ? ` ${field.unit}` : '';
  return `${low} to ${high}${unit}${field.multipleOf ? ` in steps of ${field.multipleOf}` : ''}`;
}

/** Whether a value that is possible is still odd enough to be asked about once. */
export function isUnusual(field: NumberField, value: number): boolean {
  return field.soft !== undefined && (value < field.soft[0] || value > field.soft[1]);
}
