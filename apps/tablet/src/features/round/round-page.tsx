import { useQuery } from '@tanstack/react-query';
import { boardQuery } from '@windrow/client/board/board-queries';
import { sessionQuery } from '@windrow/client/session/session';
import { ReadFault } from '@windrow/ui/controls/faults';
import { EmptyState, LoadingState } from '@windrow/ui/controls/states';
import type { Board } from '@windrow/ventilation/contract/board';
import type { Session } from '@windrow/ventilation/contract/session';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { RoundHeading } from './round-heading.tsx';
import { RoundList } from './round-list.tsx';
import { roundOf } from './round-order.ts';
import { useShownBeds } from './use-shown-beds.ts';

/** The unit as one person goes round it. */
export function RoundPage() {
  const { unitId = '' } = useParams();
  const { data: session } = useQuery(sessionQuery());
  const board = useQuery(boardQuery(unitId, 'staff'));
  if (!session) return null;
  if (board.isPending) return <LoadingState what="the unit's beds" />;
  if (!board.data)
    return <ReadFault error={board.error} what="The unit's beds" onRetry={() => void board.refetch()} />;
  return <Round key={unitId} board={board.data} session={session} />;
}

function Round({ board, session }: { board: Board; session: Session }) {
  const { shown, now } = useShownBeds(board);
  const round = roundOf({ beds: shown, personId: session.person.personId, now });
  const hasOwn = round.mine.length > 0;
  const [wantsAll, setWantsAll] = useState(false);
  const showsAll = wantsAll || !hasOwn;

  if (board.beds.length === 0) {
    return (
      <EmptyState title={`${board.unit.name} has no beds yet`}>
        <p>They are made in Setup.</p>
      </EmptyState>
    );
  }
  return (
    <div className="mx-auto flex w-full max-w-7xl flex-col gap-4">
      <RoundHeading
        round={round}
        person={session.person.displayName}
        showsAll={showsAll}
        onShowAll={hasOwn ? setWantsAll : null}
      />
      {hasOwn && (
        <RoundList
          title="My beds"
          beds={round.mine}
          now={now}
          timeZone={board.unit.timeZone}
          grants={session.grants}
        />
      )}
      {showsAll && (
        <>
          <RoundList
            title={hasOwn ? 'Other beds' : 'All beds'}
            beds={round.others}
            now={now}
            timeZone={board.unit.timeZone}
            grants={session.grants}
            emptyWords={
              hasOwn ? 'Every other bed of this unit is empty.' : 'Every bed of this unit is empty.'
            }
          />
          <RoundList
            title="Empty"
            beds={round.empty}
            now={now}
            timeZone={board.unit.timeZone}
            grants={session.grants}
          />
        </>
      )}
    </div>
  );
}
