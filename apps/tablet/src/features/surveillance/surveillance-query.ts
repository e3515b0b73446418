import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@windrow/client/http';
import type { Surveillance } from '@windrow/ventilation/contract/surveillance';

export function surveillanceKey(stayId: string) {
  return ['surveillance', stayId] as const;
}

/** The day table of a stay. It is computed when asked for, so it is asked for anew each time the page opens. */
export function surveillanceQuery(stayId: string) {
  return queryOptions({
    queryKey: surveillanceKey(stayId),
    queryFn: ({ signal }) =>
      getJson<Surveillance>(`/api/stays/${encodeURIComponent(stayId)}/surveillance`, { signal }),
    staleTime: 0,
  });
}
