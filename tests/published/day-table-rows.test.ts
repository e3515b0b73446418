import type { SupportId } from '@windrow/ventilation/support/catalogue';
import { judgeTypedList } from '@windrow/ventilation/surveillance/day-list';
import { dayTable } from '@windrow/ventilation/surveillance/day-table';
import { describe, expect, it } from 'vitest';
import { ROWS, type Row } from './rows.ts';

const DAY_ONE_MS = Date.UTC(2024, 1, 20);
const HOUR_MS = 3_600_000;

type Minima = (number | null)[];
const minimaOf = ({ inputs }: Row) => ({
  peep: inputs.daily_min_peep_cmh2o as Minima,
  fio2: inputs.daily_min_fio2_percent as Minima,
});
const printedOf = ({ expected }: Row) =>
  (expected.events as { onset_mv_day: number; by: string }[]).map(({ onset_mv_day, by }) => [
    onset_mv_day,
    by.toLowerCase(),
  ]);
const found = (events: readonly { ventilationDay: number; by: readonly string[] }[]) =>
  events.map(({ ventilationDay, by }) => [ventilationDay, by.join('+')]);

/** A mode in which a check charts just these: without PEEP alternating pressures, without both oscillation. */
function modeOf(peep: number | null, fio2: number | null): SupportId {
  if (peep !== null) return 'ac-vc';
  return fio2 === null ? 'hfov' : 'aprv';
}

const lists = ROWS.filter(({ id }) => /^VAE-LL-\d+$/.test(id));

describe.each(lists)('$id, day minima as a list, $source', (row) => {
  const { peep, fio2 } = minimaOf(row);

  it('has the printed events when it is typed in', () => {
    const typed = judgeTypedList({ peep: peep.join(','), fio2: fio2.join(',') });
    expect(typed.state).toBe('judged');
    expect(typed.state === 'judged' && found(typed.events)).toEqual(printedOf(row));
  });

  it('has the printed events as a stay with a check every hour', () => {
    const checks = peep.flatMap((peepCmH2O, day) =>
      Array.from({ length: 24 }, (_, hour) => ({
        observedAt: new Date(DAY_ONE_MS + (day * 24 + hour) * HOUR_MS).toISOString(),
        mode: modeOf(peepCmH2O, fio2[day] ?? null),
        peepCmH2O,
        fio2Percent: fio2[day] ?? 100,
      })),
    );
    const { rows, events } = dayTable({
      checks,
      airways: [],
      extracorporealDays: [],
      timeZone: 'UTC',
      chartingIntervalMinutes: 60,
      until: new Date(DAY_ONE_MS + peep.length * 24 * HOUR_MS).toISOString(),
      isPresent: false,
    });
    expect(rows.map(({ minPeep }) => minPeep)).toEqual(peep);
    expect(rows.map(({ minFio2Percent }) => minFio2Percent)).toEqual(fio2);
    expect(found(events)).toEqual(printedOf(row));
  });
});
