import { describe, expect, it } from 'vitest';
import { floorPlan, nextFreeCell } from './floor-plan.ts';

const bed = (row: number, column: number) => ({
  bedId: `${row}-${column}`,
  unitId: 'u1',
  label: `${row}${column}`,
  row,
  column,
  isOpen: true,
});

describe('floorPlan', () => {
  it('has room to grow by a row and a column, and never less than a small unit', () => {
    expect(floorPlan([]).columns).toBe(6);
    expect(floorPlan([]).cells).toHaveLength(12);
    expect(floorPlan([bed(3, 8)])).toMatchObject({ columns: 9 });
    expect(floorPlan([bed(3, 8)]).cells).toHaveLength(36);
  });

  it('ends where the schema ends', () => {
    expect(floorPlan([bed(20, 20)]).cells).toHaveLength(400);
  });

  it('puts each bed in its cell', () => {
    expect(
      floorPlan([bed(2, 3)]).cells.find(({ row, column }) => row === 2 && column === 3)?.bed?.bedId,
    ).toBe('2-3');
  });
});

describe('nextFreeCell', () => {
  it('goes along the row, past beds, then down', () => {
    const { cells } = floorPlan([bed(1, 2), bed(1, 6)]);
    expect(nextFreeCell(cells, { row: 1, column: 1 })).toMatchObject({ row: 1, column: 3 });
    expect(nextFreeCell(cells, { row: 1, column: 5 })).toMatchObject({ row: 1, column: 7 });
    expect(nextFreeCell(cells, { row: 2, column: 7 })).toBeNull();
  });
});
