import { Bed, Unit } from '@windrow/ventilation/contract/board';
import { Session, Start } from '@windrow/ventilation/contract/session';
import { Person } from '@windrow/ventilation/contract/setup';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readSettings } from '../../apps/server/src/config/settings.ts';
import { startServer } from '../../apps/server/src/start-server.ts';
import { Caller } from '../support/caller.ts';
import { type House, openHouse, PASSWORD } from '../support/house.ts';
import { listOf } from '../support/shapes.ts';

describe('an empty house', () => {
  it('asks for its first administrator, and is then set up by them', async () => {
    const settings = { ...readSettings({}), port: 0, database: ':memory:', logLevel: 'silent' as const };
    const server = await startServer(settings, { version: 'test', publicFolder: '/nowhere' });
    try {
      const root = new Caller(server.url);
      expect((await root.get('/api/start')).as(Start)).toMatchObject({
        needsAdministrator: true,
        demonstration: false,
      });
      // Nobody can sign in, and nothing else is open.
      expect((await root.signIn('root', PASSWORD)).status).toBe(401);
      expect((await root.post('/api/units', { name: 'Alder', timeZone: 'Europe/London' })).status).toBe(401);
      const first = { username: 'root', displayName: 'Rana van Oduya', password: PASSWORD };
      // Two who come in one moment: one is it, the other is told so.
      const asked = await Promise.all(
        [first, { ...first, username: 'late' }].map((body) => root.post('/api/start/administrator', body)),
      );
      expect(asked.map(({ status }) => status).sort()).toEqual([201, 409]);
      const made = asked.find(({ status }) => status === 201);
      if (!made) throw new Error('nobody was made administrator');
      expect(made.as(Session)).toMatchObject({
        person: { initials: 'RVO' },
        grants: [{ role: 'administrator', unitId: null }],
      });
      root.keepCookie(made);
      expect((await root.get('/api/start')).as(Start).needsAdministrator).toBe(false);
      expect((await root.get('/api/units')).as(listOf(Unit)).items).toEqual([]);
      expect((await root.post('/api/units', { name: 'Alder', timeZone: 'Europe/London' })).status).toBe(201);
    } finally {
      await server.stop();
    }
  });
});

describe('the house', () => {
  let house: House;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());

  it('has units with their beds in floor-plan order', async () => {
    const cedar = await house.addUnit('Cedar', 0);
    const places = [
      ['C', 2, 1],
      ['A', 1, 2],
      ['B', 1, 1],
      ['D', 2, 2],
    ] as const;
    for (const [label, row, column] of places) {
      const bed = await house
        .as('administrator')
        .post(`/api/units/${cedar.unitId}/beds`, { label, row, column });
      expect(bed.as(Bed)).toMatchObject({ label, row, column, isOpen: true, stay: null });
    }
    const board = await house.board(cedar, 'supervisor');
    expect(board.beds.map(({ label }) => label)).toEqual(['B', 'A', 'C', 'D']);
    expect(board.unit).toMatchObject({
      name: 'Cedar',
      bedCount: 4,
      timeZone: 'Europe/London',
      nightFrom: '20:00',
      nightTo: '07:00',
    });
    expect(board.revision).toBe(4);
  });

  it('closes an empty bed and opens it again', async () => {
    const bedId = house.bed(house.birch, 1);
    const set = async (isOpen: boolean) =>
      (await house.as('administrator').patch(`/api/beds/${bedId}`, { isOpen })).as(Bed);
    expect((await set(false)).isOpen).toBe(false);
    expect((await house.board(house.birch, 'birch-therapist')).beds[1]?.isOpen).toBe(false);
    expect((await set(true)).isOpen).toBe(true);
  });

  it('lists its people page by page, with their roles and no password', async () => {
    const first = await house.as('administrator').get('/api/people?limit=4');
    const page = first.as(listOf(Person));
    const rest = (await house.as('administrator').get(`/api/people?limit=200&cursor=${page.nextCursor}`)).as(
      listOf(Person),
    );
    const names = [...page.items, ...rest.items].map(({ username }) => username);
    expect(names).toEqual([...names].sort());
    expect(names).toHaveLength(9);
    expect(first.text).not.toMatch(/argon|hash|password/i);
  });

  it('gives somebody new roles from the next sign-in on, and the old ones no more', async () => {
    const caller = await house.addPerson('mover', [{ role: 'therapist', unitId: house.alder.unitId }]);
    const path = `/api/people/${house.personId('mover')}`;
    const grants = [{ role: 'therapist', unitId: house.birch.unitId }];
    const changed = (await house.as('administrator').patch(path, { grants }, { version: 1 })).as(Person);
    expect(changed).toMatchObject({ version: 2, grants, disabled: false });
    expect((await caller.get(`/api/units/${house.alder.unitId}/board`)).status).toBe(401);
    await caller.signIn('mover', PASSWORD);
    expect((await caller.get(`/api/units/${house.alder.unitId}/board`)).status).toBe(403);
    expect((await caller.get(`/api/units/${house.birch.unitId}/board`)).status).toBe(200);
  });

  it('lets somebody disabled in again when they are enabled, with the new password only', async () => {
    const caller = await house.addPerson('leaver', [{ role: 'clinician', unitId: null }]);
    const path = `/api/people/${house.personId('leaver')}`;
    const change = (body: object, version: number) =>
      house.as('administrator').patch(path, body, { version });
    expect((await change({ disabled: true }, 1)).as(Person).disabled).toBe(true);
    expect((await caller.signIn('leaver', PASSWORD)).status).toBe(401);
    const back = await change({ disabled: false, password: 'another horse battery' }, 2);
    expect(back.as(Person)).toMatchObject({ disabled: false, version: 3 });
    expect((await caller.signIn('leaver', PASSWORD)).status).toBe(401);
    expect((await caller.signIn('leaver', 'another horse battery')).status).toBe(201);
  });
});

describe('settings', () => {
  it('that are not accepted are all named at once, misspelt ones among them', () => {
    const wrong = {
      PORT: 'http',
      WINDROW_DEMO: 'yes',
      WINDROW_ORIGIN: 'board.example.org',
      WINDROW_LOGS: 'info',
    };
    expect(() => readSettings(wrong)).toThrow(
      /PORT: .*"http"[\s\S]*WINDROW_DEMO: must be 0 or 1, not "yes"[\s\S]*WINDROW_ORIGIN: must be an origin[\s\S]*WINDROW_LOGS: no such setting; there are PORT/,
    );
  });

  it('have defaults that serve this machine only, without the demonstration', () => {
    expect(readSettings({ HOME: '/root' })).toEqual({
      port: 4310,
      host: '127.0.0.1',
      database: 'db/data/windrow.sqlite3',
      demo: false,
      origin: null,
      proxies: 0,
      logLevel: 'info',
    });
  });

  it('keep the origin of an address, whatever follows it', () => {
    expect(readSettings({ WINDROW_ORIGIN: 'https://board.example.org/wall?x=1' }).origin).toBe(
      'https://board.example.org',
    );
  });
});

describe('the demonstration', () => {
  it('is filled once, opens for its sign-ins, and shows every state of the ladder', async () => {
    const settings = {
      ...readSettings({ WINDROW_DEMO: '1' }),
      port: 0,
      database: ':memory:',
      logLevel: 'silent' as const,
    };
    const server = await startServer(settings, { version: 'test', publicFolder: '/nowhere' });
    try {
      const { fillDemo } = await import('../../apps/server/src/services/fill-demo.ts');
      const before = await server.deps.db('observations').count({ n: '*' });
      await fillDemo(server.deps);
      expect(await server.deps.db('observations').count({ n: '*' })).toEqual(before);
      const names = [
        'therapist',
        'therapist2',
        'charge',
        'supervisor',
        'clinician',
        'biomed',
        'admin',
        'display',
      ];
      for (const name of names) {
        const session = (await new Caller(server.url).signIn(name, 'windrow-demo')).as(Session);
        expect(session.demonstration).toBe(true);
      }
      const { rebuildAllBeds } = await import('../../apps/server/src/services/rebuild-all-beds.ts');
      const { beds, differed } = await rebuildAllBeds(server.deps.db, { now: new Date().toISOString() });
      expect(beds).toBeGreaterThan(20);
      expect(differed).toEqual([]);
    } finally {
      await server.stop();
    }
  });
});
