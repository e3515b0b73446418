import { z } from 'zod';
import { Id, Instant } from './instant.ts';

export const ShiftPerson = z.object({
  personId: Id,
  displayName: z.string(),
  initials: z.string(),
  minutesAvailable: z.number().int(),
});
export type ShiftPerson = z.infer<typeof ShiftPerson>;

export const Shift = z.object({
  shiftId: Id,
  unitId: Id,
  name: z.string(),
  startsAt: z.string(),
  endsAt: z.string(),
  version: z.number().int(),
  publishedVersion: z.number().int().nullable(),
  people: z.array(ShiftPerson),
});
export type Shift = z.infer<typeof Shift>;

export const NewShift = z
  .strictObject({
    name: z.string().trim().min(1).max(40),
    startsAt: Instant,
    endsAt: Instant,
    people: z
      .array(z.strictObject({ personId: Id, minutesAvailable: z.number().int().min(30).max(1440) }))
      .min(1)
      .max(60),
  })
  .refine(
    (shift) =>
      Date.parse(shift.endsAt) > Date.parse(shift.startsAt) &&
      Date.parse(shift.endsAt) - Date.parse(shift.startsAt) <= 86_400_000,
    {
      path: ['endsAt'],
      error: 'a shift ends after it starts, within 24 h',
    },
  )
  .refine((shift) => new Set(shift.people.map((p) => p.personId)).size === shift.people.length, {
    path: ['people'],
    error: 'each person is on a shift once',
  });
export type NewShift = z.infer<typeof NewShift>;

export const AssignmentPlace = z.strictObject({
  bedId: Id,
  personId: Id,
  coverPersonId: Id.nullable().optional(),
});
export type AssignmentPlace = z.infer<typeof AssignmentPlace>;

/** Each bed to one person. Beds that are not named are unassigned, and shown so. */
export const AssignmentInput = z
  .strictObject({ places: z.array(AssignmentPlace).max(200), publish: z.boolean() })
  .refine((input) => new Set(input.places.map((p) => p.bedId)).size === input.places.length, {
    path: ['places'],
    error: 'each bed is given to one person',
  });
export type AssignmentInput = z.infer<typeof AssignmentInput>;

export const Assignment = z.object({
  shift: Shift,
  places: z.array(AssignmentPlace),
  version: z.number().int(),
  publishedVersion: z.number().int().nullable(),
  changedBy: z.string().nullable(),
  changedAt: z.string().nullable(),
});
export type Assignment = z.infer<typeof Assignment>;

/** Somebody who could be put on a shift of a unit. */
export const Colleague = z.object({ personId: Id, displayName: z.string(), initials: z.string() });
export type Colleague = z.infer<typeof Colleague>;
