import { expect, expectAccessible, LANDSCAPE, signIn, test } from './windrow.ts';

const PASSWORD = 'a long pass phrase';

test('an empty house is set up from its first administrator to a therapist who signs in', async ({
  emptyWindrow,
  open,
}) => {
  const desk = await open(emptyWindrow, LANDSCAPE);
  await desk.goto(emptyWindrow.url);
  await expectAccessible(desk);
  await desk.getByLabel('Your name').fill('Rana Oduya');
  await desk.getByLabel('User name').fill('root');
  await desk.getByLabel('Password', { exact: true }).fill(PASSWORD);
  await desk.getByLabel('Password again').fill(PASSWORD);
  await desk.locator('button[type=submit]').click();
  await expect(desk.getByRole('heading', { name: 'Setup' })).toBeVisible();
  await expectAccessible(desk);

  await desk.getByRole('button', { name: 'Add a unit' }).first().click();
  await desk.getByRole('dialog').getByLabel('Name', { exact: true }).fill('Alder ICU');
  await desk.getByRole('dialog').getByRole('button', { name: 'Add', exact: true }).click();
  await desk.getByRole('button', { name: /^Add a bed in row 1, column 1/ }).click();
  await desk.getByRole('dialog').getByLabel('Label').fill('01');
  await desk.getByRole('dialog').getByRole('button', { name: 'Add', exact: true }).click();
  await expect(desk.getByRole('button', { name: /^Bed 01, open/ })).toBeVisible();

  await desk.getByRole('link', { name: 'People', exact: true }).click();
  await desk
    .getByRole('button', { name: /^Add (a person|somebody)/ })
    .first()
    .click();
  const person = desk.getByRole('dialog');
  await person.getByLabel('Name', { exact: true }).fill('Noor Halvorsen');
  await person.getByLabel('Initials').fill('NH');
  await person.getByLabel('User name').fill('noor');
  await person.getByLabel('First password').fill(PASSWORD);
  await expectAccessible(desk);
  await person.getByRole('button', { name: 'Add', exact: true }).click();
  await expect(desk.getByText('Noor Halvorsen').first()).toBeVisible();

  const tablet = await open(emptyWindrow, LANDSCAPE);
  await signIn(tablet, emptyWindrow, 'noor', '/', PASSWORD);
  await expect(tablet.getByRole('heading', { name: 'Round' })).toBeVisible();
  await expect(tablet.getByText(/demonstration/i)).toHaveCount(0);
});
