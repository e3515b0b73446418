import type { SurveillanceMark } from '../contract/surveillance.ts';
import { dayFromNumber, dayNumber } from '../units/calendar-day.ts';
import { countedAs, plain, RULE, riseInWords, valueInWords } from './rule-words.ts';
import {
  type EventParameter,
  type SurveillanceDay,
  type VentilatorEvent,
  ventilatorEvents,
} from './ventilator-events.ts';

type Days = {
  days: readonly SurveillanceDay[];
  events: readonly VentilatorEvent[];
  openDay: string | null;
  nameOf: (day: string) => string;
};
type Marks = Map<string, SurveillanceMark[]>;
/** A first worse day with the two days before it and the day after it, where that is there. */
type Stretch = {
  parameter: EventParameter;
  first: SurveillanceDay;
  second: SurveillanceDay;
  worse: SurveillanceDay;
  next: SurveillanceDay | null;
};

/** What each day is to the rule, by its day, with the sentence why. */
export function markedDays(input: Days): Marks {
  const marks: Marks = new Map();
  const byNumber = new Map(input.days.map((day) => [dayNumber('day', day.day), day]));
  for (const number of [...byNumber.keys()].sort((a, b) => a - b)) {
    for (const parameter of ['peep', 'fio2'] as const) {
      const [first, second, worse] = [number - 2, number - 1, number].map((each) => byNumber.get(each));
      if (!first || !second || !worse) continue;
      const stretch = { parameter, first, second, worse, next: byNumber.get(number + 1) ?? null };
      for (const [day, mark] of marksOf(stretch, input)) marks.set(day, [...(marks.get(day) ?? []), mark]);
    }
  }
  return marks;
}

function marksOf(stretch: Stretch, { events, openDay, nameOf }: Days): [string, SurveillanceMark][] {
  const { parameter, worse, next } = stretch;
  if (!isRise(stretch)) return [];
  const rise = riseOf(stretch, worse);
  if (!next || !isEvent({ ...stretch, next }))
    return [
      [worse.day, { kind: 'one-day', parameter, why: `${rise}, but ${whyNotLasting(stretch, openDay)}` }],
    ];
  const event = events.find(({ onset, by }) => onset === worse.day && by.includes(parameter));
  if (event) return eventMarks({ ...stretch, next });
  const running = events.findLast(({ onset }) => onset < worse.day);
  const within = running ? `: within the 14 days of the event of ${nameOf(running.onset)}` : '';
  return [
    [worse.day, { kind: 'repeat', parameter, why: `${rise}, and lasts, but is no new event${within}.` }],
  ];
}

function eventMarks(stretch: Stretch & { next: SurveillanceDay }): [string, SurveillanceMark][] {
  const { parameter, first, second, worse, next } = stretch;
  const { of, rise } = RULE[parameter];
  const [firstValue, secondValue] = [of(first) ?? Number.NaN, of(second) ?? Number.NaN];
  const reference = plain(countedAs({ parameter, value: firstValue }));
  const mark = (kind: SurveillanceMark['kind'], why: string) => ({ kind, parameter, why });
  return [
    [first.day, mark('baseline', `First baseline day: ${valueInWords({ parameter, value: firstValue })}.`)],
    [
      second.day,
      mark(
        'baseline',
        `Second baseline day: ${valueInWords({ parameter, value: secondValue })}, not above the first day’s ${reference}.`,
      ),
    ],
    [
      worse.day,
      mark(
        'onset',
        `${riseOf(stretch, worse)}; ${rise} is needed, on this day and the next. The event begins here.`,
      ),
    ],
    [next.day, mark('worse', `${riseOf(stretch, next)}: the second worse day.`)],
  ];
}

function riseOf({ parameter, first }: Stretch, day: SurveillanceDay): string {
  const { of } = RULE[parameter];
  return riseInWords({ parameter, value: of(day) ?? Number.NaN, first: of(first) ?? Number.NaN });
}

function whyNotLasting({ parameter, worse, next }: Stretch, openDay: string | null): string {
  const value = next && !next.excluded ? RULE[parameter].of(next) : null;
  if (value !== null) return `the next day’s ${plain(value)} is not: one day alone is no event.`;
  if (next) return 'the next day has no minimum: one day alone is no event.';
  if (openDay !== null && worse.day >= openDay)
    return 'a second day like it is needed: the next day decides.';
  return 'no ventilation day follows: one day alone is no event.';
}

/** Whether the first worse day is one, if only the next were like it. The published rule itself is asked. */
function isRise(stretch: Stretch): boolean {
  const after = dayFromNumber(dayNumber('day', stretch.worse.day) + 1);
  return isEvent({ ...stretch, next: { ...stretch.worse, day: after } });
}

function isEvent({ parameter, first, second, worse, next }: Stretch & { next: SurveillanceDay }): boolean {
  const alone = [first, second, worse, next].map((day) =>
    parameter === 'peep' ? { ...day, minFio2Percent: null } : { ...day, minPeep: null },
  );
  return ventilatorEvents({ days: alone }).some(({ onset }) => onset === worse.day);
}
