import { VentilatorMove, type VentilatorState } from '@windrow/ventilation/contract/fleet';

/** A move while it is entered. Only what the state takes is sent. */
export type MoveDraft = {
  state: VentilatorState;
  bedId: string;
  unitId: string;
  words: string;
  note: string;
};

export type MoveErrors = { bedId?: string; words?: string };

/** The move to send, or what is still missing. A machine lent must be found again, so where it went is needed. */
export function moveFrom(draft: MoveDraft): { move: VentilatorMove } | { errors: MoveErrors } {
  const isInUse = draft.state === 'in-use';
  if (isInUse && draft.bedId === '') return { errors: { bedId: 'choose the bed' } };
  if (draft.state === 'on-loan' && draft.words.trim() === '')
    return { errors: { words: 'say to whom, and until when' } };
  const staysInUnit = draft.state !== 'on-loan' && draft.state !== 'retired';
  const parsed = VentilatorMove.safeParse({
    state: draft.state,
    bedId: isInUse ? draft.bedId : null,
    unitId: !isInUse && staysInUnit ? draft.unitId || null : null,
    words: isInUse ? null : draft.words.trim() || null,
    ...(draft.note.trim() ? { note: draft.note } : {}),
  });
  return parsed.success
    ? { move: parsed.data }
    : { errors: { words: parsed.error.issues[0]?.message ?? 'cannot be sent so' } };
}
