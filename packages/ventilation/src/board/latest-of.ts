import type { Happening, HappeningKind } from '../contract/observations.ts';
import type { Stamped } from './facts.ts';

/** The newest happening of these kinds; the list is newest first. */
export function latestOf(
  happenings: readonly Stamped<Happening>[],
  kinds: readonly HappeningKind[],
): Stamped<Happening> | null {
  return happenings.find(({ body }) => kinds.includes(body.kind)) ?? null;
}
