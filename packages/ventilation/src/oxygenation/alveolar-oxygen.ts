import { requireNumbers, shown } from '../units/require-number.ts';
import { requireWord } from '../units/require-word.ts';

const WATER_VAPOUR_MMHG = 47;

export type AlveolarOxygenInput = {
  fio2: number;
  paco2MmHg: number;
  barometricMmHg?: number;
  respiratoryQuotient?: number;
  form?: 'simplified' | 'full';
};

/** CO2's share of the alveolar gas: what each mmHg of it costs in oxygen. */
const FORMS = {
  simplified: ({ respiratoryQuotient }: { fio2: number; respiratoryQuotient: number }) =>
    1 / respiratoryQuotient,
  full: ({ fio2, respiratoryQuotient }: { fio2: number; respiratoryQuotient: number }) =>
    fio2 + (1 - fio2) / respiratoryQuotient,
} as const;

/**
 * Oxygen pressure in the alveoli. The simplified form reads lower as FiO2 rises.
 *
 * @title Alveolar oxygen pressure
 * @formula full form `FiO2 × (Pb − 47) − PaCO2 × (FiO2 + (1 − FiO2) ÷ R)`; simplified form `FiO2 × (Pb − 47) −
 *   PaCO2 ÷ R`.
 * @valid in a steady state at 37 °C.
 *
 * @param input.fio2 inspired oxygen, fraction (0.21 to 1), not a percentage.
 * @param input.paco2MmHg arterial CO2 pressure, mmHg (5 to 250).
 * @param input.barometricMmHg pressure of the air, mmHg (200 to 900); 760 unless given.
 * @param input.respiratoryQuotient CO2 made per oxygen used (0.5 to 1.5); 0.8 unless given.
 * @param input.form form of the equation: 'simplified' or 'full'; 'full' unless given.
 * @returns mmHg, above zero.
 * @throws RangeError on missing, non-finite or impossible input; also when this much CO2 would leave no room
 *   for oxygen.
 *
 * @source alveolar gas equation; the full form (not compared with the print).
 */
export function alveolarOxygen({
  fio2,
  paco2MmHg,
  barometricMmHg = 760,
  respiratoryQuotient = 0.8,
  form = 'full',
}: AlveolarOxygenInput): number {
  requireNumbers({ fio2, paco2MmHg, barometricMmHg, respiratoryQuotient });
  requireWord('form', form, Object.keys(FORMS));
  const inspiredMmHg = fio2 * (barometricMmHg - WATER_VAPOUR_MMHG);
  const costPerMmHg = FORMS[form]({ fio2, respiratoryQuotient });
  const alveolarMmHg = inspiredMmHg - paco2MmHg * costPerMmHg;
  if (alveolarMmHg > 0) return alveolarMmHg;
  const limit = inspiredMmHg / costPerMmHg;
  throw new RangeError(`paco2MmHg must be from 5 to below ${limit} at this fio2, not ${shown(paco2MmHg)}`);
}
