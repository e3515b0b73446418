import type { BedCheck } from '../contract/board.ts';

type Breath = Pick<BedCheck, 'passive'>;

/**
 * Whether the plateau of this check can mean what it says: it is read in a pause, and an effort of the patient's
 * own moves it. Compliance, driving pressure, power and the limits of them are only had where somebody recorded
 * that there was none.
 */
export function wasPassive({ passive }: Breath): boolean {
  return passive === true;
}

/** Whether an effort was recorded; then intrinsic PEEP is no trapped gas. Where it was not said, the reading stands. */
export function madeEffort({ passive }: Breath): boolean {
  return passive === false;
}

/** Beside a plateau that is shown as it was entered and used for nothing; null where it may be used. */
export function notPassiveWords({ passive }: Breath): 'not passive' | 'passive? not recorded' | null {
  if (passive === true) return null;
  return passive === false ? 'not passive' : 'passive? not recorded';
}
