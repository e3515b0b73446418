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
  await enter(tablet, 'Cuff pressure', '22');
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
  await expect(tablet.getByText(/Cuff pressure 22\scmH2O/)).toHaveCount(1);
});

test('an entry that is stopped while the network is gone is never sent by itself, and the changed one once', async ({
  windrow,
  open,
}) => {
  const tablet = await open(windrow, PORTRAIT);
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '02');
  await openPart(tablet, 'Airway');
  await enter(tablet, 'Cuff pressure', '22');
  await tablet.getByRole('button', { name: 'Review and record' }).tap();
  await expect(tablet.getByRole('button', { name: 'Back to the values' })).toBeVisible();
  await tablet.context().setOffline(true);
  await tablet.getByRole('button', { name: /^Record/ }).tap();
  await expect(tablet.getByText('Not recorded yet: the server does not answer')).toBeVisible({
    timeout: 40_000,
  });
  await expect(tablet.getByRole('button', { name: 'Back to the values' })).toBeHidden();
  await expectAccessible(tablet);
  await tablet.getByRole('button', { name: 'Stop sending and change' }).tap();
  const warning = tablet.getByText('The first try may have been recorded');
  await expect(warning).toBeInViewport();

  const sent: string[] = [];
  tablet.on('request', (request) => {
    if (request.method() === 'POST') sent.push(request.postData() ?? '');
  });
  await tablet.context().setOffline(false);
  // Longer than the pause after which an entry that was not stopped is sent again.
  await tablet.waitForTimeout(10_000);
  expect(sent).toEqual([]);

  await enter(tablet, 'Cuff pressure', '30');
  await tablet.getByRole('button', { name: 'Review and record' }).tap();
  await expect(warning).toBeVisible();
  await tablet.getByRole('button', { name: /^Record/ }).tap();
  await expect(tablet.getByRole('status').filter({ hasText: /Recorded/ })).toBeVisible();
  expect(sent).toHaveLength(1);
  await openPart(tablet, 'Record');
  await expect(tablet.getByText(/Cuff pressure 30\scmH2O/)).toHaveCount(1);
  await expect(tablet.getByText(/Cuff pressure 22\scmH2O/)).toHaveCount(0);
});

test('all settings are as before by one press, what is changed stays changed, and what leaves the board is told', async ({
  windrow,
  open,
}) => {
  const tablet = await open(windrow, { width: 390, height: 844 });
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '01');
  for (const part of ['Now', 'Check', 'Airway', 'Gas', 'Happening', 'Record'])
    await expect(
      tablet.getByRole('navigation', { name: /^Bed / }).getByRole('link', { name: part }),
    ).toBeInViewport({ ratio: 1 });
  await openPart(tablet, 'Check');
  await enter(tablet, 'Oxygen (FiO2)', '55');
  await tablet.getByRole('button', { name: 'Other settings as before' }).tap();
  await expect(tablet.getByRole('button', { name: 'Other settings as before' })).toBeHidden();
  await expect(tablet.getByRole('textbox', { name: /^Oxygen/ })).toHaveValue('55');
  await expectAccessible(tablet);
  await tablet.getByRole('button', { name: 'Review and record' }).tap();
  await expect(tablet.getByText(/no longer shown on the board after this check/)).toBeVisible();
  await expectAccessible(tablet);
  await tablet.getByRole('button', { name: /^Record/ }).tap();
  await expect(tablet.getByRole('status').filter({ hasText: /Recorded/ })).toBeVisible();
});
