import type { Grant } from '@windrow/ventilation/permissions/permissions';
import { may, mayAnywhere } from '@windrow/ventilation/permissions/permissions';

const AT_BEDS: readonly string[] = ['therapist', 'charge', 'clinician'];

/**
 * Where a person's work begins. Those at the beds begin with their round, those who see to the house with
 * its capacity, those who set it up with that. Null: this sign-in has no place on a tablet.
 */
export function homePath({
  grants,
  unitIds,
  lastUnitId,
}: {
  grants: readonly Grant[];
  unitIds: readonly string[];
  lastUnitId: string | null;
}): string | null {
  const unitId = firstUnit({ grants, unitIds, lastUnitId });
  if (unitId !== null && grants.some(({ role }) => AT_BEDS.includes(role))) return `/round/${unitId}`;
  if (mayAnywhere(grants, 'see-capacity')) return '/capacity';
  if (mayAnywhere(grants, 'set-up')) return '/setup';
  return unitId !== null && may(grants, 'see-people', unitId) ? `/round/${unitId}` : null;
}

/** The unit used last, where it is still one of theirs; else the first whose people they may see. */
export function firstUnit({
  grants,
  unitIds,
  lastUnitId,
}: {
  grants: readonly Grant[];
  unitIds: readonly string[];
  lastUnitId: string | null;
}): string | null {
  const open = unitIds.filter((unitId) => may(grants, 'see-people', unitId));
  return open.find((unitId) => unitId === lastUnitId) ?? open[0] ?? null;
}
