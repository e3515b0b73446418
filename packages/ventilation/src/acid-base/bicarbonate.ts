import { requireNumbers } from '../units/require-number.ts';
import { CO2_SOLUBILITY, PK } from './henderson-hasselbalch.ts';

/**
 * Bicarbonate from pH and CO2, as an analyser computes it.
 *
 * @title Bicarbonate
 * @formula `0.03 × PaCO2 × 10^(pH − 6.1)`.
 * @valid for blood at 37 °C; analysers also use 0.0307.
 *
 * @param input.ph pH (6.5 to 8).
 * @param input.paco2MmHg CO2 pressure, mmHg (5 to 250).
 * @returns mmol/L.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Henderson–Hasselbalch equation.
 */
export function bicarbonate({ ph, paco2MmHg }: { ph: number; paco2MmHg: number }): number {
  requireNumbers({ ph, paco2MmHg });
  return CO2_SOLUBILITY * paco2MmHg * 10 ** (ph - PK);
}
