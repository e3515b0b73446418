import { HPA_PER_CMH2O, KPA_PER_MMHG, PRESSURE_RANGE } from './pressure.ts';
import { requireNumber } from './require-number.ts';

const HPA_PER_KPA = 10;

/**
 * A pressure in millimetres of mercury as centimetres of water, as for a cuff gauge.
 *
 * @title cmH2O from mmHg
 * @formula `mmHg × 1.35951`.
 * @valid for any pressure.
 *
 * @param mmHg pressure, mmHg (0 to 100000).
 * @returns cmH2O.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source SI definitions: 133.322387415 Pa per mmHg, 98.0665 Pa per cmH2O (not compared with the print).
 */
export function cmH2OFromMmHg(mmHg: number): number {
  requireNumber('mmHg', mmHg, PRESSURE_RANGE);
  return (mmHg * KPA_PER_MMHG * HPA_PER_KPA) / HPA_PER_CMH2O;
}
