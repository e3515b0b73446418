import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@windrow/client/http';
import type { Ventilator } from '@windrow/ventilation/contract/fleet';

type Page = { items: Ventilator[]; nextCursor: string | null };

/** Machines that can be taken to a bed. Below "fleet", so that it is read again when any machine moves. */
export function readyVentilatorsQuery() {
  return queryOptions({
    queryKey: ['fleet', 'ready'],
    queryFn: async ({ signal }) => {
      const ready: Ventilator[] = [];
      let cursor: string | null = null;
      do {
        const page: Page = await getJson<Page>(
          cursor ? `/api/ventilators?cursor=${encodeURIComponent(cursor)}` : '/api/ventilators',
          { signal },
        );
        ready.push(...page.items.filter(({ state }) => state === 'ready'));
        cursor = page.nextCursor ?? null;
      } while (cursor !== null);
      return ready;
    },
  });
}
