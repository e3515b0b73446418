import type { SurveillanceEvent, SurveillanceMark, SurveillanceRow } from '../contract/surveillance.ts';
import { dayFromNumber, dayNumber } from '../units/calendar-day.ts';
import { eventWindow } from './event-window.ts';
import { markedDays } from './marked-days.ts';
import { countedAs, RULE } from './rule-words.ts';
import type { SurveyedDay } from './surveyed-days.ts';
import { type VentilatorEvent, ventilatorEvents } from './ventilator-events.ts';

/** The onset is day 1. @source CDC NHSN, ventilator-associated event protocol. */
const EVENT_PERIOD_DAYS = 14;

export type JudgedDays = { rows: SurveillanceRow[]; events: SurveillanceEvent[] };

/**
 * The rule laid over days of ventilation: each day with what it is to the rule and the sentence why, and the
 * events with their window and their 14 days.
 *
 * @param input.openDay the calendar day that is not over yet; null for a list that is complete.
 * @param input.nameOf how a day is called in a sentence.
 * @source CDC NHSN, ventilator-associated event protocol, through `ventilatorEvents` and `eventWindow`.
 */
export function judgeDays({
  days,
  openDay,
  nameOf,
}: {
  days: readonly SurveyedDay[];
  openDay: string | null;
  nameOf: (day: string) => string;
}): JudgedDays {
  const listed = days.map((day) => ({
    day: day.day,
    minPeep: day.minPeep,
    minFio2Percent: day.minFio2Percent,
    excluded: day.excluded !== null,
  }));
  const found = ventilatorEvents({ days: listed });
  const marks = markedDays({ days: listed, events: found, openDay, nameOf });
  const byDay = new Map(days.map((day) => [day.day, day]));
  const events = found.flatMap((event) => {
    const onset = byDay.get(event.onset);
    return onset ? [toEvent({ event, onset, openDay, marks })] : [];
  });
  return {
    events,
    rows: days.map((day) => toRow({ day, events, openDay, marks: marks.get(day.day) ?? [] })),
  };
}

function toEvent({
  event,
  onset,
  openDay,
  marks,
}: {
  event: VentilatorEvent;
  onset: SurveyedDay;
  openDay: string | null;
  marks: ReadonlyMap<string, SurveillanceMark[]>;
}): SurveillanceEvent {
  const { ventilationDay, ventilationDayOne } = onset;
  const number = dayNumber('onset', event.onset);
  const window = eventWindow({ onset: event.onset, ventilationDayOne });
  const secondWorse = dayFromNumber(number + 1);
  const its = [-2, -1, 0, 1].flatMap((by) =>
    (marks.get(dayFromNumber(number + by)) ?? []).filter(
      ({ kind, parameter }) => event.by.includes(parameter) && PARTS[by + 2] === kind,
    ),
  );
  return {
    ...event,
    ventilationDay,
    ventilationDayOne,
    window: { first: dayFromNumber(window.first), last: dayFromNumber(window.last) },
    period: { first: event.onset, last: dayFromNumber(number + EVENT_PERIOD_DAYS - 1) },
    isFirm: secondWorse !== openDay && event.onset !== openDay,
    why: its.map(({ why }) => why),
  };
}

/** What the four days of an event are, in order. */
const PARTS: readonly SurveillanceMark['kind'][] = ['baseline', 'baseline', 'onset', 'worse'];

function toRow({
  day,
  events,
  openDay,
  marks,
}: {
  day: SurveyedDay;
  events: readonly SurveillanceEvent[];
  openDay: string | null;
  marks: SurveillanceMark[];
}): SurveillanceRow {
  const within = ({ first, last }: { first: string; last: string }) => day.day >= first && day.day <= last;
  const running = events.find(({ period }) => within(period));
  const isOver = day.day !== openDay;
  return {
    ...day,
    isOver,
    notes: notesOf({ day, isOver }),
    marks,
    windowOf: events.find(({ window }) => within(window))?.onset ?? null,
    period: running
      ? {
          onset: running.onset,
          dayOfPeriod: dayNumber('day', day.day) - dayNumber('onset', running.onset) + 1,
        }
      : null,
  };
}

function notesOf({ day, isOver }: { day: SurveyedDay; isOver: boolean }): string[] {
  if (day.excluded !== null) return [EXCLUDED_WORDS[day.excluded]];
  const { minPeep, minFio2Percent, byFio2Alone } = day;
  const isEmpty = minPeep === null && minFio2Percent === null;
  if (isEmpty && !isOver) return ['Nothing is charted on this day yet.'];
  if (isEmpty) return ['Nothing that counts is charted on this day, so it is no baseline.'];
  const notes = isOver ? [] : ['The day is not over: a minimum can still fall.'];
  if (byFio2Alone)
    notes.push('All day on alternating pressures: PEEP is left out, the day is judged by FiO2 alone.');
  else if (minPeep === null) notes.push('No PEEP is charted on this day, so it is no baseline for PEEP.');
  if (minFio2Percent === null) notes.push('No FiO2 is charted on this day, so it is no baseline for FiO2.');
  if (minPeep !== null && countedAs({ parameter: 'peep', value: minPeep }) !== minPeep)
    notes.push(`${RULE.peep.label} of 0 to 5 counts as 5.`);
  return notes;
}

const EXCLUDED_WORDS = {
  'high-frequency': 'Left out: high-frequency ventilation all day. A baseline begins anew after it.',
  extracorporeal: 'Left out: entered as a day on extracorporeal support. A baseline begins anew after it.',
} as const;
