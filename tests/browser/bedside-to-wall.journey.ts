import { asBefore, enter, openBed, openPart } from './bedside.ts';
import { expect, expectAccessible, LANDSCAPE, PORTRAIT, signIn, test, WALL } from './windrow.ts';

const FLAGGED = 'Vt 9.4 mL/kg';

for (const [held, size] of [
  ['landscape', LANDSCAPE],
  ['portrait', PORTRAIT],
] as const) {
  test(`a check recorded on the tablet (${held}) raises its flag on the wall without a reload`, async ({
    windrow,
    open,
  }) => {
    const wall = await open(windrow, WALL);
    await signIn(wall, windrow, 'display', '/wall');
    await wall.getByRole('button', { name: /Harbour ICU/ }).click();
    const tile = wall.getByRole('article', { name: /^Bed 01,/ });
    await expect(tile).toBeVisible();
    await expect(tile).not.toContainText(FLAGGED);
    await expectAccessible(wall);
    await wall.evaluate(() => Object.assign(window, { sameDocument: true }));

    const tablet = await open(windrow, size);
    await signIn(tablet, windrow, 'therapist');
    await expectAccessible(tablet);
    await openBed(tablet, '01');
    await expectAccessible(tablet);
    await openPart(tablet, 'Check');
    for (const field of ['Tidal volume set', 'Rate set', 'PEEP']) await asBefore(tablet, field);
    await enter(tablet, 'Oxygen (FiO2)', '55');
    await enter(tablet, 'Exhaled Vt', '560');
    await enter(tablet, 'Peak pressure', '36');
    await enter(tablet, 'Plateau', '28');
    await expectAccessible(tablet);
    await tablet.getByRole('button', { name: 'Review and record' }).tap();
    await expect(tablet.getByRole('main')).toContainText('560');
    await expectAccessible(tablet);
    await tablet.getByRole('button', { name: /^Record/ }).tap();
    await expect(tablet.getByRole('status').filter({ hasText: /Recorded/ })).toBeVisible();

    await expect(tile).toContainText(FLAGGED);
    await expect(tile).toContainText('55');
    expect(await wall.evaluate(() => 'sameDocument' in window)).toBe(true);
  });
}

test('when the server is killed the wall says so over everything, and heals with the value there', async ({
  windrow,
  open,
}) => {
  const wall = await open(windrow, WALL);
  await signIn(wall, windrow, 'display', '/wall');
  await wall.getByRole('button', { name: /Harbour ICU/ }).click();
  const tile = wall.getByRole('article', { name: /^Bed 01,/ });
  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '01');
  await openPart(tablet, 'Airway');
  await enter(tablet, 'Cuff pressure', '29');
  await tablet.getByRole('button', { name: 'Review and record' }).tap();
  await tablet.getByRole('button', { name: /^Record/ }).tap();
  await expect(tile).toContainText('cuff 29 cmH2O');

  await windrow.kill();
  await expect(wall.getByText(/Not live since \d\d:\d\d:\d\d/)).toBeVisible({ timeout: 20_000 });
  await expectAccessible(wall);

  await windrow.resume();
  await expect(wall.getByText(/Not live since/)).toBeHidden({ timeout: 20_000 });
  await expect(wall.getByText('live', { exact: true })).toBeVisible();
  await expect(tile).toContainText('cuff 29 cmH2O');
});
