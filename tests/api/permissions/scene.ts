import { Shift } from '@windrow/ventilation/contract/shifts';
import { ROLES, type Role } from '@windrow/ventilation/permissions/permissions';
import type { Caller } from '../../support/caller.ts';
import { aCheck, aPatient } from '../../support/entries.ts';
import type { House, HouseUnit } from '../../support/house.ts';

/** A unit with one of everything that a route can be about. */
export type Place = HouseUnit & {
  takenBedId: string;
  freeBedId: string;
  stayId: string;
  observationId: string;
  shiftId: string;
};

export type Scene = {
  house: House;
  alder: Place;
  birch: Place;
  machineId: string;
  /** Everybody holds their role in Alder only, or in the whole hospital. */
  inAlder: Record<Role, Caller>;
  inHospital: Record<Role, Caller>;
};

/** Words and numbers that stand in the record and must not be found where they do not belong. */
export const IDENTITY = ['Quillfeather', 'Zebedee', 'HN-CANARY-7', '1937-11-23'];
export const WRITTEN = ['airborne-canary', 'limits-canary'];
export const CLINICAL = [
  '"settings"',
  '"readings"',
  '"vtSetMl"',
  '"ph"',
  '"predictedBodyWeightKg"',
  '"support":{"id"',
];

export async function openScene(house: House): Promise<Scene> {
  const charge = await house.addPerson('charge-of-all', [{ role: 'charge', unitId: null }]);
  const alder = await openPlace(house, charge, house.alder);
  const birch = await openPlace(house, charge, house.birch);
  const machineId = (await house.readyMachine('V-000')).ventilatorId;
  const inAlder: Partial<Record<Role, Caller>> = {};
  const inHospital: Partial<Record<Role, Caller>> = {};
  for (const role of ROLES) {
    inAlder[role] = await house.addPerson(`${role}-of-alder`, [{ role, unitId: alder.unitId }]);
    inHospital[role] = await house.addPerson(`${role}-of-hospital`, [{ role, unitId: null }]);
  }
  return { house, alder, birch, machineId, inAlder: whole(inAlder), inHospital: whole(inHospital) };
}

async function openPlace(house: House, charge: Caller, unit: HouseUnit): Promise<Place> {
  const [takenBedId, freeBedId] = [house.bed(unit, 0), house.bed(unit, 1)];
  const [familyName, givenName, number, bornOn] = IDENTITY;
  const [precautions, careLimits] = WRITTEN;
  const patient = aPatient({
    familyName,
    givenName,
    bornOn,
    hospitalNumber: `${number}${unit.unitId.slice(0, 4)}`,
  });
  const { stayId } = await house.admit(takenBedId, { patient, precautions, careLimits });
  const { observationId } = await house.record(stayId, 'checks', aCheck(house.ago(20)), 'charge-of-all');
  const shift = await charge.post(`/api/units/${unit.unitId}/shifts`, {
    name: 'Day',
    startsAt: house.ago(60),
    endsAt: house.ago(-600),
    people: [{ personId: house.personId('charge-of-all'), minutesAvailable: 600 }],
  });
  return { ...unit, takenBedId, freeBedId, stayId, observationId, shiftId: shift.as(Shift).shiftId };
}

function whole(callers: Partial<Record<Role, Caller>>): Record<Role, Caller> {
  const { therapist, charge, supervisor, clinician, biomedical, administrator, display } = callers;
  if (!therapist || !charge || !supervisor || !clinician || !biomedical || !administrator || !display) {
    throw new Error('a role has nobody');
  }
  return { therapist, charge, supervisor, clinician, biomedical, administrator, display };
}
