import { readSettings } from '../../apps/server/src/config/settings.ts';
import { startServer } from '../../apps/server/src/start-server.ts';

/** The real service in a process of its own, for tests that kill it. Says its address on its first line. */
const server = await startServer(readSettings(process.env), { version: 'test', publicFolder: '/nowhere' });
process.stdout.write(`${server.url}\n`);
