import { queryOptions } from '@tanstack/react-query';
import { getJson } from '@windrow/client/http';
import type { BedPlace } from '@windrow/ventilation/contract/board';
import type { Person } from '@windrow/ventilation/contract/setup';

type Page<T> = { items: T[]; nextCursor: string | null };

export const PEOPLE_KEY = ['people'] as const;

/** Everybody, so that a search finds whoever is meant. */
export function peopleQuery() {
  return queryOptions({
    queryKey: PEOPLE_KEY,
    queryFn: async ({ signal }) => {
      const people: Person[] = [];
      let cursor: string | null = null;
      do {
        const page: Page<Person> = await getJson<Page<Person>>(
          cursor ? `/api/people?cursor=${encodeURIComponent(cursor)}` : '/api/people',
          { signal },
        );
        people.push(...page.items);
        cursor = page.nextCursor ?? null;
      } while (cursor !== null);
      return people;
    },
  });
}

/** The beds of a unit without what is in them; who sets up a unit sees no patients. Below "units", so it is re-read with them. */
export function bedsKey(unitId: string) {
  return ['units', unitId, 'beds'] as const;
}

export function bedsPath(unitId: string) {
  return `/api/units/${encodeURIComponent(unitId)}/beds`;
}

export function bedsQuery(unitId: string) {
  return queryOptions({
    queryKey: bedsKey(unitId),
    queryFn: ({ signal }) => getJson<{ items: BedPlace[] }>(bedsPath(unitId), { signal }),
  });
}
