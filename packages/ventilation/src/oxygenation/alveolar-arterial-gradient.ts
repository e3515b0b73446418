import { requireNumbers } from '../units/require-number.ts';
import { type AlveolarOxygenInput, alveolarOxygen } from './alveolar-oxygen.ts';

/**
 * What is lost between alveoli and arteries. On 21 % normally 5–10 mmHg, on 100 % 30–60. Below zero the oxygen
 * given was higher than stated, or the sample was old.
 *
 * @title Alveolar–arterial oxygen gradient
 * @formula `PAO2 − PaO2`, with PAO2 by the alveolar gas equation.
 * @valid in a steady state at 37 °C, as the alveolar gas equation.
 *
 * @param input.fio2 inspired oxygen, fraction (0.21 to 1), not a percentage.
 * @param input.paco2MmHg arterial CO2 pressure, mmHg (5 to 250).
 * @param input.pao2MmHg arterial oxygen pressure, mmHg (10 to 700).
 * @param input.barometricMmHg pressure of the air, mmHg (200 to 900); 760 unless given.
 * @param input.respiratoryQuotient CO2 made per oxygen used (0.5 to 1.5); 0.8 unless given.
 * @param input.form form of the equation: 'simplified' or 'full'; 'full' unless given.
 * @returns mmHg.
 * @throws RangeError on missing, non-finite or impossible input, as `alveolarOxygen`.
 *
 * @source alveolar gas equation; the full form (not compared with the print).
 */
export function alveolarArterialGradient({
  pao2MmHg,
  ...alveolar
}: AlveolarOxygenInput & { pao2MmHg: number }): number {
  requireNumbers({ pao2MmHg });
  return alveolarOxygen(alveolar) - pao2MmHg;
}
