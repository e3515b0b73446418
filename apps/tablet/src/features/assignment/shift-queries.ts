import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@windrow/client/http';
import type { Assignment, Colleague, Shift } from '@windrow/ventilation/contract/shifts';

/** What the live link may have missed while it was cut is found again within this time. */
const REREAD_EVERY_MS = 30_000;

/** The shifts of a unit. "Shifts changed" re-reads by this prefix, so the assignments below it too. */
export function shiftsKey(unitId: string) {
  return ['shifts', unitId] as const;
}

export function shiftsQuery(unitId: string) {
  return queryOptions({
    queryKey: shiftsKey(unitId),
    queryFn: ({ signal }) =>
      getJson<{ items: Shift[] }>(`/api/units/${encodeURIComponent(unitId)}/shifts`, { signal }),
    refetchInterval: REREAD_EVERY_MS,
  });
}

export function assignmentKey({ unitId, shiftId }: { unitId: string; shiftId: string }) {
  return [...shiftsKey(unitId), shiftId] as const;
}

export function assignmentPath(shiftId: string) {
  return `/api/shifts/${encodeURIComponent(shiftId)}/assignment`;
}

export function assignmentQuery(of: { unitId: string; shiftId: string }) {
  return queryOptions({
    queryKey: assignmentKey(of),
    queryFn: ({ signal }) => getJson<Assignment>(assignmentPath(of.shiftId), { signal }),
    refetchInterval: REREAD_EVERY_MS,
  });
}

export function colleaguesQuery(unitId: string) {
  return queryOptions({
    queryKey: ['colleagues', unitId],
    queryFn: ({ signal }) =>
      getJson<{ items: Colleague[] }>(`/api/units/${encodeURIComponent(unitId)}/colleagues`, { signal }),
  });
}
