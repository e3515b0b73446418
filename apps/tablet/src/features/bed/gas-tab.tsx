import { useCallback } from 'react';
import { useBed } from './bed-context.ts';
import { earlierOf } from './entry/earlier.ts';
import type { Before } from './entry/entry-field.ts';
import { gasPlan } from './entry/plans/gas-plan.ts';
import type { Earlier } from './entry/rows.ts';
import { RecordingForm } from './recording-form.tsx';

/** PEEP has another name in each family of modes; at the draw it is one thing. */
const PEEP_KEYS = ['peepCmH2O', 'epapCmH2O', 'cpapCmH2O', 'pLowCmH2O'] as const;

export function GasTab() {
  const { shown, stored } = useBed();
  const planOf = useCallback(() => {
    const check = earlierOf({ shown, group: 'check' });
    return gasPlan({
      earlier: earlierOf({ shown, group: 'gas' }),
      asSet: (key) => (key === 'peepCmH2O' ? peepIn(check) : check(key)),
    });
  }, [shown]);
  return <RecordingForm name="gas" kind="gas" planOf={planOf} latestId={stored.gas?.observationId ?? null} />;
}

function peepIn(check: Earlier): Before {
  const found = PEEP_KEYS.map(check).find(({ state }) => state === 'shown');
  return found ?? check('peepCmH2O');
}
