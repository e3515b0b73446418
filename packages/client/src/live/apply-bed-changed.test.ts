import type { Bed, Board } from '@windrow/ventilation/contract/board';
import { describe, expect, it } from 'vitest';
import { applyBedChanged } from './apply-bed-changed.ts';

const aBed = (bedId: string, revision = 1): Bed => ({
  bedId,
  unitId: 'u1',
  label: bedId,
  row: 1,
  column: 1,
  isOpen: true,
  revision,
  stay: null,
  assignments: [],
  ventilator: null,
});

const aBoard = (revision: number): Board => ({
  unit: {
    unitId: 'u1',
    name: 'Unit',
    timeZone: 'UTC',
    revision,
    nightFrom: '20:00',
    nightTo: '07:00',
    bedCount: 2,
  },
  revision,
  serverTime: '2026-03-05T10:00:00Z',
  at: null,
  demonstration: false,
  beds: [aBed('01'), aBed('02')],
  fleet: { ready: 3 },
});

describe('applyBedChanged', () => {
  it('puts the next revision of a bed in its place and leaves the other beds as they are', () => {
    const board = aBoard(7);
    const next = applyBedChanged(board, { revision: 8, unitId: 'u1', bed: aBed('02', 8) });

    expect(next?.revision).toBe(8);
    expect(next?.beds[1]?.revision).toBe(8);
    expect(next?.beds[0]).toBe(board.beds[0]);
    expect(board.revision).toBe(7);
  });

  it('asks for the board again when a revision was missed', () => {
    expect(applyBedChanged(aBoard(7), { revision: 9, unitId: 'u1', bed: aBed('02', 9) })).toBeNull();
  });

  it('leaves a board alone that already contains the change', () => {
    const board = aBoard(7);
    expect(applyBedChanged(board, { revision: 7, unitId: 'u1', bed: aBed('02', 7) })).toBe(board);
    expect(applyBedChanged(board, { revision: 3, unitId: 'u1', bed: aBed('02', 3) })).toBe(board);
  });

  it('leaves the board of another unit alone', () => {
    const board = aBoard(7);
    expect(applyBedChanged(board, { revision: 8, unitId: 'u2', bed: aBed('02', 8) })).toBe(board);
  });

  it('asks for the board again when the bed is new to it', () => {
    expect(applyBedChanged(aBoard(7), { revision: 8, unitId: 'u1', bed: aBed('03', 8) })).toBeNull();
  });
});
