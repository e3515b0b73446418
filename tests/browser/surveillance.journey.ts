import type { APIRequestContext, Page } from '@playwright/test';
import { enter, openBed } from './bedside.ts';
import { expect, expectAccessible, LANDSCAPE, PORTRAIT, signIn, test, type Windrow } from './windrow.ts';

const PHONE = { width: 390, height: 844 };
const DAY_MS = 86_400_000;

async function openSurveillance(page: Page): Promise<void> {
  await page.getByRole('navigation', { name: /^Bed / }).getByRole('link', { name: 'Surveillance' }).tap();
  await expect(page.getByText('A screening aid, not a diagnosis')).toBeVisible();
}

/** The row of a day of the table, counted from 1; its head stands above it. */
const rowOf = (page: Page, caption: string, day: number) =>
  page.getByRole('table', { name: caption }).getByRole('row').nth(day);

test('a list of day minima that is typed in shows its event in the day table, with the reason', async ({
  windrow,
  open,
}) => {
  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '01');
  await openSurveillance(tablet);
  await tablet.getByLabel('PEEP by day').fill('6, 6, 9, 10');
  await tablet.getByLabel('FiO2 by day').fill('40, 0.4, 40, 40');

  await expect(tablet.getByRole('status').filter({ hasText: 'One event in 4 days.' })).toBeVisible();
  const onset = rowOf(tablet, 'Days of the typed list', 3);
  await expect(onset).toContainText('PEEP, event onset');
  await expect(onset).toContainText('PEEP 9 cmH2O is 3 above the first baseline day’s 6');
  await expect(rowOf(tablet, 'Days of the typed list', 1)).toContainText('First baseline day');
  await expectAccessible(tablet);

  await tablet.getByLabel('PEEP by day').fill('6, 6, 9, 8');
  await expect(tablet.getByRole('status').filter({ hasText: 'No event in 4 days.' })).toBeVisible();
  await expect(onset).toContainText('the next day’s 8 is not: one day alone is no event');

  await tablet.getByLabel('PEEP by day').fill('6, 60');
  await expect(tablet.getByText('PEEP of day 2 must be 0 to 40 cmH2O, not 60.')).toBeVisible();
});

test('two worsening days recorded late at the bedside show their event, and signs entered by hand its second tier', async ({
  windrow,
  open,
}) => {
  const tablet = await open(windrow, PORTRAIT);
  await signIn(tablet, windrow, 'charge');
  await expect(tablet.getByRole('checkbox', { name: 'All beds' })).toBeVisible();
  const { stayId, unitId, bedId, label } = await emptyBedTaken(tablet.request, windrow);
  const today = Date.now();
  for (const [daysAgo, peepCmH2O] of [
    [5, 5],
    [4, 5],
    [3, 8],
    [2, 9],
    [1, 9],
  ] as const) {
    const observedAt = new Date(today - daysAgo * DAY_MS).toISOString();
    await post(tablet.request, windrow, `/api/stays/${stayId}/checks`, {
      observedAt,
      mode: 'ac-vc',
      settings: { vtSetMl: 400, rateSetPerMin: 16, peepCmH2O, fio2Percent: 40 },
    });
  }
  await tablet.goto(`${windrow.url}/beds/${unitId}/${bedId}/surveillance`);

  await expect(tablet.getByText(`Bed ${label}`, { exact: true })).toBeVisible();
  const onset = rowOf(tablet, 'Days of ventilation', 3);
  await expect(onset).toContainText('PEEP, event onset');
  await expect(onset).toContainText('PEEP 8 cmH2O is 3 above the first baseline day’s 5');
  await expect(tablet.getByText('Infection-related (IVAC): not met so far')).toBeVisible();
  await expect(tablet.getByText(/no temperature and no white cells are entered/)).toBeVisible();

  await tablet.getByRole('link', { name: 'Enter Antimicrobial day' }).tap();
  await tablet.getByLabel('Agent').fill('meropenem');
  await tablet.getByLabel('Given on').fill(dayAgo(today, 3));
  await tablet.getByRole('button', { name: 'Review and record' }).tap();
  await tablet.getByRole('button', { name: 'Record', exact: true }).tap();
  await expect(tablet.getByRole('status').filter({ hasText: /Recorded/ })).toBeVisible();
  for (const daysAgo of [2, 1, 0]) {
    await tablet.getByRole('button', { name: /^meropenem also given on/ }).tap();
    await expect(tablet.getByText(new RegExp(`Antimicrobial days: ${4 - daysAgo} of the 4`))).toHaveCount(
      daysAgo === 0 ? 0 : 1,
    );
  }

  await tablet.getByRole('link', { name: 'Enter Temperature' }).tap();
  await enter(tablet, 'Temperature', '38.6');
  await tablet.getByRole('button', { name: 'Review and record' }).tap();
  await tablet.getByRole('button', { name: 'Record', exact: true }).tap();
  await expect(tablet.getByRole('heading', { name: 'Signs of infection and treatment days' })).toBeVisible();
  await expect(tablet.getByText(/^38\.6 °C on/)).toBeVisible();
  await expectAccessible(tablet);

  // By its address, also from a phone, and after the stay has ended.
  await post(tablet.request, windrow, `/api/stays/${stayId}/discharge`, {
    outcome: 'ward',
    observedAt: new Date().toISOString(),
  });
  await tablet.setViewportSize(PHONE);
  await tablet.goto(`${windrow.url}/surveillance/${stayId}`);
  await expect(tablet.getByRole('heading', { name: /Surveillance: Varga, Ilse/ })).toBeVisible();
  await expect(tablet.getByText(/The stay ended on/)).toBeVisible();
  await expect(tablet.getByRole('link', { name: /^Enter/ })).toHaveCount(0);
  const overflow = await tablet.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(overflow).toBeLessThanOrEqual(0);
  await expectAccessible(tablet);
});

function dayAgo(now: number, days: number): string {
  return new Intl.DateTimeFormat('en-CA', { timeZone: 'Europe/London' }).format(now - days * DAY_MS);
}

async function post(request: APIRequestContext, windrow: Windrow, path: string, data: object) {
  const reply = await request.post(`${windrow.url}${path}`, {
    data,
    headers: { 'Idempotency-Key': crypto.randomUUID(), Origin: windrow.url },
  });
  expect(reply.status(), await reply.text()).toBeLessThan(300);
  return reply.json();
}

/** A stay of our own in a bed that stood empty, six days old, so that no demo fact mixes in. */
async function emptyBedTaken(request: APIRequestContext, windrow: Windrow) {
  const { items } = await (await request.get(`${windrow.url}/api/units`)).json();
  for (const { unitId } of items) {
    const board = await (await request.get(`${windrow.url}/api/units/${unitId}/board`)).json();
    const bed = board.beds.find((one: { stay: unknown; isOpen: boolean }) => one.stay === null && one.isOpen);
    if (!bed) continue;
    const { stay } = await post(request, windrow, '/api/stays', {
      bedId: bed.bedId,
      observedAt: new Date(Date.now() - 6 * DAY_MS).toISOString(),
      patient: {
        hospitalNumber: 'SG-778001',
        familyName: 'Varga',
        givenName: 'Ilse',
        bornOn: '1961-03-04',
        sex: 'female',
        heightCm: 165,
      },
      difficultAirway: false,
      precautions: null,
      careLimits: null,
      orders: { checkEveryMinutes: null, gasEveryMinutes: null },
    });
    return { stayId: stay.stayId, unitId, bedId: bed.bedId, label: bed.label };
  }
  throw new Error('no bed is empty');
}
