import { z } from 'zod';
import { PATIENT_FIELDS } from '../entry/fields.ts';
import { numberSchema } from '../entry/number-schema.ts';
import { changesSomething, Day, Id, Instant, Note, nothingToChange } from './instant.ts';

export const SEXES = ['female', 'male'] as const;

/** Who the patient is. Two identifiers at least: name and hospital number; a bed is never one. */
export const Patient = z.strictObject({
  hospitalNumber: z.string().trim().min(1, { error: 'a hospital number is needed' }).max(30),
  familyName: z.string().trim().min(1, { error: 'a family name is needed' }).max(80),
  givenName: z.string().trim().min(1, { error: 'a given name is needed' }).max(80),
  bornOn: Day,
  /** For the weight formula only (lung size). Null: not recorded, and then nothing is judged per kg. */
  sex: z.enum(SEXES).nullable(),
  heightCm: numberSchema(PATIENT_FIELDS.heightCm).nullable(),
});
export type Patient = z.infer<typeof Patient>;

export const StayDetails = z.strictObject({
  patient: Patient,
  difficultAirway: z.boolean(),
  precautions: Note.nullable(),
  careLimits: Note.nullable(),
  /** Ordered intervals, which tighten the unit's age ladder for this stay. Null: the unit's own. */
  orders: z.strictObject({
    checkEveryMinutes: z.number().int().min(15).max(1440).nullable(),
    gasEveryMinutes: z.number().int().min(15).max(2880).nullable(),
  }),
});
export type StayDetails = z.infer<typeof StayDetails>;

export const Admission = StayDetails.extend({ bedId: Id, observedAt: Instant });
export type Admission = z.infer<typeof Admission>;

/** Correct who the patient is, or what is ordered; what is left out stays as it is. */
export const StayCorrection = StayDetails.partial().refine(changesSomething, nothingToChange);
export type StayCorrection = z.infer<typeof StayCorrection>;

export const Transfer = z.strictObject({ bedId: Id, observedAt: Instant });
export type Transfer = z.infer<typeof Transfer>;

export const OUTCOMES = ['ward', 'other-hospital', 'home', 'died'] as const;

export const Discharge = z.strictObject({ outcome: z.enum(OUTCOMES), observedAt: Instant });
export type Discharge = z.infer<typeof Discharge>;

export const Stay = z.object({
  stayId: Id,
  version: z.number().int(),
  bedId: Id.nullable(),
  unitId: Id,
  admittedAt: z.string(),
  leftAt: z.string().nullable(),
  outcome: z.enum(OUTCOMES).nullable(),
  details: StayDetails,
});
export type Stay = z.infer<typeof Stay>;
