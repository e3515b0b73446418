import { queryOptions } from '@tanstack/react-query';
import type { Board, Unit } from '@windrow/ventilation/contract/board';
import type { Audience } from '@windrow/ventilation/contract/live';
import { noteServerTime } from '../clock/server-clock.ts';
import { getJson } from '../http.ts';

export const UNITS_KEY = ['units'] as const;
export const BOARDS_KEY = ['board'] as const;

/** The units that this person or display may see. */
export function unitsQuery() {
  return queryOptions({
    queryKey: UNITS_KEY,
    queryFn: ({ signal }) => getJson<{ items: Unit[] }>('/api/units', { signal }),
  });
}

export function boardKey(unitId: string) {
  return [...BOARDS_KEY, unitId] as const;
}

/** One unit's board. After the first reading the live link keeps it, so it never goes stale by itself. */
export function boardQuery(unitId: string, audience: Audience) {
  const queryKey = boardKey(unitId);
  return queryOptions({
    queryKey,
    staleTime: Number.POSITIVE_INFINITY,
    queryFn: async ({ client, signal }): Promise<Board> => {
      const before = client.getQueryData<Board>(queryKey);
      const read = await getJson<Board>(
        `/api/units/${encodeURIComponent(unitId)}/board?audience=${audience}`,
        { signal },
      );
      noteServerTime(read.serverTime);
      const held = client.getQueryData<Board>(queryKey);
      // Beds that arrived while this answer was on its way are newer than the answer.
      const overtaken = held !== undefined && held !== before && held.revision > read.revision;
      return overtaken ? held : read;
    },
  });
}
