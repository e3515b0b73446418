import { NOT_LIVE_AFTER_MS, WITHDRAW_ALL_AFTER_MS } from '@windrow/ventilation/contract/live';
import { elapsedSince, serverNow } from '../clock/server-clock.ts';

/** How this screen stands to the server. */
export type LiveState = 'connecting' | 'live' | 'not-live' | 'withdrawn';

/** A moment by both clocks of this device, since neither alone can be trusted (see server-clock), and by the server's. */
type Moment = { steadyMs: number; wallMs: number; at: number };

let began = moment();
let last: Moment | null = null;
let byUnit = new Map<string, Moment>();
let version: string | null = null;
let upgraded = false;

function moment(): Moment {
  return { steadyMs: performance.now(), wallMs: Date.now(), at: serverNow() };
}

/** Called when a link is made: from now on silence counts. */
export function beginListening(): void {
  began = moment();
  last = null;
  byUnit = new Map();
  version = null;
  upgraded = false;
}

/** Called when the server was heard, and what this screen holds of the unit is what the server has. */
export function noteHeard(unitId: string | null): void {
  last = moment();
  if (unitId !== null) byUnit.set(unitId, last);
}

/** Called with the version that the server says it runs. */
export function noteVersion(said: string): void {
  version ??= said;
  upgraded = upgraded || said !== version;
}

/** Whether the server now runs another version than when this page began to listen. */
export function isUpgraded(): boolean {
  return upgraded;
}

/** When the server was last heard, by its own clock: about one unit, or at all. */
export function lastHeardAt(unitId?: string): number | null {
  return lastOf(unitId)?.at ?? null;
}

export function liveState(unitId?: string): LiveState {
  const heard = lastOf(unitId);
  return stateAfter({ silentMs: elapsedSince(heard ?? began), everHeard: heard !== null });
}

function lastOf(unitId: string | undefined): Moment | null {
  return unitId === undefined ? last : (byUnit.get(unitId) ?? null);
}

/** The rule alone: silence first says "not live", then takes everything away. */
export function stateAfter({ silentMs, everHeard }: { silentMs: number; everHeard: boolean }): LiveState {
  if (silentMs >= WITHDRAW_ALL_AFTER_MS) return 'withdrawn';
  if (silentMs >= NOT_LIVE_AFTER_MS) return 'not-live';
  return everHeard ? 'live' : 'connecting';
}
