import { draftStore } from '@windrow/client/writes/drafts';
import { useEffect, useMemo, useReducer, useState } from 'react';
import { type EntryAction, type EntryDraft, isUntouched, reduceEntry } from './entry-draft.ts';
import type { EntryPlan } from './entry-plan.ts';
import { type JudgedTime, judgeTime, type TimeDraft } from './entry-time.ts';
import { type JudgedEntry, judgeEntry } from './judge-entry.ts';

const entryDrafts = draftStore<EntryDraft>();

export type EntryInput = {
  /** Begins with the stay's id, so that the round can tell where something waits. */
  draftKey: string;
  planOf: (values: Readonly<Record<string, string>>) => EntryPlan;
  initialValues: Readonly<Record<string, string>>;
  initialTime?: TimeDraft;
  /** The latest fact of this kind as the form was opened. */
  latestId: string | null;
  weightKg: number | null;
  timeZone: string;
  now: number;
};

export type Entry = {
  draft: EntryDraft;
  dispatch: (action: EntryAction) => void;
  plan: EntryPlan;
  judged: JudgedEntry;
  time: JudgedTime;
  isUntouched: boolean;
  /** After recording, or when the person gives it up. */
  forget: () => void;
};

/** One form's state, kept beside the page so that an interruption costs nothing. */
export function useEntry({
  draftKey,
  planOf,
  initialValues,
  initialTime = null,
  latestId,
  weightKg,
  timeZone,
  now,
}: EntryInput): Entry {
  const [initial] = useState<EntryDraft>(() => ({
    values: initialValues,
    kept: {},
    left: [],
    active: null,
    typing: null,
    time: initialTime,
    mayStand: false,
    startedFrom: latestId,
  }));
  const [draft, dispatch] = useReducer(reduceEntry, initial, (fresh) => {
    const kept = entryDrafts.get(draftKey);
    return kept ? { ...kept, active: null, typing: null } : fresh;
  });
  const untouched = isUntouched(draft, initial);

  useEffect(() => {
    // A form that was only looked at is nothing to be missed.
    if (untouched) entryDrafts.drop(draftKey);
    else entryDrafts.set(draftKey, draft);
  }, [draftKey, draft, untouched]);

  const plan = useMemo(() => planOf(draft.values), [planOf, draft.values]);
  const judged = useMemo(() => judgeEntry({ plan, draft, weightKg }), [plan, draft, weightKg]);
  const time = judgeTime({ time: draft.time, now, timeZone });
  return {
    draft,
    dispatch,
    plan,
    judged,
    time,
    isUntouched: untouched,
    forget: () => entryDrafts.drop(draftKey),
  };
}
