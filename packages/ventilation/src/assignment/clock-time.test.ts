import { describe, expect, it } from 'vitest';
import { asClockTime, isClockTime } from './clock-time.ts';

describe('asClockTime', () => {
  it('takes a time in the ways in which people type it', () => {
    for (const typed of ['07:15', '7:15', '0715', '715', ' 7.15 ']) expect(asClockTime(typed)).toBe('07:15');
    expect(asClockTime('7')).toBe('07:00');
    expect(asClockTime('2359')).toBe('23:59');
  });

  it('leaves what is no time for its field to refuse', () => {
    for (const typed of ['', '24:00', '12:60', 'noon', '7:1']) expect(asClockTime(typed)).toBe(typed);
  });
});

describe('isClockTime', () => {
  it('knows the first and the last minute of the day', () => {
    expect([isClockTime('00:00'), isClockTime('23:59'), isClockTime('24:00')]).toEqual([true, true, false]);
  });
});
