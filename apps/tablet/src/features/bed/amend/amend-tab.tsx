import { entryIn } from '@windrow/client/writes/amend-state';
import { buttonClass } from '@windrow/ui/controls/button';
import { SegmentedChoice } from '@windrow/ui/controls/segmented-tabs';
import { EmptyState } from '@windrow/ui/controls/states';
import type { RecordEntry } from '@windrow/ventilation/contract/observations';
import { useCallback, useState } from 'react';
import { Link, useLocation, useNavigate } from 'react-router-dom';
import { useBed } from '../bed-context.ts';
import { EntryForm } from '../entry/entry-form.tsx';
import { struckPlan } from '../entry/plans/stay-plans.ts';
import { useThresholds } from '../use-thresholds.ts';
import { amendPlan, isAmendable, textsOf } from './amend-plan.ts';

type As = 'corrected' | 'struck';

const WAYS: readonly { value: As; label: string }[] = [
  { value: 'corrected', label: 'Correct the values' },
  { value: 'struck', label: 'Strike it, entered in error' },
];

/** Mends one entry of the record. Which one came along from the record's page. */
export function AmendTab() {
  const { board, shown, stay } = useBed();
  const state: unknown = useLocation().state;
  const entry = entryIn({ state, stayId: stay.stayId });
  const recordPath = `/beds/${board.unit.unitId}/${shown.bed.bedId}/record`;
  if (!entry || !isAmendable(entry)) {
    return (
      <EmptyState title="Which entry?">
        <Link to={recordPath} className={buttonClass()}>
          Choose it in the record
        </Link>
      </EmptyState>
    );
  }
  return <Amend key={entry.observationId} entry={entry} recordPath={recordPath} />;
}

function Amend({ entry, recordPath }: { entry: RecordEntry; recordPath: string }) {
  const { board, shown, stay, now, timeZone } = useBed();
  const navigate = useNavigate();
  const thresholds = useThresholds(board.unit.unitId);
  const [as, setAs] = useState<As>('corrected');
  const observedAt = Date.parse(entry.observedAt);
  const ageMinutes = Math.max(0, Math.floor((now - observedAt) / 60_000));
  const correctedPlan = useCallback(
    (values: Readonly<Record<string, string>>) => amendPlan({ entry, values, ageMinutes }),
    [entry, ageMinutes],
  );
  const common = {
    latestId: null,
    stay,
    bedLabel: shown.bed.label,
    timeZone,
    path: `/api/observations/${encodeURIComponent(entry.observationId)}/amendments`,
    doneWords: 'Amended',
    onDone: () => void navigate(recordPath, { replace: true }),
  };
  const draftKey = `${stay.stayId}/amend-${as}-${entry.observationId}`;

  return (
    <div className="flex flex-col gap-3">
      <SegmentedChoice label="How to amend" options={WAYS} value={as} onChoose={setAs} />
      {as === 'corrected' ? (
        <EntryForm
          key={draftKey}
          {...common}
          draftKey={draftKey}
          planOf={correctedPlan}
          initialValues={textsOf(entry.body)}
          initialAt={observedAt}
          thresholds={thresholds}
          verb="Amend"
          wrap={(body, { reason }) => ({ as: 'corrected', reason, body })}
        />
      ) : (
        <EntryForm
          key={draftKey}
          {...common}
          draftKey={draftKey}
          planOf={struckPlan}
          initialValues={{}}
          thresholds={null}
          verb="Strike"
        />
      )}
    </div>
  );
}
