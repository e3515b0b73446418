import { bedForAudience } from '@windrow/ventilation/board/for-audience';
import { conflict } from '../errors.ts';
import type { ObservationRow } from '../queries/observations.ts';
import type { StayRow } from '../queries/stays.ts';
import { appendObservation } from './append-observation.ts';
import { requireObservedTime } from './observed-time.ts';
import type { Write } from './write.ts';

/** A check, a gas or whatever else a person records on a stay: appended, the bed's row rebuilt, the screens told. */
export async function recordObservation(
  write: Write,
  {
    stay,
    kind,
    entry,
  }: { stay: StayRow; kind: ObservationRow['kind']; entry: { observedAt: string } & Record<string, unknown> },
) {
  const bedId = requirePresent(stay);
  requireObservedTime({ observedAt: entry.observedAt, now: write.now });
  const { observedAt, ...body } = entry;
  const observationId = await appendObservation(write, {
    stayId: stay.id,
    unitId: stay.unit_id,
    kind,
    observedAt,
    body,
  });
  const { revision, bed } = await write.bedChanged(bedId);
  await write.audit({ act: `record ${kind}`, unitId: stay.unit_id, subject: observationId });
  return { observationId, revision, bed: bedForAudience({ bed, audience: 'staff', now: write.now }) };
}

/** The bed of a stay that is still here; nothing is recorded on one that has left. */
export function requirePresent(stay: StayRow): string {
  if (stay.left_at !== null || stay.bed_id === null) {
    throw conflict(
      `This stay ended at ${stay.left_at}; nothing can be recorded on it. Choose the patient again.`,
      [{ path: 'stayId', message: `the stay ended at ${stay.left_at}; only a present stay takes entries` }],
    );
  }
  return stay.bed_id;
}
