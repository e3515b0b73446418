import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { NetworkError, ProblemError } from '../http.ts';
import { type Write, write } from './write.ts';

const answers: (() => Promise<Response>)[] = [];
const seen: { key: string | null; ifMatch: string | null; body: unknown }[] = [];

function problem(status: number) {
  return () =>
    Promise.resolve(
      new Response(JSON.stringify({ type: 'about:blank', title: 'No', status, detail: 'no' }), { status }),
    );
}
const lost = () => Promise.reject(new TypeError('network'));
const taken = () => Promise.resolve(new Response('{"observationId":"o1"}', { status: 201 }));

/** The pauses between tries pass at once. */
async function sent<T>(what: Write): Promise<T> {
  const answer = write<T>(what);
  answer.catch(() => undefined);
  await vi.runAllTimersAsync();
  return answer;
}

beforeEach(() => {
  vi.useFakeTimers({ toFake: ['setTimeout', 'clearTimeout'] });
  vi.stubGlobal('fetch', (_path: string, init: RequestInit) => {
    const headers = new Headers(init.headers);
    seen.push({ key: headers.get('Idempotency-Key'), ifMatch: headers.get('If-Match'), body: init.body });
    return (answers.shift() ?? lost)();
  });
});
afterEach(() => {
  answers.length = 0;
  seen.length = 0;
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

describe('write', () => {
  it('sends again under the same key when the network is lost', async () => {
    answers.push(lost, lost, taken);
    const answer = await sent<{ observationId: string }>({ method: 'POST', path: '/api/x', body: { a: 1 } });
    expect(answer.observationId).toBe('o1');
    expect(seen).toHaveLength(3);
    expect(new Set(seen.map(({ key }) => key)).size).toBe(1);
    expect(new Set(seen.map(({ body }) => body)).size).toBe(1);
  });

  it('keeps the key that it was given, and names the version it replaces', async () => {
    answers.push(taken);
    await sent({ method: 'PATCH', path: '/api/x', body: {}, key: 'k1', ifMatch: 4 });
    expect(seen).toEqual([{ key: 'k1', ifMatch: '"4"', body: '{}' }]);
  });

  it('gives up with a network error after three tries', async () => {
    await expect(sent({ method: 'POST', path: '/api/x' })).rejects.toBeInstanceOf(NetworkError);
    expect(seen).toHaveLength(3);
  });

  it('does not repeat what the server refused', async () => {
    answers.push(problem(409), taken);
    await expect(sent({ method: 'POST', path: '/api/x' })).rejects.toBeInstanceOf(ProblemError);
    expect(seen).toHaveLength(1);
  });

  it('repeats where the server broke, since the outcome is open', async () => {
    answers.push(problem(500), taken);
    await sent({ method: 'POST', path: '/api/x' });
    expect(seen).toHaveLength(2);
  });
});
