import { useNow } from '../clock/use-now.ts';
import { isUpgraded, type LiveState, lastHeardAt, liveState } from './live-state.ts';

/** `lastHeardAt` is by the server's clock; `upgraded` says that this page is older than the server. */
export type Live = { state: LiveState; lastHeardAt: number | null; upgraded: boolean };

/**
 * How this screen stands to the server, looked at each second. With a unit, it is also asked whether what
 * the screen holds of that unit keeps up with what the server has.
 */
export function useLive(unitId?: string): Live {
  useNow();
  return { state: liveState(unitId), lastHeardAt: lastHeardAt(unitId), upgraded: isUpgraded() };
}
