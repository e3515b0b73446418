import { requireNumbers } from '../units/require-number.ts';

/**
 * How well oxygen crosses into the blood for the oxygen given.
 *
 * @title P/F ratio
 * @formula `PaO2 ÷ FiO2`.
 * @valid for an arterial sample, with the oxygen fraction as it was at the draw.
 *
 * @param input.pao2MmHg arterial oxygen pressure, mmHg (10 to 700).
 * @param input.fio2 inspired oxygen, fraction (0.21 to 1), not a percentage.
 * @returns mmHg.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source ARDS Definition Task Force, JAMA 2012;307:2526–33.
 */
export function pfRatio({ pao2MmHg, fio2 }: { pao2MmHg: number; fio2: number }): number {
  requireNumbers({ pao2MmHg, fio2 });
  return pao2MmHg / fio2;
}
