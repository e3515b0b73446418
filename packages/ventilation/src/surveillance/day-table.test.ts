import { Temporal } from '@js-temporal/polyfill';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { SupportId } from '../support/catalogue.ts';
import { dayTable } from './day-table.ts';
import type { SurveyedCheck } from './surveyed-days.ts';
import type { AirwayChange } from './ventilated-stretches.ts';

type Stay = Parameters<typeof dayTable>[0];

const STEP_MIN = 30;
const STEP_MS = STEP_MIN * 60_000;
const TUBE_MODES: readonly SupportId[] = ['ac-vc', 'psv', 'aprv', 'hfov'];
const OTHER: readonly SupportId[] = ['niv-st', 'hfnc', 'trach-collar'];

/**
 * The whole once more, slowly: walk the stay in half hours, ask of each what was charted last, write it on the
 * page of its calendar day (by another library), and read the pages one after the other.
 */
function walked(stay: Stay) {
  const { pages, modeAt } = pagesOf(stay);
  const days = [...pages.keys()].sort();
  let dayOne = '';
  const rows = days.map((day) => {
    if (!pages.has(plus(day, -1))) dayOne = day;
    const page = pages.get(day) ?? new Set<string>();
    const charted = (wanted: (mode: SupportId) => boolean, pick: (check: SurveyedCheck) => number | null) =>
      lowestHeld({
        samples: stay.checks
          .filter(({ mode }) => wanted(mode))
          .flatMap((check) => {
            const value = pick(check);
            return value === null ? [] : [{ ms: Date.parse(check.observedAt), value }];
          }),
        isOn: ({ ms }) => dayIn(new Date(ms).toISOString(), stay.timeZone) === day,
        counts: (ms) => wanted(modeAt.get(ms) ?? 'room-air'),
        everyMin: stay.chartingIntervalMinutes,
      });
    const onlyHigh = [...page].every((mode) => mode === 'hfov');
    const excluded = stay.extracorporealDays.includes(day)
      ? 'extracorporeal'
      : onlyHigh
        ? 'high-frequency'
        : null;
    return {
      day,
      ventilationDay: Math.round((Date.parse(day) - Date.parse(dayOne)) / 86_400_000) + 1,
      minPeep: excluded
        ? null
        : charted(
            (mode) => mode === 'ac-vc' || mode === 'psv',
            (c) => c.peepCmH2O,
          ),
      minFio2Percent: excluded
        ? null
        : charted(
            (mode) => ['ac-vc', 'psv', 'aprv'].includes(mode),
            (c) => c.fio2Percent,
          ),
      excluded,
      byFio2Alone: excluded === null && !page.has('ac-vc') && !page.has('psv'),
    };
  });
  return { rows, onsets: onsetsOf(rows) };
}

/** The modes of each day, and the mode of each half hour. */
function pagesOf({ checks, airways, until, timeZone }: Stay) {
  const pages = new Map<string, Set<string>>();
  const modeAt = new Map<number, SupportId>();
  const write = (ms: number, mode: string) => {
    const day = dayIn(new Date(ms).toISOString(), timeZone);
    pages.set(day, (pages.get(day) ?? new Set()).add(mode));
  };
  const endMs = Date.parse(until);
  const facts = [
    ...checks.map(({ observedAt, mode }) => ({ ms: Date.parse(observedAt), rank: 0, is: mode })),
    ...airways.map(({ observedAt, event }) => ({
      ms: Date.parse(observedAt),
      rank: event === 'removed' ? 1 : 2,
      is: event,
    })),
  ].sort((a, b) => a.ms - b.ms || a.rank - b.rank);
  let now = 'nothing';
  facts.forEach((fact, at) => {
    if (fact.is === 'removed') now = 'nothing';
    else if (fact.is === 'placed') {
      if (now === 'nothing') {
        let look = at + 1;
        while (facts[look]?.is === 'placed') look += 1;
        const next = facts[look]?.is ?? 'nothing';
        now = (TUBE_MODES as readonly string[]).includes(next) ? next : 'nothing';
      }
    } else now = (TUBE_MODES as readonly string[]).includes(fact.is) ? fact.is : 'nothing';
    if (now === 'nothing') return;
    write(fact.ms, now);
    for (let ms = fact.ms; ms < Math.min(facts[at + 1]?.ms ?? endMs, endMs); ms += STEP_MS) {
      write(ms, now);
      modeAt.set(ms, now as SupportId);
    }
  });
  return { pages, modeAt };
}

type Sample = { ms: number; value: number };

/** What stands is forgotten in a half hour that does not count, and after the day's last only that one is followed. */
function lowestHeld({
  samples,
  isOn,
  counts,
  everyMin,
}: {
  samples: Sample[];
  isOn: (sample: Sample) => boolean;
  counts: (ms: number) => boolean;
  everyMin: number;
}): number | null {
  const ofDay = samples.filter(isOn).sort((a, b) => a.ms - b.ms);
  const last = ofDay.at(-1);
  if (!last) return null;
  const charted = new Map(samples.map(({ ms, value }) => [ms, value]));
  const values = [...new Set(ofDay.map(({ value }) => value))].sort((a, b) => a - b);
  for (const value of values) {
    let minutes = 0;
    let stands: number | null = null;
    for (let ms = ofDay[0]?.ms ?? 0; ms < last.ms + everyMin * 60_000; ms += STEP_MS) {
      stands = counts(ms) ? (charted.get(ms) ?? stands) : null;
      if (ms > last.ms && stands !== last.value) break;
      minutes = stands === value ? minutes + STEP_MIN : 0;
      if (minutes > 60) return value;
    }
  }
  return values[0] ?? null;
}

type SlowRow = { day: string; minPeep: number | null; minFio2Percent: number | null };

function onsetsOf(rows: readonly SlowRow[]): string[] {
  const on = (day: string) => rows.find((row) => row.day === day);
  const found: string[] = [];
  for (const { day } of rows) {
    const four = [-2, -1, 0, 1].map((by) => on(plus(day, by)));
    const worse = (pick: (row: SlowRow) => number | null, rise: number) => {
      const [a, b, c, d] = four.map((row) => (row ? pick(row) : null));
      if (a == null || b == null || c == null || d == null) return false;
      return b <= a && c >= a + rise && d >= a + rise;
    };
    const peep = worse(({ minPeep }) => (minPeep === null ? null : Math.max(5, minPeep)), 3);
    const fio2 = worse(({ minFio2Percent }) => minFio2Percent, 20);
    const before = found.at(-1);
    if ((peep || fio2) && (before === undefined || plus(before, 14) <= day)) found.push(day);
  }
  return found;
}

function dayIn(instant: string, timeZone: string): string {
  return Temporal.Instant.from(instant).toZonedDateTimeISO(timeZone).toPlainDate().toString();
}

function plus(day: string, days: number): string {
  return Temporal.PlainDate.from(day).add({ days }).toString();
}

/** Weeks in which the clocks change, in zones by the whole and by the half hour. */
const ZONES = [
  ['Europe/Berlin', '2024-03-20T00:00:00Z'],
  ['Europe/Berlin', '2024-10-18T00:00:00Z'],
  ['America/New_York', '2024-03-03T00:00:00Z'],
  ['America/New_York', '2024-10-28T00:00:00Z'],
  ['Australia/Lord_Howe', '2024-03-30T00:00:00Z'],
  ['Asia/Kolkata', '2024-02-20T00:00:00Z'],
] as const;

/** Settings stand for a while, so that baselines and lasting rises are common. */
const phase = fc.record({
  mode: fc.oneof(
    { weight: 12, arbitrary: fc.constantFrom(...TUBE_MODES.slice(0, 2)) },
    { weight: 2, arbitrary: fc.constantFrom(...TUBE_MODES.slice(2)) },
    { weight: 1, arbitrary: fc.constantFrom(...OTHER) },
  ),
  peepCmH2O: fc.constantFrom(0, 5, 5, 5, 8, 8, 10, 12),
  fio2Percent: fc.constantFrom(30, 40, 40, 50, 60, 80),
  gaps: fc.array(fc.integer({ min: 1, max: 20 }), { minLength: 2, maxLength: 14 }),
  airway: fc.option(fc.constantFrom('placed' as const, 'removed' as const), { freq: 8, nil: null }),
});

const stays: fc.Arbitrary<Stay> = fc
  .record({
    zone: fc.constantFrom(...ZONES),
    phases: fc.array(phase, { minLength: 3, maxLength: 14 }),
    chartingIntervalMinutes: fc.constantFrom(30, 60, 120, 240),
    extracorporeal: fc.option(fc.nat(20), { freq: 4, nil: null }),
    after: fc.nat(60),
    isPresent: fc.boolean(),
  })
  .map(({ zone: [timeZone, from], phases, chartingIntervalMinutes, extracorporeal, after, isPresent }) => {
    const checks: SurveyedCheck[] = [];
    const airways: AirwayChange[] = [];
    let ms = Date.parse(from);
    const at = () => new Date(ms).toISOString();
    for (const { mode, peepCmH2O, fio2Percent, gaps, airway } of phases) {
      if (airway) airways.push({ observedAt: at(), event: airway });
      for (const gap of gaps) {
        ms += gap * STEP_MS;
        const hasPeep = mode === 'ac-vc' || mode === 'psv';
        checks.push({ observedAt: at(), mode, peepCmH2O: hasPeep ? peepCmH2O : null, fio2Percent });
      }
    }
    ms += after * STEP_MS;
    const extracorporealDays = extracorporeal === null ? [] : [plus(from.slice(0, 10), extracorporeal)];
    return { checks, airways, extracorporealDays, timeZone, chartingIntervalMinutes, until: at(), isPresent };
  });

describe('dayTable', () => {
  it('agrees with walking the stay by half hours, over weeks in which the clocks change', () => {
    const seen = { events: 0, excluded: 0, byFio2Alone: 0, newEpisodes: 0 };
    fc.assert(
      fc.property(stays, (stay) => {
        const expected = walked(stay);
        const { rows, events } = dayTable(stay);
        expect(
          rows.map(({ day, ventilationDay, minPeep, minFio2Percent, excluded, byFio2Alone }) => ({
            ...{ day, ventilationDay, minPeep, minFio2Percent, excluded, byFio2Alone },
          })),
        ).toEqual(expected.rows);
        expect(events.map(({ onset }) => onset)).toEqual(expected.onsets);
        seen.events += events.length;
        seen.excluded += rows.filter(({ excluded }) => excluded).length;
        seen.byFio2Alone += rows.filter((row) => row.byFio2Alone).length;
        seen.newEpisodes += rows.filter(({ ventilationDay }) => ventilationDay === 1).length - 1;
      }),
      { numRuns: 150 },
    );
    // Stays without any of these would prove little.
    expect(seen.events).toBeGreaterThan(10);
    expect(seen.excluded).toBeGreaterThan(10);
    expect(seen.byFio2Alone).toBeGreaterThan(10);
    expect(seen.newEpisodes).toBeGreaterThan(5);
  });

  it('does not depend on the order of the facts, and gives every mark a sentence', () => {
    const mixed = stays.chain((stay) =>
      fc
        .shuffledSubarray([...stay.checks], { minLength: stay.checks.length })
        .map((checks) => [stay, { ...stay, checks }] as const),
    );
    fc.assert(
      fc.property(mixed, ([stay, shuffled]) => {
        const table = dayTable(stay);
        expect(dayTable(shuffled)).toEqual(table);
        for (const { why } of table.rows.flatMap(({ marks }) => marks))
          expect(why).toMatch(/^[A-Z].*\d.*\.$/);
        for (const { by, why } of table.events) expect(why).toHaveLength(4 * by.length);
      }),
      { numRuns: 60 },
    );
  });
});

/** A check every four hours of each listed day, in Berlin. */
function listed(
  days: readonly Partial<SurveyedCheck>[],
  over: Partial<Stay> = {},
): Parameters<typeof dayTable>[0] {
  const first = Temporal.PlainDate.from('2026-03-02');
  const checks = days.flatMap((day, at) =>
    [2, 6, 10, 14, 18, 22].map(
      (hour): SurveyedCheck => ({
        observedAt: first
          .add({ days: at })
          .toZonedDateTime({ timeZone: 'Europe/Berlin', plainTime: { hour } })
          .toInstant()
          .toString(),
        mode: 'ac-vc',
        peepCmH2O: 5,
        fio2Percent: 40,
        ...day,
      }),
    ),
  );
  return {
    checks,
    airways: [],
    extracorporealDays: [],
    timeZone: 'Europe/Berlin',
    chartingIntervalMinutes: 240,
    until: checks.at(-1)?.observedAt ?? '2026-03-02T12:00:00Z',
    isPresent: false,
    ...over,
  };
}

const WORSE = [{}, {}, { peepCmH2O: 8 }, { peepCmH2O: 9 }];

describe('the sentences of a day table', () => {
  it('say of each of the four days what it is', () => {
    const { rows, events } = dayTable(listed([{ peepCmH2O: 3 }, ...WORSE.slice(1)]));
    expect(
      rows.map(({ marks }) => marks.map(({ kind, why }) => `${kind}: ${why.replaceAll('\u00a0', ' ')}`)),
    ).toEqual([
      ['baseline: First baseline day: PEEP 3 cmH2O, which counts as 5.'],
      ['baseline: Second baseline day: PEEP 5 cmH2O, not above the first day’s 5.'],
      [
        'onset: PEEP 8 cmH2O is 3 above the first baseline day’s 5; 3 is needed, on this day and the next. The event begins here.',
      ],
      ['worse: PEEP 9 cmH2O is 4 above the first baseline day’s 5: the second worse day.'],
    ]);
    expect(events).toMatchObject([
      {
        onset: '2026-03-04',
        ventilationDay: 3,
        window: { first: '2026-03-04', last: '2026-03-06' },
        period: { first: '2026-03-04', last: '2026-03-17' },
        isFirm: true,
      },
    ]);
    expect(rows.map(({ period }) => period?.dayOfPeriod ?? null)).toEqual([null, null, 1, 2]);
  });

  it('say why a rise of one day is no event, and that an open day decides', () => {
    const whyOf = (stay: Stay) => dayTable(stay).rows[2]?.marks[0]?.why;
    expect(whyOf(listed([{}, {}, { peepCmH2O: 8 }, { peepCmH2O: 7 }]))).toContain(
      'the next day’s 7 is not: one day alone is no event',
    );
    expect(whyOf(listed(WORSE.slice(0, 3), { isPresent: true }))).toContain('the next day decides');
    expect(whyOf(listed(WORSE.slice(0, 3)))).toContain('no ventilation day follows');
  });

  it('call an event not firm while its second worse day is going on', () => {
    expect(dayTable(listed(WORSE, { isPresent: true })).events).toMatchObject([{ isFirm: false }]);
    expect(dayTable(listed(WORSE, { isPresent: true })).rows.at(-1)?.notes).toContain(
      'The day is not over: a minimum can still fall.',
    );
  });

  it('name the event within whose 14 days a lasting rise lies', () => {
    const rises = [...WORSE, ...Array.from({ length: 4 }, () => ({})), { peepCmH2O: 8 }, { peepCmH2O: 8 }];
    const { rows, events } = dayTable(listed(rises));
    expect(events).toHaveLength(1);
    expect(rows[8]?.marks).toMatchObject([{ kind: 'repeat' }]);
    expect(rows[8]?.marks[0]?.why).toContain('within the 14 days of the event of 04-Mar-2026');
  });
});

describe('what counts as a ventilation day', () => {
  it('leaves out mask ventilation, and counts from 1 again after one full day off', () => {
    const days = [{}, {}, { mode: 'niv-st' as const, peepCmH2O: null }, { mode: 'niv-st' as const }, {}];
    expect(dayTable(listed(days)).rows.map(({ day, ventilationDay }) => [day, ventilationDay])).toEqual([
      ['2026-03-02', 1],
      ['2026-03-03', 2],
      // Until the first mask check, at 02:00.
      ['2026-03-04', 3],
      ['2026-03-06', 1],
    ]);
  });

  it('begins on the day of the intubation and ends on that of the extubation', () => {
    const stay = listed(WORSE, {
      airways: [
        { observedAt: '2026-03-01T22:30:00Z', event: 'placed' },
        { observedAt: '2026-03-05T21:30:00Z', event: 'removed' },
      ],
      until: '2026-03-09T00:00:00Z',
    });
    const days = dayTable(stay).rows.map(({ day }) => day);
    expect([days.at(0), days.at(-1)]).toEqual(['2026-03-01', '2026-03-05']);
  });

  it('leaves out whole days of high-frequency ventilation and extracorporeal support, with the reason', () => {
    const hfov = { mode: 'hfov' as const, peepCmH2O: null };
    const { rows } = dayTable(listed([{}, hfov, hfov, {}, {}], { extracorporealDays: ['2026-03-06'] }));
    // Conventional until 02:00, so that day is not wholly left out, though nothing counts on it.
    expect(rows.map(({ excluded }) => excluded)).toEqual([
      null,
      null,
      'high-frequency',
      null,
      'extracorporeal',
    ]);
    expect(rows[2]?.notes[0]).toContain('high-frequency ventilation all day');
    expect(rows[4]?.notes[0]).toContain('extracorporeal support');
  });

  it('judges a day on alternating pressures by FiO2 alone, and finds its event', () => {
    const aprv = (fio2Percent: number) => ({ mode: 'aprv' as const, peepCmH2O: null, fio2Percent });
    const { rows, events } = dayTable(listed([aprv(40), aprv(40), aprv(60), aprv(65)]));
    expect(rows.map(({ minPeep, byFio2Alone }) => [minPeep, byFio2Alone])).toEqual(
      rows.map(() => [null, true]),
    );
    expect(events).toMatchObject([{ onset: '2026-03-04', by: ['fio2'] }]);
  });
});

describe('how long a setting was held', () => {
  const DAY = '2026-03-03';
  const check = (observedAt: string, over: Partial<SurveyedCheck> = {}): SurveyedCheck => ({
    ...{ observedAt, mode: 'ac-vc', peepCmH2O: 10, fio2Percent: 40 },
    ...over,
  });
  const minimaOf = (facts: Partial<Stay>) => {
    const table = dayTable({ ...listed([]), timeZone: 'UTC', until: '2026-03-05T00:00:00Z', ...facts });
    return table.rows.find(({ day }) => day === DAY);
  };
  const low = (time: string) => check(`${DAY}T${time}Z`, { peepCmH2O: 5 });
  const before = check(`${DAY}T00:00:00Z`);

  it('ends with a change to alternating pressures, though FiO2 goes on', () => {
    const aprv = { mode: 'aprv' as const, peepCmH2O: null };
    const checks = [
      before,
      { ...low('08:00:00'), fio2Percent: 30 },
      check(`${DAY}T08:30:00Z`, { ...aprv, fio2Percent: null }),
      check(`${DAY}T20:00:00Z`),
    ];
    expect(minimaOf({ checks })).toMatchObject({ minPeep: 10, minFio2Percent: 30 });
  });

  it('ends with oscillation, for FiO2 too', () => {
    const hfov = check(`${DAY}T08:30:00Z`, { mode: 'hfov', peepCmH2O: null });
    const checks = [before, { ...low('08:00:00'), fio2Percent: 30 }, hfov, check(`${DAY}T20:00:00Z`)];
    expect(minimaOf({ checks })).toMatchObject({ minPeep: 10, minFio2Percent: 40 });
  });

  it('ends with an extubation, and begins anew after a reintubation', () => {
    const airways: AirwayChange[] = [
      { observedAt: `${DAY}T08:20:00Z`, event: 'removed' },
      { observedAt: `${DAY}T14:00:00Z`, event: 'placed' },
    ];
    const after = (...checks: SurveyedCheck[]) =>
      minimaOf({ airways, checks: [before, low('08:00:00'), ...checks] })?.minPeep;
    expect(after(check(`${DAY}T14:10:00Z`))).toBe(10);
    expect(after(low('14:10:00'), check(`${DAY}T15:00:00Z`))).toBe(10);
    expect(after(low('14:10:00'), check(`${DAY}T15:11:00Z`))).toBe(5);
  });

  it('ends with a T-piece', () => {
    const tpiece = check(`${DAY}T08:20:00Z`, { mode: 'tpiece', peepCmH2O: null });
    const checks = [before, low('08:00:00'), tpiece, check(`${DAY}T20:00:00Z`)];
    expect(minimaOf({ checks })?.minPeep).toBe(10);
  });

  it('ends with another value after midnight, not with the same', () => {
    const next = (clock: string, peepCmH2O: number) => check(`2026-03-04T${clock}Z`, { peepCmH2O });
    const after = (...checks: SurveyedCheck[]) =>
      minimaOf({ checks: [before, low('23:50:00'), ...checks] })?.minPeep;
    expect(after(next('00:05:00', 10))).toBe(10);
    expect(after(next('00:05:00', 5), next('00:50:00', 10))).toBe(10);
    expect(after(next('00:05:00', 5), next('00:51:00', 10))).toBe(5);
  });

  it('is not foretold: the end of the stay, or now, ends it', () => {
    const until = (clock: string) =>
      minimaOf({ checks: [before, low('08:00:00')], until: `${DAY}T${clock}Z` })?.minPeep;
    expect([until('09:00:00'), until('09:01:00')]).toEqual([10, 5]);
  });
});
