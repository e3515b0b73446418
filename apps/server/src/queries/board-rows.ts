import type { Bed } from '@windrow/ventilation/contract/board';
import type { Knex } from 'knex';

type BoardRow = { bed_id: string; unit_id: string; revision: number; row: string };

export async function putBoardRow(db: Knex, bed: Bed): Promise<void> {
  const row: BoardRow = {
    bed_id: bed.bedId,
    unit_id: bed.unitId,
    revision: bed.revision,
    row: JSON.stringify(bed),
  };
  await db<BoardRow>('board_rows').insert(row).onConflict('bed_id').merge();
}

/** As many rows as the unit has beds, whatever the length of the record. */
export async function boardRows(db: Knex, unitId: string): Promise<Bed[]> {
  const rows = await db<BoardRow>('board_rows').where({ unit_id: unitId });
  return rows
    .map(({ row }): Bed => JSON.parse(row))
    .sort((one, other) => one.row - other.row || one.column - other.column);
}

export async function boardRow(db: Knex, bedId: string): Promise<Bed | null> {
  const row = await db<BoardRow>('board_rows').where({ bed_id: bedId }).first();
  return row ? JSON.parse(row.row) : null;
}
