import { useNow } from '@windrow/client/clock/use-now';
import { announce } from '@windrow/ui/controls/notice-host';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { formatMoment } from '@windrow/ventilation/format/clock';
import type { Policy } from '@windrow/ventilation/policy/policy';
import { useState } from 'react';
import { patientInWords } from '../patient-in-words.ts';
import { entryBody, keyOfPath } from './entry-body.ts';
import { EntryFill } from './entry-fill.tsx';
import type { EntryPlan } from './entry-plan.ts';
import { isLate, isSameTime, timeFrom } from './entry-time.ts';
import { type Refusals, refusalsOf } from './faults.ts';
import { findingsOf } from './findings.ts';
import { type EntryValues, obstaclesOf } from './judge-entry.ts';
import { reviewOf } from './review.ts';
import { ReviewPanel } from './review-panel.tsx';
import { focusRow } from './row-id.ts';
import { useEntry } from './use-entry.ts';
import { useRecording } from './use-recording.ts';

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

type Step = { is: 'fill' } | { is: 'review'; observedAt: number; body: Record<string, unknown> };

/** From the first value to the record: fill, review, record. Every kind of fact goes this way. */
export function EntryForm(props: EntryFormProps) {
  const {
    draftKey,
    planOf,
    initialValues,
    initialAt,
    latestId,
    stay,
    bedLabel,
    timeZone,
    thresholds,
    path,
    onDone,
  } = props;
  const { wrap = (body) => body, verb = 'Record', doneWords = 'Recorded' } = props;
  const now = useNow();
  const weightKg = stay.predictedBodyWeightKg;
  const initialTime = initialAt === undefined ? null : timeFrom(initialAt, timeZone);
  const entry = useEntry({ draftKey, planOf, initialValues, initialTime, latestId, weightKg, timeZone, now });
  const [step, setStep] = useState<Step>({ is: 'fill' });
  const [tries, setTries] = useState(0);
  const [refused, setRefused] = useState<{ refusals: Refusals; others: readonly string[] }>({
    refusals: {},
    others: [],
  });
  const { plan, judged, time } = entry;
  const findings = findingsOf({ plan, values: judged.values, stay, thresholds, at: now });
  // Before the first number there is nothing to flag but that nothing is there.
  const hasNumbers = judged.rows.some(
    ({ row, judgement }) => row.kind === 'number' && judgement.state === 'valid',
  );

  const refuse = (errors: readonly { key: string; message: string }[]) => {
    const next = refusalsOf({ errors, judged });
    setRefused(next);
    setStep({ is: 'fill' });
    const first = Object.keys(next.refusals)[0];
    // The rows are drawn again first.
    if (first) setTimeout(() => focusRow(first));
  };

  const recording = useRecording({
    path,
    onRecorded: () => {
      entry.forget();
      announce(`${doneWords} ${formatMoment(now, now, timeZone)}`);
      onDone(step.is === 'review' ? step.body : {});
    },
    onRefused: ({ problem }) => {
      const errors = (problem.errors ?? []).map(({ path: at, message }) => ({ key: keyOfPath(at), message }));
      // What is said of no row is said of the whole, in the review.
      if (errors.some(({ key }) => judged.rows.some(({ row }) => row.key === key))) refuse(errors);
    },
  });

  const review = () => {
    entry.dispatch({ type: 'leave-all' });
    setTries(tries + 1);
    if (obstaclesOf(judged).length > 0 || time.state === 'refused') return;
    // A clock shows no seconds; an instant that was left alone keeps its own.
    const isLeftAlone = initialAt !== undefined && isSameTime(entry.draft.time, initialTime);
    const observedAt = isLeftAlone ? initialAt : time.state === 'set' ? time.at : now;
    const made = entryBody({ plan, judged, observedAt });
    if (made.state === 'refused') {
      refuse(made.errors);
      return;
    }
    recording.reset();
    setStep({ is: 'review', observedAt, body: made.body });
  };

  if (step.is === 'review') {
    return (
      <ReviewPanel
        title={verb === 'Record' ? `Record this ${plan.title.toLowerCase()}?` : `${verb}?`}
        who={`${patientInWords(stay.patient)} · bed ${bedLabel}`}
        when={
          plan.timeLabel && whenInWords({ label: plan.timeLabel, observedAt: step.observedAt, now, timeZone })
        }
        statement={plan.statement}
        review={reviewOf(judged)}
        flags={findings.flags}
        verb={verb}
        recording={recording}
        onRecord={() => recording.send(wrap(step.body, judged.values))}
        onBack={() => setStep({ is: 'fill' })}
      />
    );
  }
  return (
    <EntryFill
      entry={entry}
      findings={hasNumbers ? findings : { ...findings, flags: [] }}
      refused={refused}
      tries={tries}
      verb={verb}
      hasNewer={latestId !== entry.draft.startedFrom}
      now={now}
      timeZone={timeZone}
      onReview={review}
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
