import { z } from 'zod';
import { FAILURE_CRITERION_IDS } from '../readiness/trial-failure.ts';
import { Id } from './instant.ts';
import { TRIAL_METHOD_IDS } from './observations.ts';

/** One breathing trial of a stay, as told by its happenings. */
export const Trial = z.object({
  observationId: Id,
  /** Null where only its end was recorded. */
  startedAt: z.string().nullable(),
  method: z.enum(TRIAL_METHOD_IDS).nullable(),
  plannedMinutes: z.number().nullable(),
  /** `ended`: an extubation or another start ended it, and nobody said how it went. */
  outcome: z.enum(['running', 'passed', 'failed', 'ended']),
  endedAt: z.string().nullable(),
  minutes: z.number().nullable(),
  criteria: z.array(z.enum(FAILURE_CRITERION_IDS)),
  detail: z.string().nullable(),
});
export type Trial = z.infer<typeof Trial>;
