import type { ShownBed } from '@windrow/ventilation/board/shown-bed';
import type { BedStay, Board } from '@windrow/ventilation/contract/board';
import type { Session } from '@windrow/ventilation/contract/session';
import { useOutletContext } from 'react-router-dom';

/** What the page of a bed gives to each of its tabs. */
export type BedContext = {
  board: Board;
  shown: ShownBed;
  /** The stay with what may be shown of it; never absent under a tab. */
  stay: BedStay;
  /** The same as it was sent, for the ids of the latest facts. */
  stored: BedStay;
  session: Session;
  now: number;
  timeZone: string;
};

export function useBed(): BedContext {
  return useOutletContext<BedContext>();
}
