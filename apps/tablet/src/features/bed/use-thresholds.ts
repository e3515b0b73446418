import { useQuery } from '@tanstack/react-query';
import { policyQuery } from '@windrow/client/board/policy-query';
import type { Policy } from '@windrow/ventilation/policy/policy';

/** What flags are held against while typing. Null until it is read: then no flag is guessed. */
export function useThresholds(unitId: string): Policy['thresholds'] | null {
  return useQuery(policyQuery(unitId)).data?.policy.thresholds ?? null;
}
