import type { Knex } from 'knex';

export type StayRow = {
  id: string;
  unit_id: string;
  bed_id: string | null;
  hospital_number: string;
  admitted_at: string;
  left_at: string | null;
  outcome: string | null;
  recorded_at: string;
  left_recorded_at: string | null;
  version: number;
};

export async function stayById(db: Knex, id: string): Promise<StayRow | null> {
  return (await db<StayRow>('stays').where({ id }).first()) ?? null;
}

export async function stayInBed(db: Knex, bedId: string): Promise<StayRow | null> {
  return (await db<StayRow>('stays').where({ bed_id: bedId }).whereNull('left_at').first()) ?? null;
}

/** How hospital numbers are compared: "sg-41 02" and "SG-4102" are one patient's. */
export function comparable(hospitalNumber: string): string {
  return hospitalNumber.replaceAll(/\s/g, '').toUpperCase();
}

export async function presentStayOfPatient(db: Knex, hospitalNumber: string): Promise<StayRow | null> {
  return (
    (await db<StayRow>('stays')
      .where({ hospital_number: comparable(hospitalNumber) })
      .whereNull('left_at')
      .first()) ?? null
  );
}

export async function insertStay(db: Knex, row: StayRow): Promise<void> {
  await db<StayRow>('stays').insert(row);
}

/** Changes where a stay is, or that it ended, and counts its version up. */
export async function updateStay(
  db: Knex,
  id: string,
  change: Partial<Omit<StayRow, 'id' | 'version'>>,
): Promise<void> {
  await db<StayRow>('stays').where({ id }).update(change).increment('version', 1);
}

/** The stays that the board held at an instant, by what had been recorded then. */
export async function staysKnownAt(db: Knex, at: string): Promise<StayRow[]> {
  return db<StayRow>('stays')
    .where('recorded_at', '<=', at)
    .where((on) => on.whereNull('left_recorded_at').orWhere('left_recorded_at', '>', at));
}
