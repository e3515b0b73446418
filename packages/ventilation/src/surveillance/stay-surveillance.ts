import type { Airway, Check, Happening, InfectionSign } from '../contract/observations.ts';
import type { EnteredSigns, Surveillance } from '../contract/surveillance.ts';
import { instantMs } from '../units/instant.ts';
import { calendarInZone } from './calendar-in-zone.ts';
import { dayTable } from './day-table.ts';
import { SURVEILLANCE_EDITION } from './edition.ts';
import { infectionTier } from './infection-tier.ts';
import type { AirwayChange } from './ventilated-stretches.ts';

/** A fact that holds: corrected values are taken in, struck ones left out. */
type Held<Body> = { observedAt: string; body: Body };

export type SurveyedFacts = {
  checks: readonly Held<Pick<Check, 'mode' | 'settings'>>[];
  airways: readonly Held<Pick<Airway, 'event'>>[];
  happenings: readonly Held<Pick<Happening, 'kind'>>[];
  signs: readonly Held<InfectionSignBody>[];
};

/** A sign without its envelope, as it is kept. */
export type InfectionSignBody = InfectionSign extends infer Sign
  ? Sign extends { observedAt: string }
    ? Omit<Sign, 'observedAt'>
    : never
  : never;

/**
 * The surveillance of a stay from the facts that hold: its day table, the events, and the second tier of each
 * by the signs that were entered by hand.
 *
 * @param input.admittedAt the beginning of the stay: facts from long before it are slips in the date.
 * @source CDC NHSN, definitions of ventilator-associated events for adult locations; see `edition.ts`.
 */
export function staySurveillance({
  facts,
  timeZone,
  chartingIntervalMinutes,
  admittedAt,
  until,
  isPresent,
}: {
  facts: SurveyedFacts;
  timeZone: string;
  chartingIntervalMinutes: number;
  admittedAt: string;
  until: string;
  isPresent: boolean;
}): Pick<
  Surveillance,
  'edition' | 'timeZone' | 'chartingIntervalMinutes' | 'today' | 'dayTable' | 'events' | 'entered'
> {
  const dayOf = calendarInZone('timeZone', timeZone);
  const { checks, airways, signs } = near(facts, instantMs('admittedAt', admittedAt));
  const entered = enteredSigns(signs, dayOf);
  const { rows, events } = dayTable({
    checks: checks.map(({ observedAt, body: { mode, settings } }) => ({
      observedAt,
      mode,
      peepCmH2O: settings.peepCmH2O ?? null,
      fio2Percent: settings.fio2Percent ?? null,
    })),
    airways,
    extracorporealDays: entered.extracorporealDays,
    timeZone,
    chartingIntervalMinutes,
    until,
    isPresent,
  });
  return {
    edition: SURVEILLANCE_EDITION,
    timeZone,
    chartingIntervalMinutes,
    today: dayOf(instantMs('until', until)),
    dayTable: rows,
    events: events.map((event) => ({ ...event, infection: infectionTier({ event, entered }) })),
    entered,
  };
}

/** How long before the admission a patient can have been ventilated here: with a charted airway, and without. */
const LOOK_BACK_MS = { withAirway: 30 * 86_400_000, without: 3 * 86_400_000 };

/**
 * Without the facts that have a slip in their date, which would stretch the table. Signs make no ventilation
 * days, and those before the airway can matter.
 */
function near({ checks, airways, happenings, signs }: SurveyedFacts, admittedMs: number) {
  const changes = airwayChanges({ airways, happenings });
  const placedMs = changes
    .filter(({ event }) => event === 'placed')
    .map(({ observedAt }) => Date.parse(observedAt));
  const earliestMs = admittedMs - LOOK_BACK_MS.withAirway;
  const fromMs = Math.max(earliestMs, Math.min(admittedMs - LOOK_BACK_MS.without, ...placedMs));
  const since = <Fact extends { observedAt: string }>(all: readonly Fact[], ms: number) =>
    all.filter(({ observedAt }) => Date.parse(observedAt) >= ms);
  return {
    checks: since(checks, fromMs),
    airways: since(changes, fromMs),
    signs: since(signs, earliestMs),
  };
}

function airwayChanges({
  airways,
  happenings,
}: Pick<SurveyedFacts, 'airways' | 'happenings'>): AirwayChange[] {
  return [
    ...airways.map(({ observedAt, body: { event } }) => ({ observedAt, event })),
    ...happenings.flatMap(({ observedAt, body: { kind } }): AirwayChange[] => {
      if (kind === 'extubated-planned' || kind === 'extubated-unplanned')
        return [{ observedAt, event: 'removed' }];
      return kind === 'intubated' || kind === 'reintubated' ? [{ observedAt, event: 'placed' }] : [];
    }),
  ];
}

function enteredSigns(
  signs: readonly Held<InfectionSignBody>[],
  dayOf: (ms: number) => string,
): EnteredSigns {
  const courses = new Map<string, { agent: string; days: Set<string> }>();
  const entered: EnteredSigns = {
    temperatures: [],
    whiteCells: [],
    antimicrobialDays: [],
    extracorporealDays: [],
  };
  for (const { observedAt, body } of signs) {
    const observedOn = dayOf(instantMs('observedAt', observedAt));
    switch (body.sign) {
      case 'temperature':
        entered.temperatures.push({ day: observedOn, celsius: body.temperatureC });
        break;
      case 'white-cells':
        entered.whiteCells.push({ day: observedOn, perMm3: body.whiteCellsPerMm3 });
        break;
      case 'antimicrobial': {
        // One drug written in two ways is still one drug.
        const key = body.agent.toLowerCase();
        const course = courses.get(key) ?? { agent: body.agent, days: new Set<string>() };
        courses.set(key, course);
        course.days.add(body.day);
        break;
      }
      case 'extracorporeal':
        entered.extracorporealDays.push(body.day);
        break;
    }
  }
  return {
    temperatures: entered.temperatures,
    whiteCells: entered.whiteCells,
    antimicrobialDays: [...courses.values()].map(({ agent, days }) => ({ agent, days: [...days].sort() })),
    extracorporealDays: [...new Set(entered.extracorporealDays)].sort(),
  };
}
