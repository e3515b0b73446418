import type { Page } from '@playwright/test';
import { enter, openBed, openPart } from './bedside.ts';
import { expect, expectAccessible, LANDSCAPE, PORTRAIT, signIn, test, WALL } from './windrow.ts';

const FLAG = 'Vt limit missing';
const NOTE = 'Alarm is set on the ventilator, missed in the check';

/** A check in pressure control: a high pressure limit is written down, and no limit of volume. */
async function recordUnguarded(tablet: Page, vtExhaledMl: string): Promise<void> {
  await openPart(tablet, 'Check');
  await tablet
    .getByLabel('Mode', { exact: true })
    .selectOption({ label: 'AC/PC · Assist-control, pressure' });
  await enter(tablet, 'Pressure above PEEP', '15');
  await enter(tablet, 'Rate set', '18');
  await enter(tablet, 'PEEP', '8');
  await enter(tablet, 'Oxygen (FiO2)', '40');
  await enter(tablet, 'Exhaled Vt', vtExhaledMl);
  await enter(tablet, 'Plateau', '22');
  await enter(tablet, 'High pressure limit', '40');
  await tablet.getByRole('button', { name: 'Review and record' }).tap();
  await tablet.getByRole('button', { name: /^Record/ }).tap();
  await expect(tablet.getByRole('status').filter({ hasText: /Recorded/ })).toBeVisible();
  await openPart(tablet, 'Now');
}

for (const [held, size] of [
  ['landscape', LANDSCAPE],
  ['portrait', PORTRAIT],
] as const) {
  test(`a pressure mode without a low volume limit is flagged until acknowledged, and again when it changes (${held})`, async ({
    windrow,
    open,
  }) => {
    const wall = await open(windrow, WALL);
    await signIn(wall, windrow, 'display', '/wall');
    await wall.getByRole('button', { name: /Harbour ICU/ }).click();
    const tile = wall.getByRole('article', { name: /^Bed 01,/ });
    await expect(tile).toBeVisible();
    await expect(tile).not.toContainText(FLAG);

    const tablet = await open(windrow, size);
    await signIn(tablet, windrow, 'therapist');
    await openBed(tablet, '01');
    await recordUnguarded(tablet, '420');
    await expect(tile).toContainText(FLAG);

    const flags = tablet.getByRole('region', { name: 'Flags' });
    await expect(flags).toContainText('no low exhaled Vt limit');
    await flags.getByRole('button', { name: `Acknowledge: ${FLAG}` }).tap();
    await expect(flags).toContainText('comes back when its values change');
    await flags.getByRole('button', { name: 'Save note' }).tap();
    await expect(flags).toContainText('A note of at least 3 letters is needed');
    await expectAccessible(tablet);
    await flags.getByLabel(/^Note/).fill(NOTE);
    await flags.getByRole('button', { name: 'Save note' }).tap();

    // Quiet on the wall and not gone: the tablet says who has seen it, when and why.
    await expect(tile).not.toContainText(FLAG);
    await expect(tile).toContainText('1 seen');
    await expect(tile).not.toContainText(NOTE);
    await expect(flags.getByRole('heading', { name: 'Acknowledged' })).toBeVisible();
    await expect(flags).toContainText(NOTE);
    await expect(flags.getByRole('button', { name: `Acknowledge: ${FLAG}` })).toHaveCount(0);
    await expectAccessible(tablet);
    await expectAccessible(wall);

    await recordUnguarded(tablet, '420');
    await expect(flags.getByRole('heading', { name: 'Acknowledged' })).toBeVisible();
    await expect(tile).not.toContainText(FLAG);

    await recordUnguarded(tablet, '380');
    await expect(tile).toContainText(FLAG);
    await expect(tile).not.toContainText('1 seen');
    await expect(flags.getByRole('button', { name: `Acknowledge: ${FLAG}` })).toBeVisible();

    await openPart(tablet, 'Record');
    await expect(tablet.getByRole('heading', { name: 'Flag acknowledged' })).toHaveCount(1);
    await expect(tablet.getByText(NOTE)).toBeVisible();
  });
}

test('a plateau counts for nothing until somebody says that the patient was passive', async ({
  windrow,
  open,
}) => {
  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '01');
  await recordUnguarded(tablet, '420');
  const check = tablet.getByRole('region', { name: 'Check', exact: true });
  await expect(check.getByText('passive? not recorded', { exact: true })).toBeVisible();
  await expect(check).not.toContainText('Driving pressure');
  await openPart(tablet, 'Check');
  await enter(tablet, 'Plateau', '24');
  const passive = tablet.getByRole('group', { name: 'Patient passive (no effort)' });
  await passive.getByRole('radio', { name: 'Yes' }).tap();
  await expect(tablet.getByRole('complementary', { name: /^Keypad/ })).not.toContainText('passive?');
  await expectAccessible(tablet);
});
