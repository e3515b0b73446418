import { useQuery } from '@tanstack/react-query';
import { boardQuery } from '@windrow/client/board/board-queries';
import { CannotRead } from '../messages/cannot-read.tsx';
import { Message } from '../messages/message.tsx';
import { RETRY_EVERY_MS } from '../messages/retry.ts';
import { LiveBoard } from './live-board.tsx';

/** Reads a unit's board as displays may see it. A failed later reading keeps the board; the live mark then tells. */
export function BoardScreen({ unitId, hasOtherUnits }: { unitId: string; hasOtherUnits: boolean }) {
  const board = useQuery({
    ...boardQuery(unitId, 'display'),
    refetchInterval: ({ state }) => (state.status === 'error' ? RETRY_EVERY_MS : false),
  });
  if (board.data) return <LiveBoard board={board.data} hasOtherUnits={hasOtherUnits} />;
  if (board.isError) return <CannotRead error={board.error} onRetry={() => void board.refetch()} />;
  return <Message title="Windrow" sentence="Reading the board" />;
}
