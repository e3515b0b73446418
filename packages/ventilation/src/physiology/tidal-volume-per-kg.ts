import { requireNumbers } from '../units/require-number.ts';

/**
 * Tidal volume for the size of the lungs; guidelines for ARDS ask for 4–8 mL/kg.
 *
 * @title Tidal volume per kg
 * @formula `tidalVolumeMl ÷ predictedBodyWeightKg`.
 * @valid for controlled and assisted breaths, with the exhaled volume.
 *
 * @param input.tidalVolumeMl exhaled tidal volume, mL (1 to 3000).
 * @param input.predictedBodyWeightKg predicted body weight, kg (1 to 150), not the actual one.
 * @returns mL/kg.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source ARDS Network, N Engl J Med 2000;342:1301–8.
 * @source ATS/ESICM/SCCM guideline 2017.
 */
export function tidalVolumePerKg({
  tidalVolumeMl,
  predictedBodyWeightKg,
}: {
  tidalVolumeMl: number;
  predictedBodyWeightKg: number;
}): number {
  requireNumbers({ tidalVolumeMl, predictedBodyWeightKg });
  return tidalVolumeMl / predictedBodyWeightKg;
}
