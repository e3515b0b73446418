import { asBefore, enter, openBed, openPart } from './bedside.ts';
import { expect, expectAccessible, LANDSCAPE, PORTRAIT, signIn, test } from './windrow.ts';

test('impossible values are refused at their field in words, and nothing typed is lost', async ({
  windrow,
  open,
}) => {
  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '01');
  await openPart(tablet, 'Check');
  for (const field of ['Tidal volume set', 'Rate set', 'PEEP']) await asBefore(tablet, field);
  await enter(tablet, 'Oxygen (FiO2)', '101');
  await enter(tablet, 'Peak pressure', '30');
  await enter(tablet, 'Plateau', '34');
  await tablet.getByRole('button', { name: 'Review and record' }).tap();
  const alert = tablet.getByRole('alert');
  await expect(alert).toContainText('Oxygen (FiO2) must be 21 to 100 %, or 0.21 to 1.0, not 101');
  await expect(alert).toContainText('Plateau must be at most the peak pressure, 30 cmH2O, not 34');
  await expect(tablet.getByRole('textbox', { name: /^Plateau/ })).toHaveValue('34');
  await expectAccessible(tablet);
});

test('oxygen typed as 0.4 is understood as 40 %', async ({ windrow, open }) => {
  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '01');
  await openPart(tablet, 'Check');
  await enter(tablet, 'Oxygen (FiO2)', '0.4');
  await expect(tablet.getByRole('region', { name: 'Keypad for Oxygen (FiO2)' })).toContainText('40');
});

test('a number typed into a field that holds one replaces it', async ({ windrow, open }) => {
  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '01');
  await openPart(tablet, 'Check');
  await enter(tablet, 'Peak pressure', '39');
  await enter(tablet, 'Plateau', '28');
  await enter(tablet, 'Peak pressure', '33');
  await expect(tablet.getByRole('textbox', { name: /^Peak pressure/ })).toHaveValue('33');
});

test('with the network gone the entry stays, says so, and is stored once when it is back', async ({
  windrow,
  open,
}) => {
  const tablet = await open(windrow, PORTRAIT);
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '02');
  await openPart(tablet, 'Airway');
  await enter(tablet, 'Depth', '23');
  await enter(tablet, 'Cuff pressure', '27');
  await tablet.getByRole('button', { name: 'Review and record' }).tap();
  await tablet.context().setOffline(true);
  await tablet.getByRole('button', { name: /^Record/ }).tap();
  await expect(tablet.getByText('Not recorded yet: the server does not answer')).toBeVisible({
    timeout: 40_000,
  });
  await tablet.context().setOffline(false);
  await tablet.getByRole('button', { name: 'Send again now' }).tap();
  await expect(tablet.getByRole('status').filter({ hasText: /Recorded/ })).toBeVisible();
  await openPart(tablet, 'Record');
  await expect(tablet.getByText(/Cuff pressure 27\scmH2O/)).toHaveCount(1);
});
