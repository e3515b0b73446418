import { useNow } from '@windrow/client/clock/use-now';
import { announce } from '@windrow/ui/controls/notice-host';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { formatMoment } from '@windrow/ventilation/format/clock';
import type { Policy } from '@windrow/ventilation/policy/policy';
import { patientInWords } from '../patient-in-words.ts';
import type { EntryValues } from './entry-field.ts';
import { EntryFill } from './entry-fill.tsx';
import type { EntryPlan } from './entry-plan.ts';
import { isLate } from './entry-time.ts';
import { findingsOf } from './findings.ts';
import { reviewOf } from './review.ts';
import { ReviewPanel } from './review-panel.tsx';
import { useEntryFlow } from './use-entry-flow.ts';

export type EntryFormProps = {
  draftKey: string;
  planOf: (values: Readonly<Record<string, string>>) => EntryPlan;
  initialValues: Readonly<Record<string, string>>;
  /** The instant that the form opens with; without it, now. */
  initialAt?: number;
  latestId: string | null;
  stay: BedStay;
  bedLabel: string;
  timeZone: string;
  thresholds: Policy['thresholds'] | null;
  /** Where it is sent, and what is put around the fact. */
  path: string;
  wrap?: (body: Record<string, unknown>, values: EntryValues) => unknown;
  /** What the last button does, and what is said when it is done. */
  verb?: string;
  doneWords?: string;
  onDone: (body: Record<string, unknown>) => void;
};

/** From the first value to the record: fill, review, record. Every kind of fact goes this way. */
export function EntryForm({
  wrap = (body) => body,
  verb = 'Record',
  doneWords = 'Recorded',
  ...props
}: EntryFormProps) {
  const { draftKey, planOf, initialValues, initialAt, latestId, stay, bedLabel, timeZone, thresholds, path } =
    props;
  const now = useNow();
  const weightKg = stay.predictedBodyWeightKg;
  const flow = useEntryFlow({
    ...{ draftKey, planOf, initialValues, initialAt, latestId, weightKg, timeZone, now, path, wrap },
    onRecorded: (body, isHere) => {
      announce(`${doneWords} ${formatMoment(now, now, timeZone)}`);
      if (isHere) props.onDone(body);
    },
  });
  const { entry, step } = flow;
  const { plan, judged } = entry;
  const findings = findingsOf({ plan, values: judged.values, stay, thresholds, at: now });

  if (step.is === 'review') {
    return (
      <ReviewPanel
        title={verb === 'Record' ? `Record this ${plan.title.toLowerCase()}?` : `${verb}?`}
        who={`${patientInWords(stay.patient)} · bed ${bedLabel}`}
        when={
          plan.timeLabel && whenInWords({ label: plan.timeLabel, observedAt: step.observedAt, now, timeZone })
        }
        statement={plan.statement}
        review={reviewOf({ plan, judged, ageMinutes: (now - step.observedAt) / 60_000 })}
        flags={findings.flags}
        verb={verb}
        recording={flow.recording}
        wasSent={flow.wasSent}
        onRecord={flow.record}
        isOpen={flow.isOpen}
        mayStand={entry.draft.mayStand}
        onBack={flow.back}
        onStop={flow.stop}
      />
    );
  }
  // Before the first number there is nothing to flag but that nothing is there.
  const hasNumbers = judged.rows.some(
    ({ row, judgement }) => row.kind === 'number' && judgement.state === 'valid',
  );
  return (
    <EntryFill
      entry={entry}
      findings={hasNumbers ? findings : { ...findings, flags: [] }}
      refused={flow.refused}
      tries={flow.tries}
      verb={verb}
      hasNewer={latestId !== entry.draft.startedFrom}
      now={now}
      timeZone={timeZone}
      onReview={flow.review}
    />
  );
}

function whenInWords({
  label,
  observedAt,
  now,
  timeZone,
}: {
  label: string;
  observedAt: number;
  now: number;
  timeZone: string;
}): string {
  const observed = `${label} ${formatMoment(observedAt, now, timeZone)}`;
  return isLate({ observedAt, recordedAt: now })
    ? `${observed} · recorded ${formatMoment(now, now, timeZone)}, a late entry`
    : observed;
}
