// The script that each app loads before it can show anything, gzipped, against its budget.
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { ROOT, say } from './steps.mjs';

const PUBLIC = join(ROOT, 'apps/server/dist/public');
const BUDGETS_KB = { wall: 140, tablet: 240 };

const manifest = JSON.parse(readFileSync(join(PUBLIC, '.vite/manifest.json'), 'utf8'));
let over = false;
for (const [app, budgetKb] of Object.entries(BUDGETS_KB)) {
  const files = firstLoad(`apps/${app}/index.html`);
  const bytes = files.reduce((sum, file) => sum + gzipSync(readFileSync(join(PUBLIC, file))).length, 0);
  const kb = bytes / 1000;
  over ||= kb > budgetKb;
  say(`${app}: ${kb.toFixed(1)} kB of script at first load, budget ${budgetKb} kB (${files.length} files)`);
}
if (over) process.exit(1);

function firstLoad(entry, seen = new Set()) {
  const chunk = manifest[entry];
  if (!chunk || seen.has(chunk.file)) return [...seen];
  seen.add(chunk.file);
  for (const imported of chunk.imports ?? []) firstLoad(imported, seen);
  return [...seen].filter((file) => file.endsWith('.js'));
}
