import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { type DestinationStream, pino } from 'pino';
import type { Settings } from './config/settings.ts';
import type { Deps } from './deps.ts';
import { makeApp } from './http/app.ts';
import { migrateDatabase, openDatabase } from './queries/database.ts';
import { isDemonstration } from './queries/demonstration.ts';
import { deleteKeysBefore } from './queries/idempotency-keys.ts';
import { openLiveLink } from './realtime/live-link.ts';
import { signIns } from './services/sign-ins.ts';

const KEYS_KEPT_DAYS = 7;
const HOUR_MS = 3_600_000;

export type Running = { deps: Deps; url: string; stop: () => Promise<void> };

/** Opens the record, brings it up to date, and serves. `now`, `publicFolder` and `logTo` are the tests' to choose. */
export async function startServer(
  settings: Settings,
  {
    version,
    publicFolder,
    now = () => new Date(),
    logTo,
  }: { version: string; publicFolder: string; now?: () => Date; logTo?: DestinationStream },
): Promise<Running> {
  const log = pino({ level: settings.logLevel }, logTo);
  const db = await openDatabase(settings.database);
  await migrateDatabase(db);
  const deps: Deps = {
    db,
    settings,
    signIns: signIns(db, settings),
    live: { tell: () => {}, drop: () => {} },
    log,
    version,
    demonstration: false,
    now,
  };
  // The invented hospital is loaded only where it is asked for.
  if (settings.demo) await (await import('./services/fill-demo.ts')).fillDemo(deps);

  deps.demonstration = await isDemonstration(db);
  if (deps.demonstration && !settings.demo) {
    await db.destroy();
    throw new Error(
      `${settings.database} holds the demonstration hospital, with passwords that everybody knows. Set WINDROW_DATABASE to another file, or WINDROW_DEMO=1.`,
    );
  }

  const httpServer = createServer();
  const live = openLiveLink(httpServer, deps);
  deps.live = live;
  httpServer.on('request', makeApp(deps, { publicFolder }));
  await new Promise<void>((resolve, reject) => {
    httpServer.once('error', reject);
    httpServer.listen(settings.port, settings.host, resolve);
  });

  const tidy = setInterval(
    () => void tidyUp(deps).catch((error: unknown) => log.error({ err: error }, 'tidying failed')),
    HOUR_MS,
  );
  tidy.unref();

  return {
    deps,
    url: `http://${settings.host}:${(httpServer.address() as AddressInfo).port}`,
    stop: async () => {
      clearInterval(tidy);
      // Closing the link closes the HTTP server with it; the record is closed last, whole.
      await live.close();
      await db.destroy();
    },
  };
}

async function tidyUp({ db, signIns: sessions, now }: Deps): Promise<void> {
  await sessions.deleteExpired();
  await deleteKeysBefore(db, new Date(now().getTime() - KEYS_KEPT_DAYS * 24 * HOUR_MS).toISOString());
}
