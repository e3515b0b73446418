import { asBefore, enter, openBed, openPart } from './bedside.ts';
import { expect, expectAccessible, LANDSCAPE, signIn, test } from './windrow.ts';

test('a value of the bed opens its method note with the numbers that made it', async ({ windrow, open }) => {
  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '01');
  const value = tablet.getByRole('link', { name: /how Vt per kg is worked out/ });
  const shown = Number(await value.textContent());
  await value.tap();

  await expect(tablet.getByRole('heading', { name: 'Tidal volume per kg', level: 1 })).toBeVisible();
  const result = tablet.getByRole('status', { name: 'Result' });
  await expect(result).toContainText('mL/kg');
  const worked = Number(/[\d.]+/.exec((await result.textContent()) ?? '')?.[0]);
  expect(worked.toFixed(1)).toBe(shown.toFixed(1));
  // Numbers alone: nothing in the address tells of a patient or a bed.
  expect(new URL(tablet.url()).search).toMatch(/^\?tidalVolumeMl=[\d.]+&predictedBodyWeightKg=[\d.]+$/);
  await expectAccessible(tablet);

  const volume = tablet.getByRole('textbox', { name: 'Exhaled tidal volume' });
  const weight = Number(await tablet.getByRole('textbox', { name: /body weight/ }).inputValue());
  await volume.fill('600');
  await expect(result).toContainText(String(Number((600 / weight).toPrecision(15))));

  await volume.fill('6000');
  await expect(tablet.getByText('tidalVolumeMl must be a number from 1 to 3000, not 6000')).toBeVisible();
  await expect(volume).toHaveAttribute('aria-invalid', 'true');
  await expect(result).toContainText('No result from these numbers.');
  await expectAccessible(tablet);

  await tablet.getByRole('button', { name: 'Back to the numbers of the value' }).tap();
  await expect(result).toContainText(String(worked));
  await tablet.getByRole('button', { name: 'Back', exact: true }).tap();
  await expect(value).toBeVisible();
});

test('a note opened from a half-filled form gives the form back as it was left', async ({
  windrow,
  open,
}) => {
  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '01');
  await openPart(tablet, 'Check');
  for (const field of ['Tidal volume set', 'Rate set', 'PEEP']) await asBefore(tablet, field);
  await enter(tablet, 'Exhaled Vt', '437');
  await tablet
    .getByRole('link', { name: /how Vt per kg is worked out/ })
    .first()
    .tap();
  await expect(tablet.getByRole('textbox', { name: 'Exhaled tidal volume' })).toHaveValue('437');
  await tablet.getByRole('button', { name: 'Back', exact: true }).tap();
  await expect(tablet.getByRole('textbox', { name: /^Exhaled Vt/ })).toHaveValue('437');
  await expect(tablet.getByRole('textbox', { name: /^PEEP/ })).not.toHaveValue('');
});

test('everybody finds the notes in their menu, by subject and by search', async ({ windrow, open }) => {
  for (const username of ['biomed', 'clinician', 'admin']) {
    const tablet = await open(windrow, LANDSCAPE);
    await signIn(tablet, windrow, username);
    await tablet.getByRole('button', { name: /^Menu of/ }).tap();
    await tablet.getByRole('menuitem', { name: 'Method notes' }).tap();
    await expect(tablet.getByRole('heading', { name: 'Method notes' })).toBeVisible();
    await expect(tablet.getByRole('heading', { name: 'Mechanics' })).toBeVisible();
  }
  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist', '/notes');
  await expectAccessible(tablet);
  await tablet.getByRole('searchbox', { name: 'Search the notes' }).fill('winters');
  await tablet.getByRole('link', { name: /Expected PaCO2/ }).tap();
  await tablet.getByRole('textbox', { name: 'Bicarbonate' }).fill('12');
  await expect(tablet.getByRole('status', { name: 'Result' })).toContainText('26');
  await tablet.getByRole('link', { name: 'All method notes' }).tap();
  await tablet.getByRole('searchbox', { name: 'Search the notes' }).fill('no such calculation');
  await expect(tablet.getByText('No note has “no such calculation” in it')).toBeVisible();
  await tablet.goto(`${windrow.url}/notes/ventilatorEvents`);
  await expect(tablet.getByRole('status', { name: 'Result' })).toContainText('onset 2026-03-03');
  await tablet.getByRole('textbox', { name: /List of the days/ }).fill('[{');
  await expect(tablet.getByText('days must be written as JSON; this cannot be read as it')).toBeVisible();
  await tablet.goto(`${windrow.url}/notes/noSuchThing`);
  await expect(tablet.getByText('There is no method note “noSuchThing”')).toBeVisible();
});
