import { requireNumbers } from '../units/require-number.ts';

/** Above it the dissociation curve is flat, and saturation says nothing about oxygen pressure. */
const HIGHEST_SPO2 = 97;

/**
 * Oxygenation without a gas.
 *
 * @title S/F ratio
 * @formula `SpO2 (%) ÷ FiO2`.
 * @valid up to an SpO2 of 97 %; above it the dissociation curve is flat.
 *
 * @param input.spo2Percent pulse oximeter saturation, % (20 to 100).
 * @param input.fio2 inspired oxygen, fraction (0.21 to 1), not a percentage.
 * @returns ratio without unit; `null` above 97 %.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Rice TW et al., Chest 2007;132:410–7.
 */
export function sfRatio({ spo2Percent, fio2 }: { spo2Percent: number; fio2: number }): number | null {
  requireNumbers({ spo2Percent, fio2 });
  return spo2Percent > HIGHEST_SPO2 ? null : spo2Percent / fio2;
}
