import { presentSupport } from '@windrow/ventilation/board/tile/present-support';
import { useCallback } from 'react';
import { useBed } from './bed-context.ts';
import { earlierOf } from './entry/earlier.ts';
import { checkPlan } from './entry/plans/check-plan.ts';
import { standingMode } from './entry/plans/standing-mode.ts';
import type { Earlier } from './entry/rows.ts';
import { RecordingForm } from './recording-form.tsx';

/** A whole check. It opens in the mode that the patient is on; every number is given or confirmed by hand. */
export function CheckTab() {
  const { shown, stored, now } = useBed();
  const mode = presentSupport({ shown, now })?.id;
  const standing = standingMode({ check: shown.bed.stay?.check ?? null, mode });
  const planOf = useCallback(
    (values: Readonly<Record<string, string>>) =>
      checkPlan({ mode: values.mode ?? '', earlier: earlierCheck({ shown, mode }), standing }),
    [shown, mode, standing],
  );
  return (
    <RecordingForm
      name="check"
      kind="check"
      planOf={planOf}
      initialValues={mode ? { mode } : {}}
      latestId={stored.check?.observationId ?? null}
    />
  );
}

/** An extubation changes the support after the last check: then the mode before is what it changed to. */
function earlierCheck({
  shown,
  mode,
}: {
  shown: ReturnType<typeof useBed>['shown'];
  mode: string | undefined;
}): Earlier {
  const earlier = earlierOf({ shown, group: 'check' });
  return (key) => {
    const before = earlier(key);
    return key === 'mode' && mode !== undefined && before.state === 'shown'
      ? { ...before, value: mode }
      : before;
  };
}
