import { z } from 'zod';
import { Policy } from '../policy/policy.ts';
import { changesSomething, Id, nothingToChange, Reason } from './instant.ts';
import { Grant, NewPassword } from './session.ts';

function isTimeZone(zone: string): boolean {
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
    return true;
  } catch {
    return false;
  }
}

export const NewUnit = z.strictObject({
  name: z.string().trim().min(1).max(60),
  timeZone: z.string().refine(isTimeZone, {
    error: (issue) =>
      `must be a zone of the time zone database, such as Europe/London, not ${JSON.stringify(issue.input)}`,
  }),
});
export type NewUnit = z.infer<typeof NewUnit>;

export const NewBed = z.strictObject({
  label: z.string().trim().min(1).max(6),
  row: z.number().int().min(1).max(20),
  column: z.number().int().min(1).max(20),
});
export type NewBed = z.infer<typeof NewBed>;

export const BedOpening = z.strictObject({ isOpen: z.boolean() });

/** The roles of one person: each once in a unit, or once in the whole hospital. */
const Grants = z
  .array(Grant)
  .max(30)
  .refine((grants) => new Set(grants.map(({ role, unitId }) => `${role} ${unitId}`)).size === grants.length, {
    error: 'each role is given once in a unit',
  });

export const NewPerson = z.strictObject({
  username: z
    .string()
    .trim()
    .toLowerCase()
    .regex(/^[a-z0-9][a-z0-9._-]{1,39}$/, {
      error: 'a user name has 2 to 40 of a–z, 0–9, dot, dash, underscore',
    }),
  displayName: z.string().trim().min(2).max(80),
  initials: z.string().trim().min(1).max(3).toUpperCase(),
  password: NewPassword,
  grants: Grants,
});
export type NewPerson = z.infer<typeof NewPerson>;

export const PersonChange = z
  .strictObject({
    grants: Grants.optional(),
    disabled: z.boolean().optional(),
    password: NewPassword.optional(),
  })
  .refine(changesSomething, nothingToChange);
export type PersonChange = z.infer<typeof PersonChange>;

export const Person = z.object({
  personId: Id,
  username: z.string(),
  displayName: z.string(),
  initials: z.string(),
  disabled: z.boolean(),
  grants: z.array(Grant),
  version: z.number().int(),
});
export type Person = z.infer<typeof Person>;

export const PolicyVersion = z.object({
  unitId: Id,
  version: z.number().int(),
  changedBy: z.string().nullable(),
  changedAt: z.string(),
  reason: z.string(),
  policy: Policy,
});
export type PolicyVersion = z.infer<typeof PolicyVersion>;

export const PolicyChange = z.strictObject({ policy: Policy, reason: Reason });
export type PolicyChange = z.infer<typeof PolicyChange>;

export const AuditEntry = z.object({
  auditId: z.number().int(),
  at: z.string(),
  personId: Id.nullable(),
  displayName: z.string().nullable(),
  act: z.string(),
  unitId: Id.nullable(),
  subject: z.string().nullable(),
  outcome: z.enum(['done', 'refused']),
});
export type AuditEntry = z.infer<typeof AuditEntry>;
