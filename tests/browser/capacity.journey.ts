import { openBed } from './bedside.ts';
import { expect, expectAccessible, LANDSCAPE, PORTRAIT, signIn, test } from './windrow.ts';

const PHONE = { width: 390, height: 844 };

test('the free count goes down when a machine is taken into use at a bed, without a reload', async ({
  windrow,
  open,
}) => {
  const house = await open(windrow, PORTRAIT);
  await signIn(house, windrow, 'supervisor');
  const answer = house.getByRole('heading', { level: 2, name: /adult ventilators are ready/ });
  await expect(answer).toContainText('Yes. 6 adult ventilators are ready');
  await expectAccessible(house);

  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist');
  await tablet.getByRole('checkbox', { name: 'All beds' }).check();
  await openBed(tablet, '16');
  const machine = await tablet.getByRole('option', { name: /^SG-V030/ }).getAttribute('value');
  await tablet.getByRole('combobox', { name: 'Ready machines' }).selectOption(machine);
  await tablet.getByRole('button', { name: 'Take into use' }).tap();
  await expect(tablet.getByRole('status').filter({ hasText: 'SG-V030 is in use at bed 16' })).toBeVisible();
  await expect(answer).toContainText('Yes. 5 adult ventilators are ready');
});

test('the supervisor moves a machine on from cleaning, on a phone', async ({ windrow, open }) => {
  const phone = await open(windrow, PHONE);
  await signIn(phone, windrow, 'supervisor');
  await expectAccessible(phone);
  await phone.getByRole('link', { name: 'Every machine' }).tap();
  await phone.getByRole('combobox', { name: 'State' }).selectOption('cleaning');
  await phone
    .getByRole('button', { name: /Adult intensive care/ })
    .first()
    .tap();
  await expectAccessible(phone);
  await phone.getByRole('radio', { name: 'ready' }).check();
  await phone.getByRole('button', { name: 'Record: ready' }).tap();
  await expect(phone.getByRole('dialog')).toBeHidden();
  await phone.getByRole('link', { name: 'House' }).tap();
  await expect(
    phone.getByRole('heading', { level: 2, name: /^Yes\. 7 adult ventilators are ready/ }),
  ).toBeVisible();
});
