import type { BedPlace } from '@windrow/ventilation/contract/board';

/** A cell of the plan: a bed, or room for one. */
export type Cell = { row: number; column: number; bed: BedPlace | null };

/** As far as the plan goes (the schema's limit). */
const MOST = 20;
const SMALLEST = { rows: 2, columns: 6 };

/** The plan of a unit, with one row and column more than its beds take, so that it can grow. */
export function floorPlan(beds: readonly BedPlace[]): { columns: number; cells: Cell[] } {
  const rows = Math.min(MOST, Math.max(SMALLEST.rows, ...beds.map(({ row }) => row + 1)));
  const columns = Math.min(MOST, Math.max(SMALLEST.columns, ...beds.map(({ column }) => column + 1)));
  const byPlace = new Map(beds.map((bed) => [`${bed.row} ${bed.column}`, bed]));
  const cells = Array.from({ length: rows * columns }, (_, index) => {
    const row = Math.floor(index / columns) + 1;
    const column = (index % columns) + 1;
    return { row, column, bed: byPlace.get(`${row} ${column}`) ?? null };
  });
  return { columns, cells };
}

/** The free cell after another, along the row and then down; null: the plan is full. */
export function nextFreeCell(cells: readonly Cell[], after: Pick<Cell, 'row' | 'column'>): Cell | null {
  const later = cells.filter(
    ({ row, column }) => row > after.row || (row === after.row && column > after.column),
  );
  return later.find(({ bed }) => bed === null) ?? null;
}
