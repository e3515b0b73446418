import { dailyMinimum, infectionRelated, ventilatorEvents } from '@windrow/ventilation';
import { expect } from 'vitest';
import { numberAt, numbersAt, type Row } from '../rows.ts';
import type { Check } from './expectations.ts';

/** Nothing in the day lists depends on the date; this one runs through a leap day. */
const DAY_ONE_MS = Date.UTC(2024, 1, 20);
const DAY_MS = 86_400_000;
const MINUTE_MS = 60_000;

export const SURVEILLANCE: readonly Check[] = [
  [/^VAE-LL-\d+$/, dayListRow],
  [/^VAE-THR$/, thresholdRow],
  [
    /^VAE-PEEP05$/,
    (row) => {
      const used = numbersAt(row.expected, 'used');
      numbersAt(row.inputs, 'daily_min_peep_raw').forEach((raw, at) => {
        // A baseline at the raw value rises against the value it counts as.
        const needed = Number(used[at]) + 3;
        expect(onsets([raw, raw, needed, needed]), `${raw}`).toEqual([3]);
        expect(onsets([raw, raw, needed - 0.1, needed]), `${raw}`).toEqual([]);
      });
      expect(onsets([5, 5, numberAt(row.expected, 'needed_after_baseline_5'), 8])).toEqual([3]);
    },
  ],
  [
    /^VAE-14D$/,
    (row) => {
      // Rises stand two days, each after two days at 5; the first onset is day 4.
      const withSecondOn = (second: number) => {
        const peep = Array.from({ length: second + 1 }, () => 5);
        for (const day of [4, 5, second, second + 1]) peep[day - 1] = 9;
        return onsets(peep);
      };
      const first = numberAt(row.inputs, 'previous_onset_mv_day');
      const earliest = numberAt(row.expected, 'earliest_next_onset');
      expect(withSecondOn(numberAt(row.expected, 'last_day_of_period'))).toEqual([first]);
      expect(withSecondOn(earliest)).toEqual([first, earliest]);
    },
  ],
  [
    /^VAE-PEEPRANGE$/,
    (row) => {
      const one = (minPeep: number, minFio2Percent: number) => () =>
        ventilatorEvents({ days: [{ day: dayAt(1), minPeep, minFio2Percent }] });
      const [peepMin, peepMax] = [numberAt(row.expected, 'peep_min'), numberAt(row.expected, 'peep_max')];
      const fio2Min = numberAt(row.expected, 'fio2_min_percent');
      const fio2Max = numberAt(row.expected, 'fio2_max_percent');
      expect([one(peepMin, fio2Min)(), one(peepMax, fio2Max)()]).toEqual([[], []]);
      for (const outside of [
        one(peepMin - 0.1, 40),
        one(peepMax + 0.1, 40),
        one(5, fio2Min - 1),
        one(5, fio2Max + 1),
      ]) {
        expect(outside).toThrow(RangeError);
      }
    },
  ],
  [
    /^VAE-WIN\d$/,
    (row) => {
      const onset = numberAt(row.inputs, 'onset_mv_day');
      const counting = Array.from({ length: 30 }, (_, at) => at + 1).filter((day) =>
        ivac({ onset, temperatures: [{ day: dayAt(day), celsius: 39 }] }),
      );
      expect([counting.at(0), counting.at(-1)]).toEqual(row.expected.window);
    },
  ],
  [
    /^VAE-IVAC-T\d$/,
    (row) => {
      const temperatures = [{ day: dayAt(6), celsius: numberAt(row.inputs, 'temp_c') }];
      expect(ivac({ onset: 6, temperatures })).toBe(row.expected.met);
    },
  ],
  [
    /^VAE-IVAC-W\d$/,
    (row) => {
      const whiteCells = [{ day: dayAt(6), perMm3: numberAt(row.inputs, 'wbc_per_mm3') }];
      expect(ivac({ onset: 6, whiteCells })).toBe(row.expected.met);
    },
  ],
  [/^VAE-QAD-[a-z]$/, antimicrobialRow],
  [
    /^VAE-DMIN-/,
    (row) => {
      const values = numbersAt(row.inputs, 'consecutive_recordings');
      expect(minimumOf(values, numberAt(row.inputs, 'recording_interval_min'))).toBe(
        numberAt(row.expected, 'daily_min'),
      );
    },
  ],
  [
    /^VAE-NREC-/,
    (row) => {
      const everyMin = numberAt(row.inputs, 'recording_interval_min');
      const needed = numberAt(row.expected, 'recordings');
      const dip = (count: number) => [
        8,
        8,
        8,
        8,
        8,
        ...Array.from({ length: count }, () => 5),
        8,
        8,
        8,
        8,
        8,
      ];
      expect(minimumOf(dip(needed), everyMin)).toBe(5);
      expect(minimumOf(dip(needed - 1), everyMin)).toBe(8);
    },
  ],
];

function dayAt(ventilationDay: number): string {
  return new Date(DAY_ONE_MS + (ventilationDay - 1) * DAY_MS).toISOString().slice(0, 10);
}

function ventilationDayOf(day: string): number {
  return (Date.parse(`${day}T00:00:00Z`) - DAY_ONE_MS) / DAY_MS + 1;
}

function events(peep: readonly (number | null)[], fio2: readonly (number | null)[]) {
  const days = peep.map((minPeep, at) => ({ day: dayAt(at + 1), minPeep, minFio2Percent: fio2[at] ?? null }));
  return ventilatorEvents({ days });
}

function onsets(peep: readonly number[]): number[] {
  const steady = peep.map(() => 40);
  return events(peep, steady).map(({ onset }) => ventilationDayOf(onset));
}

function dayListRow(row: Row): void {
  const peep = row.inputs.daily_min_peep_cmh2o as (number | null)[];
  const fio2 = row.inputs.daily_min_fio2_percent as (number | null)[];
  const found = events(peep, fio2).map(({ onset, by, kind }) => {
    expect(kind).toBe('VAC');
    return { onset_mv_day: ventilationDayOf(onset), by: by.join('+') };
  });
  const printed = row.expected.events as { onset_mv_day: number; by: string }[];
  expect(found).toEqual(printed.map(({ onset_mv_day, by }) => ({ onset_mv_day, by: by.toLowerCase() })));
}

function thresholdRow(row: Row): void {
  const peepRise = numberAt(row.expected, 'peep_rise_cmh2o');
  const fio2Rise = numberAt(row.expected, 'fio2_rise_points');
  const steady = [6, 6, 6, 6];
  expect(events([6, 6, 6 + peepRise, 6 + peepRise], [40, 40, 40, 40])).toMatchObject([{ by: ['peep'] }]);
  expect(events(steady, [40, 40, 40 + fio2Rise, 40 + fio2Rise])).toMatchObject([{ by: ['fio2'] }]);
  expect(onsets([6, 6, 9, 9])).toEqual([numberAt(row.expected, 'earliest_onset_mv_day')]);
  expect(onsets([6, 6, 9])).toEqual([]);
  expect(onsets([6, 9, 9])).toEqual([]);
}

/** An event with antimicrobials that qualify, so that only the sign decides. */
function ivac({
  onset,
  temperatures = [],
  whiteCells = [],
}: {
  onset: number;
  temperatures?: { day: string; celsius: number }[];
  whiteCells?: { day: string; perMm3: number }[];
}): boolean {
  const days = [onset, onset + 1, onset + 2, onset + 3].map(dayAt);
  return infectionRelated({
    event: { onset: dayAt(onset), kind: 'VAC', by: ['peep'], ventilationDayOne: dayAt(1) },
    temperatures,
    whiteCells,
    antimicrobialDays: [{ agent: 'A', days }],
  }).ivac;
}

function antimicrobialRow(row: Row): void {
  const onset = numberAt(row.inputs, 'onset_mv_day');
  const given = row.inputs.administered_days as Record<string, number[]>;
  const result = infectionRelated({
    event: { onset: dayAt(onset), kind: 'VAC', by: ['fio2'], ventilationDayOne: dayAt(1) },
    temperatures: [{ day: dayAt(onset), celsius: 39 }],
    whiteCells: [],
    antimicrobialDays: Object.entries(given).map(([agent, days]) => ({ agent, days: days.map(dayAt) })),
  });
  expect(result.qualifyingDays.map(ventilationDayOf)).toEqual(numbersAt(row.expected, 'qad_days'));
  expect(result.ivac).toBe(row.expected.ivac_antimicrobial_met);
}

/** Recordings that end on the last step of a day, as in the published examples of an evening. */
function minimumOf(values: readonly number[], everyMin: number): number | null {
  const endMs = DAY_ONE_MS + DAY_MS - everyMin * MINUTE_MS;
  const samples = values.map((value, at) => ({
    at: new Date(endMs - (values.length - 1 - at) * everyMin * MINUTE_MS).toISOString(),
    value,
  }));
  return dailyMinimum({ samples, day: dayAt(1), timeZone: 'UTC' });
}
