import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type SurveillanceDay, ventilatorEvents } from './ventilator-events.ts';

/** Calendar days in a row over two leap-year months, written by hand so that no code under test makes them. */
const CALENDAR = [
  ...Array.from({ length: 29 }, (_, at) => `2024-02-${String(at + 1).padStart(2, '0')}`),
  ...Array.from({ length: 31 }, (_, at) => `2024-03-${String(at + 1).padStart(2, '0')}`),
];

type Listed = SurveillanceDay | 'not listed';

/**
 * The rule once more, slowly and as it is told at the bedside: look at each stretch of four calendar days, one parameter at a
 * time; strike out an onset within 14 days of the last one.
 */
function toldAtTheBedside(calendar: readonly Listed[]) {
  const found: { onset: string; kind: 'VAC'; by: string[] }[] = [];
  let daysSinceOnset = 1000;
  for (let at = 0; at < calendar.length; at += 1) {
    daysSinceOnset += 1;
    const stretch = [calendar[at - 2], calendar[at - 1], calendar[at], calendar[at + 1]];
    const by: string[] = [];
    if (worse(stretch, (day) => floored(day.minPeep), 3)) by.push('peep');
    if (worse(stretch, (day) => day.minFio2Percent, 20)) by.push('fio2');
    if (by.length === 0 || daysSinceOnset < 14) continue;
    found.push({ onset: String(CALENDAR[at]), kind: 'VAC', by });
    daysSinceOnset = 0;
  }
  return found;
}

function floored(peep: number | null): number | null {
  if (peep === null) return null;
  return peep < 5 ? 5 : peep;
}

function worse(
  stretch: (Listed | undefined)[],
  pick: (day: SurveillanceDay) => number | null,
  rise: number,
): boolean {
  const values: number[] = [];
  for (const day of stretch) {
    if (day === undefined || day === 'not listed' || day.excluded === true) return false;
    const value = pick(day);
    if (value === null) return false;
    values.push(value);
  }
  const [baselineOne, baselineTwo, worseOne, worseTwo] = values.map(Number);
  if (Number(baselineTwo) > Number(baselineOne)) return false;
  if (Number(worseOne) < Number(baselineOne) + rise) return false;
  return Number(worseTwo) >= Number(baselineOne) + rise;
}

/** Settings stand for some days, as at the bedside, so that baselines and rises are common. */
const settings = <T>(values: readonly T[]) =>
  fc
    .array(fc.tuple(fc.constantFrom(...values), fc.integer({ min: 1, max: 4 })), {
      minLength: 15,
      maxLength: 25,
    })
    .map((stretches) => stretches.flatMap(([value, days]) => Array.from({ length: days }, () => value)));

const now = <T>(often: T, seldom: T) =>
  fc.array(fc.oneof({ weight: 25, arbitrary: fc.constant(often) }, fc.constant(seldom)), {
    minLength: CALENDAR.length,
    maxLength: CALENDAR.length,
  });

const calendars = fc
  .record({
    length: fc.nat(CALENDAR.length),
    peep: settings([0, 4, 5, 5, 7, 8, 8, 10, 11, 14, null]),
    fio2: settings([40, 40, 50, 59, 60, 80, null]),
    excluded: now(false, true),
    listed: now(true, false),
  })
  .map(({ length, peep, fio2, excluded, listed }) =>
    CALENDAR.slice(0, length).map((day, at): Listed => {
      if (!listed[at]) return 'not listed';
      return { day, minPeep: peep[at] ?? null, minFio2Percent: fio2[at] ?? null, excluded: excluded[at] };
    }),
  );

const listedOf = (calendar: readonly Listed[]) => calendar.filter((day) => day !== 'not listed');

const at5 = (day: string, minPeep: number | null) => ({ day, minPeep, minFio2Percent: 40 });

describe('ventilatorEvents', () => {
  it('agrees with the rule told slowly, on any list of days', () => {
    let withEvents = 0;
    let withSeveral = 0;
    fc.assert(
      fc.property(calendars, (calendar) => {
        const expected = toldAtTheBedside(calendar);
        if (expected.length > 0) withEvents += 1;
        if (expected.length > 1) withSeveral += 1;
        expect(ventilatorEvents({ days: listedOf(calendar) })).toEqual(expected);
      }),
      { numRuns: 2000 },
    );
    // Lists without any event, or with one only, would prove little.
    expect(withEvents).toBeGreaterThan(1000);
    expect(withSeveral).toBeGreaterThan(300);
  });

  it('does not depend on the order of the list', () => {
    const shuffled = calendars.chain((calendar) => {
      const days = listedOf(calendar);
      return fc.tuple(fc.constant(days), fc.shuffledSubarray(days, { minLength: days.length }));
    });
    fc.assert(
      fc.property(shuffled, ([days, mixed]) => {
        expect(ventilatorEvents({ days: mixed })).toEqual(ventilatorEvents({ days }));
      }),
    );
  });

  it('names both parameters when both worsen on one day', () => {
    const days = [
      { day: '2024-02-28', minPeep: 5, minFio2Percent: 40 },
      { day: '2024-02-29', minPeep: 5, minFio2Percent: 40 },
      { day: '2024-03-01', minPeep: 8, minFio2Percent: 60 },
      { day: '2024-03-02', minPeep: 9, minFio2Percent: 65 },
    ];

    expect(ventilatorEvents({ days })).toEqual([{ onset: '2024-03-01', kind: 'VAC', by: ['peep', 'fio2'] }]);
  });

  it('starts a new baseline after an excluded day and after a day off the ventilator', () => {
    const days: SurveillanceDay[] = [
      at5('2024-02-01', 5),
      at5('2024-02-02', 5),
      at5('2024-02-03', 8),
      at5('2024-02-04', 8),
    ];
    const excluded = days.with(1, { ...at5('2024-02-02', 5), excluded: true });

    expect(ventilatorEvents({ days })).toHaveLength(1);
    expect(ventilatorEvents({ days: excluded })).toEqual([]);
    expect(ventilatorEvents({ days: days.toSpliced(1, 1) })).toEqual([]);
  });

  it('compares with the first baseline day when the second is lower', () => {
    const days = [at5('2024-02-01', 10), at5('2024-02-02', 5), at5('2024-02-03', 8), at5('2024-02-04', 8)];

    expect(ventilatorEvents({ days })).toEqual([]);
  });

  it('counts a percentage that was computed from a fraction', () => {
    const fio2 = [38, 38, 0.58 * 100, 0.58 * 100];
    const days = fio2.map((minFio2Percent, at) => ({
      day: String(CALENDAR[at]),
      minPeep: null,
      minFio2Percent,
    }));

    expect(fio2[2]).toBeLessThan(58);
    expect(ventilatorEvents({ days })).toMatchObject([{ by: ['fio2'] }]);
  });

  it('finds nothing in no days', () => {
    expect(ventilatorEvents({ days: [] })).toEqual([]);
  });
});
