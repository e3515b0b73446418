import type { Knex } from 'knex';

export type UnitRow = { id: string; name: string; time_zone: string; revision: number };
export type BedRow = {
  id: string;
  unit_id: string;
  label: string;
  row: number;
  column: number;
  is_open: number;
};

export async function allUnits(db: Knex): Promise<UnitRow[]> {
  return db<UnitRow>('units').orderBy('name');
}

export async function unitById(db: Knex, id: string): Promise<UnitRow | null> {
  return (await db<UnitRow>('units').where({ id }).first()) ?? null;
}

export async function insertUnit(db: Knex, row: UnitRow): Promise<void> {
  await db<UnitRow>('units').insert(row);
}

/** Takes the unit's next revision; inside the transaction that uses it, so that there are no gaps. */
export async function nextRevision(trx: Knex, unitId: string): Promise<number> {
  await trx<UnitRow>('units').where({ id: unitId }).increment('revision', 1);
  return (await trx<UnitRow>('units').where({ id: unitId }).first('revision'))?.revision ?? 0;
}

/** One number that grows with every change in the house. */
export async function houseRevision(db: Knex): Promise<number> {
  const row = await db('units').sum<{ total: number | null }>({ total: 'revision' }).first();
  return row?.total ?? 0;
}

export async function bedById(db: Knex, id: string): Promise<BedRow | null> {
  return (await db<BedRow>('beds').where({ id }).first()) ?? null;
}

/** In floor-plan order. */
export async function bedsOfUnit(db: Knex, unitId: string): Promise<BedRow[]> {
  return db<BedRow>('beds').where({ unit_id: unitId }).orderBy(['row', 'column']);
}

export async function bedCounts(db: Knex): Promise<Map<string, number>> {
  const rows = await db<BedRow>('beds')
    .select('unit_id')
    .count<{ unit_id: string; n: number }[]>({ n: '*' })
    .groupBy('unit_id');
  return new Map(rows.map(({ unit_id, n }) => [unit_id, n]));
}

export async function insertBed(db: Knex, row: BedRow): Promise<void> {
  await db<BedRow>('beds').insert(row);
}

export async function setBedOpen(db: Knex, id: string, isOpen: boolean): Promise<void> {
  await db<BedRow>('beds')
    .where({ id })
    .update({ is_open: Number(isOpen) });
}
