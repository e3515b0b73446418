import fc from 'fast-check';
import { afterEach, describe, expect, it } from 'vitest';
import { dailyMinimum } from './daily-minimum.ts';

/** How many equal values in a row show more than an hour, by minutes between charted values, as published. */
const NEEDED: Readonly<Record<number, number>> = { 15: 5, 30: 3, 60: 2, 120: 1, 240: 1 };

const DAY = '2024-03-05';
const START_MS = Date.parse(`${DAY}T00:00:00Z`);

const machineZone = process.env.TZ;
afterEach(() => {
  process.env.TZ = machineZone;
});

function charted(values: readonly number[], everyMin: number, startMs = START_MS) {
  return values.map((value, at) => ({ at: new Date(startMs + at * everyMin * 60_000).toISOString(), value }));
}

/** The published counts, slowly: try each value from the lowest up, and look for a long enough row of it. */
function byCounting(values: readonly number[], everyMin: number): number | null {
  const ascending = [...new Set(values)].sort((a, b) => a - b);
  for (const candidate of ascending) {
    let inARow = 0;
    for (const value of values) {
      inARow = value === candidate ? inARow + 1 : 0;
      if (inARow >= Number(NEEDED[everyMin])) return candidate;
    }
  }
  return ascending[0] ?? null;
}

describe('dailyMinimum', () => {
  it('agrees with counting equal values in a row, at each charting interval', () => {
    const days = fc.constantFrom(15, 30, 60, 120, 240).chain((everyMin) =>
      fc.record({
        everyMin: fc.constant(everyMin),
        // A lone value in a day shows no interval; both rules then fall back on it.
        values: fc.array(fc.constantFrom(5, 5, 5, 6, 8), { maxLength: 1440 / everyMin }),
      }),
    );
    fc.assert(
      fc.property(days, ({ values, everyMin }) => {
        const samples = charted(values, everyMin);
        expect(dailyMinimum({ samples, day: DAY, timeZone: 'UTC' })).toBe(byCounting(values, everyMin));
      }),
      { numRuns: 3000 },
    );
  });

  it('does not depend on the order of the samples, nor on samples of other days', () => {
    const samples = charted([10, 8, 5, 5, 8, 8], 60);
    const other = charted([1, 1, 1, 1], 60, START_MS - 4 * 3_600_000);

    const mixed = [...other, ...samples.toReversed(), ...charted([2, 2], 60, START_MS + 86_400_000)];

    expect(dailyMinimum({ samples: mixed, day: DAY, timeZone: 'UTC' })).toBe(5);
  });

  it('is null when nothing was charted that day', () => {
    expect(dailyMinimum({ samples: [], day: DAY, timeZone: 'UTC' })).toBeNull();
    expect(dailyMinimum({ samples: charted([5], 60), day: '2024-03-06', timeZone: 'UTC' })).toBeNull();
  });

  it('takes an irregular chart by how long each value stood', () => {
    const at = (clock: string, value: number) => ({ at: `${DAY}T${clock}:00Z`, value });
    const rest = [at('12:00', 8), at('12:30', 8), at('13:00', 8), at('13:30', 8)];
    const minimum = (samples: { at: string; value: number }[]) =>
      dailyMinimum({ samples: [...samples, ...rest], day: DAY, timeZone: 'UTC' });

    expect(minimum([at('10:59', 5)])).toBe(5);
    expect(minimum([at('11:00', 5)])).toBe(8);
  });

  it('holds a value no longer than it says, and refuses an end before its beginning', () => {
    const at = (clock: string, value: number, until?: string) => ({
      at: `${DAY}T${clock}:00Z`,
      value,
      ...(until !== undefined && { until: `${until}:00Z` }),
    });
    const minimum = (...samples: ReturnType<typeof at>[]) =>
      dailyMinimum({ samples: [at('01:00', 8), ...samples], day: DAY, timeZone: 'UTC' });

    expect(minimum(at('10:00', 5, `${DAY}T11:00`), at('20:00', 8))).toBe(8);
    expect(minimum(at('10:00', 5, `${DAY}T11:01`), at('20:00', 8))).toBe(5);
    expect(minimum(at('10:00', 5, `${DAY}T10:30`), at('11:00', 5, `${DAY}T11:45`))).toBe(8);
    expect(minimum(at('10:00', 5, `${DAY}T11:00`), at('11:00', 5, `${DAY}T11:45`))).toBe(5);
    expect(minimum(at('23:50', 5, '2024-03-06T00:05'))).toBe(8);
    expect(() => minimum(at('10:00', 5, `${DAY}T09:59`))).toThrow(/^samples\[1\]\.until must not be before/);
  });

  it('cuts days at midnight of the unit, not of the machine', () => {
    const samples = [
      { at: '2024-03-05T22:59:00Z', value: 12 },
      { at: '2024-03-05T23:00:00Z', value: 7 },
      { at: '2024-03-06T00:59:00+02:00', value: 11 },
    ];
    for (const zone of ['UTC', 'Pacific/Kiritimati', 'America/Los_Angeles']) {
      process.env.TZ = zone;
      expect(dailyMinimum({ samples, day: '2024-03-05', timeZone: 'Europe/Berlin' })).toBe(11);
      expect(dailyMinimum({ samples, day: '2024-03-06', timeZone: 'Europe/Berlin' })).toBe(7);
    }
    expect(new Date(2024, 0, 1).getTimezoneOffset()).toBe(480);
  });

  it.each([
    ['Europe/Berlin', '2024-03-31', '2024-03-30T23:00:00Z', 23],
    ['Europe/Berlin', '2024-10-27', '2024-10-26T22:00:00Z', 25],
    ['America/New_York', '2024-03-10', '2024-03-10T05:00:00Z', 23],
    ['America/New_York', '2024-11-03', '2024-11-03T04:00:00Z', 25],
    ['Australia/Lord_Howe', '2024-04-07', '2024-04-06T13:00:00Z', 24.5],
    ['Asia/Kolkata', '2024-05-01', '2024-04-30T18:30:00Z', 24],
  ])('knows that in %s the day %s begins at %s and has %d hours', (timeZone, day, beginsAt, hours) => {
    const beginMs = Date.parse(beginsAt);
    const endMs = beginMs + hours * 3_600_000;
    const holds = (ms: number) =>
      dailyMinimum({ samples: [{ at: new Date(ms).toISOString(), value: 5 }], day, timeZone }) === 5;

    expect([beginMs - 1, beginMs, endMs - 1, endMs].map(holds)).toEqual([false, true, true, false]);
  });

  it('counts real time in the hour that summer time repeats', () => {
    // 02:15 summer time to 02:15 winter time is an hour, not none.
    const samples = [
      { at: '2024-10-27T02:15:00+02:00', value: 5 },
      { at: '2024-10-27T02:45:00+02:00', value: 5 },
      { at: '2024-10-27T02:15:00+01:00', value: 5 },
      { at: '2024-10-27T02:45:00+01:00', value: 8 },
      { at: '2024-10-27T03:15:00+01:00', value: 8 },
      { at: '2024-10-27T03:45:00+01:00', value: 8 },
    ];

    expect(dailyMinimum({ samples, day: '2024-10-27', timeZone: 'Europe/Berlin' })).toBe(5);
  });
});
