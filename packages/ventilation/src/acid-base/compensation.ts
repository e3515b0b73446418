import type { Disorder } from './disorder.ts';
import { expectedPaco2Winters } from './expected-paco2-winters.ts';

/** What follows from a rule of compensation. */
export type Compensation = {
  rule: string;
  source: string;
  /** What compensates, and the band in which the rule expects it. */
  of: 'PaCO2' | 'bicarbonate';
  unit: 'mmHg' | 'mmol/L';
  low: number;
  high: number;
  actual: number;
  verdict: 'below' | 'within' | 'above';
  /** For a respiratory disorder: which of its two stages the bicarbonate fits. */
  stage: 'acute' | 'chronic' | 'between' | 'either' | null;
  /** The second disorder that lying outside the band means. */
  second: Disorder | null;
};

type Input = { paco2MmHg: number; bicarbonateMmolL: number };

const MIDDLE_CO2 = 40;
const MIDDLE_BASE = 24;
/** mmol/L around what the rules of respiratory disorders give. @source common practice (from memory). */
const BASE_BAND = 2;

/**
 * What the other system should do about a single disorder, by the bedside rules, and whether it does.
 *
 * @source metabolic acidosis: Albert MS, Dell RB, Winters RW, Ann Intern Med 1967;66:312–22. Metabolic alkalosis
 *   0.7 × HCO3 + 20 ± 5, respiratory acidosis +0.1 (acute) to +0.35 (chronic) mmol/L per mmHg, respiratory alkalosis
 *   −0.2 to −0.4 … −0.5: common practice, read in secondary pages; 0.4 and 0.5 are both published, so the band spans both.
 */
export function compensationOf({ disorder, ...input }: Input & { disorder: Disorder }): Compensation {
  return RULES[disorder](input);
}

const RULES: Readonly<Record<Disorder, (input: Input) => Compensation>> = {
  'metabolic acidosis': ({ paco2MmHg, bicarbonateMmolL }) => {
    const { low, high } = expectedPaco2Winters({ bicarbonateMmolL });
    return byBreathing({ low, high, actual: paco2MmHg }, '1.5 × HCO3 + 8 ± 2', WINTERS);
  },
  'metabolic alkalosis': ({ paco2MmHg, bicarbonateMmolL }) => {
    const middle = 0.7 * bicarbonateMmolL + 20;
    return byBreathing(
      { low: middle - 5, high: middle + 5, actual: paco2MmHg },
      '0.7 × HCO3 + 20 ± 5',
      COMMON,
    );
  },
  'respiratory acidosis': (input) =>
    byKidney(input, {
      perMmHg: { acute: [0.1, 0.1], chronic: [0.35, 0.35] },
      rule: '24 + 0.1 (acute) to 0.35 (chronic) × (PaCO2 − 40), ± 2',
    }),
  'respiratory alkalosis': (input) =>
    byKidney(input, {
      perMmHg: { acute: [0.2, 0.2], chronic: [0.4, 0.5] },
      rule: '24 − 0.2 (acute) to 0.4–0.5 (chronic) × (40 − PaCO2), ± 2',
    }),
};

const WINTERS = 'Albert MS, Dell RB, Winters RW, Ann Intern Med 1967;66:312–22';
const COMMON = 'common practice, read in secondary pages';

type Band = { low: number; high: number; actual: number };

function byBreathing(band: Band, rule: string, source: string): Compensation {
  const verdict = verdictOf(band);
  return {
    ...{ rule, source, of: 'PaCO2', unit: 'mmHg', stage: null, verdict },
    ...band,
    second:
      verdict === 'within' ? null : verdict === 'above' ? 'respiratory acidosis' : 'respiratory alkalosis',
  };
}

type Stages = {
  perMmHg: { acute: readonly [number, number]; chronic: readonly [number, number] };
  rule: string;
};

function byKidney({ paco2MmHg, bicarbonateMmolL }: Input, { perMmHg, rule }: Stages): Compensation {
  const bandOf = (slopes: readonly [number, number]) => {
    const expected = slopes.map((slope) => MIDDLE_BASE + slope * (paco2MmHg - MIDDLE_CO2));
    return {
      low: Math.min(...expected) - BASE_BAND,
      high: Math.max(...expected) + BASE_BAND,
      actual: bicarbonateMmolL,
    };
  };
  const [acute, chronic] = [bandOf(perMmHg.acute), bandOf(perMmHg.chronic)];
  const whole = {
    low: Math.min(acute.low, chronic.low),
    high: Math.max(acute.high, chronic.high),
    actual: bicarbonateMmolL,
  };
  const verdict = verdictOf(whole);
  return {
    ...{ rule, source: COMMON, of: 'bicarbonate', unit: 'mmol/L', verdict },
    ...whole,
    stage: verdict === 'within' ? stageOf(verdictOf(acute), verdictOf(chronic)) : null,
    second: verdict === 'within' ? null : verdict === 'above' ? 'metabolic alkalosis' : 'metabolic acidosis',
  };
}

function stageOf(acute: Compensation['verdict'], chronic: Compensation['verdict']): Compensation['stage'] {
  // Close to the middle both stages give the same bicarbonate, and it tells them not apart.
  if (acute === 'within') return chronic === 'within' ? 'either' : 'acute';
  return chronic === 'within' ? 'chronic' : 'between';
}

/** A quotient or product may miss its exact value by a part in 10^16; that is no verdict. */
function verdictOf({ low, high, actual }: Band): Compensation['verdict'] {
  if (actual < low - 1e-9) return 'below';
  return actual > high + 1e-9 ? 'above' : 'within';
}
