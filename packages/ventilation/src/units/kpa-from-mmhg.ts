import { KPA_PER_MMHG, PRESSURE_RANGE } from './pressure.ts';
import { requireNumber } from './require-number.ts';

/**
 * A pressure in millimetres of mercury as kilopascal.
 *
 * @title kPa from mmHg
 * @formula `mmHg × 0.133322387415`.
 * @valid for any pressure.
 *
 * @param mmHg pressure, mmHg (0 to 100000).
 * @returns kPa.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source SI definition of the conventional millimetre of mercury, 133.322387415 Pa (not compared with the
 *   print).
 */
export function kpaFromMmHg(mmHg: number): number {
  requireNumber('mmHg', mmHg, PRESSURE_RANGE);
  return mmHg * KPA_PER_MMHG;
}
