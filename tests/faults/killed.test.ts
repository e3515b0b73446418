import { join } from 'node:path';
import { Bed, Unit } from '@windrow/ventilation/contract/board';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openDatabase } from '../../apps/server/src/queries/database.ts';
import { rebuildAllBeds } from '../../apps/server/src/services/rebuild-all-beds.ts';
import { Caller, type Reply } from '../support/caller.ts';
import { aCheck, anAdmission } from '../support/entries.ts';
import { PASSWORD } from '../support/house.ts';
import { type Killable, serveFile } from '../support/killable-server.ts';
import { Placed, Recorded } from '../support/shapes.ts';
import { temporaryFolder } from '../support/temporary-folder.ts';

const KILLS = 8;
const WRITERS = 3;

type Entry = { key: string; path: string; body: object };

let folder: ReturnType<typeof temporaryFolder>;
let file: string;
let server: Killable;
beforeAll(async () => {
  folder = temporaryFolder();
  file = join(folder.path, 'windrow.sqlite3');
  server = await serveFile(file);
});
afterAll(async () => {
  await server.kill();
  folder.remove();
});

const minutesAgo = (minutes: number) => new Date(Date.now() - minutes * 60_000).toISOString();

async function setUp(): Promise<{ cookie: string; stays: string[] }> {
  const root = new Caller(server.url);
  const first = { username: 'root', displayName: 'Rana Oduya', password: PASSWORD };
  root.keepCookie(await root.post('/api/start/administrator', first));
  const { unitId } = (await root.post('/api/units', { name: 'Alder', timeZone: 'Europe/London' })).as(Unit);
  const grants = [{ role: 'therapist', unitId }];
  await root.post('/api/people', {
    username: 'writer',
    displayName: 'Wren Writer',
    initials: 'WW',
    password: PASSWORD,
    grants,
  });
  const writer = new Caller(server.url);
  await writer.signIn('writer', PASSWORD);
  const stays: string[] = [];
  for (let n = 1; n <= WRITERS; n += 1) {
    const { bedId } = (await root.post(`/api/units/${unitId}/beds`, { label: `${n}`, row: 1, column: n })).as(
      Bed,
    );
    stays.push((await writer.post('/api/stays', anAdmission(bedId, minutesAgo(60)))).as(Placed).stay.stayId);
  }
  return { cookie: writer.cookieHeader, stays };
}

/** Records one check after the other until the server is gone; says what was answered and what was not. */
async function writeUntilGone(caller: Caller, stayId: string) {
  const answered: (Entry & { observationId: string })[] = [];
  for (;;) {
    const entry = {
      key: crypto.randomUUID(),
      path: `/api/stays/${stayId}/checks`,
      body: aCheck(minutesAgo(0)),
    };
    let reply: Reply;
    try {
      reply = await caller.post(entry.path, entry.body, { key: entry.key });
    } catch (error) {
      if (error instanceof TypeError || error instanceof SyntaxError) return { answered, unanswered: entry };
      throw error;
    }
    answered.push({ ...entry, observationId: reply.as(Recorded).observationId });
  }
}

describe('a server killed again and again while it records', () => {
  it('has every fact that it answered, each once, and a retry of the others makes exactly one', {
    timeout: 120_000,
  }, async () => {
    const { cookie, stays } = await setUp();
    const known = new Map<string, string>();
    let storedUnanswered = 0;
    for (let kill = 0; kill < KILLS; kill += 1) {
      const writing = stays.map((stayId) => writeUntilGone(new Caller(server.url, cookie), stayId));
      await new Promise((resolve) => setTimeout(resolve, 40 + Math.random() * 200));
      await server.kill();
      const outcomes = await Promise.all(writing);
      server = await serveFile(file);
      const db = await openDatabase(file);
      try {
        expect(await db.raw('PRAGMA integrity_check')).toEqual([{ integrity_check: 'ok' }]);
        expect(await db.raw('PRAGMA foreign_key_check')).toEqual([]);
        for (const { answered } of outcomes)
          for (const entry of answered) known.set(entry.key, entry.observationId);
        const facts = async () =>
          new Set<string>(
            (await db('observations').where({ kind: 'check' }).select('id')).map(({ id }) => id),
          );
        const before = await facts();
        for (const observationId of known.values()) expect(before.has(observationId)).toBe(true);

        const caller = new Caller(server.url, cookie);
        for (const { unanswered } of outcomes) {
          const retry = () => caller.post(unanswered.path, unanswered.body, { key: unanswered.key });
          const { observationId } = (await retry()).as(Recorded);
          expect((await retry()).as(Recorded).observationId).toBe(observationId);
          if (before.has(observationId)) storedUnanswered += 1;
          known.set(unanswered.key, observationId);
        }
        // One fact for each key, and none besides.
        expect([...(await facts())].sort()).toEqual([...known.values()].sort());
        expect((await rebuildAllBeds(db, { now: minutesAgo(0) })).differed).toEqual([]);
      } finally {
        await db.destroy();
      }
    }
    expect(known.size).toBeGreaterThan(KILLS * WRITERS);
    // Said for whoever reads the run: how often the answer was lost on its way and the fact was not.
    process.stdout.write(
      `  ${known.size} facts over ${KILLS} kills, ${storedUnanswered} of them stored and not answered\n`,
    );
  });
});
