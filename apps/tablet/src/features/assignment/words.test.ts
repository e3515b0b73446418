import type { Assignment } from '@windrow/ventilation/contract/shifts';
import { describe, expect, it } from 'vitest';
import { standingOf, sumOf } from './words.ts';

const now = Date.parse('2026-03-05T12:00:00Z');
const timeZone = 'Europe/London';

function assignment(change: Partial<Assignment>): Assignment {
  const shift = {
    shiftId: 's1',
    unitId: 'u1',
    name: 'Day',
    startsAt: '2026-03-05T07:00:00Z',
    endsAt: '2026-03-05T19:00:00Z',
    version: 0,
    publishedVersion: null,
    people: [],
  };
  return {
    shift,
    places: [],
    version: 3,
    publishedVersion: null,
    changedBy: 'Hanne Lund',
    changedAt: '2026-03-05T06:50:00Z',
    ...change,
  };
}
const standing = (change: Partial<Assignment>, at = now) =>
  standingOf({ assignment: assignment(change), now: at, timeZone });

describe('standingOf', () => {
  it('says whether the screens show it, who did it and when', () => {
    expect(standing({ publishedVersion: 3 })).toBe('published by Hanne Lund at 06:50');
    expect(standing({})).toBe('draft saved by Hanne Lund at 06:50, not published');
    expect(standing({ publishedVersion: 2 })).toBe(
      'draft saved by Hanne Lund at 06:50; screens show the one before',
    );
    expect(standing({ version: 0, changedBy: null, changedAt: null })).toBe('draft, not published');
  });

  it('says that the shift has ended, from its last minute on', () => {
    const end = Date.parse('2026-03-05T19:00:00Z');
    expect(standing({ publishedVersion: 3 }, end - 1)).not.toContain('ended');
    expect(standing({ publishedVersion: 3 }, end)).toBe('shift has ended; published by Hanne Lund at 06:50');
  });
});

describe('sumOf', () => {
  it('adds what is over, and rounds once', () => {
    const person = { personId: 'ao', displayName: 'Ama Osei', initials: 'AO', minutesAvailable: 690 };
    expect(sumOf({ person, minutes: 625.4, over: 0 })).toBe('625 of 690 min');
    expect(sumOf({ person, minutes: 755, over: 65 })).toBe('755 of 690 min, 65 over');
  });
});
