import { requireNumbers } from '../units/require-number.ts';

/**
 * Tidal volume for the size of the lungs: `tidalVolumeMl ÷ predictedBodyWeightKg`.
 * Valid for controlled and assisted breaths; use the exhaled volume. Guidelines for ARDS: 4–8 mL/kg.
 *
 * @param input.tidalVolumeMl exhaled tidal volume, mL (1 to 3000).
 * @param input.predictedBodyWeightKg predicted, not actual, body weight, kg (1 to 150).
 * @returns mL/kg.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source ARDS Network, N Engl J Med 2000;342:1301–8; ATS/ESICM/SCCM guideline 2017.
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
