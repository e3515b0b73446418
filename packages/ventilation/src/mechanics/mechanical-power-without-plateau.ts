import { requireNumber, requireNumbers } from '../units/require-number.ts';

/**
 * Mechanical power in volume control when nobody made a pause.
 *
 * @title Mechanical power without a plateau
 * @formula `VE × (peak + PEEP + flow ÷ 6) ÷ 20`.
 * @valid with constant flow and a passive patient.
 *
 * @param input.minuteVentilationLMin minute volume, L/min (0 to 300).
 * @param input.peakCmH2O peak airway pressure, cmH2O (0 to 120).
 * @param input.peepCmH2O PEEP, cmH2O (0 to 120), not above the peak.
 * @param input.inspiratoryFlowLMin constant inspiratory flow, L/min (1 to 300).
 * @returns J/min.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Giosa L et al., Intensive Care Med 2019;45:1030–2.
 */
export function mechanicalPowerWithoutPlateau({
  minuteVentilationLMin,
  peakCmH2O,
  peepCmH2O,
  inspiratoryFlowLMin,
}: {
  minuteVentilationLMin: number;
  peakCmH2O: number;
  peepCmH2O: number;
  inspiratoryFlowLMin: number;
}): number {
  requireNumbers({ minuteVentilationLMin, peakCmH2O, inspiratoryFlowLMin });
  requireNumber('peepCmH2O', peepCmH2O, [0, peakCmH2O]);
  return (minuteVentilationLMin * (peakCmH2O + peepCmH2O + inspiratoryFlowLMin / 6)) / 20;
}
