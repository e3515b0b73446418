import { SUPPORT_IDS, type SupportId, supportEntry } from '@windrow/ventilation/support/catalogue';
import type { DemoFact, DemoStay } from './demo-types.ts';

/**
 * What a stay's record says the patient breathes with at the end of it, and for how long they have been on a
 * ventilator (or off it) without a break.
 */
export function supportNow({ facts }: DemoStay): { id: SupportId; sinceMinutesAgo: number } | null {
  const told = facts.flatMap((fact) => {
    const id = supportOf(fact);
    return id ? [{ id, minutesAgo: fact.minutesAgo }] : [];
  });
  const last = told.at(-1);
  if (!last) return null;
  const { kind } = supportEntry(last.id);
  const firstOther = told.findLastIndex(({ id }) => supportEntry(id).kind !== kind);
  return { id: last.id, sinceMinutesAgo: told[firstOther + 1]?.minutesAgo ?? last.minutesAgo };
}

function supportOf({ body }: DemoFact): SupportId | undefined {
  const told = body.mode ?? body.toSupport;
  return SUPPORT_IDS.find((id) => id === told);
}
