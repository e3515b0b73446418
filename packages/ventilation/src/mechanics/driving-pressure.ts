import { requireNumbers } from '../units/require-number.ts';

/**
 * The pressure that stretches the lungs with each breath; the same as tidal volume over static compliance.
 *
 * @title Driving pressure
 * @formula `plateauCmH2O − totalPeepCmH2O`.
 * @valid in a passive patient after an inspiratory pause.
 *
 * @param input.plateauCmH2O plateau pressure, cmH2O (0 to 120).
 * @param input.totalPeepCmH2O set plus intrinsic PEEP, cmH2O (0 to 120).
 * @returns cmH2O; `null` when the plateau is not above total PEEP, so that one of the two must be wrong.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Amato MBP et al., N Engl J Med 2015;372:747–55 (not compared with the print).
 */
export function drivingPressure({
  plateauCmH2O,
  totalPeepCmH2O,
}: {
  plateauCmH2O: number;
  totalPeepCmH2O: number;
}): number | null {
  requireNumbers({ plateauCmH2O, totalPeepCmH2O });
  const pressure = plateauCmH2O - totalPeepCmH2O;
  return pressure > 0 ? pressure : null;
}
