import { describe, expect, it } from 'vitest';
import { wholeNumber } from './whole-number.ts';

describe('wholeNumber', () => {
  it.each([
    ['', null, null],
    [' 15 ', 15, null],
    ['3', 3, null],
    ['2', null, 'A whole number from 3 to 15, not 2'],
    ['16', null, 'A whole number from 3 to 15, not 16'],
    ['1e1', null, 'A whole number from 3 to 15, not 1e1'],
    ['12.5', null, 'A whole number from 3 to 15, not 12.5'],
  ])('reads "%s" as %s', (text, value, fault) => {
    expect(wholeNumber(text, [3, 15])).toEqual({ value, fault });
  });
});
