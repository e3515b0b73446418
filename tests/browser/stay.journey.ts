import { enter, openPart } from './bedside.ts';
import { expect, expectAccessible, PORTRAIT, signIn, test, WALL } from './windrow.ts';

test('a stay from admission to its end: admitted, a gas with a slip, the slip amended, moved, ended', async ({
  windrow,
  open,
}) => {
  const wall = await open(windrow, WALL);
  await signIn(wall, windrow, 'display', '/wall');
  await wall.getByRole('button', { name: /Harbour ICU/ }).click();
  const tile = (bed: string) => wall.getByRole('article', { name: new RegExp(`^Bed ${bed},`) });
  await expect(tile('04')).toContainText('empty');

  const tablet = await open(windrow, PORTRAIT);
  await signIn(tablet, windrow, 'charge');
  await tablet.getByRole('checkbox', { name: 'All beds' }).check();
  await tablet
    .getByRole('link', { name: /\b04\b/ })
    .first()
    .tap();
  await tablet.getByRole('button', { name: 'Admit to bed 04' }).tap();
  await expect(tablet.getByRole('textbox', { name: 'Hospital number' })).toHaveAttribute(
    'aria-invalid',
    'true',
  );
  await tablet.getByRole('textbox', { name: 'Hospital number' }).fill('SG-999001');
  await tablet.getByRole('textbox', { name: 'Born' }).fill('1971-02-09');
  await tablet.getByRole('textbox', { name: 'Family name' }).fill('Papadimitriou-Featherstonehaugh');
  await tablet.getByRole('textbox', { name: 'Given name' }).fill('Konstantina');
  await tablet.getByRole('radio', { name: 'Female' }).check();
  await tablet.getByRole('textbox', { name: 'Height, cm' }).fill('165');
  await expectAccessible(tablet);
  await tablet.getByRole('button', { name: 'Admit to bed 04' }).tap();
  await expect(tablet.getByText('Bed 04', { exact: true })).toBeVisible();
  await expect(tile('04')).toContainText('no check yet');
  // A name is on the tablet, and never on the wall.
  await expect(tablet.getByRole('main')).toContainText('Papadimitriou-Featherstonehaugh');
  await expect(wall.locator('body')).not.toContainText('Papadimitriou');

  await openPart(tablet, 'Gas');
  await tablet.getByRole('radio', { name: 'Arterial' }).check();
  await enter(tablet, 'pH', '7.12');
  await enter(tablet, 'PCO2', '41');
  await enter(tablet, 'PO2', '80');
  await tablet.getByRole('button', { name: 'Review and record' }).tap();
  await tablet.getByRole('button', { name: /^Record/ }).tap();
  await expect(tablet.getByRole('status').filter({ hasText: /Recorded/ })).toBeVisible();
  await expect(tile('04')).toContainText('7.12');

  await openPart(tablet, 'Record');
  await tablet
    .getByRole('link', { name: /^Amend/ })
    .first()
    .tap();
  await tablet.getByRole('textbox', { name: /^Why it is amended/ }).fill('typed 7.12 for 7.42');
  await enter(tablet, 'pH', '7.42');
  await expectAccessible(tablet);
  await tablet.getByRole('button', { name: /^Review/ }).tap();
  await tablet.getByRole('button', { name: 'Amend', exact: true }).tap();
  await expect(tile('04')).toContainText('7.42');
  await openPart(tablet, 'Record');
  await expect(tablet.getByRole('main')).toContainText('7.12');
  await expect(tablet.getByRole('main')).toContainText('typed 7.12 for 7.42');

  await openPart(tablet, 'Now');
  await tablet.getByRole('link', { name: 'End the stay' }).tap();
  await tablet.getByRole('radio', { name: 'To a ward' }).check();
  await tablet.getByRole('button', { name: 'Review and end the stay' }).tap();
  await expectAccessible(tablet);
  await tablet.getByRole('button', { name: 'End the stay', exact: true }).tap();
  await expect(tile('04')).toContainText('empty');
});
