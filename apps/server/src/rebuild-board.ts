import { readSettings } from './config/settings.ts';
import { openDatabase } from './queries/database.ts';
import { rebuildAllBeds } from './services/rebuild-all-beds.ts';

/** `npm run rebuild-board`: every board row anew from the facts; says how many differed from what was stored. */
async function main(): Promise<void> {
  const db = await openDatabase(readSettings(process.env).database);
  try {
    const { beds, differed } = await rebuildAllBeds(db, { now: new Date().toISOString() });
    process.stdout.write(
      `${beds} beds rebuilt from the facts, ${differed.length} differed${differed.length > 0 ? `: ${differed.join(', ')}` : ''}\n`,
    );
  } finally {
    await db.destroy();
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
});
