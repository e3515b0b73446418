import type { Capacity } from '@windrow/ventilation/contract/fleet';
import { WITHDRAW_ALL_AFTER_MS } from '@windrow/ventilation/contract/live';

/** Three readings missed: the counts may no longer be so. */
export const OLD_AFTER_MS = 50_000;

/** How far the counts can still be trusted, from their age alone. A boundary belongs to the older state. */
export function countState(
  { serverTime }: Pick<Capacity, 'serverTime'>,
  now: number,
): 'current' | 'old' | 'withdrawn' {
  const ageMs = now - Date.parse(serverTime);
  if (ageMs >= WITHDRAW_ALL_AFTER_MS) return 'withdrawn';
  return ageMs >= OLD_AFTER_MS ? 'old' : 'current';
}
