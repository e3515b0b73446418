import { z } from 'zod';
import { ROLES } from '../permissions/permissions.ts';
import { Id } from './instant.ts';

export const SignIn = z.strictObject({
  username: z.string().trim().min(1, { error: 'enter your user name' }).max(80),
  password: z.string().min(1, { error: 'enter your password' }).max(256),
});
export type SignIn = z.infer<typeof SignIn>;

export const Grant = z.object({ role: z.enum(ROLES), unitId: Id.nullable() });

/** Who I am, and which units I may open. */
export const Session = z.object({
  person: z.object({ personId: Id, username: z.string(), displayName: z.string(), initials: z.string() }),
  grants: z.array(Grant),
  expiresAt: z.string(),
  demonstration: z.boolean(),
});
export type Session = z.infer<typeof Session>;

/** At least 12 characters, up to 256, no rules of composition (after ASVS 6.2 and NIST SP 800-63B). */
export const NewPassword = z.string().min(12, { error: 'a password has at least 12 characters' }).max(256);

export const FirstAdministrator = z.strictObject({
  username: z
    .string()
    .trim()
    .toLowerCase()
    .regex(/^[a-z0-9][a-z0-9._-]{1,39}$/, {
      error: 'a user name has 2 to 40 of a–z, 0–9, dot, dash, underscore',
    }),
  displayName: z.string().trim().min(2).max(80),
  password: NewPassword,
});
export type FirstAdministrator = z.infer<typeof FirstAdministrator>;

/** Whether a first administrator is still needed, and what every screen must say. Open to all. */
export const Start = z.object({
  needsAdministrator: z.boolean(),
  demonstration: z.boolean(),
  serverTime: z.string(),
});
export type Start = z.infer<typeof Start>;
