import { requireNumbers } from '../units/require-number.ts';

/**
 * Who will need a tube on high-flow nasal oxygen; higher is better. Published: from 4.88 at 2, 6 or 12 h low
 * risk; below 2.85 at 2 h, 3.47 at 6 h or 3.85 at 12 h failure is likely.
 *
 * @title ROX index
 * @formula `(SpO2 (%) ÷ FiO2) ÷ rate`.
 * @valid in pneumonia on high flow.
 *
 * @param input.spo2Percent pulse oximeter saturation, % (20 to 100).
 * @param input.fio2 inspired oxygen, fraction (0.21 to 1), not a percentage.
 * @param input.ratePerMin breaths, /min (1 to 200).
 * @returns index without unit.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Roca O et al., Am J Respir Crit Care Med 2019;199:1368–76.
 */
export function roxIndex({
  spo2Percent,
  fio2,
  ratePerMin,
}: {
  spo2Percent: number;
  fio2: number;
  ratePerMin: number;
}): number {
  requireNumbers({ spo2Percent, fio2, ratePerMin }, { ratePerMin: [1, 200] });
  return spo2Percent / fio2 / ratePerMin;
}
