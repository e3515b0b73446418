import { requireNumbers } from '../units/require-number.ts';
import { OXYGEN_IN_AIR } from './air.ts';

/**
 * Oxygen drawn from the wall to blend a flow. For a ventilator the total is minute volume plus bias flow.
 *
 * @title Oxygen drawn for a blend
 * @formula `total × (FiO2 − 0.21) ÷ 0.79`.
 * @valid where the rest of the flow is air.
 *
 * @param input.totalFlowLMin blended flow, L/min (0 to 1000).
 * @param input.fio2 wanted oxygen, fraction (0.21 to 1), not a percentage.
 * @returns L/min of oxygen.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source mass balance; common practice.
 */
export function oxygenFlow({ totalFlowLMin, fio2 }: { totalFlowLMin: number; fio2: number }): number {
  requireNumbers({ totalFlowLMin, fio2 });
  return (totalFlowLMin * (fio2 - OXYGEN_IN_AIR)) / (1 - OXYGEN_IN_AIR);
}
