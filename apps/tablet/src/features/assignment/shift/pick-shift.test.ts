import type { Shift } from '@windrow/ventilation/contract/shifts';
import { describe, expect, it } from 'vitest';
import { shiftToOpen } from './pick-shift.ts';

const shift = (shiftId: string, startsAt: string, endsAt: string): Shift => ({
  shiftId,
  unitId: 'u1',
  name: shiftId,
  startsAt,
  endsAt,
  version: 0,
  publishedVersion: null,
  people: [],
});
const night = shift('night', '2026-03-04T19:00:00Z', '2026-03-05T07:00:00Z');
const day = shift('day', '2026-03-05T07:00:00Z', '2026-03-05T19:00:00Z');
const open = (now: string, shifts = [day, night]) =>
  shiftToOpen({ shifts, now: Date.parse(now) })?.shiftId ?? null;

describe('shiftToOpen', () => {
  it('is the one that runs, until an hour before the next', () => {
    expect(open('2026-03-05T05:59:59Z')).toBe('night');
    expect(open('2026-03-05T06:00:00Z')).toBe('day');
    expect(open('2026-03-05T12:00:00Z')).toBe('day');
  });

  it('is the next where none runs, else the last', () => {
    expect(open('2026-03-04T12:00:00Z')).toBe('night');
    expect(open('2026-03-06T12:00:00Z')).toBe('day');
    expect(open('2026-03-05T12:00:00Z', [])).toBeNull();
  });
});
