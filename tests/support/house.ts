import { randomUUID } from 'node:crypto';
import { Bed, Board, Unit } from '@windrow/ventilation/contract/board';
import { Ventilator } from '@windrow/ventilation/contract/fleet';
import { PolicyVersion } from '@windrow/ventilation/contract/setup';
import type { Grant } from '@windrow/ventilation/permissions/permissions';
import type { DestinationStream } from 'pino';
import { readSettings } from '../../apps/server/src/config/settings.ts';
import type { Deps } from '../../apps/server/src/deps.ts';
import { insertPerson, replaceGrants } from '../../apps/server/src/queries/people.ts';
import { startServer } from '../../apps/server/src/start-server.ts';
import { Caller } from './caller.ts';
import { anAdmission } from './entries.ts';
import { listOf, Placed, Recorded, RecordPage } from './shapes.ts';

export const PASSWORD = 'correct horse battery';

/** Made once: hashing a password is slow on purpose, and the houses of a file need it for the same one. */
let hashed: Promise<string> | undefined;
function passwordHash({ signIns }: Deps): Promise<string> {
  hashed ??= signIns.hashPassword(PASSWORD);
  return hashed;
}

export type HouseUnit = { unitId: string; bedIds: string[] };
export type House = Awaited<ReturnType<typeof openHouse>>;
type Opening = { database?: string; origin?: string; logTo?: DestinationStream };

/**
 * A small house with a real server on a free port and a real database: units Alder (four beds) and Birch
 * (two), and everybody that the roles name, signed in. `clock` is the server's, and can be set.
 */
export async function openHouse({ database = ':memory:', origin, logTo }: Opening = {}) {
  const clock = { now: new Date('2026-03-05T08:00:00.000Z') };
  const settings = {
    ...readSettings({ WINDROW_ORIGIN: origin }),
    port: 0,
    database,
    logLevel: logTo ? ('debug' as const) : ('silent' as const),
  };
  const now = () => clock.now;
  const server = await startServer(settings, { version: 'test', publicFolder: '/nowhere', now, logTo });
  const { deps, url } = server;
  const admin = new Caller(url);
  const first = { username: 'root', displayName: 'Rana Oduya', password: PASSWORD };
  admin.keepCookie(await admin.post('/api/start/administrator', first, { key: null }));

  const addUnit = async (name: string, beds: number): Promise<HouseUnit> => {
    const { unitId } = (await admin.post('/api/units', { name, timeZone: 'Europe/London' })).as(Unit);
    const bedIds: string[] = [];
    for (let n = 1; n <= beds; n += 1) {
      const bed = { label: String(n).padStart(2, '0'), row: 1, column: n };
      bedIds.push((await admin.post(`/api/units/${unitId}/beds`, bed)).as(Bed).bedId);
    }
    return { unitId, bedIds };
  };

  const people = new Map<string, { personId: string; caller: Caller }>();
  const addPerson = async (username: string, grants: Grant[]) => {
    const personId = randomUUID();
    await deps.db.transaction(async (trx) => {
      await insertPerson(trx, {
        id: personId,
        username,
        display_name: `Person ${username}`,
        initials: username.slice(0, 2).toUpperCase(),
        password_hash: await passwordHash(deps),
        disabled_at: null,
        version: 1,
      });
      await replaceGrants(trx, personId, grants);
    });
    const { cookie } = await deps.signIns.open(personId);
    const caller = new Caller(url, cookie.split(';')[0]);
    people.set(username, { personId, caller });
    return caller;
  };

  const alder = await addUnit('Alder', 4);
  const birch = await addUnit('Birch', 2);
  for (const role of ['therapist', 'charge', 'display'] as const) {
    await addPerson(role, [{ role, unitId: alder.unitId }]);
  }
  await addPerson('therapist2', [{ role: 'therapist', unitId: alder.unitId }]);
  await addPerson('birch-therapist', [{ role: 'therapist', unitId: birch.unitId }]);
  for (const role of ['supervisor', 'clinician', 'biomedical'] as const) {
    await addPerson(role, [{ role, unitId: null }]);
  }

  const as = (username: string): Caller => {
    if (username === 'administrator') return admin;
    const person = people.get(username);
    if (!person) throw new Error(`nobody is called ${username}`);
    return person.caller;
  };

  const ago = (minutes: number) => new Date(clock.now.getTime() - minutes * 60_000).toISOString();
  const bed = (unit: HouseUnit, index: number): string => {
    const bedId = unit.bedIds[index];
    if (!bedId) throw new Error(`there is no bed ${index} in this unit`);
    return bedId;
  };

  return {
    server,
    db: deps.db,
    clock,
    alder,
    birch,
    as,
    addPerson,
    addUnit,
    bed,
    ago,
    personId: (username: string) => people.get(username)?.personId ?? '',
    anybody: () => new Caller(url),
    /** Minutes later, by the server's clock. */
    later: (minutes: number) => {
      clock.now = new Date(clock.now.getTime() + minutes * 60_000);
    },
    board: async (unit: HouseUnit, who = 'therapist', query = '') =>
      (await as(who).get(`/api/units/${unit.unitId}/board${query}`)).as(Board),
    /** A stay in an empty bed, ten hours old. */
    admit: async (bedId: string, over: Record<string, unknown> = {}, who = 'supervisor') =>
      (await as(who).post('/api/stays', anAdmission(bedId, ago(600), over))).as(Placed).stay,
    record: async (stayId: string, path: string, entry: object, who = 'therapist') =>
      (await as(who).post(`/api/stays/${stayId}/${path}`, entry)).as(Recorded),
    recordOf: async (stayId: string, who = 'supervisor') =>
      (await as(who).get(`/api/stays/${stayId}/record?limit=200`)).as(RecordPage).items,
    policyOf: async (unit: HouseUnit) =>
      (await admin.get(`/api/units/${unit.unitId}/policy`)).as(PolicyVersion),
    machine: async (assetNumber: string) => {
      const { items } = (await as('biomedical').get('/api/ventilators')).as(listOf(Ventilator));
      return items.find((machine) => machine.assetNumber === assetNumber);
    },
    /** A machine of the fleet that stands ready in a unit. */
    readyMachine: async (assetNumber: string, homeUnitId: string | null = alder.unitId) => {
      const entry = { assetNumber, model: 'Model T', class: 'adult-icu', homeUnitId };
      const { ventilatorId } = (await as('biomedical').post('/api/ventilators', entry)).as(Ventilator);
      const moved = await as('biomedical').post(`/api/ventilators/${ventilatorId}/moves`, { state: 'ready' });
      return moved.as(Ventilator);
    },
    close: () => server.stop(),
  };
}
