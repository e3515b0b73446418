import type { QueryClient } from '@tanstack/react-query';
import { ProblemError } from '@windrow/client/http';
import { SESSION_KEY } from '@windrow/client/session/session';
import { clearAllDrafts } from '@windrow/client/writes/drafts';
import type { Session } from '@windrow/ventilation/contract/session';
import { useSyncExternalStore } from 'react';

/**
 * A session that ends by itself must not cost what somebody was typing. So pages go on with the session
 * that they had, and only this says that it is over; the shell then asks to sign in, over the page.
 */
let held: Session | null = null;
let isOver = false;
const listeners = new Set<() => void>();

function setOver(over: boolean): void {
  if (isOver === over) return;
  isOver = over;
  for (const listener of listeners) listener();
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function useSessionOver(): boolean {
  return useSyncExternalStore(subscribe, () => isOver);
}

/** Watches the cache from the start, so that no page ever sees the session vanish under it. */
export function holdSession(queryClient: QueryClient): void {
  queryClient.getQueryCache().subscribe(({ query, type }) => {
    if (type !== 'updated' || query.queryKey[0] !== SESSION_KEY[0]) return;
    const now = queryClient.getQueryData<Session | null>(SESSION_KEY);
    if (now) {
      held = now;
    } else if (now === null && held !== null) {
      setOver(true);
      queryClient.setQueryData(SESSION_KEY, held);
    }
  });
  queryClient.getMutationCache().subscribe((event) => {
    if (event.type !== 'updated' || event.action.type !== 'error') return;
    const { error } = event.action;
    if (held !== null && error instanceof ProblemError && error.problem.status === 401) setOver(true);
  });
}

/** Somebody has signed in, for the first time or again. True: it is the same person, so the page can go on. */
export function takeSession(queryClient: QueryClient, session: Session): boolean {
  const isSame = held?.person.personId === session.person.personId;
  if (held !== null && !isSame) {
    clearAllDrafts();
    queryClient.clear();
  }
  held = session;
  queryClient.setQueryData(SESSION_KEY, session);
  setOver(false);
  return isSame;
}

/** What the sign-in page itself reads. */
const OF_NOBODY: readonly unknown[] = [SESSION_KEY[0], 'start'];

/** After a sign-out that was meant: nothing of this person stays on the device. */
export function dropSession(queryClient: QueryClient): void {
  held = null;
  clearAllDrafts();
  queryClient.setQueryData(SESSION_KEY, null);
  queryClient.removeQueries({ predicate: ({ queryKey }) => !OF_NOBODY.includes(queryKey[0]) });
  queryClient.getMutationCache().clear();
  setOver(false);
}
