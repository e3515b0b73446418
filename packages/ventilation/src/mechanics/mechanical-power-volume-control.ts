import { requireNumber, requireNumbers } from '../units/require-number.ts';
import { JOULES_PER_L_CMH2O } from './joules.ts';

/**
 * Energy given to the respiratory system each minute in volume control. Risk rose above 17 J/min in one large
 * cohort; show it as a trend.
 *
 * @title Mechanical power, volume control
 * @formula `0.098 × rate × VT (L) × (peak − ½ × (plateau − PEEP))`.
 * @valid with constant flow and a passive patient.
 *
 * @param input.ratePerMin total rate, /min (0 to 200).
 * @param input.tidalVolumeMl tidal volume, mL (1 to 3000).
 * @param input.peakCmH2O peak airway pressure, cmH2O (0 to 120).
 * @param input.plateauCmH2O plateau pressure, cmH2O (0 to 120), from PEEP to the peak.
 * @param input.peepCmH2O PEEP, cmH2O (0 to 120).
 * @returns J/min.
 * @throws RangeError on missing, non-finite or impossible input; also when PEEP ≤ plateau ≤ peak does not hold.
 *
 * @source Gattinoni L et al., Intensive Care Med 2016;42:1567–75, simplified form (not compared with the
 *   print).
 * @source Serpa Neto A et al., Intensive Care Med 2018, for the threshold.
 */
export function mechanicalPowerVolumeControl({
  ratePerMin,
  tidalVolumeMl,
  peakCmH2O,
  plateauCmH2O,
  peepCmH2O,
}: {
  ratePerMin: number;
  tidalVolumeMl: number;
  peakCmH2O: number;
  plateauCmH2O: number;
  peepCmH2O: number;
}): number {
  requireNumbers({ ratePerMin, tidalVolumeMl, peakCmH2O, peepCmH2O });
  requireNumber('plateauCmH2O', plateauCmH2O, [peepCmH2O, peakCmH2O]);
  const pressure = peakCmH2O - (plateauCmH2O - peepCmH2O) / 2;
  return JOULES_PER_L_CMH2O * ratePerMin * (tidalVolumeMl / 1000) * pressure;
}
