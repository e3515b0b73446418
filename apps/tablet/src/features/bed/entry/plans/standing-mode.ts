import type { BedCheck } from '@windrow/ventilation/contract/board';

/**
 * The mode of the last check while that check holds: not withdrawn, and nothing has changed the support
 * since. Null: its settings can no longer be said to be as before.
 *
 * @param input.mode what the patient is on now.
 */
export function standingMode({
  check,
  mode,
}: {
  check: Pick<BedCheck, 'mode' | 'changedSinceAt'> | null;
  mode: string | undefined;
}): string | null {
  return check !== null && check.changedSinceAt === null && check.mode === mode ? check.mode : null;
}
