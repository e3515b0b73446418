import { bandUpTo } from '../units/band.ts';
import { requireNumbers } from '../units/require-number.ts';
import { type ArdsClass, LEAST_PEEP_CMH2O, PF_BANDS } from './ards-bands.ts';

const SEA_LEVEL_MMHG = 760;

/**
 * The oxygenation part of the Berlin definition. Onset, opacities and origin are for people to judge.
 *
 * @title ARDS class, Berlin definition
 * @formula P/F `≤ 100` severe, `≤ 200` moderate, `≤ 300` mild, above none; P/F is first multiplied by
 *   `barometricMmHg ÷ 760`.
 * @valid at a PEEP or CPAP of at least 5 cmH2O.
 *
 * @param input.pfMmHg PaO2/FiO2, mmHg (1 to 4000).
 * @param input.peepCmH2O PEEP or CPAP, cmH2O (0 to 120).
 * @param input.barometricMmHg pressure of the air, mmHg (200 to 900); 760 unless given, to be given above 1,000
 *   m only.
 * @returns class: 'none', 'mild', 'moderate' or 'severe'; `null` when PEEP is below 5 and the definition does
 *   not grade.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source ARDS Definition Task Force, JAMA 2012;307:2526–33.
 */
export function berlinClass({
  pfMmHg,
  peepCmH2O,
  barometricMmHg = SEA_LEVEL_MMHG,
}: {
  pfMmHg: number;
  peepCmH2O: number;
  barometricMmHg?: number;
}): ArdsClass | null {
  requireNumbers({ pfMmHg, peepCmH2O, barometricMmHg });
  if (peepCmH2O < LEAST_PEEP_CMH2O) return null;
  return bandUpTo(PF_BANDS, (pfMmHg * barometricMmHg) / SEA_LEVEL_MMHG);
}
