import { BEDSIDE_MOVES, NEXT_STATES, type VentilatorState } from '@windrow/ventilation/contract/fleet';
import { type Grant, mayAnywhere } from '@windrow/ventilation/permissions/permissions';

/**
 * The states to which these grants may take a machine from where it is. The bedside may use and return;
 * who manages the fleet may do all that can follow. In use needs a bed, so it is offered only to those who
 * may see one. The server decides; this only hides what it would refuse.
 */
export function allowedMoves({
  grants,
  from,
}: {
  grants: readonly Grant[];
  from: VentilatorState;
}): VentilatorState[] {
  const manages = mayAnywhere(grants, 'manage-fleet');
  const uses = mayAnywhere(grants, 'use-ventilator');
  const seesBeds = mayAnywhere(grants, 'see-board');
  return NEXT_STATES[from].filter((to) => {
    if (to === 'in-use' && !seesBeds) return false;
    return manages || (uses && BEDSIDE_MOVES.some(([a, b]) => a === from && b === to));
  });
}
