import type { QueryClient } from '@tanstack/react-query';
import type { Board } from '@windrow/ventilation/contract/board';
import type { Audience, Beat, BedChanged, Changed, ServerToClient } from '@windrow/ventilation/contract/live';
import { io, type Socket } from 'socket.io-client';
import { boardKey, UNITS_KEY } from '../board/board-queries.ts';
import { noteServerTime } from '../clock/server-clock.ts';
import { SESSION_KEY } from '../session/session.ts';
import { applyBedChanged } from './apply-bed-changed.ts';
import { beginListening, noteHeard, noteVersion } from './live-state.ts';

/** How long to wait before knocking again where the server has shown us the door. */
const KNOCK_AGAIN_MS = 5_000;

/** Keeps the cached boards as the server tells, until the returned function is called. */
export function connectLive({
  queryClient,
  audience,
}: {
  queryClient: QueryClient;
  audience: Audience;
}): () => void {
  beginListening();
  const socket: Socket<ServerToClient> = io({
    transports: ['websocket'],
    auth: { audience },
    reconnectionDelay: 500,
    reconnectionDelayMax: 5_000,
    timeout: 5_000,
  });
  let knocking: ReturnType<typeof setTimeout> | undefined;

  // Whatever was said while nobody listened is lost, so everything is read again.
  socket.on(
    'connect',
    () => void queryClient.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== SESSION_KEY[0] }),
  );
  socket.on('beat', (beat) => handleBeat(queryClient, beat));
  socket.on('bed', (changed) => handleBed(queryClient, changed));
  socket.on('changed', ({ topic, unitId }) => {
    for (const queryKey of keysOf(topic, unitId)) void queryClient.invalidateQueries({ queryKey });
  });

  // Socket.IO does not come back by itself once the server itself has closed the door: the session may be over.
  const knockLater = () => {
    if (socket.active) return;
    void queryClient.invalidateQueries({ queryKey: SESSION_KEY });
    clearTimeout(knocking);
    knocking = setTimeout(() => socket.connect(), KNOCK_AGAIN_MS);
  };
  socket.on('connect_error', knockLater);
  socket.on('disconnect', knockLater);

  return () => {
    clearTimeout(knocking);
    socket.removeAllListeners();
    socket.disconnect();
  };
}

/**
 * A beat is only word of life if this screen holds what the server has. A board that cannot be read again,
 * for whatever reason, so ends as "not live", though the link itself stands.
 */
function handleBeat(queryClient: QueryClient, beat: Beat): void {
  noteServerTime(beat.serverTime);
  noteVersion(beat.version);
  const { unitId } = beat;
  if (unitId === null) {
    noteHeard(null);
    return;
  }
  const queryKey = boardKey(unitId);
  const board = queryClient.getQueryData<Board>(queryKey);
  if (board && board.fleet.ready !== beat.ventilatorsReady) {
    queryClient.setQueryData<Board>(queryKey, { ...board, fleet: { ready: beat.ventilatorsReady } });
  }
  const keepsUp = !board || board.revision === beat.revision;
  if (keepsUp) noteHeard(unitId);
  else reread(queryClient, queryKey);
}

function handleBed(queryClient: QueryClient, changed: BedChanged): void {
  const queryKey = boardKey(changed.unitId);
  const board = queryClient.getQueryData<Board>(queryKey);
  const next = board ? applyBedChanged(board, changed) : null;
  if (next === null) {
    reread(queryClient, queryKey);
    return;
  }
  noteHeard(changed.unitId);
  if (next !== board) queryClient.setQueryData<Board>(queryKey, next);
}

/** A reading that is already on its way is let through: were each message to restart it, it might never arrive. */
function reread(queryClient: QueryClient, queryKey: readonly unknown[]): void {
  void queryClient.invalidateQueries({ queryKey }, { cancelRefetch: false });
}

function keysOf(topic: Changed['topic'], unitId: string | null): readonly (readonly unknown[])[] {
  switch (topic) {
    case 'shifts':
      return [inUnit('shifts', unitId)];
    case 'fleet':
      return [['fleet'], ['capacity']];
    case 'policy':
      return [inUnit('policy', unitId), inUnit('board', unitId)];
    case 'units':
      return [UNITS_KEY, inUnit('board', unitId)];
  }
}

/** Without a unit the change is of the whole house, and the key's first part covers all units. */
function inUnit(topic: string, unitId: string | null): readonly string[] {
  return unitId === null ? [topic] : [topic, unitId];
}
