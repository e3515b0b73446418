import { draftStore } from '@windrow/client/writes/drafts';
import { samePlaces } from '@windrow/ventilation/assignment/places';
import type { Assignment, AssignmentPlace } from '@windrow/ventilation/contract/shifts';
import { useEffect, useState } from 'react';
import {
  type Draft,
  isUnsaved,
  moved,
  putOnTop,
  redone,
  saved,
  startDraft,
  takeTheirs,
  undone,
} from './draft.ts';

/** Moves outlive the page, so that a look at a bed in between costs nothing; not the person's session. */
const kept = draftStore<Draft>();

/**
 * The draft of one shift's assignment. What the server says anew replaces a draft without moves at once;
 * with unsaved moves it is only offered, as `newer`.
 */
export function useAssignmentDraft(assignment: Assignment) {
  const key = `shift:${assignment.shift.shiftId}`;
  const [draft, setDraft] = useState(() => kept.get(key) ?? startDraft(assignment));
  const unsaved = isUnsaved(draft);
  const isNewer = assignment.version > draft.base.version;
  // The same as mine: my own publishing whose answer was lost, or two who came to the same.
  const isAgreed = samePlaces(draft.present, assignment.places);
  if (isNewer && (!unsaved || isAgreed)) setDraft(startDraft(assignment));

  useEffect(() => {
    if (unsaved) kept.set(key, draft);
    else kept.drop(key);
  }, [key, unsaved, draft]);

  return {
    places: draft.present,
    base: draft.base,
    unsaved,
    newer: isNewer && unsaved && !isAgreed ? assignment : null,
    canUndo: draft.past.length > 0,
    canRedo: draft.future.length > 0,
    move: (places: readonly AssignmentPlace[]) => setDraft((now) => moved(now, places)),
    undo: () => setDraft(undone),
    redo: () => setDraft(redone),
    markSaved: (answer: Assignment) => setDraft((now) => saved(now, answer)),
    takeTheirs: (theirs: Assignment) => setDraft((now) => takeTheirs(now, theirs)),
    putOnTop: (theirs: Assignment) => setDraft((now) => putOnTop(now, theirs)),
  };
}
export type AssignmentDraft = ReturnType<typeof useAssignmentDraft>;
