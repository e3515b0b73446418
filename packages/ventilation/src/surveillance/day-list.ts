import { dayFromNumber } from '../units/calendar-day.ts';
import { type JudgedDays, judgeDays } from './judge-days.ts';
import { RULE } from './rule-words.ts';
import type { SurveyedDay } from './surveyed-days.ts';
import type { EventParameter } from './ventilator-events.ts';

/** Day 1 of a typed list; which calendar day it stands for is never shown. */
const DAY_ONE = 0;
const ACCEPTED = { peep: [0, 40], fio2: [20, 100] } as const;
const LONGEST_LIST = 120;

export type TypedList =
  | { state: 'empty' }
  | { state: 'refused'; faults: { parameter: EventParameter; message: string }[] }
  | ({ state: 'judged' } & JudgedDays);

/**
 * The rule tried on day minima as a person types them: one number for each day, parted by commas; a place left
 * empty or a dash is a day without a minimum. FiO2 is understood in percent and as a fraction.
 *
 * @source CDC NHSN, ventilator-associated event protocol: PEEP 0 to 40 cmH2O, FiO2 20 to 100 % are accepted.
 */
export function judgeTypedList(typed: Readonly<Record<EventParameter, string>>): TypedList {
  const peep = numbersIn('peep', typed.peep);
  const fio2 = numbersIn('fio2', typed.fio2);
  const faults = [...peep.faults, ...fio2.faults];
  if (faults.length > 0) return { state: 'refused', faults };
  const length = Math.max(peep.values.length, fio2.values.length);
  if (length === 0) return { state: 'empty' };
  const days = Array.from({ length }, (_, at) => aDay(at, peep.values[at] ?? null, fio2.values[at] ?? null));
  const numbers = new Map(days.map(({ day, ventilationDay }) => [day, ventilationDay]));
  return {
    state: 'judged',
    ...judgeDays({ days, openDay: null, nameOf: (day) => `day ${numbers.get(day)}` }),
  };
}

function aDay(at: number, minPeep: number | null, minFio2Percent: number | null): SurveyedDay {
  return {
    day: dayFromNumber(DAY_ONE + at),
    ventilationDay: at + 1,
    ventilationDayOne: dayFromNumber(DAY_ONE),
    minPeep,
    minFio2Percent,
    excluded: null,
    byFio2Alone: false,
  };
}

function numbersIn(parameter: EventParameter, text: string) {
  if (text.trim() === '') return { values: [], faults: [] };
  const parts = text.split(/[,;\n]/).map((part) => part.trim());
  if (parts.length > LONGEST_LIST)
    return {
      values: [],
      faults: [{ parameter, message: `At most ${LONGEST_LIST} days, not ${parts.length}.` }],
    };
  const values = parts.map((part) => valueIn(parameter, part));
  const faults = values.flatMap((value, at) =>
    Number.isNaN(value)
      ? [{ parameter, message: faultInWords({ parameter, at, part: parts[at] ?? '' }) }]
      : [],
  );
  return { values, faults };
}

/** Null: no minimum. NaN: not to be understood. */
function valueIn(parameter: EventParameter, part: string): number | null {
  if (/^[-–]?$/.test(part)) return null;
  const number = /^\d+(\.\d+)?$/.test(part) ? Number(part) : Number.NaN;
  const isFraction = parameter === 'fio2' && (number < 1 || /^1\.0+$/.test(part));
  const value = isFraction ? Math.round(number * 100) : number;
  const [low, high] = ACCEPTED[parameter];
  return value >= low && value <= high ? value : Number.NaN;
}

function faultInWords({
  parameter,
  at,
  part,
}: {
  parameter: EventParameter;
  at: number;
  part: string;
}): string {
  const { label, unit } = RULE[parameter];
  const [low, high] = ACCEPTED[parameter];
  return `${label} of day ${at + 1} must be ${low} to ${high}\u00a0${unit}, not ${part}.`;
}
