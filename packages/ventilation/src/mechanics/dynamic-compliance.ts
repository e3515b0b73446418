import { requireNumbers } from '../units/require-number.ts';

/**
 * Compliance without a pause. It holds resistance too, so only its trend means anything.
 *
 * @title Dynamic compliance
 * @formula `tidalVolumeMl ÷ (peakCmH2O − peepCmH2O)`.
 * @valid as a trend in one patient, while flow and airways stay as they are.
 *
 * @param input.tidalVolumeMl exhaled tidal volume, mL (1 to 3000).
 * @param input.peakCmH2O peak airway pressure, cmH2O (0 to 120).
 * @param input.peepCmH2O set PEEP, cmH2O (0 to 120).
 * @returns mL/cmH2O; `null` when the peak is not above PEEP.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source common practice.
 */
export function dynamicCompliance({
  tidalVolumeMl,
  peakCmH2O,
  peepCmH2O,
}: {
  tidalVolumeMl: number;
  peakCmH2O: number;
  peepCmH2O: number;
}): number | null {
  requireNumbers({ tidalVolumeMl, peakCmH2O, peepCmH2O });
  return peakCmH2O > peepCmH2O ? tidalVolumeMl / (peakCmH2O - peepCmH2O) : null;
}
