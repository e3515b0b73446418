import { describe, expect, it } from 'vitest';
import { localMoment, presetSpan, shiftMinutes, spanFrom } from './shift-span.ts';

const at = (text: string) => Date.parse(text);

describe('presetSpan', () => {
  it('is the shift that runs now, in the unit’s own zone', () => {
    expect(
      presetSpan({ preset: 'day', now: at('2026-01-15T12:00:00Z'), timeZone: 'America/New_York' }),
    ).toEqual({
      startsAt: '2026-01-15T12:00:00.000Z',
      endsAt: '2026-01-16T00:00:00.000Z',
    });
    expect(
      presetSpan({ preset: 'night', now: at('2026-01-15T03:00:00Z'), timeZone: 'Europe/London' }),
    ).toEqual({
      startsAt: '2026-01-14T19:00:00.000Z',
      endsAt: '2026-01-15T07:00:00.000Z',
    });
  });

  it('is the next one once the last has ended, from the very minute', () => {
    const day = (now: string) =>
      presetSpan({ preset: 'day', now: at(now), timeZone: 'Europe/London' }).startsAt;
    expect(day('2026-01-15T06:50:00Z')).toBe('2026-01-15T07:00:00.000Z');
    expect(day('2026-01-15T18:59:59Z')).toBe('2026-01-15T07:00:00.000Z');
    expect(day('2026-01-15T19:00:00Z')).toBe('2026-01-16T07:00:00.000Z');
  });

  it('is an hour shorter or longer in the night that the clocks change', () => {
    const night = (now: string) =>
      shiftMinutes(presetSpan({ preset: 'night', now: at(now), timeZone: 'Europe/London' }));
    expect(night('2026-03-28T20:00:00Z')).toBe(660);
    expect(night('2026-10-24T20:00:00Z')).toBe(780);
    expect(night('2026-06-01T20:00:00Z')).toBe(720);
  });
});

describe('spanFrom', () => {
  it('ends on the next day where the end is not after the start', () => {
    expect(spanFrom({ day: '2026-07-01', from: '22:00', to: '06:30', timeZone: 'Asia/Kolkata' })).toEqual({
      startsAt: '2026-07-01T16:30:00.000Z',
      endsAt: '2026-07-02T01:00:00.000Z',
    });
  });

  it('takes a time that the spring change leaves out as if the clocks had not changed yet', () => {
    expect(
      spanFrom({ day: '2026-03-29', from: '01:30', to: '09:00', timeZone: 'Europe/London' }).startsAt,
    ).toBe('2026-03-29T01:30:00.000Z');
  });
});

describe('localMoment', () => {
  it('is what the wall’s clock says', () => {
    expect(localMoment(at('2026-07-01T23:15:00Z'), 'Europe/Paris')).toBe('2026-07-02T01:15');
  });
});
