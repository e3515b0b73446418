// `npm run dev`: the server and both apps, each reloaded when its code changes.
import { bin, ensureInstalled, run } from './steps.mjs';

ensureInstalled();
const env = { WINDROW_DEMO: '1', ...process.env };
run(bin('concurrently'), ['--kill-others', '--names', 'server,apps', 'tsx watch --clear-screen=false apps/server/src/main.ts', 'vite'], { env });
