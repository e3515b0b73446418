import { HPA_PER_CMH2O, PRESSURE_RANGE } from './pressure.ts';
import { requireNumber } from './require-number.ts';

/**
 * A pressure in centimetres of water as hectopascal (the same as millibar).
 *
 * @title hPa from cmH2O
 * @formula `cmH2O × 0.980665`.
 * @valid for any pressure.
 *
 * @param cmH2O pressure, cmH2O (0 to 100000).
 * @returns hPa.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source SI definition of the conventional centimetre of water, 98.0665 Pa (not compared with the print).
 */
export function hPaFromCmH2O(cmH2O: number): number {
  requireNumber('cmH2O', cmH2O, PRESSURE_RANGE);
  return cmH2O * HPA_PER_CMH2O;
}
