import { requireNumbers } from '../units/require-number.ts';

const ML_PER_L = 1000;
const PREDICTED_ML_PER_KG_MIN = 100;
const IDEAL_PACO2_MMHG = 37.5;

/**
 * Ventilation needed for this arterial CO2 against what healthy lungs of this size would need; about 1 is
 * normal, higher means more wasted ventilation.
 *
 * @title Ventilatory ratio
 * @formula `VE (mL/min) × PaCO2 ÷ (PBW × 100 × 37.5)`.
 * @valid in a steady state, with exhaled minute volume and no large leak.
 *
 * @param input.minuteVentilationLMin exhaled minute volume, L/min (0 to 300).
 * @param input.paco2MmHg arterial CO2 pressure, mmHg (5 to 250).
 * @param input.predictedBodyWeightKg predicted body weight, kg (1 to 150), not the actual one.
 * @returns ratio without unit.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Sinha P et al., Br J Anaesth 2009;102:692–7.
 */
export function ventilatoryRatio({
  minuteVentilationLMin,
  paco2MmHg,
  predictedBodyWeightKg,
}: {
  minuteVentilationLMin: number;
  paco2MmHg: number;
  predictedBodyWeightKg: number;
}): number {
  requireNumbers({ minuteVentilationLMin, paco2MmHg, predictedBodyWeightKg });
  const predicted = predictedBodyWeightKg * PREDICTED_ML_PER_KG_MIN * IDEAL_PACO2_MMHG;
  return (minuteVentilationLMin * ML_PER_L * paco2MmHg) / predicted;
}
