import { type Grant, may } from '@windrow/ventilation/permissions/permissions';

/**
 * The unit by which this screen tells whether it is live. Who may not see its board (who only sets it up)
 * hears nothing of it, and is told of the server alone.
 */
export function heardUnit({
  grants,
  unitId,
}: {
  grants: readonly Grant[];
  unitId: string | null;
}): string | undefined {
  return unitId !== null && may(grants, 'see-board', unitId) ? unitId : undefined;
}
