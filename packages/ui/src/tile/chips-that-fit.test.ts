import type { TileChip } from '@windrow/ventilation/board/tile/tile-view';
import { describe, expect, it } from 'vitest';
import { chipsThatFit } from './chips-that-fit.ts';

const aChip = (short: string): TileChip => ({ id: short, short, level: 'attention' });
const CHIPS = ['Plateau 31', 'P/F 89', 'pH 7.24'].map(aChip);

describe('chipsThatFit', () => {
  it('shows all where there is room', () => {
    expect(chipsThatFit(CHIPS, 60)).toEqual({ chips: CHIPS, more: [] });
  });

  it('counts what does not fit, and keeps room for the count', () => {
    expect(chipsThatFit(CHIPS, 31)).toEqual({ chips: CHIPS.slice(0, 2), more: CHIPS.slice(2) });
  });

  it('shows the first whole even where it is longer than the room', () => {
    expect(chipsThatFit(CHIPS, 5)).toEqual({ chips: CHIPS.slice(0, 1), more: CHIPS.slice(1) });
  });

  it('has nothing to say where nothing is flagged', () => {
    expect(chipsThatFit([], 5)).toEqual({ chips: [], more: [] });
  });
});
