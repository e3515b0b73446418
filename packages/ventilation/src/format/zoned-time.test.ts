import { describe, expect, it } from 'vitest';
import { dayIn, dayMoved, instantIn } from './zoned-time.ts';

const LONDON = 'Europe/London';

describe('instantIn', () => {
  it.each([
    ['2026-01-10', '09:00', LONDON, '2026-01-10T09:00:00Z'],
    ['2026-07-10', '09:00', LONDON, '2026-07-10T08:00:00Z'],
    ['2026-07-10', '00:10', 'Pacific/Auckland', '2026-07-09T12:10:00Z'],
    ['2026-07-10', '23:50', 'Pacific/Honolulu', '2026-07-11T09:50:00Z'],
    ['2026-07-10', '12:15', 'Asia/Kathmandu', '2026-07-10T06:30:00Z'],
  ])('knows when clocks showed %s %s in %s', (day, time, timeZone, instant) => {
    expect(instantIn({ day, time, timeZone })).toBe(Date.parse(instant));
  });

  it('knows no instant in the hour that is left out, and the later one of the hour that comes twice', () => {
    expect(instantIn({ day: '2026-03-29', time: '01:30', timeZone: LONDON })).toBeNull();
    expect(instantIn({ day: '2026-10-25', time: '01:30', timeZone: LONDON })).toBe(
      Date.parse('2026-10-25T01:30:00Z'),
    );
  });
});

describe('an hour that comes twice', () => {
  const twice = { day: '2026-10-25', time: '02:30', timeZone: 'Europe/Berlin' };
  const [first, second] = [Date.parse('2026-10-25T00:30:00Z'), Date.parse('2026-10-25T01:30:00Z')];

  it.each([
    ['the first pass while the second has not come', first + 60_000, first],
    ['the first pass to the last moment', second - 1, first],
    ['the second pass from then on', second, second],
    ['the first where both lie ahead', first - 60_000, first],
  ])('means %s', (_which, notAfter, meant) => {
    expect(instantIn({ ...twice, notAfter })).toBe(meant);
  });
});

describe('days', () => {
  it('belong to a zone', () => {
    const instant = Date.parse('2026-03-05T23:30:00Z');
    expect([dayIn(instant, LONDON), dayIn(instant, 'Asia/Tokyo')]).toEqual(['2026-03-05', '2026-03-06']);
  });

  it('follow each other through months and leap years', () => {
    expect([dayMoved('2028-02-28', 1), dayMoved('2026-01-01', -1)]).toEqual(['2028-02-29', '2025-12-31']);
  });
});
