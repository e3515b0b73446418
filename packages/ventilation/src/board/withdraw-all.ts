import type { FactGroup } from '../contract/board.ts';
import type { ShownBed, ShownGroup } from './shown-bed.ts';

/**
 * A bed on a screen that has not heard the server for so long that nothing it holds may be taken for the
 * present: every group is withdrawn, whatever its age, and the flags are gone with them.
 */
export function withdrawAll({ bed, groups, assignment }: ShownBed): ShownBed {
  const withdrawn = { check: gone(groups.check), airway: gone(groups.airway), gas: gone(groups.gas) };
  if (!bed.stay) return { bed, groups: withdrawn, assignment };
  const at = (group: FactGroup) => groups[group].observedAt;
  const stay = {
    ...bed.stay,
    check: null,
    airway: null,
    gas: null,
    flags: [],
    screen: null,
    withdrawn: { check: at('check'), airway: at('airway'), gas: at('gas') },
  };
  return { bed: { ...bed, stay }, groups: withdrawn, assignment };
}

function gone(group: ShownGroup): ShownGroup {
  return group.state === 'never' ? group : { ...group, state: 'withdrawn' };
}
