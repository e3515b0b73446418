import { type SupportId, supportEntry } from '../support/catalogue.ts';
import { instantMs } from '../units/instant.ts';

/** A time without a change of support through an artificial airway. */
export type Stretch = { fromMs: number; toMs: number; mode: SupportId };

/** How a mode counts in surveillance. */
export type Manner = 'conventional' | 'alternating' | 'high-frequency';

export type CheckedSupport = { observedAt: string; mode: SupportId };
/** A device put into the airway or taken out; an extubation takes it out too. */
export type AirwayChange = { observedAt: string; event: 'placed' | 'removed' };

type Told = { ms: number; order: number } & (
  | { tells: 'support'; mode: SupportId | null }
  | { tells: 'removed' }
  | { tells: 'placed' }
);

/**
 * When a patient was ventilated through an artificial airway, and how. What was last charted holds until the
 * next fact: a check in a mode that needs a tube begins or goes on, any other check (mask, high flow, T-piece,
 * collar) and the removal of the device end it. From a placement on it is so if the next such fact is a check
 * in a mode that needs a tube; a tracheostomy that is breathed through without a machine is none.
 *
 * @param input.until the instant up to which the last fact holds.
 * @source CDC NHSN, ventilator-associated event protocol: ventilation by mask does not count (from memory).
 */
export function ventilatedStretches({
  checks,
  airways,
  until,
}: {
  checks: readonly CheckedSupport[];
  airways: readonly AirwayChange[];
  until: string;
}): Stretch[] {
  const told = inOrder(checks, airways);
  const untilMs = instantMs('until', until);
  const stretches: Stretch[] = [];
  let mode: SupportId | null = null;
  for (const [index, fact] of told.entries()) {
    mode = modeAfter(mode, { fact, later: told.slice(index + 1, index + 1 + LOOK_AHEAD) });
    if (mode === null) continue;
    const toMs = told[index + 1]?.ms ?? untilMs;
    stretches.push({ fromMs: fact.ms, toMs: Math.max(fact.ms, toMs), mode });
  }
  return stretches;
}

/** Several placements may stand before the next check. */
const LOOK_AHEAD = 10;

function modeAfter(
  before: SupportId | null,
  { fact, later }: { fact: Told; later: readonly Told[] },
): SupportId | null {
  if (fact.tells === 'support') return fact.mode;
  if (fact.tells === 'removed') return null;
  if (before !== null) return before;
  const next = later.find(({ tells }) => tells !== 'placed');
  return next?.tells === 'support' ? next.mode : null;
}

/** Of facts at one instant the check is taken first, then a device out, then a device in. */
function inOrder(checks: readonly CheckedSupport[], airways: readonly AirwayChange[]): Told[] {
  const told: Told[] = [
    ...checks.map(({ observedAt, mode }, index) => ({
      ms: instantMs(`checks[${index}].observedAt`, observedAt),
      order: 0,
      tells: 'support' as const,
      mode: isThroughAirway(mode) ? mode : null,
    })),
    ...airways.map(({ observedAt, event }, index) => ({
      ms: instantMs(`airways[${index}].observedAt`, observedAt),
      order: event === 'removed' ? 1 : 2,
      tells: event,
    })),
  ];
  return told.sort((a, b) => a.ms - b.ms || a.order - b.order);
}

/** Whether a mode is ventilation through an artificial airway. */
export function isThroughAirway(mode: SupportId): boolean {
  return supportEntry(mode).kind === 'invasive';
}

/** For a mode through an artificial airway. */
export function mannerOf(mode: SupportId): Manner {
  if (supportEntry(mode).sequence === 'oscillation') return 'high-frequency';
  return mode === 'aprv' ? 'alternating' : 'conventional';
}
