import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { AxeBuilder } from '@axe-core/playwright';
import { test as base, expect, type Page } from '@playwright/test';

const ROOT = join(import.meta.dirname, '../..');
export const PASSWORD = 'windrow-demo';

/** The built service on a free port with its own record, as `npm run serve` runs it. */
export class Windrow {
  private process: ChildProcess | null = null;
  private readonly folder = mkdtempSync(join(tmpdir(), 'windrow-journey-'));

  private constructor(
    readonly port: number,
    private readonly demo: boolean,
  ) {}

  static async start({ demo }: { demo: boolean }): Promise<Windrow> {
    const windrow = new Windrow(await freePort(), demo);
    await windrow.resume();
    return windrow;
  }

  get url(): string {
    return `http://127.0.0.1:${this.port}`;
  }

  /** Starts the service again on the record it has. */
  async resume(): Promise<void> {
    this.process = spawn(process.execPath, [join(ROOT, 'apps/server/dist/server/main.js')], {
      cwd: ROOT,
      stdio: ['ignore', 'ignore', 'inherit'],
      env: {
        ...process.env,
        PORT: String(this.port),
        WINDROW_DATABASE: join(this.folder, 'record.sqlite3'),
        WINDROW_DEMO: this.demo ? '1' : '0',
        WINDROW_LOG: 'warn',
      },
    });
    await expect
      .poll(
        () =>
          fetch(`${this.url}/api/health`).then(
            (answer) => answer.status,
            () => 0,
          ),
        { timeout: 30_000 },
      )
      .toBe(200);
  }

  /** As if the power went: no time to say good-bye. */
  async kill(): Promise<void> {
    const ended = new Promise((resolve) => this.process?.once('exit', resolve));
    this.process?.kill('SIGKILL');
    await ended;
  }

  async dispose(): Promise<void> {
    if (this.process?.exitCode === null) await this.kill();
    rmSync(this.folder, { recursive: true, force: true });
  }
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      probe.close(() =>
        typeof address === 'object' && address ? resolve(address.port) : reject(new Error('no port')),
      );
    });
  });
}

type Fixtures = {
  /** The demo hospital, fresh for this test. */
  windrow: Windrow;
  /** A house that nobody has set up yet. */
  emptyWindrow: Windrow;
  /** A browser of its own for each screen, watched: no request leaves the origin, and no error is printed. */
  open: (where: Windrow, size: { width: number; height: number }) => Promise<Page>;
};

export const test = base.extend<Fixtures>({
  // biome-ignore lint/correctness/noEmptyPattern: Playwright reads the fixture's needs from this pattern
  windrow: async ({}, provide) => {
    const windrow = await Windrow.start({ demo: true });
    await provide(windrow);
    await windrow.dispose();
  },
  // biome-ignore lint/correctness/noEmptyPattern: Playwright reads the fixture's needs from this pattern
  emptyWindrow: async ({}, provide) => {
    const windrow = await Windrow.start({ demo: false });
    await provide(windrow);
    await windrow.dispose();
  },
  open: async ({ browser }, provide) => {
    const faults: string[] = [];
    const contexts: Awaited<ReturnType<typeof browser.newContext>>[] = [];
    await provide(async (where, size) => {
      const context = await browser.newContext({ viewport: size, hasTouch: true });
      contexts.push(context);
      const page = await context.newPage();
      page.on('request', (request) => {
        const { origin, protocol } = new URL(request.url());
        if (protocol !== 'data:' && origin !== where.url) faults.push(`asked ${request.url()}`);
      });
      page.on('console', (message) => {
        // A refused sign-in and a server that was killed on purpose are printed by the browser itself.
        if (
          message.type() === 'error' &&
          !/Failed to load resource|WebSocket connection/.test(message.text())
        )
          faults.push(`printed ${message.text()}`);
      });
      page.on('pageerror', (error) => faults.push(`threw ${error.message}`));
      return page;
    });
    for (const context of contexts) await context.close();
    expect(faults).toEqual([]);
  },
});

export { expect };

export const WALL = { width: 1920, height: 1080 };
export const LANDSCAPE = { width: 1180, height: 820 };
export const PORTRAIT = { width: 820, height: 1180 };

export async function signIn(
  page: Page,
  windrow: Windrow,
  username: string,
  path = '/',
  password = PASSWORD,
): Promise<void> {
  await page.goto(`${windrow.url}${path}`);
  await page.getByLabel('User name').fill(username);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

/** WCAG 2.2 AA by axe, on the page as it is now. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
    .analyze();
  expect(
    violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join(', ')}`),
  ).toEqual([]);
}
