import { RecordEntry } from '@windrow/ventilation/contract/observations';
import type { Knex } from 'knex';
import { invalid } from '../errors.ts';
import { type ObservationWithPerson, recordPage } from '../queries/observations.ts';

/** A stay's whole record, newest first, with what was amended still to be read. */
export async function readRecord(
  db: Knex,
  { stayId, limit, cursor }: { stayId: string; limit: number; cursor: string | null },
) {
  const rows = await recordPage(db, {
    stayId,
    limit: limit + 1,
    before: cursor === null ? null : readCursor(cursor),
  });
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  return {
    items: page.map(toRecordEntry),
    nextCursor: rows.length > limit && last ? `${last.observed_at}_${last.sequence}` : null,
  };
}

function readCursor(cursor: string): { observedAt: string; sequence: number } {
  const [, observedAt, sequence] = /^([\d-]+T[\d:.]+Z)_(\d{1,15})$/.exec(cursor) ?? [];
  if (observedAt === undefined)
    throw invalid([{ path: 'cursor', message: 'must be the nextCursor of an earlier page' }]);
  return { observedAt, sequence: Number(sequence) };
}

function toRecordEntry(row: ObservationWithPerson): RecordEntry {
  return {
    observationId: row.id,
    kind: row.kind,
    observedAt: row.observed_at,
    recordedAt: row.recorded_at,
    recordedBy: { personId: row.recorded_by, displayName: row.display_name, initials: row.initials },
    source: row.source,
    amends:
      row.amends_id && row.amended_as
        ? { observationId: row.amends_id, reason: row.reason ?? '', as: row.amended_as }
        : null,
    amendedBy: row.amended_by_id,
    body: RecordEntry.shape.body.parse(JSON.parse(row.body)),
  };
}
