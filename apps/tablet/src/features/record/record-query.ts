import { infiniteQueryOptions } from '@tanstack/react-query';
import { getJson } from '@windrow/client/http';
import type { RecordEntry } from '@windrow/ventilation/contract/observations';

export type RecordPage = { items: RecordEntry[]; nextCursor: string | null };

const PAGE = 30;
const FIRST_PAGE: string | null = null;

/** The whole record of a stay, newest first, a page at a time. */
export function recordQuery(stayId: string) {
  return infiniteQueryOptions({
    queryKey: ['record', stayId],
    initialPageParam: FIRST_PAGE,
    queryFn: ({ pageParam, signal }) => {
      const cursor = pageParam === null ? '' : `&cursor=${encodeURIComponent(pageParam)}`;
      return getJson<RecordPage>(`/api/stays/${encodeURIComponent(stayId)}/record?limit=${PAGE}${cursor}`, {
        signal,
      });
    },
    getNextPageParam: (page) => page.nextCursor,
    // Somebody else may have recorded meanwhile.
    staleTime: 0,
  });
}
