import type { Bed } from '@windrow/ventilation/contract/board';
import { describe, expect, it } from 'vitest';
import { inPlanOrder, PAGE_EVERY_MS, pageAt } from './pages.ts';

const aBed = (label: string, row: number, column: number): Bed => ({
  bedId: label,
  unitId: 'u1',
  label,
  row,
  column,
  isOpen: true,
  revision: 1,
  stay: null,
  assignments: [],
  ventilator: null,
});

describe('inPlanOrder', () => {
  it('goes by row and then by column, not by label', () => {
    const beds = [aBed('A', 2, 1), aBed('B', 1, 2), aBed('C', 1, 1)];
    expect(inPlanOrder(beds).map(({ label }) => label)).toEqual(['C', 'B', 'A']);
  });
});

describe('pageAt', () => {
  const all = [1, 2, 3, 4, 5];

  it('turns at a steady pace and begins again', () => {
    const shown = [0, 1, 2].map((turn) => pageAt({ all, perPage: 3, now: turn * PAGE_EVERY_MS }));
    expect(shown.map(({ items }) => items)).toEqual([
      [1, 2, 3],
      [4, 5],
      [1, 2, 3],
    ]);
    expect(shown[1]).toMatchObject({ number: 2, of: 2 });
  });

  it('stays where there is one page', () => {
    expect(pageAt({ all, perPage: 5, now: 7 * PAGE_EVERY_MS })).toEqual({ items: all, number: 1, of: 1 });
  });

  it('has one empty page for a unit without beds', () => {
    expect(pageAt({ all: [], perPage: 1, now: 0 })).toEqual({ items: [], number: 1, of: 1 });
  });
});
