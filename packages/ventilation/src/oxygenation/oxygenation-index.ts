import { requireNumbers } from '../units/require-number.ts';

/**
 * Oxygenation for the airway pressure it takes; higher is worse.
 *
 * @title Oxygenation index
 * @formula `mean airway pressure × FiO2 × 100 ÷ PaO2`.
 * @valid for arterial samples in children and adults on positive pressure, with the mean airway pressure as
 *   read.
 *
 * @param input.meanAirwayPressureCmH2O mean airway pressure, cmH2O (0 to 120).
 * @param input.fio2 inspired oxygen, fraction (0.21 to 1), not a percentage.
 * @param input.pao2MmHg arterial oxygen pressure, mmHg (10 to 700).
 * @returns index without unit.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Pediatric Acute Lung Injury Consensus Conference, Pediatr Crit Care Med 2015;16:428–39.
 */
export function oxygenationIndex({
  meanAirwayPressureCmH2O,
  fio2,
  pao2MmHg,
}: {
  meanAirwayPressureCmH2O: number;
  fio2: number;
  pao2MmHg: number;
}): number {
  requireNumbers({ meanAirwayPressureCmH2O, fio2, pao2MmHg });
  return (meanAirwayPressureCmH2O * fio2 * 100) / pao2MmHg;
}
