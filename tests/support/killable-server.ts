import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { resolve } from 'node:path';
import { createInterface } from 'node:readline';

export type Killable = { url: string; kill: () => Promise<void> };

/** Starts the service on a database file in its own process; `kill` gives it no chance to finish anything. */
export async function serveFile(database: string): Promise<Killable> {
  const script = resolve(import.meta.dirname, 'serve-file.ts');
  const child = spawn(process.execPath, ['--import', 'tsx', script], {
    env: { PATH: process.env.PATH, PORT: '0', WINDROW_DATABASE: database, WINDROW_LOG: 'silent' },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const kill = async () => {
    if (child.exitCode !== null || child.signalCode !== null) return;
    child.kill('SIGKILL');
    await once(child, 'exit');
  };
  try {
    return { url: await addressOf(child), kill };
  } catch (error) {
    await kill();
    throw error;
  }
}

async function addressOf(child: ChildProcess): Promise<string> {
  const { stdout, stderr } = child;
  if (!stdout || !stderr) throw new Error('the server was started without its output');
  let said = '';
  stderr.on('data', (chunk) => {
    said += String(chunk);
  });
  const [first] = await Promise.race([
    once(createInterface({ input: stdout }), 'line'),
    once(child, 'exit').then(() => {
      throw new Error(`the server ended before it served: ${said}`);
    }),
  ]);
  return String(first);
}
