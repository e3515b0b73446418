import { requireNumbers } from '../units/require-number.ts';

/**
 * Oxygenation index without a gas.
 *
 * @title Oxygen saturation index
 * @formula `mean airway pressure × FiO2 × 100 ÷ SpO2`.
 * @valid up to an SpO2 of 97 %.
 *
 * @param input.meanAirwayPressureCmH2O mean airway pressure, cmH2O (0 to 120).
 * @param input.fio2 inspired oxygen, fraction (0.21 to 1), not a percentage.
 * @param input.spo2Percent pulse oximeter saturation, % (20 to 100).
 * @returns index without unit.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Pediatric Acute Lung Injury Consensus Conference, Pediatr Crit Care Med 2015;16:428–39.
 */
export function oxygenSaturationIndex({
  meanAirwayPressureCmH2O,
  fio2,
  spo2Percent,
}: {
  meanAirwayPressureCmH2O: number;
  fio2: number;
  spo2Percent: number;
}): number {
  requireNumbers({ meanAirwayPressureCmH2O, fio2, spo2Percent });
  return (meanAirwayPressureCmH2O * fio2 * 100) / spo2Percent;
}
