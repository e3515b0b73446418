import { requireNumbers } from '../units/require-number.ts';

/** A French is a third of a millimetre of outer diameter, and the catheter may fill half of the tube: 3 × ½. */
const FR_PER_MM = 1.5;

/**
 * The largest suction catheter for a tube, at half of its inner diameter. The guideline says less than half,
 * which refuses a catheter of exactly this size; common practice takes it.
 *
 * @title Largest suction catheter
 * @formula `1.5 × ID`.
 * @valid for children and adults.
 *
 * @param input.tubeInternalDiameterMm inner diameter of the tube, mm (2 to 12).
 * @returns Fr, between catalogue sizes as it falls.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source AARC clinical practice guideline on endotracheal suctioning, Respir Care 2010;55:758–64.
 * @source common practice.
 */
export function suctionCatheterMaxFr({ tubeInternalDiameterMm }: { tubeInternalDiameterMm: number }): number {
  requireNumbers({ tubeInternalDiameterMm });
  return FR_PER_MM * tubeInternalDiameterMm;
}
