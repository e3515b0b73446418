import { describe, expect, it } from 'vitest';
import { isNight } from './is-night.ts';

const at = (time: string, nightFrom: string, nightTo: string, timeZone = 'UTC') =>
  isNight({ now: Date.parse(`2026-03-05T${time}:00Z`), timeZone, nightFrom, nightTo });

describe('isNight', () => {
  it.each([
    ['19:59', false],
    ['20:00', true],
    ['23:59', true],
    ['00:00', true],
    ['06:59', true],
    ['07:00', false],
  ])('at %s of a night from 20:00 to 07:00 is %s', (time, night) => {
    expect(at(time, '20:00', '07:00')).toBe(night);
  });

  it('knows a night within one day', () => {
    expect(at('03:00', '01:00', '05:00')).toBe(true);
    expect(at('12:00', '01:00', '05:00')).toBe(false);
  });

  it('has no night where it ends as it begins', () => {
    expect(at('20:00', '20:00', '20:00')).toBe(false);
  });

  it('goes by the clock of the unit', () => {
    expect(at('12:30', '20:00', '07:00', 'Pacific/Auckland')).toBe(true);
  });
});
