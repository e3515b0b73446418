import type { AssignmentPlace } from '@windrow/ventilation/contract/shifts';
import type { Knex } from 'knex';

export type ShiftRow = {
  id: string;
  unit_id: string;
  name: string;
  starts_at: string;
  ends_at: string;
  made_by: string | null;
};
export type ShiftPersonRow = {
  person_id: string;
  display_name: string;
  initials: string;
  minutes_available: number;
};
type AssignmentRow = {
  shift_id: string;
  version: number;
  published: number;
  places: string;
  changed_by: string | null;
  changed_at: string;
};
export type StoredAssignment = {
  shiftId: string;
  version: number;
  published: boolean;
  places: AssignmentPlace[];
  changedBy: string | null;
  changedAt: string;
};

export async function shiftById(db: Knex, id: string): Promise<ShiftRow | null> {
  return (await db<ShiftRow>('shifts').where({ id }).first()) ?? null;
}

/** Latest start first. */
export async function shiftPage(
  db: Knex,
  { unitId, limit, before }: { unitId: string; limit: number; before: string | null },
): Promise<ShiftRow[]> {
  const query = db<ShiftRow>('shifts').where({ unit_id: unitId }).orderBy('starts_at', 'desc').limit(limit);
  return before === null ? query : query.where('starts_at', '<', before);
}

/** Shifts of a unit that have not ended at an instant. */
export async function shiftsNotEnded(db: Knex, unitId: string, at: string): Promise<ShiftRow[]> {
  return db<ShiftRow>('shifts').where({ unit_id: unitId }).where('ends_at', '>', at).orderBy('starts_at');
}

export async function insertShift(
  db: Knex,
  row: ShiftRow,
  people: { personId: string; minutesAvailable: number }[],
): Promise<void> {
  await db<ShiftRow>('shifts').insert(row);
  for (const { personId, minutesAvailable } of people) {
    await db('shift_people').insert({
      shift_id: row.id,
      person_id: personId,
      minutes_available: minutesAvailable,
    });
  }
}

export async function shiftPeople(db: Knex, shiftId: string): Promise<ShiftPersonRow[]> {
  return db('shift_people')
    .join('people', 'people.id', 'shift_people.person_id')
    .where({ shift_id: shiftId })
    .select<ShiftPersonRow[]>(
      'shift_people.person_id',
      'people.display_name',
      'people.initials',
      'shift_people.minutes_available',
    )
    .orderBy('people.display_name');
}

export async function latestAssignment(
  db: Knex,
  shiftId: string,
  known: { publishedOnly?: boolean; changedBy?: string } = {},
): Promise<StoredAssignment | null> {
  const query = db<AssignmentRow>('assignments').where({ shift_id: shiftId }).orderBy('version', 'desc');
  if (known.publishedOnly) void query.where({ published: 1 });
  if (known.changedBy !== undefined) void query.where('changed_at', '<=', known.changedBy);
  const row = await query.first();
  return row
    ? {
        shiftId,
        version: row.version,
        published: row.published === 1,
        places: JSON.parse(row.places),
        changedBy: row.changed_by,
        changedAt: row.changed_at,
      }
    : null;
}

export async function insertAssignment(
  db: Knex,
  { shiftId, version, published, places, changedBy, changedAt }: StoredAssignment,
): Promise<void> {
  await db<AssignmentRow>('assignments').insert({
    shift_id: shiftId,
    version,
    published: Number(published),
    places: JSON.stringify(places),
    changed_by: changedBy,
    changed_at: changedAt,
  });
}
