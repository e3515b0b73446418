import { randomUUID } from 'node:crypto';
import { bedForAudience } from '@windrow/ventilation/board/for-audience';
import type { Bed } from '@windrow/ventilation/contract/board';
import type {
  Admission,
  Discharge,
  Stay,
  StayCorrection,
  Transfer,
} from '@windrow/ventilation/contract/stays';
import { StayDetails } from '@windrow/ventilation/contract/stays';
import { conflict, invalid, notFound } from '../errors.ts';
import type { Place } from '../queries/stay-facts.ts';
import { stayFacts } from '../queries/stay-facts.ts';
import {
  comparable,
  insertStay,
  presentStayOfPatient,
  type StayRow,
  stayById,
  stayInBed,
  updateStay,
} from '../queries/stays.ts';
import { type BedRow, bedById } from '../queries/units.ts';
import { appendObservation } from './append-observation.ts';
import { machineFollows, machineToCleaning } from './move-ventilator.ts';
import { requireObservedTime } from './observed-time.ts';
import { requirePresent } from './record-observation.ts';
import type { Write } from './write.ts';

/** The furthest that a clock on earth runs ahead of UTC. */
const FIRST_DAWN_HOURS = 14;

/** Admits a patient to an open, empty bed. */
export async function admitStay(write: Write, { bedId, observedAt, ...details }: Admission) {
  requireObservedTime({ observedAt, now: write.now });
  requireBorn(details.patient, write.now);
  const bed = await requireFreeBed(write, bedId);
  await requireNotHere(write, details.patient.hospitalNumber);
  const stayId = randomUUID();
  await insertStay(write.trx, {
    id: stayId,
    unit_id: bed.unit_id,
    bed_id: bed.id,
    hospital_number: comparable(details.patient.hospitalNumber),
    admitted_at: observedAt,
    left_at: null,
    outcome: null,
    recorded_at: write.now,
    left_recorded_at: null,
    version: 1,
  });
  await appendObservation(write, { stayId, unitId: bed.unit_id, kind: 'details', observedAt, body: details });
  await appendPlace(write, {
    stayId,
    unitId: bed.unit_id,
    observedAt,
    place: { event: 'admitted', bedId: bed.id, unitId: bed.unit_id },
  });
  await write.audit({ act: 'admit', unitId: bed.unit_id, subject: stayId });
  return { stay: await readStay(write, stayId), bed: await changedBed(write, bed.id) };
}

/** Corrects who the patient is, or what is ordered; the earlier words stay in the record. */
export async function correctStay(
  write: Write,
  { stay, correction }: { stay: StayRow; correction: StayCorrection },
) {
  const bedId = requirePresent(stay);
  const facts = await stayFacts(write.trx, stay.id);
  if (!facts) throw new Error(`stay ${stay.id} has no details`);
  const details = StayDetails.parse({ ...facts.details, ...correction });
  requireBorn(details.patient, write.now);
  if (comparable(details.patient.hospitalNumber) !== stay.hospital_number)
    await requireNotHere(write, details.patient.hospitalNumber);
  await appendObservation(write, {
    stayId: stay.id,
    unitId: stay.unit_id,
    kind: 'details',
    // An admission may have been entered a little ahead of the server's clock; its correction still comes after it.
    observedAt: write.now < stay.admitted_at ? stay.admitted_at : write.now,
    body: details,
  });
  await updateStay(write.trx, stay.id, { hospital_number: comparable(details.patient.hospitalNumber) });
  await write.audit({ act: 'correct stay', unitId: stay.unit_id, subject: stay.id });
  return { stay: await readStay(write, stay.id), bed: await changedBed(write, bedId) };
}

/** Moves a stay to another open, empty bed; its record and its ventilator go with it. */
export async function transferStay(
  write: Write,
  { stay, transfer: { bedId, observedAt } }: { stay: StayRow; transfer: Transfer },
) {
  const fromBedId = requirePresent(stay);
  requireObservedTime({ observedAt, now: write.now });
  if (bedId === fromBedId)
    throw conflict('The stay is in this bed already.', [
      { path: 'bedId', message: 'is where the stay is now' },
    ]);
  requireSinceAdmission(stay, observedAt);
  const bed = await requireFreeBed(write, bedId);
  await updateStay(write.trx, stay.id, { unit_id: bed.unit_id, bed_id: bed.id });
  await appendPlace(write, {
    stayId: stay.id,
    unitId: bed.unit_id,
    observedAt,
    place: { event: 'transferred', bedId: bed.id, unitId: bed.unit_id },
  });
  await machineFollows(write, { fromBedId, to: bed, observedAt });
  await write.audit({ act: 'transfer', unitId: bed.unit_id, subject: stay.id });
  return {
    stay: await readStay(write, stay.id),
    beds: [await changedBed(write, fromBedId), await changedBed(write, bed.id)],
  };
}

/** Ends a stay: the bed is empty, the record is kept, the ventilator goes to be cleaned. */
export async function dischargeStay(
  write: Write,
  { stay, discharge: { outcome, observedAt } }: { stay: StayRow; discharge: Discharge },
) {
  const bedId = requirePresent(stay);
  requireObservedTime({ observedAt, now: write.now });
  requireSinceAdmission(stay, observedAt);
  await updateStay(write.trx, stay.id, {
    bed_id: null,
    left_at: observedAt,
    left_recorded_at: write.now,
    outcome,
  });
  await appendPlace(write, {
    stayId: stay.id,
    unitId: stay.unit_id,
    observedAt,
    place: { event: 'left', outcome },
  });
  await machineToCleaning(write, { bedId, observedAt });
  await write.audit({ act: 'discharge', unitId: stay.unit_id, subject: stay.id });
  return { stay: await readStay(write, stay.id), bed: await changedBed(write, bedId) };
}

function requireSinceAdmission(stay: StayRow, observedAt: string): void {
  if (observedAt >= stay.admitted_at) return;
  throw conflict(`The stay began at ${stay.admitted_at}; it cannot move or end before.`, [
    { path: 'observedAt', message: `must not be before ${stay.admitted_at}, not ${observedAt}` },
  ]);
}

/** Nobody is born after today, wherever on earth it is already tomorrow. */
function requireBorn({ bornOn }: StayDetails['patient'], now: string): void {
  const today = new Date(Date.parse(now) + FIRST_DAWN_HOURS * 3_600_000).toISOString().slice(0, 10);
  if (bornOn > today)
    throw invalid([{ path: 'patient.bornOn', message: `must be not after ${today}, not ${bornOn}` }]);
}

async function appendPlace(
  write: Write,
  { place, ...fact }: { stayId: string; unitId: string; observedAt: string; place: Place },
) {
  await appendObservation(write, { ...fact, kind: 'place', body: place });
}

async function changedBed(write: Write, bedId: string): Promise<Bed> {
  const { bed } = await write.bedChanged(bedId);
  return bedForAudience({ bed, audience: 'staff', now: write.now });
}

async function requireFreeBed({ trx }: Write, bedId: string): Promise<BedRow> {
  const bed = await bedById(trx, bedId);
  if (!bed) throw notFound('bed', 'bedId', bedId);
  if (bed.is_open !== 1)
    throw conflict(`Bed ${bed.label} is closed.`, [
      { path: 'bedId', message: 'is closed; only an open bed takes a patient' },
    ]);
  if (await stayInBed(trx, bedId))
    throw conflict(`Bed ${bed.label} is taken.`, [
      { path: 'bedId', message: 'has a patient; only an empty bed takes one' },
    ]);
  return bed;
}

async function requireNotHere({ trx }: Write, hospitalNumber: string): Promise<void> {
  const stay = await presentStayOfPatient(trx, hospitalNumber);
  if (!stay?.bed_id) return;
  const bed = await bedById(trx, stay.bed_id);
  throw conflict(`A patient with this hospital number is in bed ${bed?.label} already.`, [
    { path: 'patient.hospitalNumber', message: 'belongs to a present stay' },
  ]);
}

async function readStay({ trx }: Write, stayId: string): Promise<Stay> {
  const row = await stayById(trx, stayId);
  const facts = await stayFacts(trx, stayId);
  if (!row || !facts) throw new Error(`stay ${stayId} cannot be read back`);
  return {
    stayId,
    version: row.version,
    bedId: row.bed_id,
    unitId: row.unit_id,
    admittedAt: row.admitted_at,
    leftAt: row.left_at,
    outcome: row.outcome as Stay['outcome'],
    details: facts.details,
  };
}
