import { requireNumber, requireNumbers } from '../units/require-number.ts';

const SECONDS_PER_MINUTE = 60;

/**
 * Pressure lost to flow in tube and airways.
 *
 * @title Airway resistance
 * @formula `(peakCmH2O − plateauCmH2O) ÷ flow in L/s`.
 * @valid in volume control with constant (square) flow and a passive patient.
 *
 * @param input.peakCmH2O peak airway pressure, cmH2O (0 to 120).
 * @param input.plateauCmH2O plateau pressure, cmH2O (0 to 120), not above the peak.
 * @param input.inspiratoryFlowLMin constant inspiratory flow, L/min (1 to 300).
 * @returns cmH2O/(L/s).
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source common practice.
 */
export function airwayResistance({
  peakCmH2O,
  plateauCmH2O,
  inspiratoryFlowLMin,
}: {
  peakCmH2O: number;
  plateauCmH2O: number;
  inspiratoryFlowLMin: number;
}): number {
  requireNumbers({ peakCmH2O, inspiratoryFlowLMin });
  requireNumber('plateauCmH2O', plateauCmH2O, [0, peakCmH2O]);
  return ((peakCmH2O - plateauCmH2O) * SECONDS_PER_MINUTE) / inspiratoryFlowLMin;
}
