import { RECORDED_KINDS, type RecordedKind } from '@windrow/ventilation/contract/observations';
import { useNavigate } from 'react-router-dom';
import { useBed } from './bed-context.ts';
import { EntryForm } from './entry/entry-form.tsx';
import type { EntryPlan } from './entry/entry-plan.ts';
import { useThresholds } from './use-thresholds.ts';

/** A form whose answers become a new fact of this stay. */
export function RecordingForm({
  name,
  kind,
  planOf,
  initialValues = {},
  latestId,
  backTo = 'now',
}: {
  /** Tells the drafts of one stay apart. */
  name: string;
  kind: RecordedKind;
  planOf: (values: Readonly<Record<string, string>>) => EntryPlan;
  initialValues?: Readonly<Record<string, string>>;
  latestId: string | null;
  /** The tab that is shown once it is recorded. */
  backTo?: 'now' | 'surveillance';
}) {
  const { shown, stay, timeZone, board } = useBed();
  const navigate = useNavigate();
  const thresholds = useThresholds(board.unit.unitId);
  const draftKey = `${stay.stayId}/${name}`;
  return (
    <EntryForm
      key={draftKey}
      draftKey={draftKey}
      planOf={planOf}
      initialValues={initialValues}
      latestId={latestId}
      stay={stay}
      bedLabel={shown.bed.label}
      timeZone={timeZone}
      thresholds={thresholds}
      path={`/api/stays/${encodeURIComponent(stay.stayId)}/${RECORDED_KINDS[kind].path}`}
      onDone={() => void navigate(`/beds/${board.unit.unitId}/${shown.bed.bedId}/${backTo}`)}
    />
  );
}
