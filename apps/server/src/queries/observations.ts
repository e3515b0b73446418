import type { RecordEntry } from '@windrow/ventilation/contract/observations';
import type { Knex } from 'knex';

export type ObservationRow = {
  sequence: number;
  id: string;
  stay_id: string;
  unit_id: string;
  kind: RecordEntry['kind'];
  observed_at: string;
  recorded_at: string;
  recorded_by: string;
  source: RecordEntry['source'];
  support: string | null;
  amends_id: string | null;
  amended_as: 'corrected' | 'struck' | null;
  reason: string | null;
  body: string;
};

export type ObservationWithPerson = ObservationRow & {
  display_name: string;
  initials: string;
  amended_by_id: string | null;
};

export async function insertObservation(db: Knex, row: Omit<ObservationRow, 'sequence'>): Promise<void> {
  await db<ObservationRow>('observations').insert(row);
}

export async function observationById(db: Knex, id: string): Promise<ObservationRow | null> {
  return (await db<ObservationRow>('observations').where({ id }).first()) ?? null;
}

/** The fact that amends this one, if any, with the name of whoever made it. */
export async function amendmentOf(db: Knex, id: string): Promise<ObservationWithPerson | null> {
  return (await withPeople(db).where('observations.amends_id', id).first()) ?? null;
}

/** Newest observed first; the sequence breaks ties, so that pages never skip or repeat one. */
export async function recordPage(
  db: Knex,
  {
    stayId,
    limit,
    before,
  }: { stayId: string; limit: number; before: { observedAt: string; sequence: number } | null },
): Promise<ObservationWithPerson[]> {
  const query = withPeople(db)
    .where('observations.stay_id', stayId)
    .orderBy([
      { column: 'observations.observed_at', order: 'desc' },
      { column: 'observations.sequence', order: 'desc' },
    ])
    .limit(limit);
  if (before) {
    void query.where((on) =>
      on
        .where('observations.observed_at', '<', before.observedAt)
        .orWhere((tie) =>
          tie
            .where('observations.observed_at', before.observedAt)
            .where('observations.sequence', '<', before.sequence),
        ),
    );
  }
  return query;
}

function withPeople(db: Knex) {
  return db<ObservationRow>('observations')
    .join('people', 'people.id', 'observations.recorded_by')
    .leftJoin({ later: 'observations' }, 'later.amends_id', 'observations.id')
    .select<ObservationWithPerson[]>('observations.*', 'people.display_name', 'people.initials', {
      amended_by_id: 'later.id',
    });
}

/** Who last changed a stay's identity or place, and when. */
export async function stayVersionBy(
  db: Knex,
  stayId: string,
): Promise<{ by: string | null; at: string | null }> {
  const row = await withPeople(db)
    .where('observations.stay_id', stayId)
    .whereIn('observations.kind', ['details', 'place'])
    .orderBy('observations.sequence', 'desc')
    .first();
  return { by: row?.display_name ?? null, at: row?.recorded_at ?? null };
}
