import { randomUUID } from 'node:crypto';
import type { Bed, Unit } from '@windrow/ventilation/contract/board';
import type { FirstAdministrator } from '@windrow/ventilation/contract/session';
import type {
  NewBed,
  NewPerson,
  NewUnit,
  Person,
  PersonChange,
  PolicyChange,
  PolicyVersion,
} from '@windrow/ventilation/contract/setup';
import type { Grant } from '@windrow/ventilation/permissions/permissions';
import { DEFAULT_POLICY } from '@windrow/ventilation/policy/policy';
import type { Knex } from 'knex';
import type { Deps } from '../deps.ts';
import { conflict, notFound, staleVersion } from '../errors.ts';
import { insertAudit, lastActOn } from '../queries/audit.ts';
import {
  anyPerson,
  grantsOf,
  insertPerson,
  type PersonRow,
  personById,
  personByUsername,
  replaceGrants,
  updatePerson,
} from '../queries/people.ts';
import { insertPolicy, policyOf, type StoredPolicy } from '../queries/policies.ts';
import { stayInBed } from '../queries/stays.ts';
import {
  allUnits,
  type BedRow,
  bedsOfUnit,
  insertBed,
  insertUnit,
  setBedOpen,
  unitById,
} from '../queries/units.ts';
import { toUnit } from './read-board.ts';
import type { Write } from './write.ts';

export async function addUnit(write: Write, { name, timeZone }: NewUnit): Promise<Unit> {
  if ((await allUnits(write.trx)).some((unit) => unit.name === name))
    throw conflict(`There is a unit ${name} already.`, [{ path: 'name', message: 'is taken' }]);
  const unit = { id: randomUUID(), name, time_zone: timeZone, revision: 0 };
  await insertUnit(write.trx, unit);
  await insertPolicy(write.trx, {
    unitId: unit.id,
    version: 1,
    policy: DEFAULT_POLICY,
    reason: 'default policy',
    changedBy: write.person.personId,
    changedAt: write.now,
  });
  write.changed({ topic: 'units', unitId: unit.id });
  await write.audit({ act: 'add unit', unitId: unit.id, subject: unit.id });
  return toUnit(write.trx, unit);
}

export async function addBed(write: Write, { unitId, bed }: { unitId: string; bed: NewBed }): Promise<Bed> {
  const beds = await bedsOfUnit(write.trx, unitId);
  if (beds.some(({ label }) => label === bed.label))
    throw conflict(`There is a bed ${bed.label} already.`, [
      { path: 'label', message: 'is taken in this unit' },
    ]);
  const other = beds.find(({ row, column }) => row === bed.row && column === bed.column);
  if (other)
    throw conflict(`Bed ${other.label} stands there.`, [
      { path: 'column', message: `row ${bed.row}, column ${bed.column} is taken by bed ${other.label}` },
    ]);
  const id = randomUUID();
  await insertBed(write.trx, {
    id,
    unit_id: unitId,
    label: bed.label,
    row: bed.row,
    column: bed.column,
    is_open: 1,
  });
  await write.audit({ act: 'add bed', unitId, subject: id });
  write.changed({ topic: 'units', unitId });
  return asPlace((await write.bedChanged(id)).bed);
}

export async function openOrCloseBed(
  write: Write,
  { bed, isOpen }: { bed: BedRow; isOpen: boolean },
): Promise<Bed> {
  if (!isOpen && (await stayInBed(write.trx, bed.id)))
    throw conflict(`Bed ${bed.label} has a patient; only an empty bed is closed.`, [
      { path: 'isOpen', message: 'a bed with a patient stays open' },
    ]);
  await setBedOpen(write.trx, bed.id, isOpen);
  await write.audit({ act: isOpen ? 'open bed' : 'close bed', unitId: bed.unit_id, subject: bed.id });
  return asPlace((await write.bedChanged(bed.id)).bed);
}

/** A bed as those who set up the house may see it: the place, and nothing of whoever lies in it. */
function asPlace(bed: Bed): Bed {
  return { ...bed, stay: null };
}

export async function addPerson(deps: Deps, write: Write, entry: NewPerson): Promise<Person> {
  if (await personByUsername(write.trx, entry.username))
    throw conflict(`There is somebody called ${entry.username} already.`, [
      { path: 'username', message: 'is taken' },
    ]);
  await requireKnownUnits(write.trx, entry.grants);
  const row: PersonRow = {
    id: randomUUID(),
    username: entry.username,
    display_name: entry.displayName,
    initials: entry.initials,
    password_hash: await deps.signIns.hashPassword(entry.password),
    disabled_at: null,
    version: 1,
  };
  await insertPerson(write.trx, row);
  await replaceGrants(write.trx, row.id, entry.grants);
  await write.audit({ act: 'add person', unitId: null, subject: row.id });
  return toPerson(write.trx, row);
}

const CHANGE_PERSON = 'change person';

/** Changes roles, password, or whether somebody may sign in; every open session of theirs ends. */
export async function changePerson(
  deps: Deps,
  write: Write,
  { person, change, version }: { person: PersonRow; change: PersonChange; version: number },
): Promise<Person> {
  if (version !== person.version) {
    const last = await lastActOn(write.trx, { act: CHANGE_PERSON, subject: person.id });
    throw staleVersion({
      thing: 'person',
      given: version,
      current: person.version,
      by: last?.display_name ?? null,
      at: last?.at ?? null,
    });
  }
  if (change.grants) await requireKnownUnits(write.trx, change.grants);
  if (
    person.id === write.person.personId &&
    (change.disabled || change.grants?.every((grant) => !isOfWholeHouse(grant)))
  ) {
    throw conflict('An administrator cannot shut themselves out; another administrator does that.', [
      {
        path: change.disabled ? 'disabled' : 'grants',
        message: 'would leave you without the role that you use now',
      },
    ]);
  }
  await updatePerson(write.trx, person.id, {
    version: person.version + 1,
    ...(change.password === undefined
      ? {}
      : { password_hash: await deps.signIns.hashPassword(change.password) }),
    ...(change.disabled === undefined ? {} : { disabled_at: change.disabled ? write.now : null }),
  });
  if (change.grants) await replaceGrants(write.trx, person.id, change.grants);
  // Whoever signs in next has the new roles; a connection opened under the old ones must not stay.
  await write.signOut(person.id);
  await write.audit({ act: CHANGE_PERSON, unitId: null, subject: person.id });
  return toPerson(write.trx, {
    ...person,
    version: person.version + 1,
    disabled_at: change.disabled === undefined ? person.disabled_at : change.disabled ? write.now : null,
  });
}

/** What whoever changes people holds: the administrator of one unit could not give it back. */
function isOfWholeHouse({ role, unitId }: Grant): boolean {
  return role === 'administrator' && unitId === null;
}

export async function toPerson(db: Knex, row: PersonRow): Promise<Person> {
  return {
    personId: row.id,
    username: row.username,
    displayName: row.display_name,
    initials: row.initials,
    disabled: row.disabled_at !== null,
    version: row.version,
    grants: await grantsOf(db, row.id),
  };
}

/** A new version of a unit's policy; every bed is shown by it from now on. */
export async function changePolicy(
  write: Write,
  { unitId, change, version }: { unitId: string; change: PolicyChange; version: number },
): Promise<PolicyVersion> {
  const current = await policyOf(write.trx, unitId);
  if (version !== current.version) {
    const by = current.changedBy ? await personById(write.trx, current.changedBy) : null;
    throw staleVersion({
      thing: 'policy',
      given: version,
      current: current.version,
      by: by?.display_name ?? null,
      at: current.changedAt,
    });
  }
  const stored: StoredPolicy = {
    unitId,
    version: version + 1,
    policy: change.policy,
    reason: change.reason,
    changedBy: write.person.personId,
    changedAt: write.now,
  };
  await insertPolicy(write.trx, stored);
  for (const bed of await bedsOfUnit(write.trx, unitId)) await write.bedChanged(bed.id);
  write.changed({ topic: 'policy', unitId });
  await write.audit({ act: 'change policy', unitId, subject: `version ${stored.version}` });
  return toPolicyVersion(write.trx, stored);
}

export async function toPolicyVersion(
  db: Knex,
  { unitId, version, policy, reason, changedBy, changedAt }: StoredPolicy,
): Promise<PolicyVersion> {
  const by = changedBy ? await personById(db, changedBy) : null;
  return { unitId, version, changedBy: by?.display_name ?? null, changedAt, reason, policy };
}

/** The first person of an empty house: its administrator. Only once, and never where anybody is. */
export async function makeFirstAdministrator(
  deps: Deps,
  { username, displayName, password }: FirstAdministrator,
): Promise<string> {
  const alreadyThere = () => conflict('This house has its administrator already. Sign in instead.');
  // Open to anybody, so nothing slow is done for those who come too late.
  if (await anyPerson(deps.db)) throw alreadyThere();
  const passwordHash = await deps.signIns.hashPassword(password);
  return deps.db.transaction(async (trx) => {
    if (await anyPerson(trx)) throw alreadyThere();
    const id = randomUUID();
    const initials = displayName
      .split(/\s+/)
      .map((word) => word.slice(0, 1))
      .join('')
      .slice(0, 3)
      .toUpperCase();
    await insertPerson(trx, {
      id,
      username,
      display_name: displayName,
      initials,
      password_hash: passwordHash,
      disabled_at: null,
      version: 1,
    });
    await replaceGrants(trx, id, [{ role: 'administrator', unitId: null }]);
    await insertAudit(trx, {
      at: deps.now().toISOString(),
      person_id: id,
      act: 'first administrator',
      unit_id: null,
      subject: id,
      outcome: 'done',
    });
    return id;
  });
}

async function requireKnownUnits(db: Knex, grants: readonly { unitId: string | null }[]): Promise<void> {
  for (const [index, { unitId }] of grants.entries()) {
    if (unitId !== null && !(await unitById(db, unitId)))
      throw notFound('unit', `grants.${index}.unitId`, unitId);
  }
}
