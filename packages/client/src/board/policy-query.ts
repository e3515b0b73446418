import { queryOptions } from '@tanstack/react-query';
import type { PolicyVersion } from '@windrow/ventilation/contract/setup';
import { getJson } from '../http.ts';

export const policyKey = (unitId: string) => ['policy', unitId] as const;
export const policyPath = (unitId: string) => `/api/units/${encodeURIComponent(unitId)}/policy`;

/** The unit's policy: its ladder, thresholds and what its tasks take. The live link says when it changes. */
export function policyQuery(unitId: string) {
  return queryOptions({
    queryKey: policyKey(unitId),
    queryFn: ({ signal }) => getJson<PolicyVersion>(policyPath(unitId), { signal }),
  });
}
