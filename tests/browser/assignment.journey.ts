import type { Page } from '@playwright/test';
import {
  expect,
  expectAccessible,
  LANDSCAPE,
  PORTRAIT,
  signIn,
  test,
  WALL,
  type Windrow,
} from './windrow.ts';

async function openAssignment(page: Page, windrow: Windrow): Promise<void> {
  await signIn(page, windrow, 'charge');
  await page.getByRole('link', { name: 'Assignment' }).click();
  await expect(page.getByRole('status').filter({ hasText: /^published by/ })).toBeVisible();
}

const block = (page: Page, bed: string) => page.getByRole('button', { name: new RegExp(`^Bed ${bed},`) });
const bedsOf = (page: Page, person: string) => page.getByRole('list', { name: `Beds of ${person}` });

for (const [held, size] of [
  ['landscape', LANDSCAPE],
  ['portrait', PORTRAIT],
] as const) {
  test(`the charge therapist (${held}) moves two beds, one by drag and one by menu, and the wall follows`, async ({
    windrow,
    open,
  }) => {
    const wall = await open(windrow, WALL);
    await signIn(wall, windrow, 'display', '/wall');
    await wall.getByRole('button', { name: /Harbour ICU/ }).click();
    const tile = (bed: string) => wall.getByRole('article', { name: new RegExp(`^Bed ${bed},`) });
    await expect(tile('01')).toContainText('therapist AO');

    const desk = await open(windrow, size);
    await openAssignment(desk, windrow);
    await expectAccessible(desk);

    const from = await block(desk, '01').boundingBox();
    const to = await bedsOf(desk, 'Mirek Kolar').boundingBox();
    if (!from || !to) throw new Error('a row is not on the screen');
    await desk.mouse.move(from.x + from.width / 2, from.y + from.height / 2);
    await desk.mouse.down();
    await desk.mouse.move(to.x + 60, to.y + to.height / 2, { steps: 12 });
    await desk.mouse.up();
    await expect(bedsOf(desk, 'Mirek Kolar').getByRole('button', { name: /^Bed 01,/ })).toBeVisible();

    await expect(async () => {
      await block(desk, '15').click();
      await expect(desk.getByRole('dialog', { name: /^Bed 15/ })).toBeVisible({ timeout: 1_000 });
    }).toPass();
    await expectAccessible(desk);
    await desk.getByRole('button', { name: /^Ama Osei/ }).click();
    await expect(bedsOf(desk, 'Ama Osei').getByRole('button', { name: /^Bed 15,/ })).toBeVisible();
    // Nothing is shown to anybody before it is published.
    await expect(tile('01')).toContainText('therapist AO');

    await desk.getByRole('button', { name: /^Publish/ }).click();
    await expect(tile('01')).toContainText('therapist MK');
    await expect(tile('15')).toContainText('therapist AO');
  });
}

test('a bed is moved by keyboard alone, and undone', async ({ windrow, open }) => {
  const desk = await open(windrow, LANDSCAPE);
  await openAssignment(desk, windrow);
  await block(desk, '15').focus();
  await desk.keyboard.press('Enter');
  await desk.getByRole('button', { name: /^Tove Ravn/ }).focus();
  await desk.keyboard.press('Enter');
  await expect(bedsOf(desk, 'Tove Ravn').getByRole('button', { name: /^Bed 15,/ })).toBeVisible();
  await desk.getByRole('button', { name: 'Undo' }).press('Enter');
  await expect(
    desk.getByRole('list', { name: 'Beds that nobody has' }).getByRole('button', { name: /^Bed 15,/ }),
  ).toBeVisible();
});

test('two charge therapists at once: the second is told who was first, and neither loses a move', async ({
  windrow,
  open,
}) => {
  const [first, second] = [await open(windrow, LANDSCAPE), await open(windrow, LANDSCAPE)];
  for (const desk of [first, second]) await openAssignment(desk, windrow);

  await block(second, '15').click();
  await second.getByRole('button', { name: /^Mirek Kolar/ }).click();
  await block(first, '02').click();
  await first.getByRole('button', { name: /^Tove Ravn/ }).click();
  await first.getByRole('button', { name: /^Publish/ }).click();
  // Bed 15 is still nobody's there, and that is asked about once.
  await expect(first.getByRole('dialog')).toContainText('Nobody has bed 15');
  await first.getByRole('button', { name: 'Publish so' }).click();
  await expect(first.getByRole('status').filter({ hasText: /^published by/ })).toBeVisible();

  await second.getByRole('button', { name: /^Publish/ }).click();
  await expect(second.getByText(/Tove Ravn changed this assignment at/).first()).toBeVisible();
  await expectAccessible(second);
  await second.getByRole('button', { name: /Put mine on top/ }).click();
  await expect(bedsOf(second, 'Tove Ravn').getByRole('button', { name: /^Bed 02,/ })).toBeVisible();
  await expect(bedsOf(second, 'Mirek Kolar').getByRole('button', { name: /^Bed 15,/ })).toBeVisible();
});
