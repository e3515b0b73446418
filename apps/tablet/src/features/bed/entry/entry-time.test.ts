import { describe, expect, it } from 'vitest';
import { isLate, judgeTime, timeFrom } from './entry-time.ts';

const LONDON = 'Europe/London';
const now = Date.parse('2026-03-29T11:20:30Z'); // the day the clocks went forward: 12:20 in London

const at = (day: string, digits: string, timeZone = LONDON) =>
  judgeTime({ time: { day, digits }, now, timeZone });

describe('judgeTime', () => {
  it('says now when nothing was set', () => {
    expect(judgeTime({ time: null, now, timeZone: LONDON })).toEqual({ state: 'now' });
  });

  it('reads a clock in the zone of the unit', () => {
    expect(at('2026-03-29', '0940')).toEqual({ state: 'set', at: Date.parse('2026-03-29T08:40:00Z') });
    expect(at('2026-03-29', '0030')).toEqual({ state: 'set', at: Date.parse('2026-03-29T00:30:00Z') });
    expect(at('2026-03-28', '2350', 'America/New_York')).toEqual({
      state: 'set',
      at: Date.parse('2026-03-29T03:50:00Z'),
    });
  });

  it('refuses the hour that no clock showed', () => {
    expect(at('2026-03-29', '0130')).toMatchObject({
      state: 'refused',
      message: expect.stringContaining('left out'),
    });
  });

  it('takes the later of an hour that came twice', () => {
    const later = judgeTime({
      time: { day: '2026-10-25', digits: '0130' },
      now: Date.parse('2026-10-25T12:00:00Z'),
      timeZone: LONDON,
    });
    expect(later).toEqual({ state: 'set', at: Date.parse('2026-10-25T01:30:00Z') });
  });

  it.each([
    ['2026-10-25T00:35:00Z', '2026-10-25T00:30:00Z'],
    ['2026-10-25T01:27:30Z', '2026-10-25T00:30:00Z'],
    ['2026-10-25T01:28:00Z', '2026-10-25T01:30:00Z'],
    ['2026-10-25T01:40:00Z', '2026-10-25T01:30:00Z'],
  ])('at %s takes the pass of the hour that has been', (clock, meant) => {
    const judged = judgeTime({
      time: { day: '2026-10-25', digits: '0230' },
      now: Date.parse(clock),
      timeZone: 'Europe/Berlin',
    });
    expect(judged).toEqual({ state: 'set', at: Date.parse(meant) });
  });

  it('accepts two minutes ahead of the clock and no more', () => {
    expect(at('2026-03-29', '1222').state).toBe('set');
    expect(at('2026-03-29', '1223')).toEqual({
      state: 'refused',
      message: '12:23 is ahead of the clock, which shows 12:20',
    });
  });

  it.each(['', '9', '094', '2460', '2400'])('refuses %j as a time', (digits) => {
    expect(at('2026-03-29', digits).state).toBe('refused');
  });

  it('writes an instant the way it reads one', () => {
    const instant = Date.parse('2026-03-28T23:05:00Z');
    expect(judgeTime({ time: timeFrom(instant, LONDON), now, timeZone: LONDON })).toEqual({
      state: 'set',
      at: instant,
    });
  });
});

describe('isLate', () => {
  it('begins after a quarter of an hour', () => {
    expect(isLate({ observedAt: 0, recordedAt: 15 * 60_000 })).toBe(false);
    expect(isLate({ observedAt: 0, recordedAt: 15 * 60_000 + 1 })).toBe(true);
  });
});
