import type { Grant } from '@windrow/ventilation/permissions/permissions';
import type { Knex } from 'knex';

export type PersonRow = {
  id: string;
  username: string;
  display_name: string;
  initials: string;
  password_hash: string;
  disabled_at: string | null;
  version: number;
};
type GrantRow = { id: number; person_id: string; role: Grant['role']; unit_id: string | null };

export async function anyPerson(db: Knex): Promise<boolean> {
  return (await db<PersonRow>('people').first('id')) !== undefined;
}

export async function personById(db: Knex, id: string): Promise<PersonRow | null> {
  return (await db<PersonRow>('people').where({ id }).first()) ?? null;
}

export async function personByUsername(db: Knex, username: string): Promise<PersonRow | null> {
  return (await db<PersonRow>('people').where({ username: username.toLowerCase() }).first()) ?? null;
}

export async function peoplePage(
  db: Knex,
  { limit, after }: { limit: number; after: string | null },
): Promise<PersonRow[]> {
  const query = db<PersonRow>('people').orderBy('username').limit(limit);
  return after === null ? query : query.where('username', '>', after);
}

/** Those who may look after beds of a unit: therapists and charge therapists, of the unit or of the whole house. */
export async function colleaguesOfUnit(db: Knex, unitId: string): Promise<PersonRow[]> {
  return db<PersonRow>('people')
    .whereNull('disabled_at')
    .whereIn(
      'id',
      db<GrantRow>('grants')
        .select('person_id')
        .whereIn('role', ['therapist', 'charge'])
        .where((on) => on.where({ unit_id: unitId }).orWhereNull('unit_id')),
    )
    .orderBy('display_name');
}

export async function insertPerson(db: Knex, row: PersonRow): Promise<void> {
  await db<PersonRow>('people').insert(row);
}

export async function updatePerson(db: Knex, id: string, change: Partial<PersonRow>): Promise<void> {
  await db<PersonRow>('people').where({ id }).update(change);
}

export async function grantsOf(db: Knex, personId: string): Promise<Grant[]> {
  const rows = await db<GrantRow>('grants').where({ person_id: personId }).orderBy('id');
  return rows.map(({ role, unit_id }) => ({ role, unitId: unit_id }));
}

export async function replaceGrants(db: Knex, personId: string, grants: readonly Grant[]): Promise<void> {
  await db<GrantRow>('grants').where({ person_id: personId }).delete();
  for (const { role, unitId } of grants)
    await db<GrantRow>('grants').insert({ person_id: personId, role, unit_id: unitId });
}
