import { requireNumbers } from '../units/require-number.ts';
import { drivingPressure } from './driving-pressure.ts';

/**
 * How far the respiratory system gives for each unit of pressure.
 *
 * @title Static compliance
 * @formula `tidalVolumeMl ÷ (plateauCmH2O − totalPeepCmH2O)`.
 * @valid in a passive patient after an inspiratory pause; leaving intrinsic PEEP out reads too low.
 *
 * @param input.tidalVolumeMl exhaled tidal volume, mL (1 to 3000).
 * @param input.plateauCmH2O plateau pressure, cmH2O (0 to 120).
 * @param input.totalPeepCmH2O set plus intrinsic PEEP, cmH2O (0 to 120).
 * @returns mL/cmH2O; `null` when the plateau is not above total PEEP.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source common practice.
 * @source ARDS Network protocol (0.5 s pause).
 */
export function staticCompliance({
  tidalVolumeMl,
  plateauCmH2O,
  totalPeepCmH2O,
}: {
  tidalVolumeMl: number;
  plateauCmH2O: number;
  totalPeepCmH2O: number;
}): number | null {
  requireNumbers({ tidalVolumeMl });
  const pressure = drivingPressure({ plateauCmH2O, totalPeepCmH2O });
  return pressure === null ? null : tidalVolumeMl / pressure;
}
