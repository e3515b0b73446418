import { describe, expect, it } from 'vitest';
import { boardLayout } from './board-layout.ts';

const ROOM = { width: 1888, height: 950, smallestUnit: 0.6 };

describe('boardLayout', () => {
  it.each([
    [8, '4x2 narrow'],
    [12, '4x3 narrow'],
    [16, '4x4 wide'],
    [20, '5x4 narrow'],
    [24, '6x4 narrow'],
  ])('lays %i beds out as %s on a 16:9 screen', (beds, expected) => {
    const { columns, rows, shape, pages } = boardLayout({ beds, ...ROOM });
    expect(`${columns}x${rows} ${shape}`).toBe(expected);
    expect(pages).toBe(1);
  });

  it('has a place for every bed, and never draws smaller than it may, for any number of beds', () => {
    for (let beds = 1; beds <= 80; beds += 1) {
      const { columns, rows, perPage, pages, unit } = boardLayout({ beds, ...ROOM });
      expect(columns * rows).toBeGreaterThanOrEqual(perPage);
      expect(perPage * pages).toBeGreaterThanOrEqual(beds);
      expect(perPage).toBeLessThanOrEqual(24);
      expect(unit).toBeGreaterThanOrEqual(0.6);
    }
  });

  it('shares 40 beds over two equal pages', () => {
    expect(boardLayout({ beds: 40, ...ROOM })).toMatchObject({ perPage: 20, pages: 2 });
  });

  it('takes more pages rather than smaller letters on a small screen', () => {
    const { pages, unit } = boardLayout({ beds: 24, ...ROOM, smallestUnit: 1.2 });
    expect(pages).toBeGreaterThan(1);
    expect(unit).toBeGreaterThanOrEqual(1.2);
  });

  it('stands upright on an upright screen', () => {
    const { columns, rows } = boardLayout({ beds: 16, width: 1888, height: 3200, smallestUnit: 0.6 });
    expect(rows).toBeGreaterThan(columns);
  });
});
