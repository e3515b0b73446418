import { randomUUID } from 'node:crypto';
import type { Assignment, AssignmentInput, NewShift, Shift } from '@windrow/ventilation/contract/shifts';
import type { Knex } from 'knex';
import { conflict, invalid, notFound, staleVersion } from '../errors.ts';
import { colleaguesOfUnit, personById } from '../queries/people.ts';
import {
  insertAssignment,
  insertShift,
  latestAssignment,
  type ShiftRow,
  shiftById,
  shiftPeople,
  shiftsNotEnded,
} from '../queries/shifts.ts';
import { bedsOfUnit } from '../queries/units.ts';
import type { Write } from './write.ts';

/** A span of duty in a unit with the people on it; nobody has a bed yet. */
export async function makeShift(
  write: Write,
  { unitId, shift }: { unitId: string; shift: NewShift },
): Promise<Shift> {
  const colleagues = new Set((await colleaguesOfUnit(write.trx, unitId)).map(({ id }) => id));
  const strangers = shift.people.flatMap(({ personId }, index) =>
    colleagues.has(personId)
      ? []
      : [{ path: `people.${index}.personId`, message: 'is not a therapist of this unit' }],
  );
  if (strangers.length > 0) throw invalid(strangers);
  await requireNoOverlap(write.trx, unitId, shift);
  const id = randomUUID();
  await insertShift(
    write.trx,
    {
      id,
      unit_id: unitId,
      name: shift.name,
      starts_at: shift.startsAt,
      ends_at: shift.endsAt,
      made_by: write.person.personId,
    },
    shift.people,
  );
  write.changed({ topic: 'shifts', unitId });
  await write.audit({ act: 'make shift', unitId, subject: id });
  return readShift(write.trx, await requireShift(write.trx, id));
}

/**
 * Replaces a shift's assignment whole, from the version that was read. Two people at once: the second
 * is told who was first and nothing is lost. Published, every bed it touches shows it at once.
 */
export async function putAssignment(
  write: Write,
  { shift, input, version }: { shift: ShiftRow; input: AssignmentInput; version: number },
): Promise<Assignment> {
  const latest = await latestAssignment(write.trx, shift.id);
  const current = latest?.version ?? 0;
  if (version !== current) {
    const by = latest?.changedBy ? await personById(write.trx, latest.changedBy) : null;
    throw staleVersion({
      thing: 'assignment',
      given: version,
      current,
      by: by?.display_name ?? null,
      at: latest?.changedAt ?? null,
    });
  }
  await requireKnownPlaces(write.trx, shift, input);
  const before = await latestAssignment(write.trx, shift.id, { publishedOnly: true });
  await insertAssignment(write.trx, {
    shiftId: shift.id,
    version: current + 1,
    published: input.publish,
    places: input.places,
    changedBy: write.person.personId,
    changedAt: write.now,
  });
  if (input.publish && shift.ends_at > write.now) {
    for (const bedId of touchedBeds(before?.places ?? [], input.places)) await write.bedChanged(bedId);
  }
  write.changed({ topic: 'shifts', unitId: shift.unit_id });
  await write.audit({
    act: input.publish ? 'publish assignment' : 'save assignment',
    unitId: shift.unit_id,
    subject: shift.id,
  });
  return readAssignment(write.trx, shift);
}

function touchedBeds(before: AssignmentInput['places'], after: AssignmentInput['places']): string[] {
  const key = (place: AssignmentInput['places'][number]) =>
    `${place.bedId} ${place.personId} ${place.coverPersonId ?? ''}`;
  const [old, fresh] = [new Set(before.map(key)), new Set(after.map(key))];
  const touched = [
    ...before.filter((place) => !fresh.has(key(place))),
    ...after.filter((place) => !old.has(key(place))),
  ];
  return [...new Set(touched.map(({ bedId }) => bedId))];
}

async function requireKnownPlaces(db: Knex, shift: ShiftRow, { places }: AssignmentInput): Promise<void> {
  const beds = new Set((await bedsOfUnit(db, shift.unit_id)).map(({ id }) => id));
  const people = new Set((await shiftPeople(db, shift.id)).map(({ person_id }) => person_id));
  const errors = places.flatMap(({ bedId, personId, coverPersonId }, index) => [
    ...(beds.has(bedId) ? [] : [{ path: `places.${index}.bedId`, message: 'is not a bed of this unit' }]),
    ...(people.has(personId) ? [] : [{ path: `places.${index}.personId`, message: 'is not on this shift' }]),
    ...(coverPersonId == null || people.has(coverPersonId)
      ? []
      : [{ path: `places.${index}.coverPersonId`, message: 'is not on this shift' }]),
  ]);
  if (errors.length > 0) throw invalid(errors);
}

export async function readAssignment(db: Knex, row: ShiftRow): Promise<Assignment> {
  const shift = await readShift(db, row);
  const latest = await latestAssignment(db, row.id);
  const by = latest?.changedBy ? await personById(db, latest.changedBy) : null;
  return {
    shift,
    places: latest?.places ?? [],
    version: shift.version,
    publishedVersion: shift.publishedVersion,
    changedBy: by?.display_name ?? null,
    changedAt: latest?.changedAt ?? null,
  };
}

export async function readShift(db: Knex, row: ShiftRow): Promise<Shift> {
  const people = await shiftPeople(db, row.id);
  const latest = await latestAssignment(db, row.id);
  const published = await latestAssignment(db, row.id, { publishedOnly: true });
  return {
    shiftId: row.id,
    unitId: row.unit_id,
    name: row.name,
    startsAt: row.starts_at,
    endsAt: row.ends_at,
    version: latest?.version ?? 0,
    publishedVersion: published?.version ?? null,
    people: people.map((person) => ({
      personId: person.person_id,
      displayName: person.display_name,
      initials: person.initials,
      minutesAvailable: person.minutes_available,
    })),
  };
}

export async function requireShift(db: Knex, id: string): Promise<ShiftRow> {
  const shift = await shiftById(db, id);
  if (!shift) throw notFound('shift', 'shiftId', id);
  return shift;
}

/** Two shifts of one unit at one time would give a bed two therapists. */
async function requireNoOverlap(db: Knex, unitId: string, shift: NewShift): Promise<void> {
  const other = (await shiftsNotEnded(db, unitId, shift.startsAt)).find(
    (one) => one.starts_at < shift.endsAt,
  );
  if (!other) return;
  throw conflict(
    `${other.name} runs in this unit from ${other.starts_at} to ${other.ends_at}; shifts of a unit do not overlap.`,
    [
      {
        path: 'startsAt',
        message: `must be at or after ${other.ends_at}, or the shift must end by ${other.starts_at}`,
      },
    ],
  );
}
