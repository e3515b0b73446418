/**
 * The published signs by which a breathing trial fails: against a fixed limit, against the value at its
 * start, or seen.
 *
 * @source Boles JM et al., Eur Respir J 2007;29:1033–56, table 6.
 */
export const FAILURE_CRITERIA = {
  rate: { label: 'Rate above 35 /min, or up by half' },
  'rate-over-vt': { label: 'Rate over Vt above 105 /min/L' },
  oxygenation: { label: 'SaO2 below 90 %, or PaO2 at most 60 mmHg on 50 % oxygen or more' },
  'carbon-dioxide': { label: 'PaCO2 above 50 mmHg, or up by more than 8' },
  ph: { label: 'pH below 7.32, or down by 0.07 or more' },
  'heart-rate': { label: 'Heart rate above 140 /min, or up by a fifth' },
  'blood-pressure': { label: 'Systolic above 180 or below 90 mmHg, or up by a fifth' },
  arrhythmia: { label: 'Arrhythmia' },
  agitation: { label: 'Agitation, anxiety or sweating' },
  mentation: { label: 'Less awake' },
  effort: { label: 'Effort seen: accessory muscles, distress' },
} as const satisfies Record<string, { label: string }>;
export type FailureCriterion = keyof typeof FAILURE_CRITERIA;

export const FAILURE_CRITERION_IDS = Object.keys(FAILURE_CRITERIA) as [
  FailureCriterion,
  ...FailureCriterion[],
];

/** What can be measured in a trial. A missing value says nothing, for or against. */
export type TrialMeasurements = {
  ratePerMin?: number;
  rsbiPerMinL?: number;
  /** Measured in blood, or by the oximeter where no gas was drawn. */
  sao2Percent?: number;
  pao2MmHg?: number;
  fio2Percent?: number;
  paco2MmHg?: number;
  ph?: number;
  heartRatePerMin?: number;
  systolicMmHg?: number;
};

type Fails = (now: TrialMeasurements, start: TrialMeasurements) => boolean;

const MEASURED: readonly (readonly [FailureCriterion, Fails])[] = [
  ['rate', (now, start) => above(now.ratePerMin, 35) || rose(now.ratePerMin, start.ratePerMin, 0.5)],
  ['rate-over-vt', (now) => above(now.rsbiPerMinL, 105)],
  [
    'oxygenation',
    (now) => below(now.sao2Percent, 90) || (atMost(now.pao2MmHg, 60) && atLeast(now.fio2Percent, 50)),
  ],
  [
    'carbon-dioxide',
    (now, start) => above(now.paco2MmHg, 50) || above(difference(now.paco2MmHg, start.paco2MmHg), 8),
  ],
  ['ph', (now, start) => below(now.ph, 7.32) || atLeast(difference(start.ph, now.ph), 0.07)],
  [
    'heart-rate',
    (now, start) => above(now.heartRatePerMin, 140) || rose(now.heartRatePerMin, start.heartRatePerMin, 0.2),
  ],
  [
    'blood-pressure',
    (now, start) =>
      above(now.systolicMmHg, 180) ||
      below(now.systolicMmHg, 90) ||
      rose(now.systolicMmHg, start.systolicMmHg, 0.2),
  ],
];

/**
 * Which of the measurable criteria are met now. It names them; whether the trial has failed is for whoever
 * stands at the bed to say. Of "PaO2 at most 50–60" the wider bound is taken.
 *
 * @param input.now measurements during the trial; units in the keys.
 * @param input.start the same at its start, where they are known.
 * @returns ids of the table above, in its order.
 *
 * @source Boles JM et al., Eur Respir J 2007;29:1033–56, table 6.
 */
export function failureSigns({
  now,
  start = {},
}: {
  now: TrialMeasurements;
  start?: TrialMeasurements;
}): FailureCriterion[] {
  return MEASURED.filter(([, fails]) => fails(now, start)).map(([id]) => id);
}

type Value = number | undefined;

/** What only the arithmetic of a computer adds must not put a patient on the other side of an edge. */
const settled = (value: number): number => Math.round(value * 1e9) / 1e9;
const above = (value: Value, limit: number) => value !== undefined && settled(value) > limit;
const below = (value: Value, limit: number) => value !== undefined && settled(value) < limit;
const atLeast = (value: Value, limit: number) => value !== undefined && settled(value) >= limit;
const atMost = (value: Value, limit: number) => value !== undefined && settled(value) <= limit;

function difference(one: Value, other: Value): Value {
  return one === undefined || other === undefined ? undefined : one - other;
}

/** By at least this part of what it was at the start. */
function rose(now: Value, start: Value, part: number): boolean {
  return now !== undefined && start !== undefined && start > 0 && atLeast(now / start - 1, part);
}
