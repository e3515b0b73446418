import { requireNumbers } from '../units/require-number.ts';

const ML_PER_L = 1000;

/**
 * How fast the lungs empty: after one time constant 63 % of the volume is out, after three 95 %.
 *
 * @title Time constant
 * @formula `complianceMlCmH2O ÷ 1000 × resistanceCmH2OPerLS`.
 * @valid in a passive patient.
 *
 * @param input.complianceMlCmH2O static compliance, mL/cmH2O (0.1 to 500).
 * @param input.resistanceCmH2OPerLS airway resistance, cmH2O/(L/s) (0 to 500).
 * @returns s.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source common practice.
 */
export function timeConstant({
  complianceMlCmH2O,
  resistanceCmH2OPerLS,
}: {
  complianceMlCmH2O: number;
  resistanceCmH2OPerLS: number;
}): number {
  requireNumbers({ complianceMlCmH2O, resistanceCmH2OPerLS });
  return (complianceMlCmH2O * resistanceCmH2OPerLS) / ML_PER_L;
}
