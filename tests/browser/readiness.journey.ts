import { SCREEN_ANSWERS } from '../../packages/ventilation/src/readiness/screen-answers.ts';
import { openBed, openPart } from './bedside.ts';
import { expect, expectAccessible, LANDSCAPE, signIn, test, WALL } from './windrow.ts';

const BED = '09';

test('a patient is screened, tried and fails by a published criterion, seen in the record and on the wall', async ({
  windrow,
  open,
}) => {
  const wall = await open(windrow, WALL);
  await signIn(wall, windrow, 'display', '/wall');
  await wall.getByRole('button', { name: /Harbour ICU/ }).click();
  const tile = wall.getByRole('article', { name: new RegExp(`^Bed ${BED},`) });
  await expect(tile).toBeVisible();
  await expect(tile).not.toContainText('Ready to try');

  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist');
  await tablet.getByRole('checkbox', { name: 'All beds' }).check();
  await openBed(tablet, BED);
  await openPart(tablet, 'Readiness');
  const due = tablet.getByRole('region', { name: 'Due today' });
  await expect(due).toContainText('The readiness screen: none stands now');
  const screen = tablet.getByRole('region', { name: 'Readiness screen' });
  await expect(screen).toContainText('not screened');
  await expectAccessible(tablet);

  await tablet.getByRole('button', { name: 'Screen now' }).tap();
  for (const item of Object.values(SCREEN_ANSWERS)) {
    await tablet.getByRole('group', { name: item }).getByRole('radio', { name: 'Yes' }).check();
  }
  await expectAccessible(tablet);
  await tablet.getByRole('button', { name: 'Record the screen' }).tap();
  await expect(screen).toContainText('Every needed item is met');
  await expect(tile).toContainText('Ready to try');

  await tablet.getByRole('button', { name: 'Start a trial' }).tap();
  await tablet.getByRole('button', { name: 'Start the trial' }).tap();
  await expect(tablet.getByText('Choose what it is made on')).toBeVisible();
  await tablet.getByRole('radio', { name: 'Pressure support' }).check();
  await tablet.getByRole('radio', { name: '30 min', exact: true }).check();
  await expectAccessible(tablet);
  await tablet.getByRole('button', { name: 'Start the trial' }).tap();
  const trial = tablet.getByRole('region', { name: 'Breathing trial' });
  await expect(trial).toContainText('0 min of 30 planned · on Pressure support');
  await expect(tile).toContainText('On trial 0 min');
  await expect(tile).not.toContainText('Ready to try');

  await trial.getByRole('button', { name: 'Failed' }).tap();
  await trial.getByRole('button', { name: 'Record as failed' }).tap();
  await expect(trial.getByText('Tick a criterion, or say why in words')).toBeVisible();
  await trial.getByRole('checkbox', { name: /^Rate above 35/ }).check();
  await expectAccessible(tablet);
  await trial.getByRole('button', { name: 'Record as failed' }).tap();
  const past = tablet.getByRole('region', { name: 'Past trials' });
  await expect(past).toContainText('Failed');
  await expect(past).toContainText('Rate above 35 /min, or up by half');
  await expect(due).toContainText('The next screen, from');
  await expect(tile).not.toContainText('On trial');
  await expect(tile).not.toContainText('Ready to try');

  await openPart(tablet, 'Record');
  const record = tablet.getByRole('region', { name: 'Record' });
  await expect(record).toContainText('Breathing trial failed');
  await expect(record).toContainText('Criteria met: Rate above 35 /min, or up by half');
  await expect(record).toContainText('Screened for readiness');
});

test('the aids reckon from what is current, say what is missing, and follow a target', async ({
  windrow,
  open,
}) => {
  const tablet = await open(windrow, LANDSCAPE);
  await signIn(tablet, windrow, 'therapist');
  await openBed(tablet, '01');
  await openPart(tablet, 'Aids');
  const ladders = tablet.getByRole('region', { name: 'PEEP and oxygen ladders' });
  await expect(ladders).toContainText('Next step up');
  const rate = tablet.getByRole('region', { name: 'Rate for a target PaCO2' });
  const before = await rate.getByText('/min expected').textContent();
  await rate.getByRole('button', { name: 'Target one lower' }).tap();
  await expect(rate.getByText('/min expected')).not.toHaveText(before ?? '');
  const murray = tablet.getByRole('region', { name: 'Lung injury score (Murray)' });
  await expect(murray).toContainText('the quadrants of the film');
  await murray.getByRole('radio', { name: '2' }).check();
  await expect(murray).toContainText('of 4 points');
  await expect(tablet.getByRole('region', { name: 'HACOR, on a mask' })).toContainText(
    'it is for mask ventilation',
  );
  await ladders.getByText('How and from what').tap();
  await expect(ladders).toContainText('Source: ARDS Network');
  await expectAccessible(tablet);
});
