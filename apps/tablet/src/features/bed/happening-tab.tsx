import { NOTHING_BEFORE } from './entry/entry-field.ts';
import { happeningPlan, namesCriterion } from './entry/plans/happening-plan.ts';
import { RecordingForm } from './recording-form.tsx';

export function HappeningTab() {
  return <RecordingForm name="happening" kind="happening" planOf={planOf} latestId={null} />;
}

function planOf(values: Readonly<Record<string, string>>) {
  return happeningPlan({
    kind: values.kind ?? '',
    earlier: () => NOTHING_BEFORE,
    hasCriteria: namesCriterion(values),
  });
}
