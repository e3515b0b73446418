// `npm start`: from a fresh clone to a running demonstration. Every step is skipped where it is done.
import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { ensureBuilt, ensureInstalled, ROOT } from './steps.mjs';

ensureInstalled();
ensureBuilt();
// The server migrates its database and fills the demonstration itself.
const server = spawn(process.execPath, [join(ROOT, 'apps/server/dist/server/main.js')], {
  cwd: ROOT,
  stdio: 'inherit',
  env: { WINDROW_DEMO: '1', ...process.env },
});
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal));
server.on('exit', (code) => process.exit(code ?? 1));
