import { queryOptions } from '@tanstack/react-query';
import type { FirstAdministrator, Session, SignIn, Start } from '@windrow/ventilation/contract/session';
import { exchange, getJson, ProblemError } from '../http.ts';
import { newKey } from '../new-key.ts';

export const SESSION_KEY = ['session'] as const;

/** Who I am; null when nobody is signed in. */
export function sessionQuery() {
  return queryOptions({
    queryKey: SESSION_KEY,
    queryFn: ({ signal }) => getJson<Session>('/api/session', { signal }).catch(nullWhenSignedOut),
  });
}

/** What must be known before anybody signs in. */
export function startQuery() {
  return queryOptions({
    queryKey: ['start'],
    queryFn: ({ signal }) => getJson<Start>('/api/start', { signal }),
  });
}

export function signIn(body: SignIn): Promise<Session> {
  return post('/api/session', body);
}

export function signOut(): Promise<void> {
  return exchange('/api/session', { method: 'DELETE' });
}

/** The very first person of an empty installation, who is signed in by it. */
export function createFirstAdministrator(body: FirstAdministrator): Promise<Session> {
  return post('/api/start/administrator', body);
}

function post(path: string, body: unknown): Promise<Session> {
  return exchange(path, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json', 'Idempotency-Key': newKey() },
    body: JSON.stringify(body),
  });
}

function nullWhenSignedOut(error: unknown): null {
  if (error instanceof ProblemError && error.problem.status === 401) return null;
  throw error;
}
