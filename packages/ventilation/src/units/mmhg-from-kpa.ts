import { KPA_PER_MMHG, PRESSURE_RANGE } from './pressure.ts';
import { requireNumber } from './require-number.ts';

/**
 * A pressure in kilopascal as millimetres of mercury.
 *
 * @title mmHg from kPa
 * @formula `kPa ÷ 0.133322387415`.
 * @valid for any pressure.
 *
 * @param kpa pressure, kPa (0 to 100000).
 * @returns mmHg.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source SI definition of the conventional millimetre of mercury, 133.322387415 Pa (not compared with the
 *   print).
 */
export function mmHgFromKpa(kpa: number): number {
  requireNumber('kpa', kpa, PRESSURE_RANGE);
  return kpa / KPA_PER_MMHG;
}
