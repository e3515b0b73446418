import { join } from 'node:path';
import { Session } from '@windrow/ventilation/contract/session';
import { Shift } from '@windrow/ventilation/contract/shifts';
import type { Knex } from 'knex';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { migrateDatabase, openDatabase } from '../../apps/server/src/queries/database.ts';
import { rebuildAllBeds } from '../../apps/server/src/services/rebuild-all-beds.ts';
import { startServer } from '../../apps/server/src/start-server.ts';
import { Caller } from '../support/caller.ts';
import { aCheck, aGas, anAirway } from '../support/entries.ts';
import { openHouse } from '../support/house.ts';
import { stored } from '../support/stored.ts';
import { temporaryFolder } from '../support/temporary-folder.ts';

let folder: ReturnType<typeof temporaryFolder>;
let file: string;
beforeEach(() => {
  folder = temporaryFolder();
  file = join(folder.path, 'made', 'on', 'the', 'way', 'windrow.sqlite3');
});
afterEach(() => folder.remove());

const PRAGMAS = [
  'synchronous',
  'journal_mode',
  'foreign_keys',
  'recursive_triggers',
  'trusted_schema',
] as const;
/** 2 is FULL: every commit is on the disk before it is answered. */
const KEPT = {
  synchronous: 2,
  journal_mode: 'wal',
  foreign_keys: 1,
  recursive_triggers: 1,
  trusted_schema: 0,
};

async function pragmas(db: Knex): Promise<Record<string, unknown>> {
  const found: Record<string, unknown> = {};
  for (const name of PRAGMAS) {
    const [row]: Record<string, unknown>[] = await db.raw(`PRAGMA ${name}`);
    found[name] = row?.[name];
  }
  return found;
}

describe('the database file', () => {
  it('keeps its promises after opening, after the first write, and after opening again', async () => {
    const db = await openDatabase(file);
    expect(await pragmas(db)).toEqual(KEPT);
    await migrateDatabase(db);
    await db('units').insert({ id: 'u', name: 'Alder', time_zone: 'Europe/London', revision: 0 });
    await db.transaction((trx) => trx('units').where({ id: 'u' }).increment('revision', 1));
    expect(await pragmas(db)).toEqual(KEPT);
    await db.destroy();
    const again = await openDatabase(file);
    expect(await pragmas(again)).toEqual(KEPT);
    expect(await again('units').first('revision')).toEqual({ revision: 1 });
    expect(await pragmas(again)).toEqual(KEPT);
    await again.destroy();
  });

  it('takes the write lock at the beginning of a transaction, so that none fails half-way for another’s', async () => {
    const [one, other] = [await openDatabase(file), await openDatabase(file)];
    await migrateDatabase(one);
    await other.raw('PRAGMA busy_timeout = 0');
    await one.transaction(async (trx) => {
      await trx('units').first();
      await expect(other.transaction((late) => late('units').first())).rejects.toThrow(/database is locked/);
    });
    await expect(other.transaction((late) => late('units').first())).resolves.toBeUndefined();
    await one.destroy();
    await other.destroy();
  });

  it('goes up, all the way down, and up again to the same tables', async () => {
    const db = await openDatabase(file);
    const schema = () =>
      db('sqlite_master')
        .select('type', 'name', 'tbl_name', 'sql')
        .whereNot('name', 'like', 'knex%')
        .whereNot('name', 'like', 'sqlite%')
        .orderBy(['type', 'name']);
    await migrateDatabase(db);
    const first = await schema();
    expect(first.length).toBeGreaterThan(20);
    await db.migrate.rollback(undefined, true);
    expect(await schema()).toEqual([]);
    await migrateDatabase(db);
    expect(await schema()).toEqual(first);
    const [, pending] = await db.migrate.list();
    expect(pending).toEqual([]);
    await db.destroy();
  });

  it('closed and opened again has the same board, the same sessions, and the same answers for the same keys', async () => {
    const house = await openHouse({ database: file });
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const key = crypto.randomUUID();
    const entry = aCheck(house.ago(1));
    const first = await house.as('therapist').post(`/api/stays/${stayId}/checks`, entry, { key });
    const board = await house.board(house.alder);
    await house.close();

    const { settings } = house.server.deps;
    const server = await startServer(settings, {
      version: 'test',
      publicFolder: '/nowhere',
      now: () => house.clock.now,
    });
    const therapist = new Caller(server.url, house.as('therapist').cookieHeader);
    expect((await therapist.get('/api/session')).as(Session).person.username).toBe('therapist');
    expect((await therapist.get(`/api/units/${house.alder.unitId}/board`)).body).toEqual(board);
    const before = await stored(server.deps.db);
    expect((await therapist.post(`/api/stays/${stayId}/checks`, entry, { key })).text).toBe(first.text);
    expect(await stored(server.deps.db)).toEqual(before);
    await server.stop();
  });
});

describe('what was recorded', () => {
  let house: Awaited<ReturnType<typeof openHouse>>;
  beforeEach(async () => {
    house = await openHouse();
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    await house.record(stayId, 'checks', aCheck(house.ago(5)));
    await house.record(stayId, 'gases', aGas(house.ago(5)));
    await house.record(stayId, 'airways', anAirway(house.ago(5)));
    await house.readyMachine('V-1');
    const made = await house.as('charge').post(`/api/units/${house.alder.unitId}/shifts`, {
      name: 'Day',
      startsAt: house.ago(60),
      endsAt: house.ago(-60),
      people: [{ personId: house.personId('therapist'), minutesAvailable: 60 }],
    });
    const { shiftId } = made.as(Shift);
    await house
      .as('charge')
      .put(`/api/shifts/${shiftId}/assignment`, { places: [], publish: true }, { version: 0 });
  });
  afterEach(() => house.close());

  it.each(['observations', 'policies', 'assignments', 'ventilator_moves', 'audit'])(
    'in %s is neither changed nor deleted, by whatever statement',
    async (table) => {
      const { db } = house;
      const before = await db(table);
      expect(before.length).toBeGreaterThan(0);
      const column = Object.keys(before[0]).at(-1);
      const refused = /append-only|kept by version/;
      await expect(db(table).update({ [column ?? '']: 'x' })).rejects.toThrow(refused);
      await expect(db(table).delete()).rejects.toThrow(refused);
      await expect(db(table).where(before[0]).delete()).rejects.toThrow(refused);
      // Replacing a row deletes it first, which SQLite by itself keeps from the triggers.
      await expect(db.raw(`INSERT OR REPLACE INTO ${table} SELECT * FROM ${table}`)).rejects.toThrow(refused);
      expect(await db(table)).toEqual(before);
    },
  );

  it('is guarded by the database too: no fact without its stay, no two patients in a bed, no role unheard of', async () => {
    const { db } = house;
    const before = await stored(db);
    const [fact] = await db('observations').limit(1);
    const [stay] = await db('stays').limit(1);
    const [machine] = await db('ventilators').limit(1);
    const copy = { ...fact, sequence: undefined, id: 'x' };
    const inserts: [string, object][] = [
      ['observations', { ...copy, stay_id: 'nowhere' }],
      ['observations', { ...copy, recorded_by: 'nobody' }],
      ['observations', { ...copy, kind: 'guess' }],
      ['observations', { ...copy, source: 'hearsay' }],
      ['observations', { ...copy, amends_id: fact.id, amended_as: 'struck', reason: '' }],
      ['observations', { ...copy, amends_id: null, amended_as: 'struck', reason: 'wrong patient' }],
      ['stays', { ...stay, id: 'x', hospital_number: 'other' }],
      ['stays', { ...stay, id: 'x', bed_id: house.bed(house.alder, 1) }],
      ['stays', { ...stay, id: 'x', bed_id: null, hospital_number: 'other' }],
      ['ventilators', { ...machine, id: 'x' }],
      ['ventilators', { ...machine, id: 'x', asset_number: 'V-2', state: 'in-use' }],
      ['ventilators', { ...machine, id: 'x', asset_number: 'V-2', bed_id: house.bed(house.alder, 1) }],
      ['grants', { person_id: house.personId('therapist'), role: 'root', unit_id: null }],
      ['shifts', { id: 'x', unit_id: house.alder.unitId, name: 'Day', starts_at: '2', ends_at: '1' }],
    ];
    for (const [table, row] of inserts)
      await expect(db(table).insert(row), `${table} ${JSON.stringify(row)}`).rejects.toThrow(
        /constraint failed/,
      );
    expect(await stored(db)).toEqual(before);
  });

  it('gives the board’s rows again, whatever became of them', async () => {
    const { db } = house;
    const board = await house.board(house.alder);
    expect((await rebuildAllBeds(db, { now: house.ago(0) })).differed).toEqual([]);
    const row = await db('board_rows')
      .where({ bed_id: house.bed(house.alder, 0) })
      .first();
    await db('board_rows')
      .where({ bed_id: row.bed_id })
      .update({ row: row.row.replace('"peepCmH2O":10', '"peepCmH2O":12') });
    await db('board_rows')
      .where({ bed_id: house.bed(house.alder, 1) })
      .delete();
    const { beds, differed } = await rebuildAllBeds(db, { now: house.ago(0) });
    expect({ beds, differed }).toEqual({ beds: 6, differed: ['Alder 01', 'Alder 02'] });
    const after = await house.board(house.alder);
    // Rebuilt rows are news: they have revisions of their own.
    expect(after.revision).toBe(board.revision + 2);
    const withoutRevision = (each: typeof board) => each.beds.map((bed) => ({ ...bed, revision: 0 }));
    expect(withoutRevision(after)).toEqual(withoutRevision(board));
  });
});
