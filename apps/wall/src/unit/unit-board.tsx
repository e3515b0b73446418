import { useQuery } from '@tanstack/react-query';
import { unitsQuery } from '@windrow/client/board/board-queries';
import { useEffect } from 'react';
import { BoardScreen } from '../board/board-screen.tsx';
import { CannotRead } from '../messages/cannot-read.tsx';
import { Message } from '../messages/message.tsx';
import { RETRY_EVERY_MS } from '../messages/retry.ts';
import { showUnit, useAddress } from './address.ts';
import { UnitChooser } from './unit-chooser.tsx';

/** The unit of the address; where it names none, the only one there is, or else a choice. */
export function UnitBoard() {
  const units = useQuery({
    ...unitsQuery(),
    refetchInterval: ({ state }) =>
      state.data === undefined && state.status === 'error' ? RETRY_EVERY_MS : false,
  });
  const asked = useAddress('unit');
  const items = units.data?.items;
  const only = items?.length === 1 ? items[0] : undefined;
  useEffect(() => {
    if (asked === null && only) showUnit(only.unitId, { replace: true });
  }, [asked, only]);

  if (!items) {
    if (units.isError) return <CannotRead error={units.error} onRetry={() => void units.refetch()} />;
    return <Message title="Windrow" sentence="Reading the units" />;
  }
  const unit = items.find(({ unitId }) => unitId === asked) ?? (asked === null ? only : undefined);
  if (!unit) return <UnitChooser units={items} asked={asked} />;
  return <BoardScreen key={unit.unitId} unitId={unit.unitId} hasOtherUnits={items.length > 1} />;
}
