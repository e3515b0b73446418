// What `npm start` and `npm test` share. Plain Node, because on a fresh clone nothing else is there yet.
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

export const ROOT = join(import.meta.dirname, '..');
const STAMPS = join(ROOT, '.windrow');

/** Runs a command with its output shown; throws when it fails. */
export function run(command, args, options = {}) {
  const result = spawnSync(command, args, { cwd: ROOT, stdio: 'inherit', ...options });
  if (result.error) throw result.error;
  if (result.status !== 0) throw new Error(`${command} ${args.join(' ')} ended with ${result.status ?? result.signal}`);
}

export const bin = (name) => join(ROOT, 'node_modules', '.bin', name);

/** Installs what the lock file says, unless that was done since it last changed. */
export function ensureInstalled() {
  const lock = join(ROOT, 'package-lock.json');
  const done = join(ROOT, 'node_modules', '.package-lock.json');
  if (existsSync(done) && statSync(done).mtimeMs >= statSync(lock).mtimeMs && existsSync(bin('vite'))) return;
  say('installing (better-sqlite3 may be compiled: up to three minutes)');
  run('npm', ['ci', '--no-audit', '--no-fund']);
}

/** Builds both apps and the server, unless nothing changed since the last build. */
export function ensureBuilt() {
  const stamp = join(STAMPS, 'built');
  const main = join(ROOT, 'apps/server/dist/server/main.js');
  const newest = Math.max(...['apps', 'packages', 'db', 'vite.config.ts', 'package-lock.json'].map((path) => newestChange(join(ROOT, path))));
  if (existsSync(main) && existsSync(stamp) && statSync(stamp).mtimeMs >= newest) return;
  say('building');
  run(bin('vite'), ['build', '--logLevel', 'warn']);
  run(bin('vite'), ['build', '--ssr', '--logLevel', 'warn']);
  mkdirSync(STAMPS, { recursive: true });
  writeFileSync(stamp, '');
}

function newestChange(path) {
  const stat = statSync(path);
  if (!stat.isDirectory()) return stat.mtimeMs;
  const inside = readdirSync(path, { withFileTypes: true })
    .filter(({ name }) => !['node_modules', 'dist', 'data'].includes(name))
    .map(({ name }) => newestChange(join(path, name)));
  return Math.max(0, ...inside);
}

export function say(words) {
  process.stdout.write(`windrow: ${words}\n`);
}
