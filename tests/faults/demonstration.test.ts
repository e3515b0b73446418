import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { readSettings } from '../../apps/server/src/config/settings.ts';
import { startServer } from '../../apps/server/src/start-server.ts';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'windrow-demonstration-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

const open = (demo: '0' | '1') =>
  startServer(
    {
      ...readSettings({
        WINDROW_DEMO: demo,
        WINDROW_DATABASE: join(folder, 'record.sqlite3'),
        WINDROW_LOG: 'silent',
      }),
      port: 0,
    },
    { version: 'test', publicFolder: '/nowhere' },
  );

const start = async (url: string) => (await fetch(`${url}/api/start`)).json();

it('a record with the demonstration hospital is never served as a real one', async () => {
  const demo = await open('1');
  expect(await start(demo.url)).toMatchObject({ demonstration: true, needsAdministrator: false });
  await demo.stop();
  await expect(open('0')).rejects.toThrow(/holds the demonstration hospital.*WINDROW_DATABASE/);
});

it('a real record is never filled with, nor marked as, a demonstration', async () => {
  const real = await open('0');
  await fetch(`${real.url}/api/start/administrator`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify({ username: 'root', displayName: 'Rana Oduya', password: 'a long pass phrase' }),
  });
  await real.stop();
  const again = await open('1');
  expect(await start(again.url)).toMatchObject({ demonstration: false, needsAdministrator: false });
  await again.stop();
});
