import { queryOptions, useQuery } from '@tanstack/react-query';
import { getJson } from '@windrow/client/http';
import type { PolicyVersion } from '@windrow/ventilation/contract/setup';
import type { Policy } from '@windrow/ventilation/policy/policy';

/** The unit's policy; the live link says when it changes. */
export function policyQuery(unitId: string) {
  return queryOptions({
    queryKey: ['policy', unitId],
    queryFn: ({ signal }) =>
      getJson<PolicyVersion>(`/api/units/${encodeURIComponent(unitId)}/policy`, { signal }),
  });
}

/** What flags are held against while typing. Null until it is read: then no flag is guessed. */
export function useThresholds(unitId: string): Policy['thresholds'] | null {
  return useQuery(policyQuery(unitId)).data?.policy.thresholds ?? null;
}
