// `npm run pictures`: the README's pictures, of the real screens on a fresh demonstration.
import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium } from '@playwright/test';
import { ensureBuilt, ROOT } from './steps.mjs';

const PORT = 4399;
const URL = `http://127.0.0.1:${PORT}`;

ensureBuilt();
const folder = mkdtempSync(join(tmpdir(), 'windrow-pictures-'));
const server = spawn(process.execPath, [join(ROOT, 'apps/server/dist/server/main.js')], {
  stdio: 'ignore',
  env: { ...process.env, PORT: String(PORT), WINDROW_DEMO: '1', WINDROW_DATABASE: join(folder, 'record.sqlite3') },
});
try {
  await answering();
  const browser = await chromium.launch({ executablePath: existsSync('/usr/bin/chromium') ? '/usr/bin/chromium' : undefined, args: ['--no-sandbox', '--disable-gpu'] });
  await picture(browser, 'wall-night', 'display', { width: 1920, height: 1080 }, '/wall?theme=night', (page) => page.getByRole('button', { name: /Harbour ICU/ }).click());
  await picture(browser, 'wall-day', 'display', { width: 1920, height: 1080 }, '/wall?theme=day', (page) => page.getByRole('button', { name: /Orchard ICU/ }).click());
  await picture(browser, 'round', 'therapist', { width: 1180, height: 820 });
  await picture(browser, 'check', 'therapist', { width: 1180, height: 820 }, '/', enterCheck);
  await picture(browser, 'assignment', 'charge', { width: 1180, height: 820 }, '/', (page) => page.getByRole('link', { name: 'Assignment' }).click());
  await picture(browser, 'capacity', 'supervisor', { width: 1180, height: 820 });
  await browser.close();
} finally {
  server.kill();
  rmSync(folder, { recursive: true, force: true });
}

async function picture(browser, name, username, viewport, path = '/', act = async () => {}) {
  const context = await browser.newContext({ viewport, timezoneId: 'Europe/London', colorScheme: 'light' });
  const page = await context.newPage();
  await page.goto(`${URL}${path}`);
  await page.getByLabel('User name').fill(username);
  await page.getByLabel('Password').fill('windrow-demo');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForTimeout(1500);
  await act(page);
  await page.waitForTimeout(1500);
  await page.screenshot({ path: join(ROOT, '.pictures', `${name}.png`) });
  await context.close();
}

async function enterCheck(page) {
  await page.getByRole('link', { name: /\b03\b/ }).first().click();
  await page.getByRole('navigation', { name: /^Bed / }).getByRole('link', { name: 'Check' }).click();
  const field = (name) => page.getByRole('textbox', { name: new RegExp(`^${name}`) });
  const press = async (name, keys) => {
    await field(name).click();
    for (const key of keys) await page.getByRole('button', { name: key, exact: true }).click();
  };
  await press('Pressure above PEEP', '17');
  for (const name of ['Rate set', 'PEEP', 'Oxygen']) {
    await field(name).click();
    await page.getByRole('button', { name: /^as before/ }).click();
  }
  await press('Exhaled Vt', '612');
}

async function answering() {
  for (let tries = 0; tries < 100; tries += 1) {
    if (await fetch(`${URL}/api/health`).then(({ ok }) => ok, () => false)) return;
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  throw new Error('the server does not answer');
}
