import { QueryClient } from '@tanstack/react-query';
import type { Board } from '@windrow/ventilation/contract/board';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { boardKey, boardQuery } from './board-queries.ts';

const aBoard = (revision: number): Board => ({
  unit: {
    unitId: 'u1',
    name: 'Unit',
    timeZone: 'UTC',
    revision,
    nightFrom: '20:00',
    nightTo: '07:00',
    bedCount: 0,
  },
  revision,
  serverTime: '2026-03-05T10:00:00Z',
  at: null,
  demonstration: false,
  beds: [],
  fleet: { ready: 0 },
});

/** A server whose answer is on its way until it is let go. */
function slowServer(answer: Board) {
  let resolve: (response: Response) => void = () => {};
  const promise = new Promise<Response>((settle) => {
    resolve = settle;
  });
  const asked = vi.fn(() => promise);
  vi.stubGlobal('fetch', asked);
  return { asked, arrive: () => resolve(new Response(JSON.stringify(answer))) };
}

describe('boardQuery', () => {
  afterEach(() => vi.unstubAllGlobals());

  it('asks as the audience that the screen is', async () => {
    const { asked, arrive } = slowServer(aBoard(5));
    arrive();
    await new QueryClient().fetchQuery(boardQuery('u1', 'display'));
    expect(asked.mock.calls[0]).toEqual(expect.arrayContaining(['/api/units/u1/board?audience=display']));
  });

  it('keeps beds that arrived while an older answer was on its way', async () => {
    const client = new QueryClient();
    client.setQueryData(boardKey('u1'), aBoard(5));
    const { arrive } = slowServer(aBoard(5));
    const reading = client.fetchQuery({ ...boardQuery('u1', 'display'), staleTime: 0 });
    client.setQueryData(boardKey('u1'), aBoard(6));
    arrive();
    expect((await reading).revision).toBe(6);
  });

  it('takes an answer of a lower revision where nothing arrived meanwhile: the server was restored', async () => {
    const client = new QueryClient();
    client.setQueryData(boardKey('u1'), aBoard(50));
    const { arrive } = slowServer(aBoard(5));
    arrive();
    const read = await client.fetchQuery({ ...boardQuery('u1', 'display'), staleTime: 0 });
    expect(read.revision).toBe(5);
  });
});
