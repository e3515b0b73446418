import { randomUUID } from 'node:crypto';
import type { Flag } from '@windrow/ventilation/contract/board';
import { Acknowledgement, RECORDED_KINDS } from '@windrow/ventilation/contract/observations';
import { DEFAULT_POLICY } from '@windrow/ventilation/policy/policy';
import type { Knex } from 'knex';
import { demoHospital } from '../../../../db/demo/demo-hospital.ts';
import type { DemoHospital, DemoStay } from '../../../../db/demo/demo-types.ts';
import type { Deps } from '../deps.ts';
import { markDemonstration } from '../queries/demonstration.ts';
import { insertObservation } from '../queries/observations.ts';
import { anyPerson, insertPerson, replaceGrants } from '../queries/people.ts';
import { insertPolicy } from '../queries/policies.ts';
import { insertAssignment, insertShift } from '../queries/shifts.ts';
import { comparable, insertStay } from '../queries/stays.ts';
import { bedById, insertBed, insertUnit } from '../queries/units.ts';
import { insertMove, insertVentilator } from '../queries/ventilators.ts';
import { bedFromFacts, rebuildBed } from './rebuild-bed.ts';

export const DEMO_PASSWORD = 'windrow-demo';

/** What the keys of the demo hospital became. */
type Filling = {
  trx: Knex.Transaction;
  ago: (minutes: number) => string;
  unitIds: Map<string, string>;
  bedIds: Map<string, string>;
  personIds: Map<string, string>;
};

const bedKey = (unitKey: string, label: string) => `${unitKey}/${label}`;

/** Fills an empty record with the invented hospital; a record with anybody in it is left as it is. */
export async function fillDemo({ db, signIns, now }: Deps): Promise<void> {
  if (await anyPerson(db)) return;
  const filledAt = now();
  const hospital = demoHospital({ now: filledAt.toISOString() });
  const passwordHash = await signIns.hashPassword(DEMO_PASSWORD);
  await db.transaction(async (trx) => {
    const filling: Filling = {
      trx,
      ago: (minutes) => new Date(filledAt.getTime() - minutes * 60_000).toISOString(),
      unitIds: new Map(),
      bedIds: new Map(),
      personIds: new Map(),
    };
    await markDemonstration(trx, filling.ago(0));
    await fillUnits(filling, hospital);
    await fillPeople(filling, hospital, passwordHash);
    for (const stay of hospital.stays) await fillStay(filling, stay);
    await fillVentilators(filling, hospital);
    await fillShifts(filling, hospital);
    for (const bedId of filling.bedIds.values()) await rebuildBed(trx, { bedId, now: filling.ago(0) });
  });
}

async function fillUnits({ trx, ago, unitIds, bedIds }: Filling, { units }: DemoHospital): Promise<void> {
  for (const { key, name, timeZone, beds } of units) {
    const unitId = randomUUID();
    unitIds.set(key, unitId);
    await insertUnit(trx, { id: unitId, name, time_zone: timeZone, revision: 0 });
    await insertPolicy(trx, {
      unitId,
      version: 1,
      policy: DEFAULT_POLICY,
      reason: 'default policy',
      changedBy: null,
      changedAt: ago(60 * 24 * 90),
    });
    for (const { label, row, column, isOpen } of beds) {
      const bedId = randomUUID();
      bedIds.set(bedKey(key, label), bedId);
      await insertBed(trx, { id: bedId, unit_id: unitId, label, row, column, is_open: Number(isOpen) });
    }
  }
}

async function fillPeople(
  { trx, unitIds, personIds }: Filling,
  { people }: DemoHospital,
  passwordHash: string,
): Promise<void> {
  for (const { username, displayName, initials, grants } of people) {
    const id = randomUUID();
    personIds.set(username, id);
    await insertPerson(trx, {
      id,
      username,
      display_name: displayName,
      initials,
      password_hash: passwordHash,
      disabled_at: null,
      version: 1,
    });
    await replaceGrants(
      trx,
      id,
      grants.map(({ role, unitKey }) => ({
        role,
        unitId: unitKey === null ? null : known(unitIds, unitKey),
      })),
    );
  }
}

async function fillStay(filling: Filling, stay: DemoStay): Promise<void> {
  const { trx, ago, unitIds, bedIds, personIds } = filling;
  const stayId = randomUUID();
  const unitId = known(unitIds, stay.unitKey);
  const bedId = known(bedIds, bedKey(stay.unitKey, stay.bedLabel));
  const admittedAt = ago(stay.admittedMinutesAgo);
  const leftAt = stay.leftMinutesAgo === null ? null : ago(stay.leftMinutesAgo);
  const first = stay.facts[0]?.by ?? 'charge';
  await insertStay(trx, {
    id: stayId,
    unit_id: unitId,
    bed_id: leftAt === null ? bedId : null,
    hospital_number: comparable(stay.details.patient.hospitalNumber),
    admitted_at: admittedAt,
    left_at: leftAt,
    outcome: stay.outcome,
    recorded_at: admittedAt,
    left_recorded_at: leftAt,
    version: leftAt === null ? 1 : 2,
  });
  const append = (
    kind: Parameters<typeof insertObservation>[1]['kind'],
    body: object,
    observedAt: string,
    recordedAt: string,
    by: string,
  ) =>
    insertObservation(trx, {
      id: randomUUID(),
      stay_id: stayId,
      unit_id: unitId,
      kind,
      observed_at: observedAt,
      recorded_at: recordedAt,
      recorded_by: known(personIds, by),
      source: 'hand',
      support: supportOf(body),
      amends_id: null,
      amended_as: null,
      reason: null,
      body: JSON.stringify(body),
    });
  await append('details', stay.details, admittedAt, admittedAt, first);
  await append('place', { event: 'admitted', bedId, unitId }, admittedAt, admittedAt, first);
  for (const fact of stay.facts) {
    // Through the schema of the route, so that nothing stands in the demo that a person could not have entered.
    const { observedAt, ...body } = RECORDED_KINDS[fact.kind].schema.parse({
      ...fact.body,
      observedAt: ago(fact.minutesAgo),
    });
    await append(fact.kind, body, observedAt, ago(fact.recordedMinutesAgo), fact.by);
  }
  if (stay.acknowledged) {
    const { flagId, minutesAgo, note, by } = stay.acknowledged;
    const { fingerprint, short, sentence } = await flagInBed(filling, { bedId, flagId });
    const at = ago(minutesAgo);
    const { observedAt: _at, ...body } = Acknowledgement.parse({ observedAt: at, flagId, fingerprint, note });
    await append('acknowledgement', { ...body, short, sentence }, at, at, by);
  }
  if (leftAt !== null)
    await append('place', { event: 'left', outcome: stay.outcome ?? 'ward' }, leftAt, leftAt, first);
}

async function flagInBed(
  { trx, ago }: Filling,
  { bedId, flagId }: { bedId: string; flagId: string },
): Promise<Flag> {
  const row = await bedById(trx, bedId);
  const bed = row && (await bedFromFacts(trx, { row, revision: 0, now: ago(0) }));
  const flag = bed?.stay?.flags.find(({ id }) => id === flagId);
  if (!flag) throw new Error(`the demo hospital acknowledges ${flagId}, which is not raised`);
  return flag;
}

function supportOf(body: object): string | null {
  if ('mode' in body && typeof body.mode === 'string') return body.mode;
  return 'toSupport' in body && typeof body.toSupport === 'string' ? body.toSupport : null;
}

async function fillVentilators(
  { trx, ago, unitIds, bedIds, personIds }: Filling,
  { ventilators }: DemoHospital,
): Promise<void> {
  for (const machine of ventilators) {
    const id = randomUUID();
    const homeUnitId = machine.homeUnitKey === null ? null : known(unitIds, machine.homeUnitKey);
    const unitId = machine.bed
      ? known(unitIds, machine.bed.unitKey)
      : machine.state === 'on-loan'
        ? null
        : homeUnitId;
    const bedId = machine.bed ? known(bedIds, bedKey(machine.bed.unitKey, machine.bed.bedLabel)) : null;
    const since = ago(machine.sinceMinutesAgo);
    await insertVentilator(trx, {
      id,
      asset_number: machine.assetNumber,
      model: machine.model,
      class: machine.class,
      home_unit_id: homeUnitId,
      state: machine.state,
      unit_id: unitId,
      bed_id: bedId,
      place_words: machine.words,
      since_at: since,
      version: 1,
    });
    await insertMove(trx, {
      id: randomUUID(),
      ventilator_id: id,
      from_state: machine.state === 'ready' ? 'cleaning' : 'ready',
      to_state: machine.state,
      unit_id: unitId,
      bed_id: bedId,
      place_words: machine.words,
      note: null,
      observed_at: since,
      recorded_at: since,
      recorded_by: known(personIds, 'biomed'),
    });
  }
}

async function fillShifts(
  { trx, ago, unitIds, bedIds, personIds }: Filling,
  { shifts }: DemoHospital,
): Promise<void> {
  for (const shift of shifts) {
    const id = randomUUID();
    await insertShift(
      trx,
      {
        id,
        unit_id: known(unitIds, shift.unitKey),
        name: shift.name,
        starts_at: ago(-shift.startsMinutesFromNow),
        ends_at: ago(-shift.endsMinutesFromNow),
        made_by: known(personIds, 'charge'),
      },
      shift.people.map(({ username, minutesAvailable }) => ({
        personId: known(personIds, username),
        minutesAvailable,
      })),
    );
    if (!shift.published && shift.places.length === 0) continue;
    await insertAssignment(trx, {
      shiftId: id,
      version: 1,
      published: shift.published,
      changedBy: known(personIds, 'charge'),
      changedAt: ago(Math.max(0, -shift.startsMinutesFromNow)),
      places: shift.places.map(({ bedLabel, username }) => ({
        bedId: known(bedIds, bedKey(shift.unitKey, bedLabel)),
        personId: known(personIds, username),
      })),
    });
  }
}

function known(ids: Map<string, string>, key: string): string {
  const id = ids.get(key);
  if (id === undefined) throw new Error(`the demo hospital names ${key}, which it does not have`);
  return id;
}
