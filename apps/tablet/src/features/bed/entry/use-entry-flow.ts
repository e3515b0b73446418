import { newKey } from '@windrow/client/new-key';
import { draftStore } from '@windrow/client/writes/drafts';
import { useState } from 'react';
import { entryBody, keyOfPath } from './entry-body.ts';
import type { EntryValues } from './entry-field.ts';
import { isSameTime, timeFrom } from './entry-time.ts';
import { type Refusals, refusalsOf } from './faults.ts';
import { obstaclesOf } from './judge-entry.ts';
import { focusRow } from './row-id.ts';
import { afterRefusal, type Reviewed, type Sent, sending, wayBack } from './sent.ts';
import { type Entry, type EntryInput, useEntry } from './use-entry.ts';
import { type Recording, useRecording } from './use-recording.ts';

export type Refused = { refusals: Refusals; others: readonly string[] };

export type Step = { is: 'fill' } | Reviewed;

/** Sent and not answered. It is not known whether they arrived, so they are kept with their keys. */
const unanswered = draftStore<Sent>();

export type EntryFlow = {
  entry: Entry;
  step: Step;
  /** How often the person wanted to review. */
  tries: number;
  refused: Refused;
  recording: Recording;
  /** It was sent on an earlier visit and never answered. */
  wasSent: boolean;
  review: () => void;
  record: () => void;
  /** Open: a try was not answered, and only stopping leads back to the values. */
  isOpen: boolean;
  back: () => void;
  stop: () => void;
};

type EntryFlowInput = Omit<EntryInput, 'initialTime'> & {
  initialAt: number | undefined;
  path: string;
  wrap: (body: Record<string, unknown>, values: EntryValues) => unknown;
  onRecorded: (body: Record<string, unknown>, isHere: boolean) => void;
};

const NOTHING_REFUSED: Refused = { refusals: {}, others: [] };

/** The way of an entry: filled, held against the contract, reviewed, sent; and back to its rows where it was refused. */
export function useEntryFlow({ initialAt, path, wrap, onRecorded, ...input }: EntryFlowInput): EntryFlow {
  const { now, timeZone } = input;
  const initialTime = initialAt === undefined ? null : timeFrom(initialAt, timeZone);
  const entry = useEntry({ ...input, initialTime });
  const [sentBefore] = useState(() => unanswered.get(input.draftKey));
  const [step, setStep] = useState<Step>(sentBefore ?? { is: 'fill' });
  const [tries, setTries] = useState(0);
  const [refused, setRefused] = useState(NOTHING_REFUSED);
  const { plan, judged, time } = entry;
  const { draftKey } = input;
  const held = unanswered.useDraft(draftKey);
  const wasSent = step === sentBefore;

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
    onRecorded: ({ key }, isHere) => {
      // Stopped meanwhile: what is typed now is another entry, and not recorded.
      if (unanswered.get(draftKey)?.key !== key) return;
      unanswered.drop(draftKey);
      entry.forget();
      onRecorded(step.is === 'review' ? step.body : {}, isHere);
    },
    onUnanswered: () => {
      const sent = unanswered.get(draftKey);
      if (sent) unanswered.set(draftKey, { ...sent, isOpen: true });
    },
    onRefused: ({ problem }) => {
      const sent = unanswered.get(draftKey);
      const left = sent ? afterRefusal(sent, problem.status) : null;
      if (left) unanswered.set(draftKey, left);
      else unanswered.drop(draftKey);
      const errors = (problem.errors ?? []).map(({ path: at, message }) => ({ key: keyOfPath(at), message }));
      // What is said of no row is said of the whole, in the review.
      if (errors.some(({ key }) => judged.rows.some(({ row }) => row.key === key))) refuse(errors);
    },
  });

  const review = () => {
    entry.dispatch({ type: 'leave-all' });
    setTries(tries + 1);
    setRefused((before) => ({ ...before, others: [] }));
    if (obstaclesOf(judged).length > 0 || time.state === 'refused') return;
    // A clock shows no seconds; an instant that was left alone keeps its own.
    const isLeftAlone = initialAt !== undefined && isSameTime(entry.draft.time, initialTime);
    const observedAt = isLeftAlone ? initialAt : time.state === 'set' ? time.at : now;
    const made = entryBody({ plan, judged, observedAt });
    if (made.state === 'refused') return refuse(made.errors);
    recording.reset();
    setStep({ is: 'review', observedAt, body: made.body, key: newKey() });
  };

  const back = () => {
    unanswered.drop(draftKey);
    recording.reset();
    setStep({ is: 'fill' });
  };

  return {
    entry,
    step,
    tries,
    refused,
    recording,
    review,
    wasSent,
    isOpen: wayBack({ held, wasSent }) === 'stop',
    record: () => {
      if (step.is !== 'review') return;
      unanswered.set(draftKey, sending(step, unanswered.get(draftKey)));
      recording.send({ key: step.key, body: wrap(step.body, judged.values) });
    },
    back,
    stop: () => {
      entry.dispatch({ type: 'stopped' });
      back();
    },
  };
}
