import { useQuery } from '@tanstack/react-query';
import { type ShownBed, shownBed } from '@windrow/ventilation/board/shown-bed';
import { withdrawAll } from '@windrow/ventilation/board/withdraw-all';
import type { BedStay, Board } from '@windrow/ventilation/contract/board';
import type { Session } from '@windrow/ventilation/contract/session';
import { useNow } from '../clock/use-now.ts';
import { useLive } from '../live/use-live.ts';
import { sessionQuery } from '../session/session.ts';
import { boardQuery } from './board-queries.ts';

export type PresentBed = {
  board: Board;
  shown: ShownBed;
  /** The stay with what may be shown of it in this second. */
  stay: BedStay;
  session: Session;
  now: number;
  timeZone: string;
};

/** A bed with a patient as it may be shown in this second; null until it is read, and where nobody lies. */
export function usePresentBed({ unitId, bedId }: { unitId: string; bedId: string }): PresentBed | null {
  const { data: session } = useQuery(sessionQuery());
  const { data: board } = useQuery(boardQuery(unitId, 'staff'));
  const now = useNow();
  const { state } = useLive();
  const bed = board?.beds.find((one) => one.bedId === bedId);
  if (!session || !board || !bed) return null;
  const aged = shownBed({ bed, now });
  const shown = state === 'withdrawn' ? withdrawAll(aged) : aged;
  const { stay } = shown.bed;
  return stay ? { board, shown, stay, session, now, timeZone: board.unit.timeZone } : null;
}
