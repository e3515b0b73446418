import { useQuery } from '@tanstack/react-query';
import { boardQuery } from '@windrow/client/board/board-queries';
import { useNow } from '@windrow/client/clock/use-now';
import { useLive } from '@windrow/client/live/use-live';
import { sessionQuery } from '@windrow/client/session/session';
import { ReadFault } from '@windrow/ui/controls/faults';
import { EmptyState, LoadingState } from '@windrow/ui/controls/states';
import { type ShownBed, shownBed } from '@windrow/ventilation/board/shown-bed';
import { withdrawAll } from '@windrow/ventilation/board/withdraw-all';
import type { Bed, Board } from '@windrow/ventilation/contract/board';
import type { Session } from '@windrow/ventilation/contract/session';
import { useState } from 'react';
import { Outlet, useParams } from 'react-router-dom';
import type { BedContext } from './bed-context.ts';
import { BedHeader } from './bed-header.tsx';
import { BedTabs } from './bed-tabs.tsx';
import { EmptyBed } from './empty-bed.tsx';
import { PatientGone } from './patient-gone.tsx';

/** One bed: who lies there, and the tabs of what is known and what can be recorded. */
export function BedPage() {
  const { unitId = '', bedId = '' } = useParams();
  const { data: session } = useQuery(sessionQuery());
  const board = useQuery(boardQuery(unitId, 'staff'));
  if (!session) return null;
  if (board.isPending) return <LoadingState what="the bed" />;
  if (!board.data)
    return <ReadFault error={board.error} what="The bed" onRetry={() => void board.refetch()} />;
  const bed = board.data.beds.find((one) => one.bedId === bedId);
  if (!bed) return <EmptyState title={`${board.data.unit.name} has no such bed`} />;
  return <OneBed key={bedId} board={board.data} bed={bed} session={session} />;
}

function OneBed({ board, bed, session }: { board: Board; bed: Bed; session: Session }) {
  const now = useNow();
  const { state } = useLive(board.unit.unitId);
  const [opened, setOpened] = useState(bed.stay);
  const aged = shownBed({ bed, now });
  const shown: ShownBed = state === 'withdrawn' ? withdrawAll(aged) : aged;
  const { stay } = shown.bed;
  // Opened on an empty bed, the page is for whoever comes into it first.
  if (opened === null && bed.stay !== null) setOpened(bed.stay);
  if (opened !== null && opened.stayId !== stay?.stayId) {
    return <PatientGone opened={opened} bed={bed} board={board} onRead={() => setOpened(bed.stay)} />;
  }
  if (!stay || !bed.stay) return <EmptyBed bed={bed} grants={session.grants} />;

  const context: BedContext = {
    board,
    shown,
    stay,
    stored: bed.stay,
    session,
    now,
    timeZone: board.unit.timeZone,
  };
  return (
    <div className="mx-auto flex w-full max-w-7xl grow flex-col gap-3">
      <BedHeader shown={shown} stay={stay} now={now} timeZone={board.unit.timeZone} />
      <BedTabs bed={bed} stayId={stay.stayId} grants={session.grants} />
      <Outlet key={stay.stayId} context={context} />
    </div>
  );
}
