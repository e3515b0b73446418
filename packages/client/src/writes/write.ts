import { exchange, NetworkError, ProblemError } from '../http.ts';
import { newKey } from '../new-key.ts';

export type Write = {
  method: 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  path: string;
  body?: unknown;
  /** The version that is replaced; the server refuses if another has come in between. */
  ifMatch?: number;
  /** Given where one act may be sent again later: the same act always under the same key. */
  key?: string;
  /** Told before each new try, so that a screen can say that the network is slow. */
  onRetry?: (attempt: number) => void;
};

const PAUSES_MS = [600, 2_000] as const;

/**
 * One write. Where no answer comes it is not known whether the server took it, so it is sent again under
 * the same key: the server answers a key that it knows with its first result, and nothing is saved twice.
 *
 * @throws ProblemError when the server refuses, NetworkError when no try was answered.
 */
export async function write<T>({ method, path, body, ifMatch, key = newKey(), onRetry }: Write): Promise<T> {
  const init: RequestInit = {
    method,
    headers: {
      'Idempotency-Key': key,
      ...(body === undefined ? {} : { 'Content-Type': 'application/json' }),
      ...(ifMatch === undefined ? {} : { 'If-Match': `"${ifMatch}"` }),
    },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
  };
  for (const [index, pause] of PAUSES_MS.entries()) {
    try {
      return await exchange<T>(path, init);
    } catch (error) {
      if (!isWorthRetrying(error)) throw error;
      onRetry?.(index + 1);
      await new Promise((resolve) => setTimeout(resolve, pause));
    }
  }
  return exchange<T>(path, init);
}

/** No answer, or an answer that says only that something broke: then the outcome is open. */
function isWorthRetrying(error: unknown): boolean {
  return error instanceof NetworkError || (error instanceof ProblemError && error.problem.status >= 500);
}
