import { requireNumbers } from '../units/require-number.ts';
import { bicarbonate } from './bicarbonate.ts';
import { type Compensation, compensationOf } from './compensation.ts';
import type { Disorder } from './disorder.ts';
import { type GasConsistency, gasConsistency } from './gas-consistency.ts';

export type AcidBaseReading = {
  ph: 'acidaemia' | 'alkalaemia' | 'usual';
  /** The primary disorder; two where both move pH the same way; none where nothing is out of its range. */
  primary: readonly Disorder[];
  /** What the other system should do about a single primary disorder, and whether it does. */
  compensation: Compensation | null;
  /** A second disorder, where the compensation lies outside its band. */
  second: Disorder | null;
  bicarbonateMmolL: number;
  /** False where the bicarbonate that follows from pH and CO2 is none that blood has: one of the two is a slip. */
  isReadable: boolean;
  /** Whether bicarbonate was given, or follows from pH and CO2. */
  isBicarbonateGiven: boolean;
  /** Null without a bicarbonate to compare with. */
  consistency: GasConsistency | null;
};

/** Usual ranges of arterial blood at sea level, both ends included. @source common practice. */
export const USUAL = { ph: [7.35, 7.45], paco2MmHg: [35, 45], bicarbonateMmolL: [22, 26] } as const;
const MIDDLE_PH = 7.4;
/** The range in which the rules of compensation can be asked, mmol/L. */
const READABLE_BICARBONATE = [1, 100] as const;

/**
 * An arterial gas in the words of acid and base. pH outside 7.35–7.45 names acidaemia or alkalaemia; the side
 * of 7.40 on which pH lies decides which of a PaCO2 outside 35–45 mmHg and a bicarbonate outside 22–26 mmol/L
 * is primary; compensation outside the band of its rule is a second disorder. A reading of three numbers, with
 * their usual pitfalls: anion gap, albumin and how it came about are not in it.
 *
 * @param input.ph arterial pH (6.5 to 8).
 * @param input.paco2MmHg arterial CO2 pressure, mmHg (5 to 250).
 * @param input.bicarbonateMmolL bicarbonate, mmol/L (1 to 100); reckoned from the other two unless given.
 * @returns the reading. No disorder is named where the three numbers cannot belong to one sample.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source common practice; the rules of compensation with theirs.
 */
export function acidBaseReading({
  ph,
  paco2MmHg,
  bicarbonateMmolL: given,
}: {
  ph: number;
  paco2MmHg: number;
  bicarbonateMmolL?: number;
}): AcidBaseReading {
  requireNumbers({ ph, paco2MmHg });
  const bicarbonateMmolL = given ?? bicarbonate({ ph, paco2MmHg });
  const consistency = given === undefined ? null : gasConsistency({ ph, paco2MmHg, bicarbonateMmolL });
  const read = {
    ph: ph < USUAL.ph[0] ? 'acidaemia' : ph > USUAL.ph[1] ? 'alkalaemia' : 'usual',
    bicarbonateMmolL,
    isBicarbonateGiven: given !== undefined,
    isReadable: bicarbonateMmolL >= READABLE_BICARBONATE[0] && bicarbonateMmolL <= READABLE_BICARBONATE[1],
    consistency,
  } as const;
  if (!read.isReadable || consistency?.consistent === false)
    return { ...read, primary: [], compensation: null, second: null };

  const primary = primaryOf({ ph, paco2MmHg, bicarbonateMmolL });
  const [only] = primary.length === 1 ? primary : [];
  const compensation = only ? compensationOf({ disorder: only, paco2MmHg, bicarbonateMmolL }) : null;
  return { ...read, primary, compensation, second: compensation?.second ?? null };
}

function primaryOf({
  ph,
  paco2MmHg,
  bicarbonateMmolL,
}: {
  ph: number;
  paco2MmHg: number;
  bicarbonateMmolL: number;
}): Disorder[] {
  const [lowCo2, highCo2] = USUAL.paco2MmHg;
  const [lowBase, highBase] = USUAL.bicarbonateMmolL;
  const acid: Disorder[] = [
    ...(bicarbonateMmolL < lowBase ? (['metabolic acidosis'] as const) : []),
    ...(paco2MmHg > highCo2 ? (['respiratory acidosis'] as const) : []),
  ];
  const alkaline: Disorder[] = [
    ...(bicarbonateMmolL > highBase ? (['metabolic alkalosis'] as const) : []),
    ...(paco2MmHg < lowCo2 ? (['respiratory alkalosis'] as const) : []),
  ];
  // At 7.40 itself two opposite disorders cancel out, and neither can be called the first.
  if (ph === MIDDLE_PH) return [...acid, ...alkaline];
  return ph < MIDDLE_PH ? acid : alkaline;
}
