import { requireNumbers } from '../units/require-number.ts';
import { OXYGEN_IN_AIR } from './air.ts';

/**
 * Oxygen fraction of air and oxygen run together.
 *
 * @title Blended FiO2
 * @formula `(air × 0.21 + oxygen) ÷ (air + oxygen)`.
 * @valid for gases that mix wholly, with nothing drawn in from the room.
 *
 * @param input.airLMin air, L/min (0 to 1000).
 * @param input.oxygenLMin oxygen, L/min (0 to 1000).
 * @returns fraction, 0.21–1.
 * @throws RangeError on missing, non-finite or impossible input; also when nothing flows.
 *
 * @source mass balance; common practice.
 */
export function blendedFio2({ airLMin, oxygenLMin }: { airLMin: number; oxygenLMin: number }): number {
  requireNumbers({ airLMin, oxygenLMin });
  const totalLMin = airLMin + oxygenLMin;
  if (totalLMin === 0) throw new RangeError('airLMin and oxygenLMin must be above 0 together, not 0');
  return (airLMin * OXYGEN_IN_AIR + oxygenLMin) / totalLMin;
}
