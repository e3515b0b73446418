import { useNow } from '@windrow/client/clock/use-now';
import { useLive } from '@windrow/client/live/use-live';
import { type ShownBed, shownBed } from '@windrow/ventilation/board/shown-bed';
import { withdrawAll } from '@windrow/ventilation/board/withdraw-all';
import type { Board } from '@windrow/ventilation/contract/board';

/** The beds as they may be shown in this second. After long silence about their unit nothing may be. */
export function useShownBeds({ unit, beds }: Pick<Board, 'unit' | 'beds'>): {
  shown: readonly ShownBed[];
  now: number;
} {
  const now = useNow();
  const { state } = useLive(unit.unitId);
  const aged = beds.map((bed) => shownBed({ bed, now }));
  return { shown: state === 'withdrawn' ? aged.map(withdrawAll) : aged, now };
}
