import type { BedCheck } from '../contract/board.ts';

/**
 * Whether a plateau and an intrinsic PEEP of this check can mean what they say: both are read in a pause, and
 * an effort of the patient's own moves them. Where nobody recorded it, whoever read them is taken at their word.
 */
export function wasPassive({ passive }: Pick<BedCheck, 'passive'>): boolean {
  return passive !== false;
}
