import { describe, expect, it } from 'vitest';
import { nextLabel, offeredLabel } from './next-label.ts';

describe('nextLabel', () => {
  it('counts on, and keeps leading noughts', () => {
    expect(nextLabel('07')).toBe('08');
    expect(nextLabel('09')).toBe('10');
    expect(nextLabel('L9')).toBe('L10');
    expect(nextLabel('99')).toBe('100');
  });

  it('has nothing to offer after a label without a number', () => {
    expect(nextLabel('Bay A')).toBe('');
  });
});

describe('offeredLabel', () => {
  it('goes on after the highest, not the last added', () => {
    expect(offeredLabel(['10', '9', '2'])).toBe('11');
    expect(offeredLabel([])).toBe('01');
  });
});
