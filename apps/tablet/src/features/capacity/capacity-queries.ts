import { queryOptions } from '@tanstack/react-query';
import { noteServerTime } from '@windrow/client/clock/server-clock';
import { getJson } from '@windrow/client/http';
import type { Capacity, Ventilator, VentilatorMoved } from '@windrow/ventilation/contract/fleet';

/** Beds change without a word about capacity, so it is asked for again this often. */
const REREAD_EVERY_MS = 15_000;

export function capacityQuery() {
  return queryOptions({
    queryKey: ['capacity'],
    queryFn: async ({ signal }) => {
      const capacity = await getJson<Capacity>('/api/capacity', { signal });
      noteServerTime(capacity.serverTime);
      return capacity;
    },
    refetchInterval: REREAD_EVERY_MS,
    staleTime: 0,
  });
}

type Page<T> = { items: T[]; nextCursor: string | null };

export const FLEET_KEY = ['fleet'] as const;

/** Every machine. The list comes in pages; a count or a search over half of it would mislead. */
export function fleetQuery() {
  return queryOptions({
    queryKey: FLEET_KEY,
    queryFn: ({ signal }) => allPages<Ventilator>('/api/ventilators', signal),
    refetchInterval: 2 * REREAD_EVERY_MS,
  });
}

export function movesPath(ventilatorId: string) {
  return `/api/ventilators/${encodeURIComponent(ventilatorId)}/moves`;
}

/** Where one machine has been, newest first. */
export function movesQuery(ventilatorId: string) {
  return queryOptions({
    queryKey: [...FLEET_KEY, ventilatorId, 'moves'],
    queryFn: ({ signal }) => allPages<VentilatorMoved>(movesPath(ventilatorId), signal),
  });
}

async function allPages<T>(path: string, signal: AbortSignal): Promise<T[]> {
  const items: T[] = [];
  let cursor: string | null = null;
  do {
    const page: Page<T> = await getJson<Page<T>>(
      cursor ? `${path}?cursor=${encodeURIComponent(cursor)}` : path,
      { signal },
    );
    items.push(...page.items);
    cursor = page.nextCursor ?? null;
  } while (cursor !== null);
  return items;
}
