import { onTop, samePlaces } from '@windrow/ventilation/assignment/places';
import type { Assignment, AssignmentPlace } from '@windrow/ventilation/contract/shifts';

type Places = readonly AssignmentPlace[];

/** An assignment while somebody moves beds about: what it began from, and the way here and back. */
export type Draft = {
  /** The version on the server that the moves were made on. */
  base: { version: number; places: Places };
  past: readonly Places[];
  present: Places;
  future: readonly Places[];
};

/** More steps back than anybody remembers. */
const STEPS_KEPT = 100;

export function startDraft({ version, places }: Assignment): Draft {
  return { base: { version, places }, past: [], present: places, future: [] };
}

/** Whether there are moves that the server does not have. */
export function isUnsaved(draft: Draft): boolean {
  return !samePlaces(draft.base.places, draft.present);
}

export function moved(draft: Draft, present: Places): Draft {
  if (samePlaces(draft.present, present)) return draft;
  return { ...draft, past: [...draft.past, draft.present].slice(-STEPS_KEPT), present, future: [] };
}

export function undone(draft: Draft): Draft {
  const present = draft.past.at(-1);
  if (!present) return draft;
  return { ...draft, past: draft.past.slice(0, -1), present, future: [draft.present, ...draft.future] };
}

export function redone(draft: Draft): Draft {
  const [present, ...future] = draft.future;
  if (!present) return draft;
  return { ...draft, past: [...draft.past, draft.present], present, future };
}

/** What was sent is now on the server; the way back stays, as a new draft. Moves made meanwhile stay moves. */
export function saved(draft: Draft, { version, places }: Assignment): Draft {
  return { ...draft, base: { version, places } };
}

/**
 * My moves put on top of what the server has now. Steps back that knew only the old version would undo
 * the other person's work unseen, so the way back leads to theirs.
 */
export function putOnTop(draft: Draft, theirs: Assignment): Draft {
  const present = onTop({ base: draft.base.places, mine: draft.present, theirs: theirs.places });
  return moved(startDraft(theirs), present);
}

/** Theirs, as it is now. One step forward brings my moves back, on top of theirs. */
export function takeTheirs(draft: Draft, theirs: Assignment): Draft {
  return undone(putOnTop(draft, theirs));
}
