import { Temporal } from '@js-temporal/polyfill';
import { UcumLhcUtils } from '@lhncbc/ucum-lhc';
import poisson from '@stdlib/stats-base-dists-poisson';
import {
  cmH2OFromMmHg,
  dailyMinimum,
  erlangB,
  hPaFromCmH2O,
  kpaFromMmHg,
  mmHgFromKpa,
  offeredForBlocking,
  predictedBodyWeight,
  serversForBlocking,
} from '@windrow/ventilation';
import { dayAfter, localMoment, shiftMinutes, spanFrom } from '@windrow/ventilation/assignment/shift-span';
import { dayIn, dayMoved, instantIn } from '@windrow/ventilation/format/zoned-time';
import { JOULES_PER_L_CMH2O } from '@windrow/ventilation/mechanics/joules';
import { calendarInZone } from '@windrow/ventilation/surveillance/calendar-in-zone';
import { dayFromNumber, dayNumber } from '@windrow/ventilation/units/calendar-day';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

// Well-kept libraries are asked the same question as our own few lines.

/** Blocking is the chance of exactly n over that of at most n, for a Poisson variable with the offered load. */
function referee(servers: number, offeredErlangs: number): number {
  return poisson.pmf(servers, offeredErlangs) / poisson.cdf(servers, offeredErlangs);
}

describe('Erlang B against the Poisson distribution of @stdlib (B = pmf ÷ cdf)', () => {
  const load = fc.record({
    servers: fc.integer({ min: 0, max: 120 }),
    offeredErlangs: fc.double({ min: 0.01, max: 120, noNaN: true }),
  });

  it('gives the same chance of being turned away', () => {
    fc.assert(
      fc.property(load, ({ servers, offeredErlangs }) => {
        const expected = referee(servers, offeredErlangs);
        fc.pre(expected > 1e-250);
        expect(erlangB({ servers, offeredErlangs }) / expected).toBeCloseTo(1, 9);
      }),
    );
  });

  it('finds the fewest beds that the referee lets pass', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 80, noNaN: true }),
        fc.double({ min: 1e-6, max: 0.5, noNaN: true }),
        (offeredErlangs, blocking) => {
          const servers = serversForBlocking({ offeredErlangs, blocking });
          expect(referee(servers, offeredErlangs)).toBeLessThanOrEqual(blocking * (1 + 1e-9));
          expect(referee(servers - 1, offeredErlangs)).toBeGreaterThan(blocking * (1 - 1e-9));
        },
      ),
    );
  });

  it('finds the load at which the referee turns away just so many', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 100 }),
        fc.double({ min: 1e-6, max: 0.9, noNaN: true }),
        (servers, blocking) => {
          const offeredErlangs = offeredForBlocking({ servers, blocking });
          expect(referee(servers, offeredErlangs) / blocking).toBeCloseTo(1, 8);
        },
      ),
    );
  });
});

describe('units against UCUM', () => {
  const ucum = UcumLhcUtils.getInstance();
  const converted = (from: string, value: number, to: string): number => {
    const { status, toVal, msg } = ucum.convertUnitTo(from, value, to);
    if (status !== 'succeeded' || toVal === null) throw new Error(`${from} to ${to}: ${msg.join(' ')}`);
    return toVal;
  };
  /** UCUM's own millimetre of mercury is 133.322 Pa; ours has all its digits, 3 parts in a million more. */
  const SAME = 3e-6;

  it.each([
    ['kpaFromMmHg', kpaFromMmHg, 'mm[Hg]', 'kPa'],
    ['mmHgFromKpa', mmHgFromKpa, 'kPa', 'mm[Hg]'],
    ['cmH2OFromMmHg', cmH2OFromMmHg, 'mm[Hg]', 'cm[H2O]'],
    ['hPaFromCmH2O', hPaFromCmH2O, 'cm[H2O]', 'hPa'],
  ] as const)('%s is what the library converts', (_name, ours, from, to) => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 900, noNaN: true }), (value) => {
        expect(Math.abs(ours(value) / converted(from, value, to) - 1)).toBeLessThan(SAME);
      }),
    );
  });

  it('a litre moved against a centimetre of water costs the joules of mechanical power, to its printed digits', () => {
    const joules = converted('L.cm[H2O]', 1, 'J');
    expect(JOULES_PER_L_CMH2O.toFixed(3)).toBe(joules.toFixed(3));
  });

  it('sixty inches of height weigh what the form of the chart begins with', () => {
    const heightCm = converted('[in_i]', 60, 'cm');
    expect(predictedBodyWeight({ sex: 'male', heightCm })).toBeCloseTo(50, 9);
    const oneMore = converted('[in_i]', 61, 'cm');
    expect(predictedBodyWeight({ sex: 'female', heightCm: oneMore })).toBeCloseTo(45.5 + 2.3, 9);
  });
});

/** Half-hour and quarter-hour offsets, both hemispheres, a half-hour summer time, a day that was left out. */
const ZONES = [
  'Europe/London',
  'Europe/Berlin',
  'America/New_York',
  'America/St_Johns',
  'Australia/Lord_Howe',
  'Asia/Kathmandu',
  'Pacific/Auckland',
  'Africa/Casablanca',
  'UTC',
] as const;
const zone = fc.constantFrom(...ZONES);
const instant = fc.integer({
  min: Date.parse('2015-01-01T00:00:00Z'),
  max: Date.parse('2035-01-01T00:00:00Z'),
});
const day = instant.map((ms) => new Date(ms).toISOString().slice(0, 10));

function zoned(ms: number, timeZone: string): Temporal.ZonedDateTime {
  return Temporal.Instant.fromEpochMilliseconds(ms).toZonedDateTimeISO(timeZone);
}

describe('calendar days against Temporal', () => {
  it('an instant falls on the same day and clock minute of a zone', () => {
    fc.assert(
      fc.property(instant, zone, (ms, timeZone) => {
        const there = zoned(ms, timeZone);
        expect(dayIn(ms, timeZone)).toBe(there.toPlainDate().toString());
        expect(calendarInZone('timeZone', timeZone)(ms)).toBe(there.toPlainDate().toString());
        expect(localMoment(ms, timeZone)).toBe(there.toPlainDateTime().toString({ smallestUnit: 'minute' }));
      }),
    );
  });

  it('days are as far apart, and the next is the next', () => {
    fc.assert(
      fc.property(day, day, fc.integer({ min: -400, max: 400 }), (one, other, by) => {
        const from = Temporal.PlainDate.from(one);
        expect(dayNumber('day', other) - dayNumber('day', one)).toBe(
          from.until(Temporal.PlainDate.from(other)).days,
        );
        const moved = from.add({ days: by }).toString();
        expect(dayFromNumber(dayNumber('day', one) + by)).toBe(moved);
        expect([dayMoved(one, by), dayAfter(one, by)]).toEqual([moved, moved]);
      }),
    );
  });

  it('refuses exactly the days that no calendar has', () => {
    const parts = fc.tuple(
      fc.integer({ min: 1990, max: 2040 }),
      fc.integer({ min: 0, max: 13 }),
      fc.integer({ min: 0, max: 32 }),
    );
    fc.assert(
      fc.property(parts, ([year, month, date]) => {
        const text = `${year}-${String(month).padStart(2, '0')}-${String(date).padStart(2, '0')}`;
        const isDay = succeeds(() => Temporal.PlainDate.from(text));
        expect(succeeds(() => dayNumber('day', text))).toBe(isDay);
      }),
    );
  });

  it('a time on a wall’s clock is the same instant, the later where it came twice, none where it was left out', () => {
    const clock = fc.tuple(fc.integer({ min: 0, max: 23 }), fc.integer({ min: 0, max: 59 }));
    fc.assert(
      fc.property(day, clock, zone, (on, [hour, minute], timeZone) => {
        const time = `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`;
        expect(instantIn({ day: on, time, timeZone })).toBe(instantByTemporal(on, time, timeZone));
      }),
    );
  });
});

/** The nights of the changed clocks, and how long the day is that holds them. */
const CHANGES = [
  { on: '2026-03-29', timeZone: 'Europe/London', hours: 23, missing: '01:30' },
  { on: '2026-10-25', timeZone: 'Europe/London', hours: 25, missing: null },
  { on: '2026-03-08', timeZone: 'America/New_York', hours: 23, missing: '02:30' },
  { on: '2026-11-01', timeZone: 'America/New_York', hours: 25, missing: null },
  { on: '2026-04-05', timeZone: 'Australia/Lord_Howe', hours: 24.5, missing: null },
  { on: '2026-10-04', timeZone: 'Australia/Lord_Howe', hours: 23.5, missing: '02:15' },
] as const;

describe.each(CHANGES)('the day of $hours hours, $on in $timeZone', ({ on, timeZone, hours, missing }) => {
  const from = Temporal.PlainDate.from(on).toZonedDateTime(timeZone).epochMilliseconds;
  const quarters = Array.from({ length: 160 }, (_, at) => from - 6 * 3_600_000 + at * 900_000);

  it('has as many quarters of an hour as by Temporal', () => {
    expect(zoned(from, timeZone).hoursInDay).toBe(hours);
    const dayOf = calendarInZone('timeZone', timeZone);
    expect(quarters.filter((ms) => dayOf(ms) === on)).toHaveLength(hours * 4);
    expect(quarters.filter((ms) => dayIn(ms, timeZone) === on)).toHaveLength(hours * 4);
  });

  it('has its own samples in the daily minimum, and nobody else’s', () => {
    const samples = quarters.map((ms, at) => ({ at: new Date(ms).toISOString(), value: at + 1 }));
    const own = samples.filter(({ at }) => zoned(Date.parse(at), timeZone).toPlainDate().toString() === on);
    // Every value is held for a quarter only, so the lowest of the day counts: the first.
    expect(dailyMinimum({ samples, day: on, timeZone })).toBe(own[0]?.value);
    const falling = samples.map(({ at, value }) => ({ at, value: 500 - value }));
    expect(dailyMinimum({ samples: falling, day: on, timeZone })).toBe(
      500 - (own.at(-1)?.value ?? Number.NaN),
    );
  });

  it('makes a night shift over it as long as it is worked', () => {
    const span = spanFrom({ day: dayMoved(on, -1), from: '19:00', to: '07:00', timeZone });
    expect(shiftMinutes(span)).toBe((12 + hours - 24) * 60);
    expect(zoned(Date.parse(span.endsAt), timeZone).toPlainDateTime().toString()).toBe(`${on}T07:00:00`);
  });

  it('has no instant for a time that no clock showed', () => {
    if (missing !== null) expect(instantIn({ day: on, time: missing, timeZone })).toBeNull();
  });
});

function instantByTemporal(on: string, time: string, timeZone: string): number | null {
  const plain = Temporal.PlainDateTime.from(`${on}T${time}`);
  const there = plain.toZonedDateTime(timeZone, { disambiguation: 'later' });
  return there.toPlainDateTime().equals(plain) ? there.epochMilliseconds : null;
}

function succeeds(act: () => unknown): boolean {
  try {
    act();
    return true;
  } catch {
    return false;
  }
}
