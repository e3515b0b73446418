import { randomUUID } from 'node:crypto';
import {
  BEDSIDE_MOVES,
  NEXT_STATES,
  type NewVentilator,
  VENTILATOR_STATES,
  type VentilatorMove,
  type VentilatorState,
} from '@windrow/ventilation/contract/fleet';
import { may } from '@windrow/ventilation/permissions/permissions';
import type { Knex } from 'knex';
import { conflict, notAllowed, notFound } from '../errors.ts';
import { type BedRow, bedById, unitById } from '../queries/units.ts';
import {
  insertMove,
  insertVentilator,
  updateVentilator,
  type VentilatorRow,
  ventilatorAtBed,
  ventilatorByAssetNumber,
  ventilatorById,
} from '../queries/ventilators.ts';
import { requireObservedTime } from './observed-time.ts';
import type { Write } from './write.ts';

type Target = {
  state: VentilatorState;
  unitId: string | null;
  bedId: string | null;
  words: string | null;
  observedAt: string;
  note: string | null;
};

/** A machine changes state or place, by somebody who may, from a state that allows it. */
export async function moveVentilator(
  write: Write,
  { ventilator, move }: { ventilator: VentilatorRow; move: VentilatorMove },
) {
  const { state } = move;
  const observedAt = move.observedAt ?? write.now;
  requireObservedTime({ observedAt, now: write.now });
  if (!NEXT_STATES[ventilator.state].includes(state)) {
    const accepted =
      NEXT_STATES[ventilator.state].map((next) => VENTILATOR_STATES[next]).join(', ') || 'nothing';
    throw conflict(
      `${ventilator.asset_number} is ${VENTILATOR_STATES[ventilator.state]}; from there it can become: ${accepted}.`,
      [
        {
          path: 'state',
          message: `${VENTILATOR_STATES[ventilator.state]} can be followed by ${accepted}, not by ${VENTILATOR_STATES[state]}`,
        },
      ],
    );
  }
  const bed = move.bedId ? await requireBed(write, move.bedId) : null;
  const unitId = bed?.unit_id ?? move.unitId ?? defaultUnit(ventilator, state);
  if (unitId !== null && !(await unitById(write.trx, unitId))) throw notFound('unit', 'unitId', unitId);
  requireMayMove(write, { ventilator, to: state, unitId });
  await applyMove(write, ventilator, {
    state,
    unitId,
    bedId: bed?.id ?? null,
    words: move.words ?? null,
    observedAt,
    note: move.note ?? null,
  });
  await write.audit({ act: `ventilator ${state}`, unitId, subject: ventilator.id });
}

/** A transfer takes the machine along, where the new bed has none. */
export async function machineFollows(
  write: Write,
  { fromBedId, to, observedAt }: { fromBedId: string; to: BedRow; observedAt: string },
) {
  const machine = await ventilatorAtBed(write.trx, fromBedId);
  if (!machine || (await ventilatorAtBed(write.trx, to.id))) return;
  await applyMove(write, machine, {
    state: 'in-use',
    unitId: to.unit_id,
    bedId: to.id,
    words: null,
    observedAt,
    note: 'went with the patient',
  });
}

/** When a stay ends, its machine is no longer in use: it waits to be cleaned. */
export async function machineToCleaning(
  write: Write,
  { bedId, observedAt }: { bedId: string; observedAt: string },
) {
  const machine = await ventilatorAtBed(write.trx, bedId);
  if (!machine) return;
  await applyMove(write, machine, {
    state: 'cleaning',
    unitId: machine.unit_id,
    bedId: null,
    words: null,
    observedAt,
    note: 'the stay ended',
  });
}

export async function addVentilator(write: Write, entry: NewVentilator): Promise<string> {
  if (entry.homeUnitId !== null && !(await unitById(write.trx, entry.homeUnitId)))
    throw notFound('unit', 'homeUnitId', entry.homeUnitId);
  if (await ventilatorByAssetNumber(write.trx, entry.assetNumber))
    throw conflict(`There is a machine ${entry.assetNumber} already.`, [
      { path: 'assetNumber', message: 'is taken' },
    ]);
  const id = randomUUID();
  await insertVentilator(write.trx, {
    id,
    asset_number: entry.assetNumber,
    model: entry.model,
    class: entry.class,
    home_unit_id: entry.homeUnitId,
    // New machines are cleaned and tested before the first patient.
    state: 'cleaning',
    unit_id: entry.homeUnitId,
    bed_id: null,
    place_words: null,
    since_at: write.now,
    version: 1,
  });
  write.changed({ topic: 'fleet', unitId: entry.homeUnitId });
  await write.audit({ act: 'add ventilator', unitId: entry.homeUnitId, subject: id });
  return id;
}

async function applyMove(write: Write, machine: VentilatorRow, target: Target): Promise<void> {
  await updateVentilator(write.trx, machine.id, {
    state: target.state,
    unit_id: target.unitId,
    bed_id: target.bedId,
    place_words: target.words,
    since_at: target.observedAt,
  });
  await insertMove(write.trx, {
    id: randomUUID(),
    ventilator_id: machine.id,
    from_state: machine.state,
    to_state: target.state,
    unit_id: target.unitId,
    bed_id: target.bedId,
    place_words: target.words,
    note: target.note,
    observed_at: target.observedAt,
    recorded_at: write.now,
    recorded_by: write.person.personId,
  });
  for (const bedId of new Set([machine.bed_id, target.bedId]))
    if (bedId !== null) await write.bedChanged(bedId);
  write.changed({ topic: 'fleet', unitId: target.unitId ?? machine.unit_id });
}

/** A machine that comes back from a bed stays in its unit until somebody says otherwise; on loan it is in none. */
function defaultUnit(ventilator: VentilatorRow, state: VentilatorState): string | null {
  return state === 'on-loan' || state === 'retired' ? null : (ventilator.unit_id ?? ventilator.home_unit_id);
}

async function requireBed({ trx }: Write, bedId: string): Promise<BedRow> {
  const bed = await bedById(trx, bedId);
  if (!bed) throw notFound('bed', 'bedId', bedId);
  const other = await ventilatorAtBed(trx, bedId);
  if (other)
    throw conflict(`Bed ${bed.label} has ${other.asset_number} in use.`, [
      { path: 'bedId', message: `has ${other.asset_number} in use; return that one first` },
    ]);
  return bed;
}

/**
 * Asked of the unit where the machine goes, and of the one that it is taken from, whatever the move names.
 * Only a ready machine is anybody's to take: it is carried to where a patient needs it.
 */
function requireMayMove(
  { person }: Write,
  { ventilator, to, unitId }: { ventilator: VentilatorRow; to: VentilatorState; unitId: string | null },
): void {
  const { state: from, unit_id: standsIn } = ventilator;
  const isTaken = from === 'ready' && to === 'in-use';
  const isBedside = BEDSIDE_MOVES.some(([one, other]) => one === from && other === to);
  const units = [unitId ?? standsIn, ...(isTaken || standsIn === null ? [] : [standsIn])];
  const mayIn = (unit: string | null) =>
    may(person.grants, 'manage-fleet', unit) || (isBedside && may(person.grants, 'use-ventilator', unit));
  if (units.every(mayIn)) return;
  throw notAllowed(
    'Bedside staff take a ready machine into use at a bed of their unit, and return it to cleaning; other moves belong to those who manage the fleet.',
  );
}

export async function requireVentilator(db: Knex, id: string): Promise<VentilatorRow> {
  const ventilator = await ventilatorById(db, id);
  if (!ventilator) throw notFound('ventilator', 'id', id);
  return ventilator;
}
