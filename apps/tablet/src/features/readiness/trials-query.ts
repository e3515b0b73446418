import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@windrow/client/http';
import type { Trial } from '@windrow/ventilation/contract/readiness';

/** The breathing trials of a stay. The bed's revision is part of the key, so a new fact reads them again. */
export function trialsQuery({ stayId, revision }: { stayId: string; revision: number }) {
  return queryOptions({
    queryKey: ['trials', stayId, revision],
    queryFn: ({ signal }) =>
      getJson<{ items: Trial[] }>(`/api/stays/${encodeURIComponent(stayId)}/trials`, { signal }),
    placeholderData: (before) => before,
  });
}
