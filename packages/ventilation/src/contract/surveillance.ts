import { z } from 'zod';
import { Id } from './instant.ts';

const day = z.string();
const span = z.object({ first: day, last: day });

export const EventParameter = z.enum(['peep', 'fio2']);

/**
 * What a day is to the rule, and the sentence why. `repeat`: a lasting rise within the 14 days of an earlier
 * event. `one-day`: a rise whose second day is missing or not there yet.
 */
export const SurveillanceMark = z.object({
  kind: z.enum(['baseline', 'onset', 'worse', 'repeat', 'one-day']),
  parameter: EventParameter,
  why: z.string(),
});
export type SurveillanceMark = z.infer<typeof SurveillanceMark>;

/** One calendar day, in the unit's zone, of ventilation through an artificial airway. */
export const SurveillanceRow = z.object({
  day,
  ventilationDay: z.number().int(),
  ventilationDayOne: day,
  /** As charted; the rule takes 0 to 5 as 5. */
  minPeep: z.number().nullable(),
  minFio2Percent: z.number().nullable(),
  excluded: z.enum(['high-frequency', 'extracorporeal']).nullable(),
  /** The whole day on alternating pressures: judged by FiO2 alone. */
  byFio2Alone: z.boolean(),
  /** The day has passed, so that its minima stand. */
  isOver: z.boolean(),
  notes: z.array(z.string()),
  marks: z.array(SurveillanceMark),
  /** The onset of the event in whose window the day lies. */
  windowOf: day.nullable(),
  period: z.object({ onset: day, dayOfPeriod: z.number().int() }).nullable(),
});
export type SurveillanceRow = z.infer<typeof SurveillanceRow>;

export const SurveillanceEvent = z.object({
  onset: day,
  kind: z.literal('VAC'),
  by: z.array(EventParameter),
  ventilationDay: z.number().int(),
  ventilationDayOne: day,
  window: span,
  period: span,
  /** False while the second worsening day is not over: its minimum can still fall. */
  isFirm: z.boolean(),
  why: z.array(z.string()),
});
export type SurveillanceEvent = z.infer<typeof SurveillanceEvent>;

/** The second tier of one event: whether it is infection-related by what was entered, and what is missing. */
export const InfectionTier = z.object({
  ivac: z.boolean(),
  signs: z.array(z.string()),
  qualifyingDays: z.array(day),
  longestRun: z.number().int(),
  missing: z.array(z.string()),
});
export type InfectionTier = z.infer<typeof InfectionTier>;

/** Which definition is followed, in words, and which parts of it are from memory. */
export const SurveillanceEdition = z.object({
  name: z.string(),
  purpose: z.string(),
  toBeChecked: z.array(z.string()),
});
export type SurveillanceEdition = z.infer<typeof SurveillanceEdition>;

/** The signs of infection as they were entered, by calendar day of the unit. */
export const EnteredSigns = z.object({
  temperatures: z.array(z.object({ day, celsius: z.number() })),
  whiteCells: z.array(z.object({ day, perMm3: z.number() })),
  antimicrobialDays: z.array(z.object({ agent: z.string(), days: z.array(day) })),
  extracorporealDays: z.array(day),
});
export type EnteredSigns = z.infer<typeof EnteredSigns>;

/** A stay's surveillance, computed when it is asked for. */
export const Surveillance = z.object({
  stayId: Id,
  unitId: Id,
  patient: z.object({ familyName: z.string(), givenName: z.string(), hospitalNumber: z.string() }),
  leftAt: z.string().nullable(),
  edition: SurveillanceEdition,
  timeZone: z.string(),
  chartingIntervalMinutes: z.number(),
  /** The unit's calendar day now, or on which the stay ended. */
  today: day,
  dayTable: z.array(SurveillanceRow),
  events: z.array(SurveillanceEvent.extend({ infection: InfectionTier })),
  entered: EnteredSigns,
});
export type Surveillance = z.infer<typeof Surveillance>;
