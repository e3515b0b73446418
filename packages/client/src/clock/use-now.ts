import { useSyncExternalStore } from 'react';
import { onClockJump, serverNow } from './server-clock.ts';

const SECOND_MS = 1_000;
const readers = new Set<() => void>();
let shownMs = serverNow();
let timer: ReturnType<typeof setTimeout> | undefined;
let stopListening: (() => void) | undefined;

/**
 * The server's time in steps of `everyMs` (a whole number of seconds), rounded down. All readers share
 * one timer, and one is redrawn only when its own step has passed.
 */
export function useNow(everyMs: number = SECOND_MS): number {
  return useSyncExternalStore(subscribe, () => {
    // Nobody keeps the time while nobody reads it; the first reader must not see when the last one left.
    if (readers.size === 0) shownMs = serverNow();
    return Math.floor(shownMs / everyMs) * everyMs;
  });
}

function subscribe(reader: () => void): () => void {
  readers.add(reader);
  if (readers.size === 1) start();
  return () => {
    readers.delete(reader);
    if (readers.size === 0) stop();
  };
}

function start(): void {
  const stopJumps = onClockJump(tick);
  // A hidden page is given fewer ticks; it must be right the moment it is seen again.
  document.addEventListener('visibilitychange', tick);
  stopListening = () => {
    stopJumps();
    document.removeEventListener('visibilitychange', tick);
  };
  tick();
}

function stop(): void {
  clearTimeout(timer);
  stopListening?.();
}

function tick(): void {
  clearTimeout(timer);
  shownMs = serverNow();
  timer = setTimeout(tick, SECOND_MS - (shownMs % SECOND_MS));
  for (const reader of readers) reader();
}
