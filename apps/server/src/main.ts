import { join } from 'node:path';
import release from '../package.json' with { type: 'json' };
import { readSettings } from './config/settings.ts';
import { startServer } from './start-server.ts';

/** The one file of the server that acts when it is imported. */
async function main(): Promise<void> {
  const settings = readSettings(process.env);
  const server = await startServer(settings, {
    version: release.version,
    publicFolder: join(import.meta.dirname, '..', 'public'),
  });
  server.deps.log.info(
    { url: server.url, database: settings.database, demonstration: server.deps.demonstration },
    'serving',
  );
  if (server.deps.demonstration) process.stdout.write(demoWords(server.url));

  let stopping = false;
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.on(signal, () => {
      if (stopping) return;
      stopping = true;
      server.stop().then(
        () => process.exit(0),
        () => process.exit(1),
      );
    });
  }
}

function demoWords(url: string): string {
  return `
  Windrow, with demonstration data (everything in it is invented)

    tablet   ${url}/
    wall     ${url}/wall

  Sign in as therapist, therapist2, charge, supervisor, clinician, biomed, admin or display;
  every password is windrow-demo.
`;
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
});
