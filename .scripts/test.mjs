// `npm test`: installs what it needs, then lint, types, unit, API and fault tests, build, sizes, journeys.
// Ends with one line: the sums of all runners. `npm test -- --quick` leaves out the browser.
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { bin, ensureBuilt, ensureInstalled, ROOT, run, say } from './steps.mjs';

const quick = process.argv.includes('--quick');
const results = join(ROOT, '.windrow', 'results');
const sums = { passed: 0, failed: 0 };
const faults = [];

ensureInstalled();
rmSync(results, { recursive: true, force: true });
mkdirSync(results, { recursive: true });

step('format and accessibility rules', () => run(bin('biome'), ['check', '--config-path=.biome.json', '--error-on-warnings']));
step('type-aware rules', () => run(bin('eslint'), ['-c', '.eslint.config.mjs', 'apps', 'packages', 'db', 'tests']));
step('folder directions', () => run(bin('depcruise'), ['--config', '.dependency-cruiser.cjs', '--output-type', 'err', 'apps', 'packages', 'db']));
step('types', () => run(bin('tsc'), ['--noEmit']));
suite('unit, published, API and fault tests', 'vitest.json', (file) =>
  run(bin('vitest'), ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${file}`]), readVitest);
step('build', ensureBuilt);
step('sizes', () => run(process.execPath, [join(ROOT, '.scripts/sizes.mjs')]));
if (!quick) {
  step('Chromium', ensureChromium);
  suite('journeys in a browser', 'playwright.json', (file) =>
    run(bin('playwright'), ['test', '-c', 'tests/browser/playwright.config.ts'], { env: { ...process.env, PLAYWRIGHT_JSON_OUTPUT_NAME: file } }), readPlaywright);
}

for (const fault of faults) say(`failed: ${fault}`);
process.stdout.write(`${sums.passed} passed, ${sums.failed} failed\n`);
process.exit(faults.length > 0 || sums.failed > 0 || sums.passed === 0 ? 1 : 0);

/** A check that passes or fails as one; a failure is counted, and the rest still runs. */
function step(name, act) {
  say(name);
  try {
    act();
    return true;
  } catch (error) {
    faults.push(`${name}: ${error.message}`);
    sums.failed += 1;
    return false;
  }
}

/** A runner that counts its own tests. */
function suite(name, fileName, act, read) {
  const file = join(results, fileName);
  const passed = step(name, () => act(file));
  if (!existsSync(file)) return;
  const { passed: good, failed: bad } = read(JSON.parse(readFileSync(file, 'utf8')));
  sums.passed += good;
  // The failed step was counted as one; its own count takes that place.
  sums.failed += passed ? bad : Math.max(0, bad - 1);
}

function readVitest({ numPassedTests, numFailedTests }) {
  return { passed: numPassedTests, failed: numFailedTests };
}

function readPlaywright({ stats }) {
  return { passed: stats.expected, failed: stats.unexpected + stats.flaky };
}

/** The system's Chromium; installed from Debian's packages where we may, else by Playwright. */
function ensureChromium() {
  if (existsSync('/usr/bin/chromium')) return;
  const isDebianRoot = process.getuid?.() === 0 && existsSync('/usr/bin/apt-get');
  if (isDebianRoot) {
    run('apt-get', ['update', '-qq']);
    run('apt-get', ['install', '-y', '-qq', '--no-install-recommends', 'chromium'], { env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' } });
  } else {
    run(bin('playwright'), ['install', 'chromium']);
  }
}
