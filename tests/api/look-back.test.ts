import type { Board } from '@windrow/ventilation/contract/board';
import { Shift } from '@windrow/ventilation/contract/shifts';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { aCheck, aGas, anAdmission } from '../support/entries.ts';
import { type House, openHouse } from '../support/house.ts';

let house: House;
beforeEach(async () => {
  house = await openHouse();
});
afterEach(() => house.close());

const lookBack = (at: string) => house.board(house.alder, 'therapist', `?at=${encodeURIComponent(at)}`);

/** The beds of a board without the numbers of the live sequence. */
function pictures({ beds }: Board) {
  return beds.map(({ revision: _revision, ...bed }) => bed);
}

describe('looking back', () => {
  it('shows what the board showed, and not what was recorded later about that time', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    await house.record(stayId, 'checks', aCheck(house.ago(30)));
    const then = { at: house.ago(0), board: await house.board(house.alder) };
    house.later(20);
    await house.record(stayId, 'checks', aCheck(house.ago(25), { settings: { peepCmH2O: 14 } }));
    await house.record(stayId, 'gases', aGas(house.ago(40)));
    expect((await house.board(house.alder)).beds[0]?.stay?.check?.settings.peepCmH2O).toBe(14);
    const back = await lookBack(then.at);
    expect(back).toMatchObject({ at: then.at, serverTime: house.ago(0) });
    expect(pictures(back)).toEqual(pictures(then.board));
  });

  it('ages what it shows to the minute that is looked at', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    await house.record(stayId, 'checks', aCheck(house.ago(0)));
    house.later(600);
    expect((await house.board(house.alder)).beds[0]?.stay?.check).toBeNull();
    expect((await lookBack(house.ago(121))).beds[0]?.stay?.check).not.toBeNull();
    expect((await lookBack(house.ago(120))).beds[0]?.stay).toMatchObject({
      check: null,
      withdrawn: { check: house.ago(600) },
    });
  });

  it('shows a value that was amended later as it was then', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const { observationId } = await house.record(
      stayId,
      'checks',
      aCheck(house.ago(5), { settings: { fio2Percent: 80 } }),
    );
    const at = house.ago(0);
    house.later(1);
    await house
      .as('therapist')
      .post(`/api/observations/${observationId}/amendments`, { as: 'struck', reason: 'wrong patient' });
    expect((await house.board(house.alder)).beds[0]?.stay?.check).toBeNull();
    expect((await lookBack(at)).beds[0]?.stay?.check).toMatchObject({
      observationId,
      settings: { fio2Percent: 80 },
    });
  });

  it('shows each patient in the bed where they were known to be', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const first = house.ago(0);
    house.later(10);
    // Moved five minutes before it was entered: until then the board showed the old bed.
    await house
      .as('supervisor')
      .post(`/api/stays/${stayId}/transfer`, { bedId: house.bed(house.alder, 2), observedAt: house.ago(5) });
    const second = house.ago(0);
    house.later(10);
    await house
      .as('supervisor')
      .post(`/api/stays/${stayId}/discharge`, { outcome: 'ward', observedAt: house.ago(5) });
    const third = house.ago(0);
    house.later(10);
    await house.as('supervisor').post('/api/stays', anAdmission(house.bed(house.alder, 2), house.ago(0)));
    const where = async (at: string) =>
      (await lookBack(at)).beds.map(({ stay }) =>
        stay ? (stay.stayId === stayId ? 'here' : 'other') : null,
      );
    expect(await where(first)).toEqual(['here', null, null, null]);
    expect(await where(new Date(Date.parse(second) - 60_000).toISOString())).toEqual([
      'here',
      null,
      null,
      null,
    ]);
    expect(await where(second)).toEqual([null, null, 'here', null]);
    expect(await where(new Date(Date.parse(third) - 1).toISOString())).toEqual([null, null, 'here', null]);
    expect(await where(third)).toEqual([null, null, null, null]);
    expect(await where(house.ago(0))).toEqual([null, null, 'other', null]);
  });

  it('shows who had which bed, by what was published then', async () => {
    const made = await house.as('charge').post(`/api/units/${house.alder.unitId}/shifts`, {
      name: 'Day',
      startsAt: house.ago(60),
      endsAt: house.ago(-660),
      people: ['therapist', 'charge'].map((name) => ({
        personId: house.personId(name),
        minutesAvailable: 600,
      })),
    });
    const { shiftId } = made.as(Shift);
    const put = (name: string, version: number) =>
      house
        .as('charge')
        .put(
          `/api/shifts/${shiftId}/assignment`,
          { places: [{ bedId: house.bed(house.alder, 0), personId: house.personId(name) }], publish: true },
          { version },
        );
    const initials = async (at: string) =>
      (await lookBack(at)).beds[0]?.assignments.map((each) => each.initials);
    const none = house.ago(0);
    house.later(1);
    await put('therapist', 0);
    const first = house.ago(0);
    house.later(1);
    await put('charge', 1);
    expect(await initials(none)).toEqual([]);
    expect(await initials(first)).toEqual(['TH']);
    expect(await initials(house.ago(0))).toEqual(['CH']);
  });

  it('shows which machine stood at a bed, and how many were ready', async () => {
    const { ventilatorId } = await house.readyMachine('V-1');
    await house.readyMachine('V-2');
    const move = (body: object) => house.as('therapist').post(`/api/ventilators/${ventilatorId}/moves`, body);
    const before = { at: house.ago(0), board: await house.board(house.alder) };
    house.later(1);
    await move({ state: 'in-use', bedId: house.bed(house.alder, 1) });
    const during = { at: house.ago(0), board: await house.board(house.alder) };
    house.later(1);
    await move({ state: 'cleaning' });
    expect(during.board.beds[1]?.ventilator?.assetNumber).toBe('V-1');
    for (const { at, board } of [before, during]) {
      const back = await lookBack(at);
      expect(pictures(back)).toEqual(pictures(board));
      expect(back.fleet).toEqual(board.fleet);
    }
  });

  it('before anything was recorded shows empty beds', async () => {
    await house.admit(house.bed(house.alder, 0));
    const { beds } = await lookBack('2020-01-01T00:00:00Z');
    expect(beds.every(({ stay, assignments }) => stay === null && assignments.length === 0)).toBe(true);
  });

  it('is asked with any offset, and answered with the same instant', async () => {
    expect((await lookBack('2026-03-05T08:00:00+01:00')).at).toBe('2026-03-05T07:00:00.000Z');
  });
});
