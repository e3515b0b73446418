import { requireNumbers } from '../units/require-number.ts';

/**
 * The rate that would bring arterial CO2 to a target.
 *
 * @title Rate for a target PaCO2
 * @formula `ratePerMin × paco2MmHg ÷ targetPaco2MmHg`.
 * @valid while tidal volume, dead-space fraction and CO2 production stay as they are; ask for a new gas.
 *
 * @param input.ratePerMin present total rate, /min (0 to 200).
 * @param input.paco2MmHg present arterial CO2 pressure, mmHg (5 to 250).
 * @param input.targetPaco2MmHg wanted arterial CO2 pressure, mmHg (5 to 250).
 * @returns /min.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source common practice, from the alveolar ventilation equation.
 */
export function rateForTargetPaco2({
  ratePerMin,
  paco2MmHg,
  targetPaco2MmHg,
}: {
  ratePerMin: number;
  paco2MmHg: number;
  targetPaco2MmHg: number;
}): number {
  requireNumbers({ ratePerMin, paco2MmHg, targetPaco2MmHg });
  return (ratePerMin * paco2MmHg) / targetPaco2MmHg;
}
