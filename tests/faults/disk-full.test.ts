import { execFileSync } from 'node:child_process';
import { closeSync, openSync, rmSync, writeSync } from 'node:fs';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { aCheck } from '../support/entries.ts';
import { type House, openHouse, PASSWORD } from '../support/house.ts';
import { listen } from '../support/listening.ts';
import { Recorded } from '../support/shapes.ts';
import { stored } from '../support/stored.ts';
import { temporaryFolder } from '../support/temporary-folder.ts';

type Disk = {
  file: string;
  fill: (house: House) => Promise<void>;
  free: (house: House) => Promise<void>;
  remove: () => void;
};

/** A disk of our own that is really full. Only root can mount one. */
function smallDisk(): Disk | string {
  const folder = temporaryFolder();
  try {
    execFileSync('mount', ['-t', 'tmpfs', '-o', 'size=6m', 'tmpfs', folder.path], { stdio: 'pipe' });
  } catch (error) {
    folder.remove();
    return `no disk could be mounted here: ${error instanceof Error ? error.message.split('\n')[0] : String(error)}`;
  }
  const filler = join(folder.path, 'filler');
  return {
    file: join(folder.path, 'windrow.sqlite3'),
    fill: async () => fillWith(filler),
    free: async () => rmSync(filler),
    remove: () => {
      execFileSync('umount', [folder.path]);
      folder.remove();
    },
  };
}

function fillWith(filler: string): void {
  const file = openSync(filler, 'w');
  try {
    for (const size of [65_536, 4_096, 1]) {
      try {
        for (;;) writeSync(file, Buffer.alloc(size));
      } catch (error) {
        if (!(error instanceof Error) || !error.message.includes('ENOSPC')) throw error;
      }
    }
  } finally {
    closeSync(file);
  }
}

/** The same answer of the database without a disk: it may not grow by a single page. */
function limitedDatabase(): Disk {
  const folder = temporaryFolder();
  return {
    file: join(folder.path, 'windrow.sqlite3'),
    fill: async ({ db }) => void (await db.raw('PRAGMA max_page_count = 1')),
    free: async ({ db }) => void (await db.raw('PRAGMA max_page_count = 1073741823')),
    remove: folder.remove,
  };
}

const disks: [string, () => Disk | string][] = [
  ['a disk that is full', smallDisk],
  ['a database that may not grow', limitedDatabase],
];

describe.each(disks)('on %s', (_, open) => {
  let disk: Disk | string;
  let house: House;
  beforeEach(async () => {
    disk = open();
    if (typeof disk === 'string') return;
    house = await openHouse({ database: disk.file });
  });
  afterEach(async () => {
    if (typeof disk === 'string') return;
    await house.close();
    disk.remove();
  });

  it('a write is refused with 507 and stored not at all, reads go on, and it recovers by itself', async ({
    skip,
  }) => {
    if (typeof disk === 'string') {
      process.stdout.write(`  skipped: ${disk}\n`);
      return skip(disk);
    }
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const therapist = house.as('therapist');
    const path = `/api/stays/${stayId}/checks`;
    const send = (key: string) =>
      therapist.post(path, aCheck(house.ago(1), { note: 'x'.repeat(400) }), { key });
    await send(crypto.randomUUID());
    const screen = await listen(house.as('charge'));

    await disk.fill(house);
    // What is left of the last page takes a few more.
    let key = crypto.randomUUID();
    let full = await send(key);
    for (let n = 0; full.status === 201 && n < 300; n += 1) {
      key = crypto.randomUUID();
      full = await send(key);
    }
    expect(full.status).toBe(507);
    expect(full.problem).toMatchObject({
      type: 'urn:windrow:problem:not-saving',
      detail: expect.stringContaining('Nothing was stored'),
    });
    const before = await stored(house.db);
    const board = await house.board(house.alder);
    screen.forget();
    for (let n = 0; n < 5; n += 1) expect((await send(crypto.randomUUID())).status).toBe(507);
    expect(await stored(house.db)).toEqual(before);
    expect(await house.board(house.alder)).toEqual(board);

    // Everything that is only read is answered, to a session that is due for renewal too.
    await house.recordOf(stayId, 'therapist');
    expect((await house.anybody().get('/api/health')).status).toBe(200);
    // Signing in is on the audit trail; whether its few bytes still fit is the disk’s to say.
    expect([201, 507]).toContain((await house.anybody().signIn('charge', PASSWORD)).status);
    const newcomer = await listen(therapist);
    newcomer.close();

    await disk.free(house);
    const { observationId } = (await send(key)).as(Recorded);
    expect((await send(key)).as(Recorded).observationId).toBe(observationId);
    expect((await stored(house.db)).observations).toBe((before.observations ?? 0) + 1);
    const { beds } = await screen.until((heard) => heard.beds.length > 0);
    expect(beds).toHaveLength(1);
    expect(beds[0]?.revision).toBe(board.revision + 1);
    screen.close();
    expect(await house.db.raw('PRAGMA integrity_check')).toEqual([{ integrity_check: 'ok' }]);
  });

  it('a board is read by a session that is due for renewal', async ({ skip }) => {
    if (typeof disk === 'string') return skip(disk);
    const soon = new Date(Date.now() + 3_600_000).toISOString();
    await house.db('sessions').update({ expires_at: soon });
    await disk.fill(house);
    // A session's row keeps its size, so a database may still have room for it; make sure that it has none.
    await house.db.raw('PRAGMA query_only = ON');
    expect((await house.as('therapist').get(`/api/units/${house.alder.unitId}/board`)).status).toBe(200);
    const screen = await listen(house.as('therapist'));
    screen.close();
    await house.db.raw('PRAGMA query_only = OFF');
    await disk.free(house);
  });
});
