import { requireNumbers } from '../units/require-number.ts';
import { CO2_SOLUBILITY, PK } from './henderson-hasselbalch.ts';

/**
 * About 10 % of hydrogen ion. It must be wider than the two constants in use (0.010 of pH) and the rounding of
 * three printed values.
 */
const TOLERATED_PH = 0.04;

export type GasConsistency = {
  /** What pH would follow from the other two. */
  expectedPh: number;
  /** Measured less expected. */
  difference: number;
  consistent: boolean;
};

/**
 * Whether pH, CO2 and bicarbonate can belong to one sample. If not, one of the three was mistyped.
 *
 * @title Consistency of a gas
 * @formula `expected pH = 6.1 + log10(HCO3 ÷ (0.03 × PaCO2))`; consistent when the measured pH is within 0.04
 *   of it.
 * @valid for one sample at 37 °C; the band is wider than the two constants in use and the rounding of three
 *   printed values.
 *
 * @param input.ph pH (6.5 to 8).
 * @param input.paco2MmHg CO2 pressure, mmHg (5 to 250).
 * @param input.bicarbonateMmolL bicarbonate, mmol/L (1 to 100).
 * @returns record: `expectedPh` pH that would follow from the other two; `difference` measured less expected
 *   pH; `consistent` whether the three fit.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Henderson–Hasselbalch equation.
 * @source common practice, for the band of 10 % (not compared with the print).
 */
export function gasConsistency({
  ph,
  paco2MmHg,
  bicarbonateMmolL,
}: {
  ph: number;
  paco2MmHg: number;
  bicarbonateMmolL: number;
}): GasConsistency {
  requireNumbers({ ph, paco2MmHg, bicarbonateMmolL });
  const expectedPh = PK + Math.log10(bicarbonateMmolL / (CO2_SOLUBILITY * paco2MmHg));
  const difference = ph - expectedPh;
  return { expectedPh, difference, consistent: Math.abs(difference) <= TOLERATED_PH };
}
