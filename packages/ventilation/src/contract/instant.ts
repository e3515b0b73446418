import { z } from 'zod';

/** An instant with its offset; kept and sent as UTC. */
export const Instant = z.iso
  .datetime({
    offset: true,
    error: (issue) =>
      `must be an ISO 8601 time with offset, such as 2026-03-05T14:20:00Z, not ${JSON.stringify(issue.input)}`,
  })
  .transform((text) => new Date(text).toISOString())
  .meta({ description: 'ISO 8601 instant with offset' });

/** A calendar day, `yyyy-mm-dd`. */
export const Day = z.iso.date({
  error: (issue) => `must be a day such as 1961-03-04, not ${JSON.stringify(issue.input)}`,
});

/** Ids are made by the server; they carry no meaning. */
export const Id = z.string().min(1).max(64);

/** Short free text; longer than this belongs in the chart, not on a board. */
export const Note = z.string().trim().max(500);

/** A change that names no field would still be stored, and count as one. */
export const changesSomething = (change: object): boolean =>
  Object.values(change).some((value) => value !== undefined);
export const nothingToChange = { error: 'names nothing to change' };

/** Why something was changed: never empty. */
export const Reason = z
  .string()
  .trim()
  .min(3, { error: 'a reason of at least 3 letters is needed' })
  .max(500);
