import { bedBoard } from '@windrow/ventilation/board/bed-board';
import type { Bed, BedAssignment, BedPlace } from '@windrow/ventilation/contract/board';
import type { Knex } from 'knex';
import { putBoardRow } from '../queries/board-rows.ts';
import { policyOf } from '../queries/policies.ts';
import { latestAssignment, shiftPeople, shiftsNotEnded } from '../queries/shifts.ts';
import { stayFacts } from '../queries/stay-facts.ts';
import { stayInBed } from '../queries/stays.ts';
import { type BedRow, bedById, nextRevision } from '../queries/units.ts';
import { type VentilatorRow, ventilatorAtBed } from '../queries/ventilators.ts';

type Machine = Pick<VentilatorRow, 'id' | 'asset_number' | 'model'>;

/** Computes a bed's row from the facts as they are now, stores it under the unit's next revision, and returns it. */
export async function rebuildBed(trx: Knex, { bedId, now }: { bedId: string; now: string }): Promise<Bed> {
  const row = await bedById(trx, bedId);
  if (!row) throw new Error(`there is no bed ${bedId}`);
  const bed = await bedFromFacts(trx, { row, revision: await nextRevision(trx, row.unit_id), now });
  await putBoardRow(trx, bed);
  return bed;
}

/** The same row without storing it: what the rebuild command and the tests compare with what is stored. */
export async function bedFromFacts(
  db: Knex,
  { row, revision, now }: { row: BedRow; revision: number; now: string },
): Promise<Bed> {
  const stay = await stayInBed(db, row.id);
  const machine = await ventilatorAtBed(db, row.id);
  const { policy } = await policyOf(db, row.unit_id);
  return bedBoard({
    place: toPlace(row),
    revision,
    facts: stay ? await stayFacts(db, stay.id) : null,
    policy,
    assignments: await publishedAssignments(db, { unitId: row.unit_id, bedId: row.id, notEndedAt: now }),
    ventilator: machine ? toVentilatorAtBed(machine) : null,
  });
}

export function toVentilatorAtBed({ id, asset_number, model }: Machine): Bed['ventilator'] {
  return { ventilatorId: id, assetNumber: asset_number, model };
}

export function toPlace(row: BedRow): BedPlace {
  return {
    bedId: row.id,
    unitId: row.unit_id,
    label: row.label,
    row: row.row,
    column: row.column,
    isOpen: row.is_open === 1,
  };
}

/** Who has this bed in the shifts that run or are to come, by their newest published assignment. */
export async function publishedAssignments(
  db: Knex,
  {
    unitId,
    bedId,
    notEndedAt,
    changedBy,
  }: { unitId: string; bedId: string; notEndedAt: string; changedBy?: string },
): Promise<BedAssignment[]> {
  const found: BedAssignment[] = [];
  for (const shift of await shiftsNotEnded(db, unitId, notEndedAt)) {
    const assignment = await latestAssignment(db, shift.id, {
      publishedOnly: true,
      ...(changedBy === undefined ? {} : { changedBy }),
    });
    const place = assignment?.places.find((one) => one.bedId === bedId);
    if (!place) continue;
    const people = await shiftPeople(db, shift.id);
    const person = people.find((one) => one.person_id === place.personId);
    if (!person) continue;
    found.push({
      shiftId: shift.id,
      startsAt: shift.starts_at,
      endsAt: shift.ends_at,
      personId: person.person_id,
      initials: person.initials,
      displayName: person.display_name,
      coverInitials: people.find((one) => one.person_id === place.coverPersonId)?.initials ?? null,
    });
  }
  return found;
}
