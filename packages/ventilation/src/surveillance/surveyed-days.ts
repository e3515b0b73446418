import type { SupportId } from '../support/catalogue.ts';
import { dayFromNumber, dayNumber } from '../units/calendar-day.ts';
import { calendarInZone } from './calendar-in-zone.ts';
import { dailyMinimum } from './daily-minimum.ts';
import { type HeldSetting, heldSettings } from './held-settings.ts';
import {
  type AirwayChange,
  type Manner,
  mannerOf,
  type Stretch,
  ventilatedStretches,
} from './ventilated-stretches.ts';

/** What a check says to surveillance. */
export type SurveyedCheck = {
  observedAt: string;
  mode: SupportId;
  peepCmH2O: number | null;
  fio2Percent: number | null;
};

export type SurveyedStay = {
  checks: readonly SurveyedCheck[];
  airways: readonly AirwayChange[];
  /** Calendar days wholly on extracorporeal support. */
  extracorporealDays: readonly string[];
  timeZone: string;
  chartingIntervalMinutes: number;
  until: string;
};

export type SurveyedDay = {
  day: string;
  ventilationDay: number;
  ventilationDayOne: string;
  minPeep: number | null;
  minFio2Percent: number | null;
  excluded: 'high-frequency' | 'extracorporeal' | null;
  byFio2Alone: boolean;
};

/** What was charted on one day. */
type Charted = { peep: HeldSetting[]; fio2: HeldSetting[] };

/**
 * The days of ventilation through an artificial airway, by the calendar of the unit's zone, each with its number in
 * the episode and its minima. Days follow each other without a gap in one episode; after one full calendar day off,
 * the next is day 1 again. Settings under high-frequency ventilation are left out, and a day wholly on it, or on
 * extracorporeal support, has no minima. PEEP is not taken from alternating pressures; FiO2 is.
 *
 * @source CDC NHSN, ventilator-associated event protocol and its answers on airway pressure release (episodes,
 *   the exclusion of high-frequency ventilation and of extracorporeal support for adults from memory).
 */
export function surveyedDays(stay: SurveyedStay): SurveyedDay[] {
  const dayOf = calendarInZone('timeZone', stay.timeZone);
  const stretches = ventilatedStretches(stay);
  const manners = mannersByDay(stretches, dayOf);
  const charted = chartedByDay({ checks: stay.checks, stretches, dayOf });
  const extracorporeal = new Set(stay.extracorporealDays);
  let dayOne = Number.NaN;
  let previous = Number.NaN;
  return [...manners.keys()]
    .sort((a, b) => a - b)
    .map((number) => {
      if (number !== previous + 1) dayOne = number;
      previous = number;
      const day = dayFromNumber(number);
      const onThisDay = manners.get(number) ?? new Set();
      const excluded = extracorporeal.has(day) ? 'extracorporeal' : highFrequencyOnly(onThisDay);
      return {
        day,
        ventilationDay: number - dayOne + 1,
        ventilationDayOne: dayFromNumber(dayOne),
        ...minimaOf({ day, charted: excluded ? undefined : charted.get(day), stay }),
        excluded,
        byFio2Alone: excluded === null && !onThisDay.has('conventional'),
      };
    });
}

function minimaOf({
  day,
  charted,
  stay: { timeZone, chartingIntervalMinutes },
}: {
  day: string;
  charted: Charted | undefined;
  stay: SurveyedStay;
}): Pick<SurveyedDay, 'minPeep' | 'minFio2Percent'> {
  const lowest = (samples: readonly HeldSetting[] = []) =>
    dailyMinimum({ samples, day, timeZone, chartingIntervalMinutes });
  return { minPeep: lowest(charted?.peep), minFio2Percent: lowest(charted?.fio2) };
}

function highFrequencyOnly(manners: ReadonlySet<Manner>): 'high-frequency' | null {
  return manners.size === 1 && manners.has('high-frequency') ? 'high-frequency' : null;
}

/** How a patient was ventilated on each day that a stretch touches. One that ends at midnight does not touch the next day. */
function mannersByDay(
  stretches: readonly Stretch[],
  dayOf: (ms: number) => string,
): Map<number, Set<Manner>> {
  const manners = new Map<number, Set<Manner>>();
  for (const { fromMs, toMs, mode } of stretches) {
    const first = dayNumber('day', dayOf(fromMs));
    const last = dayNumber('day', dayOf(Math.max(fromMs, toMs - 1)));
    for (let day = first; day <= last; day += 1) {
      const known = manners.get(day) ?? new Set();
      manners.set(day, known.add(mannerOf(mode)));
    }
  }
  return manners;
}

function chartedByDay({
  checks,
  stretches,
  dayOf,
}: {
  checks: readonly SurveyedCheck[];
  stretches: readonly Stretch[];
  dayOf: (ms: number) => string;
}): ReadonlyMap<string, Charted> {
  const settings = {
    peep: heldSettings({
      ...{ checks, stretches, counts: ['conventional'] },
      settingOf: ({ peepCmH2O }) => peepCmH2O,
    }),
    fio2: heldSettings({
      ...{ checks, stretches, counts: ['conventional', 'alternating'] },
      settingOf: ({ fio2Percent }) => fio2Percent,
    }),
  };
  const byDay = new Map<string, Charted>();
  for (const key of ['peep', 'fio2'] as const) {
    for (const setting of settings[key]) {
      const day = dayOf(setting.ms);
      const charted = byDay.get(day) ?? { peep: [], fio2: [] };
      charted[key].push(setting);
      byDay.set(day, charted);
    }
  }
  return byDay;
}
