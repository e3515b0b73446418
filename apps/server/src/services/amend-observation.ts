import { bedForAudience } from '@windrow/ventilation/board/for-audience';
import {
  type Amendment,
  RECORDED_KINDS,
  type RecordedKind,
} from '@windrow/ventilation/contract/observations';
import { may } from '@windrow/ventilation/permissions/permissions';
import { conflict, invalid, notAllowed } from '../errors.ts';
import { amendmentOf, type ObservationRow } from '../queries/observations.ts';
import { stayById } from '../queries/stays.ts';
import { appendObservation } from './append-observation.ts';
import { fieldErrors } from './field-errors.ts';
import { requireObservedTime } from './observed-time.ts';
import type { Write } from './write.ts';

/**
 * Corrects a fact, or strikes it as entered in error, with a reason. The first value stays in the
 * record; what counts from now on is the amendment.
 */
export async function amendObservation(
  write: Write,
  { observation, amendment }: { observation: ObservationRow; amendment: Amendment },
) {
  const { kind } = observation;
  if (kind === 'acknowledgement') {
    throw conflict(
      'An acknowledgement is not amended; it ends by itself when what the flag rests on changes.',
      [{ path: 'id', message: 'is an acknowledgement, which is not amended' }],
    );
  }
  if (!isRecordedKind(kind)) {
    throw conflict('Identity and place are corrected on the stay itself, not by an amendment.', [
      { path: 'id', message: `a fact of kind ${kind} is not amended here` },
    ]);
  }
  const stay = await stayById(write.trx, observation.stay_id);
  if (!stay) throw new Error(`observation ${observation.id} has no stay`);
  requireMayAmend(write, observation, stay.unit_id);
  const earlier = await amendmentOf(write.trx, observation.id);
  if (earlier) {
    throw conflict(
      `${earlier.display_name} amended this at ${earlier.recorded_at}. Amend that one instead; nothing was stored.`,
      [{ path: 'id', message: `was amended already; the fact that counts is ${earlier.id}` }],
    );
  }
  if (observation.amended_as === 'struck')
    throw conflict('This was struck out as entered in error; record it anew instead.');

  const { observedAt, body } =
    amendment.as === 'struck'
      ? { observedAt: observation.observed_at, body: {} }
      : corrected(kind, amendment.body);
  requireObservedTime({ observedAt, now: write.now });
  const observationId = await appendObservation(write, {
    stayId: stay.id,
    unitId: stay.unit_id,
    kind,
    observedAt,
    body,
    amends: { observationId: observation.id, as: amendment.as, reason: amendment.reason },
  });
  await write.audit({ act: `amend ${kind}`, unitId: stay.unit_id, subject: observationId });
  if (stay.bed_id === null) return { observationId, revision: null, bed: null };
  const { revision, bed } = await write.bedChanged(stay.bed_id);
  return { observationId, revision, bed: bedForAudience({ bed, audience: 'staff', now: write.now }) };
}

function isRecordedKind(kind: string): kind is RecordedKind {
  return kind in RECORDED_KINDS;
}

function requireMayAmend({ person }: Write, observation: ObservationRow, unitId: string): void {
  const act = observation.recorded_by === person.personId ? 'amend-own' : 'amend-other';
  if (!may(person.grants, act, unitId)) {
    throw notAllowed(
      act === 'amend-other'
        ? 'Only a charge therapist of the unit amends what somebody else recorded.'
        : undefined,
    );
  }
}

function corrected(kind: RecordedKind, input: unknown): { observedAt: string; body: object } {
  const parsed = RECORDED_KINDS[kind].schema.safeParse(input);
  if (!parsed.success) throw invalid(fieldErrors(parsed.error, 'body'));
  const { observedAt, ...body } = parsed.data;
  return { observedAt, body };
}
