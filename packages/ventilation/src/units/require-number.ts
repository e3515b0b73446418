/** Lowest and highest accepted value, both included. */
export type Range = readonly [low: number, high: number];

/**
 * What a calculation accepts for each key: impossible values and values in the wrong unit are refused,
 * unusual patients are not. Entry on a screen is narrower. Where a calculation divides by a value,
 * it narrows the range itself.
 *
 * @source our own input limits, not clinical limits.
 */
const ACCEPTED = {
  heightCm: [100, 250],
  predictedBodyWeightKg: [1, 150],
  tidalVolumeMl: [1, 3000],
  ratePerMin: [0, 200],
  minuteVentilationLMin: [0, 300],
  inspiratoryTimeS: [0.05, 60],
  inspiratoryFlowLMin: [1, 300],
  peakCmH2O: [0, 120],
  plateauCmH2O: [0, 120],
  peepCmH2O: [0, 120],
  totalPeepCmH2O: [0, 120],
  inspiratoryPressureCmH2O: [0, 120],
  meanAirwayPressureCmH2O: [0, 120],
  complianceMlCmH2O: [0.1, 500],
  resistanceCmH2OPerLS: [0, 500],
  ph: [6.5, 8],
  paco2MmHg: [5, 250],
  targetPaco2MmHg: [5, 250],
  mixedExpiredPco2MmHg: [0, 250],
  pao2MmHg: [10, 700],
  pfMmHg: [1, 4000],
  bicarbonateMmolL: [1, 100],
  spo2Percent: [20, 100],
  fio2: [0.21, 1],
  barometricMmHg: [200, 900],
  respiratoryQuotient: [0.5, 1.5],
  tubeInternalDiameterMm: [2, 12],
  flowLMin: [0, 300],
  totalFlowLMin: [0, 1000],
  airLMin: [0, 1000],
  oxygenLMin: [0, 1000],
  pressurePsi: [0, 5000],
  reservePsi: [0, 5000],
  heartRatePerMin: [0, 350],
} as const satisfies Record<string, Range>;

type Accepted = typeof ACCEPTED;

/**
 * Refuses text, missing, not-a-number, infinite and impossible values.
 *
 * @throws RangeError naming the key, the value and the accepted range.
 */
export function requireNumber(key: string, value: unknown, [low, high]: Range): void {
  if (typeof value === 'number' && value >= low && value <= high) return;
  throw new RangeError(`${key} must be a number from ${low} to ${high}, not ${shown(value)}`);
}

/**
 * Checks several keys at once against the table above, or against a narrower range where one is given.
 *
 * @throws RangeError as `requireNumber`.
 */
export function requireNumbers(
  inputs: { readonly [K in keyof Accepted]?: unknown },
  narrower: { readonly [K in keyof Accepted]?: Range } = {},
): void {
  const ranges: Readonly<Record<string, Range>> = { ...ACCEPTED, ...narrower };
  for (const [key, value] of Object.entries(inputs)) {
    requireNumber(key, value, ranges[key] ?? [Number.NaN, Number.NaN]);
  }
}

/** As `requireNumber`, for counts and scores that come in whole numbers. */
export function requireWholeNumber(key: string, value: unknown, [low, high]: Range): void {
  if (Number.isInteger(value) && Number(value) >= low && Number(value) <= high) return;
  throw new RangeError(`${key} must be a whole number from ${low} to ${high}, not ${shown(value)}`);
}

/** A refused value as a person can recognise it: text keeps its quotes. */
export function shown(value: unknown): string {
  return typeof value === 'string' ? JSON.stringify(value) : String(value);
}
