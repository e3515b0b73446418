import type { VentilatorClass, VentilatorState } from '@windrow/ventilation/contract/fleet';
import type { Knex } from 'knex';

export type VentilatorRow = {
  id: string;
  asset_number: string;
  model: string;
  class: VentilatorClass;
  home_unit_id: string | null;
  state: VentilatorState;
  unit_id: string | null;
  bed_id: string | null;
  place_words: string | null;
  since_at: string;
  version: number;
};
export type MoveRow = {
  sequence: number;
  id: string;
  ventilator_id: string;
  from_state: VentilatorState;
  to_state: VentilatorState;
  unit_id: string | null;
  bed_id: string | null;
  place_words: string | null;
  note: string | null;
  observed_at: string;
  recorded_at: string;
  recorded_by: string;
};

export async function ventilatorById(db: Knex, id: string): Promise<VentilatorRow | null> {
  return (await db<VentilatorRow>('ventilators').where({ id }).first()) ?? null;
}

export async function ventilatorAtBed(db: Knex, bedId: string): Promise<VentilatorRow | null> {
  return (await db<VentilatorRow>('ventilators').where({ bed_id: bedId, state: 'in-use' }).first()) ?? null;
}

export async function ventilatorByAssetNumber(db: Knex, assetNumber: string): Promise<VentilatorRow | null> {
  return (await db<VentilatorRow>('ventilators').where({ asset_number: assetNumber }).first()) ?? null;
}

export async function ventilatorPage(db: Knex, { limit, after }: { limit: number; after: string | null }) {
  const query = db<VentilatorRow>('ventilators')
    .leftJoin('beds', 'beds.id', 'ventilators.bed_id')
    .select<(VentilatorRow & { bed_label: string | null })[]>('ventilators.*', { bed_label: 'beds.label' })
    .orderBy('ventilators.asset_number')
    .limit(limit);
  return after === null ? query : query.where('ventilators.asset_number', '>', after);
}

export async function insertVentilator(db: Knex, row: VentilatorRow): Promise<void> {
  await db<VentilatorRow>('ventilators').insert(row);
}

export async function updateVentilator(db: Knex, id: string, change: Partial<VentilatorRow>): Promise<void> {
  await db<VentilatorRow>('ventilators').where({ id }).update(change).increment('version', 1);
}

export async function insertMove(db: Knex, row: Omit<MoveRow, 'sequence'>): Promise<void> {
  await db<MoveRow>('ventilator_moves').insert(row);
}

export async function movePage(
  db: Knex,
  { ventilatorId, limit, before }: { ventilatorId: string; limit: number; before: number | null },
) {
  const query = db<MoveRow>('ventilator_moves')
    .join('people', 'people.id', 'ventilator_moves.recorded_by')
    .leftJoin('beds', 'beds.id', 'ventilator_moves.bed_id')
    .select<(MoveRow & { display_name: string; bed_label: string | null })[]>(
      'ventilator_moves.*',
      'people.display_name',
      { bed_label: 'beds.label' },
    )
    .where({ ventilator_id: ventilatorId })
    .orderBy('ventilator_moves.sequence', 'desc')
    .limit(limit);
  return before === null ? query : query.where('ventilator_moves.sequence', '<', before);
}

export async function countsByClassAndState(
  db: Knex,
): Promise<{ class: VentilatorClass; state: VentilatorState; n: number }[]> {
  return db<VentilatorRow>('ventilators')
    .select('class', 'state')
    .count<{ class: VentilatorClass; state: VentilatorState; n: number }[]>({ n: '*' })
    .groupBy('class', 'state');
}

export type KnownMachine = Pick<VentilatorRow, 'id' | 'asset_number' | 'model' | 'home_unit_id'> &
  Pick<MoveRow, 'unit_id' | 'bed_id'> & { state: VentilatorState };

/** Where each machine was by what had been recorded at an instant: its last move by then. */
export async function machinesKnownAt(db: Knex, at: string): Promise<KnownMachine[]> {
  const last = db<MoveRow>('ventilator_moves')
    .max('sequence')
    .where('recorded_at', '<=', at)
    .groupBy('ventilator_id');
  return db<MoveRow>('ventilator_moves')
    .join('ventilators', 'ventilators.id', 'ventilator_moves.ventilator_id')
    .whereIn('ventilator_moves.sequence', last)
    .select<KnownMachine[]>(
      'ventilators.id',
      'ventilators.asset_number',
      'ventilators.model',
      'ventilators.home_unit_id',
      'ventilator_moves.unit_id',
      'ventilator_moves.bed_id',
      { state: 'ventilator_moves.to_state' },
    );
}

/** Machines ready in a unit: they stand there, or belong there and stand nowhere else. */
export async function readyInUnit(db: Knex, unitId: string): Promise<number> {
  const row = await db<VentilatorRow>('ventilators')
    .where({ state: 'ready' })
    .where((on) =>
      on
        .where({ unit_id: unitId })
        .orWhere((home) => home.whereNull('unit_id').where({ home_unit_id: unitId })),
    )
    .count<{ n: number }[]>({ n: '*' });
  return Number(row[0]?.n ?? 0);
}
