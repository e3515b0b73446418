import { runningAssignment } from '@windrow/ventilation/board/shown-bed';
import { Assignment, Colleague, Shift } from '@windrow/ventilation/contract/shifts';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { type House, openHouse } from '../support/house.ts';
import { listOf } from '../support/shapes.ts';
import { stored } from '../support/stored.ts';

let house: House;
beforeEach(async () => {
  house = await openHouse();
  await house.addPerson('charge2', [{ role: 'charge', unitId: house.alder.unitId }]);
});
afterEach(() => house.close());

const shiftsPath = () => `/api/units/${house.alder.unitId}/shifts`;
const on = (...names: string[]) =>
  names.map((name) => ({ personId: house.personId(name), minutesAvailable: 600 }));
const aShift = (over: object = {}) => ({
  name: 'Day',
  startsAt: house.ago(60),
  endsAt: house.ago(-660),
  people: on('therapist', 'therapist2', 'charge'),
  ...over,
});

async function makeShift(over: object = {}): Promise<Shift> {
  return (await house.as('charge').post(shiftsPath(), aShift(over))).as(Shift);
}

const given = (bed: number, name: string, cover?: string) => ({
  bedId: house.bed(house.alder, bed),
  personId: house.personId(name),
  ...(cover ? { coverPersonId: house.personId(cover) } : {}),
});
type Given = ReturnType<typeof given>;

const put = (
  who: string,
  { shiftId }: Shift,
  places: Given[],
  { version, publish = true }: { version: number; publish?: boolean },
) => house.as(who).put(`/api/shifts/${shiftId}/assignment`, { places, publish }, { version });
const readBack = async (who: string, { shiftId }: Shift) =>
  (await house.as(who).get(`/api/shifts/${shiftId}/assignment`)).as(Assignment);

/** Whose initials each bed shows now, bed by bed. */
async function shown(): Promise<(string | null)[]> {
  const { beds } = await house.board(house.alder);
  return beds.map(
    ({ assignments }) => runningAssignment(assignments, house.clock.now.getTime())?.initials ?? null,
  );
}

describe('a shift', () => {
  it('is made with the people on it, and listed latest first', async () => {
    const day = await makeShift();
    const night = await makeShift({
      name: 'Night',
      startsAt: house.ago(-660),
      endsAt: house.ago(-1380),
      people: on('therapist'),
    });
    expect(day).toMatchObject({
      unitId: house.alder.unitId,
      name: 'Day',
      version: 0,
      publishedVersion: null,
    });
    expect(day.people.map(({ displayName }) => displayName)).toEqual([
      'Person charge',
      'Person therapist',
      'Person therapist2',
    ]);
    const { items } = (await house.as('therapist').get(shiftsPath())).as(listOf(Shift));
    expect(items).toEqual([night, day]);
    const first = (await house.as('therapist').get(`${shiftsPath()}?limit=1`)).as(listOf(Shift));
    const second = (await house.as('therapist').get(`${shiftsPath()}?limit=1&cursor=${first.nextCursor}`)).as(
      listOf(Shift),
    );
    expect([...first.items, ...second.items]).toEqual([night, day]);
    expect(second.nextCursor).toBeNull();
  });

  it.each([
    ['begins in it', -600, -900],
    ['ends in it', 120, -10],
    ['lies within it', -10, -20],
    ['holds it', 120, -700],
    ['is the same', 60, -660],
  ])('is not joined by another that %s', async (_, from, to) => {
    await makeShift();
    const before = await stored(house.db);
    const reply = await house
      .as('charge2')
      .post(shiftsPath(), aShift({ name: 'Late', startsAt: house.ago(from), endsAt: house.ago(to) }));
    expect(reply.status).toBe(409);
    expect(reply.problem.detail).toContain(
      `Day runs in this unit from ${house.ago(60)} to ${house.ago(-660)}`,
    );
    expect(reply.problem.errors?.[0]?.path).toBe('startsAt');
    expect(await stored(house.db)).toEqual(before);
  });

  it('is followed by another at the very minute it ends, and runs beside those of other units', async () => {
    await makeShift();
    await makeShift({ name: 'Night', startsAt: house.ago(-660), endsAt: house.ago(-1380) });
    await makeShift({ name: 'Before', startsAt: house.ago(600), endsAt: house.ago(60) });
    const birch = { ...aShift(), people: on('birch-therapist') };
    expect((await house.as('supervisor').post(`/api/units/${house.birch.unitId}/shifts`, birch)).status).toBe(
      201,
    );
  });

  it('takes nobody who may not look after beds of the unit', async () => {
    const before = await stored(house.db);
    const reply = await house
      .as('charge')
      .post(shiftsPath(), aShift({ people: on('therapist', 'birch-therapist', 'clinician') }));
    expect(reply.status).toBe(400);
    expect(reply.problem.errors?.map(({ path }) => path)).toEqual(['people.1.personId', 'people.2.personId']);
    expect(
      (await house.as('charge').post(shiftsPath(), aShift({ people: on('therapist', 'therapist') }))).status,
    ).toBe(400);
    expect(await stored(house.db)).toEqual(before);
  });

  it('can be staffed by the unit’s therapists and charge therapists who may sign in', async () => {
    const path = `/api/people/${house.personId('therapist2')}`;
    await house.as('administrator').patch(path, { disabled: true }, { version: 1 });
    const reply = await house.as('charge').get(`/api/units/${house.alder.unitId}/colleagues`);
    const names = reply.as(listOf(Colleague)).items.map(({ displayName }) => displayName);
    expect(names).toEqual(['Person charge', 'Person charge2', 'Person therapist']);
  });
});

describe('two charge therapists at one assignment', () => {
  it('lose nothing: the second is told who was first and when, reads it, and then replaces it', async () => {
    const shift = await makeShift();
    const first = [given(0, 'therapist'), given(1, 'therapist2')];
    expect((await put('charge', shift, first, { version: 0 })).as(Assignment).version).toBe(1);
    const at = house.ago(0);
    house.later(3);

    const before = await stored(house.db);
    const refused = await put('charge2', shift, [given(2, 'therapist')], { version: 0 });
    expect(refused.status).toBe(409);
    expect(refused.problem).toMatchObject({
      type: 'urn:windrow:problem:stale-version',
      detail: expect.stringContaining(`Person charge changed it at ${at}`),
      errors: [{ path: 'If-Match', message: 'the current version is 1' }],
    });
    expect(await stored(house.db)).toEqual(before);
    expect(await shown()).toEqual(['TH', 'TH', null, null]);

    const read = await readBack('charge2', shift);
    expect(read).toMatchObject({ version: 1, changedBy: 'Person charge', changedAt: at, places: first });
    const both = [
      ...read.places.map((place) => ({ bedId: place.bedId, personId: place.personId })),
      given(2, 'charge'),
    ];
    expect((await put('charge2', shift, both, { version: read.version })).as(Assignment)).toMatchObject({
      version: 2,
      publishedVersion: 2,
      changedBy: 'Person charge2',
      places: both,
    });
    expect(await shown()).toEqual(['TH', 'TH', 'CH', null]);
  });

  it('who send in one moment are one first and one second', async () => {
    const shift = await makeShift();
    const replies = await Promise.all([
      put('charge', shift, [given(0, 'therapist')], { version: 0 }),
      put('charge2', shift, [given(0, 'therapist2')], { version: 0 }),
      put('supervisor', shift, [given(0, 'charge')], { version: 0 }),
    ]);
    expect(replies.map(({ status }) => status).sort()).toEqual([200, 409, 409]);
    const winner = replies.find(({ status }) => status === 200)?.as(Assignment);
    expect((await readBack('charge', shift)).places).toEqual(winner?.places);
  });
});

describe('an assignment', () => {
  it('as a draft shows on no bed, and leaves what was published standing', async () => {
    const shift = await makeShift();
    await put('charge', shift, [given(0, 'therapist')], { version: 0 });
    const draft = await put('charge', shift, [given(0, 'charge'), given(1, 'charge')], {
      version: 1,
      publish: false,
    });
    expect(draft.as(Assignment)).toMatchObject({ version: 2, publishedVersion: 1 });
    expect(await shown()).toEqual(['TH', null, null, null]);
    await put('charge', shift, [given(1, 'charge')], { version: 2 });
    expect(await shown()).toEqual([null, 'CH', null, null]);
  });

  it('shows on its beds from the start of its shift to its end', async () => {
    const day = await makeShift();
    const night = await makeShift({ name: 'Night', startsAt: house.ago(-660), endsAt: house.ago(-1380) });
    await put('charge', day, [given(0, 'therapist', 'charge')], { version: 0 });
    await put('charge', night, [given(0, 'charge')], { version: 0 });
    expect(await shown()).toEqual(['TH', null, null, null]);
    expect((await house.board(house.alder)).beds[0]?.assignments[0]?.coverInitials).toBe('CH');
    house.later(659);
    expect(await shown()).toEqual(['TH', null, null, null]);
    house.later(1);
    expect(await shown()).toEqual(['CH', null, null, null]);
    house.later(720);
    expect(await shown()).toEqual([null, null, null, null]);
  });

  it('leaves a bed that it does not name to nobody', async () => {
    const shift = await makeShift();
    await put('charge', shift, [given(0, 'therapist'), given(1, 'therapist')], { version: 0 });
    await put('charge', shift, [], { version: 1 });
    expect(await shown()).toEqual([null, null, null, null]);
  });

  it('takes only beds of the unit and people of the shift, and each bed once', async () => {
    const shift = await makeShift();
    const before = await stored(house.db);
    const foreign = { bedId: house.bed(house.birch, 0), personId: house.personId('therapist') };
    const wrong = await put(
      'charge',
      shift,
      [foreign, given(0, 'charge2'), given(1, 'therapist', 'charge2')],
      { version: 0 },
    );
    expect(wrong.status).toBe(400);
    expect(wrong.problem.errors?.map(({ path }) => path)).toEqual([
      'places.0.bedId',
      'places.1.personId',
      'places.2.coverPersonId',
    ]);
    const twice = await put('charge', shift, [given(0, 'therapist'), given(0, 'charge')], { version: 0 });
    expect(twice.problem.errors?.[0]).toMatchObject({
      path: 'places',
      message: 'each bed is given to one person',
    });
    expect(await stored(house.db)).toEqual(before);
  });

  it('stays with the bed when the patient goes', async () => {
    const shift = await makeShift();
    await put('charge', shift, [given(0, 'therapist')], { version: 0 });
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    await house
      .as('charge')
      .post(`/api/stays/${stayId}/transfer`, { bedId: house.bed(house.alder, 1), observedAt: house.ago(0) });
    expect(await shown()).toEqual(['TH', null, null, null]);
  });
});
