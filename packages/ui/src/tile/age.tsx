import type { GroupView } from '@windrow/ventilation/board/tile/group-view';
import type { FactGroup } from '@windrow/ventilation/contract/board';

/** One age on the rail: quiet ink is current, dashes are due, a solid block is overdue or withdrawn. */
export function Age({ group, view: { state, age, ageWords } }: { group: FactGroup; view: GroupView }) {
  return (
    <div className="tile-age" data-group={group} data-state={state}>
      {age !== null && <span aria-hidden="true">{age}</span>}
      <span className="sr-only">{ageWords}</span>
    </div>
  );
}
