import { requireNumbers } from '../units/require-number.ts';

const BAND_MMHG = 2;

/**
 * The CO2 pressure to which a metabolic acidosis should drive the breathing. Above the band the patient does
 * not keep up; below it something else drives.
 *
 * @title Expected PaCO2 (Winters)
 * @formula `1.5 × HCO3 + 8 ± 2`.
 * @valid in metabolic acidosis only.
 *
 * @param input.bicarbonateMmolL bicarbonate, mmol/L (1 to 100).
 * @returns record: `low` lower end of the band, mmHg; `mid` middle of the band, mmHg; `high` upper end of the
 *   band, mmHg.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Albert MS, Dell RB, Winters RW, Ann Intern Med 1967;66:312–22, as rounded at the bedside.
 */
export function expectedPaco2Winters({ bicarbonateMmolL }: { bicarbonateMmolL: number }): {
  low: number;
  mid: number;
  high: number;
} {
  requireNumbers({ bicarbonateMmolL });
  const mid = 1.5 * bicarbonateMmolL + 8;
  return { low: mid - BAND_MMHG, mid, high: mid + BAND_MMHG };
}
