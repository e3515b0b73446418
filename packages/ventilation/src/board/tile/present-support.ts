import type { BedStay } from '../../contract/board.ts';
import type { ShownBed, ShownGroup } from '../shown-bed.ts';

/**
 * What the bed may be said to breathe with now. Support is known by a check, or by a happening such as an
 * extubation; either way it does not outlive the ladder of checks. Null: nobody may say so any more.
 *
 * @param input.now server time, epoch milliseconds.
 */
export function presentSupport({
  shown: { bed, groups },
  now,
}: {
  shown: ShownBed;
  now: number;
}): BedStay['support'] {
  const { stay } = bed;
  if (!stay?.support) return null;
  if (stay.check) return stay.support;
  const sinceMs = Date.parse(stay.support.sinceAt);
  const isYoung = now - sinceMs < stay.ladder.check.withdrawFrom * 60_000;
  return isYoung && isAfter(stay.support.sinceAt, groups.check) ? stay.support : null;
}

/** The mode of the last check, once that check is withdrawn: known only if nothing has changed the support since. */
export function supportOfLastCheck({ bed, groups }: ShownBed): string | null {
  const { stay } = bed;
  if (!stay?.support) return null;
  return isAfter(stay.support.sinceAt, groups.check) ? null : stay.support.shortName;
}

function isAfter(sinceAt: string, { observedAt }: ShownGroup): boolean {
  return observedAt === null || Date.parse(sinceAt) > Date.parse(observedAt);
}
