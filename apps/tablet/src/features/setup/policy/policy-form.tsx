import type { Unit } from '@windrow/ventilation/contract/board';
import type { PolicyVersion } from '@windrow/ventilation/contract/setup';
import { useEffect } from 'react';
import { NotSaved } from '../not-saved.tsx';
import { LadderFields } from './ladder-fields.tsx';
import { NewerPolicy } from './newer-policy.tsx';
import { NightFields } from './night-fields.tsx';
import { PolicySave } from './policy-save.tsx';
import { PolicyStanding } from './policy-standing.tsx';
import { TaskFields } from './task-fields.tsx';
import { ThresholdFields } from './threshold-fields.tsx';
import { usePolicyForm } from './use-policy-form.ts';

/** A unit's policy, to be looked through and changed with a reason. */
export function PolicyForm({ unit, latest }: { unit: Unit; latest: PolicyVersion }) {
  const editing = usePolicyForm(latest);
  const { form, base, newer, replacement, takeTheirs } = editing;

  useEffect(() => {
    if (replacement) takeTheirs(replacement);
  }, [replacement, takeTheirs]);

  return (
    <form noValidate onSubmit={(event) => void editing.save(event)} className="flex flex-col gap-4">
      <PolicyStanding version={base} timeZone={unit.timeZone} />
      {newer && <NewerPolicy theirs={newer} mine={editing.mine} timeZone={unit.timeZone} editing={editing} />}
      <LadderFields form={form} />
      <TaskFields form={form} />
      <ThresholdFields form={form} />
      <NightFields form={form} />
      {editing.error && <NotSaved error={editing.error} />}
      <PolicySave editing={editing} />
    </form>
  );
}
