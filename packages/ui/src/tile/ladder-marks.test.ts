import { describe, expect, it } from 'vitest';
import { ladderMarks } from './ladder-marks.ts';

const LADDER = { low: 10, high: 24, measured: true, peak: 30, limit: 30, words: '' };

describe('ladderMarks', () => {
  it('draws to scale: the height of the block is the driving pressure', () => {
    const { block, base, peak, limit } = ladderMarks(LADDER);
    expect(block).toEqual({ top: 40, height: 35, isMeasured: true });
    expect([base, peak, limit]).toEqual([75, 25, 25]);
  });

  it('clamps what is above the scale at its top and keeps the number', () => {
    const { block, peak, numbers } = ladderMarks({ ...LADDER, high: 44, peak: 58 });
    expect(block).toMatchObject({ top: 0, height: 75 });
    expect(peak).toBe(0);
    expect(numbers.map(({ value }) => value)).toEqual([58, 44]);
  });

  it.each([
    [24, 25],
    [44, 58],
    [1, 2],
    [39, 40],
    [12, 13],
  ])('keeps the numbers %i and %i apart, on the scale and in order', (high, peak) => {
    const [first, second] = ladderMarks({ ...LADDER, low: 0, high, peak }).numbers;
    expect(first?.key).toBe('peak');
    expect((second?.top ?? 0) - (first?.top ?? 0)).toBeGreaterThanOrEqual(21.9);
    expect(first?.top).toBeGreaterThanOrEqual(10);
    expect(second?.top).toBeLessThanOrEqual(90);
  });

  it('shows one number where peak and plateau are the same', () => {
    expect(ladderMarks({ ...LADDER, peak: 24 }).numbers).toHaveLength(1);
  });

  it('draws no block without an upper pressure', () => {
    expect(ladderMarks({ ...LADDER, high: null, measured: false }).block).toBeNull();
  });
});
