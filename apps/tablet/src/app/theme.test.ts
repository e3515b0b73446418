import { describe, expect, it } from 'vitest';
import { hourlyTheme } from './theme.ts';

const at = (time: string, nightFrom = '20:00', nightTo = '07:00') =>
  hourlyTheme({ nightFrom, nightTo, timeZone: 'Europe/London', now: Date.parse(`2026-01-10T${time}:00Z`) });

describe('hourlyTheme', () => {
  it.each([
    ['19:59', 'day'],
    ['20:00', 'night'],
    ['03:00', 'night'],
    ['06:59', 'night'],
    ['07:00', 'day'],
  ])('is at %s %s', (time, theme) => {
    expect(at(time)).toBe(theme);
  });

  it('knows a night that does not pass midnight', () => {
    expect(at('03:00', '01:00', '05:00')).toBe('night');
    expect(at('23:00', '01:00', '05:00')).toBe('day');
  });
});
