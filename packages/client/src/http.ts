import type { Problem } from '@windrow/ventilation/contract/problem';

/** The server answered, and said no: why is in the problem document. */
export class ProblemError extends Error {
  override readonly name = 'ProblemError';
  readonly problem: Problem;

  constructor(problem: Problem) {
    super(problem.detail);
    this.problem = problem;
  }
}

/** Nobody answered, so what became of the request is not known. */
export class NetworkError extends Error {
  override readonly name = 'NetworkError';
}

const TIMEOUT_MS = 10_000;

/** Reads JSON from our own origin. The shape is the contract's; the server is held to it by its tests. */
export function getJson<T>(path: string, { signal }: { signal?: AbortSignal } = {}): Promise<T> {
  return exchange<T>(path, { method: 'GET', signal: signal ?? null });
}

/**
 * One request and its answer, with the session's cookie. A network that swallows packets would keep
 * a request open for minutes, so each has a time limit.
 *
 * @throws ProblemError when the server refuses, NetworkError when no answer of the server arrives.
 */
export async function exchange<T>(path: string, init: RequestInit): Promise<T> {
  const response = await send(path, init);
  const body: unknown = await bodyOf(response);
  if (response.ok) return body as T;
  if (isProblem(body)) throw new ProblemError(body);
  // Our server always explains itself; this came from something in between.
  if (response.status >= 500) throw new NetworkError(`no answer from the server (${response.status})`);
  const title = response.statusText || 'Refused';
  throw new ProblemError({ type: 'about:blank', title, status: response.status, detail: title });
}

async function send(path: string, init: RequestInit): Promise<Response> {
  const limit = AbortSignal.timeout(TIMEOUT_MS);
  const signal = init.signal ? AbortSignal.any([init.signal, limit]) : limit;
  try {
    return await fetch(path, { cache: 'no-store', credentials: 'same-origin', ...init, signal });
  } catch (cause) {
    throw asNetworkError(cause, init.signal);
  }
}

async function bodyOf(response: Response): Promise<unknown> {
  if (response.status === 204) return undefined;
  const text = await response.text().catch((cause: unknown) => {
    throw asNetworkError(cause, null);
  });
  try {
    return JSON.parse(text);
  } catch {
    if (response.ok) throw new NetworkError('the answer was cut short');
    return undefined;
  }
}

/** A request that its caller gave up is no fault of the network. */
function asNetworkError(cause: unknown, given: AbortSignal | null | undefined): unknown {
  return given?.aborted ? cause : new NetworkError('the server cannot be reached', { cause });
}

function isProblem(body: unknown): body is Problem {
  return (
    typeof body === 'object' &&
    body !== null &&
    'status' in body &&
    typeof body.status === 'number' &&
    'title' in body &&
    typeof body.title === 'string' &&
    'detail' in body &&
    typeof body.detail === 'string'
  );
}
