import type { QueryClient } from '@tanstack/react-query';
import type { Bed, Board } from '@windrow/ventilation/contract/board';
import { boardKey } from '../board/board-queries.ts';
import { applyBedChanged } from '../live/apply-bed-changed.ts';

/**
 * Puts a bed that a write answered with into the cached board, by the same rule as the live link: only
 * the very next revision fits, anything else means that the board is read again.
 */
export async function keepBed(queryClient: QueryClient, bed: Bed): Promise<void> {
  const queryKey = boardKey(bed.unitId);
  const board = queryClient.getQueryData<Board>(queryKey);
  if (!board) return;
  const next = applyBedChanged(board, { revision: bed.revision, unitId: bed.unitId, bed });
  if (next === null) await queryClient.invalidateQueries({ queryKey });
  else if (next !== board) queryClient.setQueryData<Board>(queryKey, next);
}
