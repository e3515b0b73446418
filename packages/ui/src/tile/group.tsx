import type { GroupView } from '@windrow/ventilation/board/tile/group-view';
import type { FactGroup } from '@windrow/ventilation/contract/board';
import { Cells } from './cells.tsx';

/** One group of facts: its values, raked when they have lain too long, or the words in their place. */
export function Group({ group, view }: { group: FactGroup; view: GroupView }) {
  const { body, remarks } = view;
  return (
    <div
      className={`tile-group ${rakeOf(view)}`}
      data-group={group}
      data-state={view.state}
      data-remarked={remarks.length > 0}
    >
      {'rows' in body ? (
        <div className="tile-rows">
          {body.rows.map(
            // A mode with few values may leave a row empty.
            (cells) => cells[0] && <Cells key={cells[0].key} cells={cells} />,
          )}
        </div>
      ) : (
        body.title !== '' && (
          <p className="tile-words">
            <span>{body.title}</span> {body.detail !== null && <small>{body.detail}</small>}
          </p>
        )
      )}
      {remarks.length > 0 && <p className="tile-remarks">{remarks.join(', ')}</p>}
    </div>
  );
}

export function rakeOf({ state }: Pick<GroupView, 'state'>): string {
  if (state === 'overdue') return 'rake-wide';
  return state === 'withdrawn' ? 'rake-dense' : '';
}
