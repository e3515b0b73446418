import { randomUUID } from 'node:crypto';
import { insertObservation, type ObservationRow } from '../queries/observations.ts';
import type { Write } from './write.ts';

/** Adds one fact to a stay's record. Nothing is ever changed there; see the triggers in its migration. */
export async function appendObservation(
  { trx, person, now }: Write,
  fact: {
    stayId: string;
    unitId: string;
    kind: ObservationRow['kind'];
    observedAt: string;
    body: object;
    amends?: { observationId: string; as: 'corrected' | 'struck'; reason: string };
  },
): Promise<string> {
  const id = randomUUID();
  await insertObservation(trx, {
    id,
    stay_id: fact.stayId,
    unit_id: fact.unitId,
    kind: fact.kind,
    observed_at: fact.observedAt,
    recorded_at: now,
    recorded_by: person.personId,
    source: 'hand',
    support: fact.amends?.as === 'struck' ? null : supportOf(fact.body),
    amends_id: fact.amends?.observationId ?? null,
    amended_as: fact.amends?.as ?? null,
    reason: fact.amends?.reason ?? null,
    body: JSON.stringify(fact.body),
  });
  return id;
}

/** Checks and extubations say what the patient breathes with from then on. */
function supportOf(body: object): string | null {
  if ('mode' in body && typeof body.mode === 'string') return body.mode;
  if ('toSupport' in body && typeof body.toSupport === 'string') return body.toSupport;
  return null;
}
