import { compensationOf } from '@windrow/ventilation/acid-base/compensation';
import { cuffBand } from '@windrow/ventilation/airway/cuff-band';
import { TRIAL_METHOD_IDS } from '@windrow/ventilation/contract/observations';
import { TRIAL_FIELDS } from '@windrow/ventilation/entry/fields';
import { DEFAULT_POLICY } from '@windrow/ventilation/policy/policy';
import { oxygenationMet, SCREENING_LIMITS } from '@windrow/ventilation/readiness/screening-limits';
import { failureSigns, type TrialMeasurements } from '@windrow/ventilation/readiness/trial-failure';
import { TRIAL_PLAN } from '@windrow/ventilation/readiness/trial-plan';
import { breathPattern } from '@windrow/ventilation/support/breath-pattern';
import { SUPPORT_CATALOGUE, SUPPORT_IDS, type SupportId } from '@windrow/ventilation/support/catalogue';
import { expect } from 'vitest';
import { numberAt, numbersAt, type Row, textAt } from '../rows.ts';
import { type Check, expectNear } from './expectations.ts';

/** The keys of the rows as the product calls them. */
const MEASURED = {
  rr: 'ratePerMin',
  rr_now: 'ratePerMin',
  sao2: 'sao2Percent',
  rsbi: 'rsbiPerMinL',
  hr: 'heartRatePerMin',
  sbp: 'systolicMmHg',
  ph: 'ph',
  paco2: 'paco2MmHg',
} as const satisfies Record<string, keyof TrialMeasurements>;

const NAMES: Readonly<Record<string, SupportId>> = {
  'Volume control': 'ac-vc',
  'Pressure control': 'ac-pc',
  'SIMV volume + PS': 'simv-vc',
  'SIMV pressure + PS': 'simv-pc',
  'Pressure support': 'psv',
  CPAP: 'cpap',
};

export const READINESS: readonly Check[] = [
  [
    /^SBT-F\d+$/,
    (row) => {
      expect(failureSigns({ now: measurementsOf(row) }).length > 0).toBe(row.expected.fails_on_this);
    },
  ],
  [
    /^SBT-REL1$/,
    (row) => {
      const start = { ratePerMin: numberAt(row.inputs, 'rr_start') };
      expect(failureSigns({ now: measurementsOf(row), start })).toEqual(['rate']);
    },
  ],
  [
    /^SBT-DUR$/,
    (row) => {
      const printed = [numberAt(row.expected, 'min_minutes'), numberAt(row.expected, 'max_minutes')];
      expect(TRIAL_PLAN.minutes).toEqual(printed);
      expect(TRIAL_FIELDS.plannedMinutes.soft).toEqual(printed);
    },
  ],
  [
    /^SBT-METHOD$/,
    (row) => {
      expect(TRIAL_PLAN.pressureSupportCmH2O).toEqual([
        numberAt(row.expected, 'ps_low'),
        numberAt(row.expected, 'ps_high'),
      ]);
      expect(TRIAL_METHOD_IDS[0]).toBe(TRIAL_PLAN.firstMethod);
    },
  ],
  [
    /^SBT-READY\d?$/,
    (row) => {
      expect(isReady(row)).toBe(row.expected.ready);
    },
  ],
  [
    /^MODE-R1$/,
    (row) => {
      const sequences = SUPPORT_CATALOGUE.flatMap(({ sequence }) => sequence ?? []);
      const published = sequences.filter((sequence) => sequence !== 'oscillation');
      expect([...new Set(published)].sort()).toEqual([...listAt(row, 'sequences')].sort());
      const patterns = SUPPORT_IDS.flatMap((id) => breathPattern(id) ?? []);
      expect([...new Set(patterns)].sort()).toEqual([...listAt(row, 'patterns')].sort());
    },
  ],
  [
    /^MODE-\d$/,
    (row) => {
      const id = NAMES[textAt(row.inputs, 'name')];
      expect(id && breathPattern(id)).toBe(row.expected.pattern);
    },
  ],
  [
    /^CUFF-RANGE$/,
    (row) => {
      const { thresholds } = DEFAULT_POLICY;
      const within = numbersAt(row.inputs, 'cmH2O').map(
        (cuffCmH2O) => cuffBand({ cuffCmH2O, thresholds }) === 'within',
      );
      expect(within).toEqual(row.expected.in_range);
    },
  ],
  [
    /^COMP-R2$/,
    (row) => {
      const expected = numberAt(row.expected, 'expected_hco3');
      expect(stageAt(row, 'respiratory acidosis', expected)).toBe('chronic');
      expectNear(row, 'delta_hco3', expected - 24);
    },
  ],
  [
    /^COMP-R3$/,
    (row) => {
      const bicarbonateMmolL = 24 + numberAt(row.expected, 'delta_hco3');
      expect(stageAt(row, 'respiratory alkalosis', bicarbonateMmolL)).toBe('acute');
    },
  ],
  [
    /^COMP-R4$/,
    (row) => {
      const bicarbonateMmolL = 24 + numberAt(row.expected, 'delta_hco3');
      expect(stageAt(row, 'respiratory alkalosis', bicarbonateMmolL)).toBe('chronic');
    },
  ],
];

/** Which stage the printed bicarbonate falls into. */
function stageAt(
  row: Row,
  disorder: 'respiratory acidosis' | 'respiratory alkalosis',
  bicarbonateMmolL: number,
) {
  return compensationOf({ disorder, paco2MmHg: numberAt(row.inputs, 'paco2_mmHg'), bicarbonateMmolL }).stage;
}

function measurementsOf({ inputs }: Row): TrialMeasurements {
  return Object.fromEntries(
    Object.entries(MEASURED).flatMap(([key, name]) =>
      inputs[key] === undefined ? [] : [[name, numberAt(inputs, key)]],
    ),
  );
}

function isReady({ inputs }: Row): boolean {
  const limits = SCREENING_LIMITS;
  const [low, high] = limits.systolicMmHg;
  const oxygenated = oxygenationMet({
    saturationPercent: numberAt(inputs, 'spo2'),
    fio2Percent: numberAt(inputs, 'fio2') * 100,
    pfMmHg: inputs.pf === undefined ? null : numberAt(inputs, 'pf'),
  });
  return (
    oxygenated === true &&
    numberAt(inputs, 'peep') <= limits.peepAtMostCmH2O &&
    numberAt(inputs, 'rr') <= limits.rateAtMostPerMin &&
    numberAt(inputs, 'rsbi') <= limits.rsbiAtMostPerMinL &&
    numberAt(inputs, 'hr') <= limits.heartRateAtMostPerMin &&
    numberAt(inputs, 'sbp') >= low &&
    numberAt(inputs, 'sbp') <= high
  );
}

function listAt({ expected }: Row, key: string): unknown[] {
  const list = expected[key];
  if (Array.isArray(list)) return list;
  throw new Error(`no list at ${key}: ${String(list)}`);
}
