import { requireNumbers } from '../units/require-number.ts';
import { JOULES_PER_L_CMH2O } from './joules.ts';

/**
 * Energy given to the respiratory system each minute in pressure control.
 *
 * @title Mechanical power, pressure control
 * @formula `0.098 × rate × VT (L) × (inspiratory pressure above PEEP + PEEP)`.
 * @valid for a square pressure wave and a passive patient; it reads high with a slow rise (mean error 19 %).
 *
 * @param input.ratePerMin total rate, /min (0 to 200).
 * @param input.tidalVolumeMl exhaled tidal volume, mL (1 to 3000).
 * @param input.inspiratoryPressureCmH2O pressure above PEEP, cmH2O (0 to 120); never the absolute peak.
 * @param input.peepCmH2O PEEP, cmH2O (0 to 120).
 * @returns J/min.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Becher T et al., Intensive Care Med 2019;45:1321–3, simplified form (not compared with the print).
 * @source Trinkle CA et al. 2022, for the error.
 */
export function mechanicalPowerPressureControl({
  ratePerMin,
  tidalVolumeMl,
  inspiratoryPressureCmH2O,
  peepCmH2O,
}: {
  ratePerMin: number;
  tidalVolumeMl: number;
  inspiratoryPressureCmH2O: number;
  peepCmH2O: number;
}): number {
  requireNumbers({ ratePerMin, tidalVolumeMl, inspiratoryPressureCmH2O, peepCmH2O });
  const pressure = inspiratoryPressureCmH2O + peepCmH2O;
  return JOULES_PER_L_CMH2O * ratePerMin * (tidalVolumeMl / 1000) * pressure;
}
