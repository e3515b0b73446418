import { requireNumbers } from '../units/require-number.ts';
import { requireWord } from '../units/require-word.ts';

/** Litres of gas for each psi on the gauge. */
const LITRES_PER_PSI = { D: 0.16, E: 0.28, M: 1.56, G: 2.41, H: 3.14 } as const;

/**
 * How long a cylinder lasts before it reaches its reserve.
 *
 * @title Cylinder duration
 * @formula `(pressure − reserve) × factor ÷ flow`, with a factor of 0.16 (D), 0.28 (E), 1.56 (M), 2.41 (G) or
 *   3.14 (H) L/psi.
 * @valid for a steady flow, and cylinders of these sizes as sold in North America.
 *
 * @param input.cylinder cylinder: 'D', 'E', 'M', 'G' or 'H'; H also stands for K.
 * @param input.pressurePsi gauge pressure, psi (0 to 5000).
 * @param input.reservePsi pressure at which to change, psi (0 to 5000); 200 unless given.
 * @param input.flowLMin oxygen drawn, L/min (0.01 to 300).
 * @returns min; 0 when the pressure is at or below the reserve.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source common practice; factors as printed in respiratory care texts.
 */
export function cylinderDuration({
  cylinder,
  pressurePsi,
  reservePsi = 200,
  flowLMin,
}: {
  cylinder: keyof typeof LITRES_PER_PSI;
  pressurePsi: number;
  reservePsi?: number;
  flowLMin: number;
}): number {
  requireWord('cylinder', cylinder, Object.keys(LITRES_PER_PSI));
  requireNumbers({ pressurePsi, reservePsi, flowLMin }, { flowLMin: [0.01, 300] });
  const usablePsi = Math.max(0, pressurePsi - reservePsi);
  return (usablePsi * LITRES_PER_PSI[cylinder]) / flowLMin;
}
