import { requireNumber, requireNumbers } from '../units/require-number.ts';
import { suctionCatheterMaxFr } from './suction-catheter-max-fr.ts';

/** Catheters as they are sold. */
export const CATHETERS_FR = [5, 6, 8, 10, 12, 14, 16] as const;
const HALF_PERCENT = 50;

/**
 * The suction catheter for a tube by the site's own rule: the largest that is sold and fills at most a share of
 * the inner diameter. At a half an 8.0 tube takes 12 Fr exactly; a share below 50 refuses it, as the guideline's
 * "less than half" does.
 *
 * @param input.tubeInternalDiameterMm inner diameter of the tube, mm (2 to 12).
 * @param input.atMostPercent share of the diameter, % (30 to 70).
 * @returns the exact bound and the catheter, Fr; the catheter is `null` where the smallest is too large.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source AARC clinical practice guideline on endotracheal suctioning, Respir Care 2010;55:758–64 (less than 50 % in
 *   children and adults, less than 70 % in infants); the rule is the site's own.
 */
export function suctionCatheter({
  tubeInternalDiameterMm,
  atMostPercent,
}: {
  tubeInternalDiameterMm: number;
  atMostPercent: number;
}): { atMostFr: number; catheterFr: number | null } {
  requireNumbers({ tubeInternalDiameterMm });
  requireNumber('atMostPercent', atMostPercent, [30, 70]);
  const atMostFr = (suctionCatheterMaxFr({ tubeInternalDiameterMm }) * atMostPercent) / HALF_PERCENT;
  return { atMostFr, catheterFr: CATHETERS_FR.findLast((fr) => fr <= atMostFr + 1e-9) ?? null };
}
