import type { BedStay } from '@windrow/ventilation/contract/board';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { aCheck, aGas, anAirway } from '../support/entries.ts';
import { type House, openHouse } from '../support/house.ts';
import { Recorded } from '../support/shapes.ts';

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

const admit = async (bed: number) => (await house.admit(house.bed(house.alder, bed))).stayId;

async function stayOnBoard(stayId: string): Promise<BedStay> {
  const { beds } = await house.board(house.alder);
  const stay = beds.find((bed) => bed.stay?.stayId === stayId)?.stay;
  if (!stay) throw new Error(`stay ${stayId} is not on the board`);
  return stay;
}

async function stayInBed(index: number): Promise<string> {
  const stay = (await house.board(house.alder)).beds[index]?.stay;
  if (!stay) throw new Error(`bed ${index} is empty`);
  return stay.stayId;
}

const flagIds = (stay: BedStay) => stay.flags.map(({ id }) => id);

describe('a check recorded at the bedside', () => {
  it('stands on the board with what follows from it, and the unit takes one revision', async () => {
    const stayId = await admit(0);
    const { revision: before } = await house.board(house.alder);
    const reply = await house.record(
      stayId,
      'checks',
      aCheck(house.ago(5), { readings: { vtExhaledMl: 500 } }),
    );
    expect(reply.revision).toBe(before + 1);

    const stay = await stayOnBoard(stayId);
    expect(stay.support).toMatchObject({ id: 'ac-vc', shortName: 'AC/VC' });
    expect(stay.check?.settings.peepCmH2O).toBe(10);
    // Woman of 165 cm: 45.5 + 2.3 × (165 ÷ 2.54 − 60) = 56.91 kg.
    expect(stay.check?.derived.vtPerKgMl).toBeCloseTo(500 / 56.91, 2);
    expect(stay.check?.derived.drivingPressureCmH2O).toBe(14);
    expect(flagIds(stay)).toContain('vt-per-kg-high');
  });

  it('sent twice under one key is stored once and answered with the first result', async () => {
    const stayId = await admit(1);
    const key = crypto.randomUUID();
    const entry = aCheck(house.ago(1));
    const first = await house.as('therapist').post(`/api/stays/${stayId}/checks`, entry, { key });
    const second = await house.as('therapist').post(`/api/stays/${stayId}/checks`, entry, { key });
    expect(second.status).toBe(201);
    expect(second.body).toEqual(first.body);
    expect((await house.recordOf(stayId)).filter(({ kind }) => kind === 'check')).toHaveLength(1);
  });

  it('sent twice at once under one key is stored once', async () => {
    const stayId = await stayInBed(1);
    const before = (await house.recordOf(stayId)).length;
    const key = crypto.randomUUID();
    const entry = aCheck(house.ago(0));
    const send = () => house.as('therapist').post(`/api/stays/${stayId}/checks`, entry, { key });
    const replies = await Promise.all([send(), send(), send()]);
    expect(new Set(replies.map(({ text }) => text)).size).toBe(1);
    expect(await house.recordOf(stayId)).toHaveLength(before + 1);
  });

  it('marks a gas that was drawn before the settings were changed, with the time of the change', async () => {
    const stayId = await admit(2);
    await house.record(stayId, 'checks', aCheck(house.ago(120)));
    await house.record(stayId, 'gases', aGas(house.ago(100)));
    expect((await stayOnBoard(stayId)).gas?.changedSinceAt).toBeNull();
    await house.record(stayId, 'checks', aCheck(house.ago(60), { settings: { peepCmH2O: 12 } }));
    expect((await stayOnBoard(stayId)).gas?.changedSinceAt).toBe(house.ago(60));
    // The first change is the one that counts, whatever was changed after it.
    await house.record(stayId, 'checks', aCheck(house.ago(40), { settings: { peepCmH2O: 14 } }));
    expect((await stayOnBoard(stayId)).gas?.changedSinceAt).toBe(house.ago(60));
  });

  it('recorded late about an earlier time does not replace what was observed after it', async () => {
    const stayId = await stayInBed(2);
    const { observationId } = await house.record(stayId, 'checks', aCheck(house.ago(10)));
    await house.record(stayId, 'checks', aCheck(house.ago(30), { settings: { peepCmH2O: 5 } }));
    expect((await stayOnBoard(stayId)).check).toMatchObject({ observationId, settings: { peepCmH2O: 10 } });
  });
});

describe('two checks of one minute', () => {
  it('are shown in the order in which they were recorded: the later one counts', async () => {
    const stayId = await stayInBed(0);
    await house.record(stayId, 'checks', aCheck(house.ago(0)));
    const { observationId } = await house.record(stayId, 'checks', aCheck(house.ago(0)));
    expect((await stayOnBoard(stayId)).check?.observationId).toBe(observationId);
  });
});

describe('an amendment', () => {
  const amend = (who: string, observationId: string, amendment: object) =>
    house.as(who).post(`/api/observations/${observationId}/amendments`, amendment);

  it('with a reason counts from now on, and the first value stays in the record', async () => {
    const stayId = await stayInBed(0);
    const wrong = await house.record(
      stayId,
      'checks',
      aCheck(house.ago(0), { settings: { fio2Percent: 80 } }),
    );
    const reply = await amend('therapist', wrong.observationId, {
      as: 'corrected',
      reason: 'typed 80 for 50',
      body: aCheck(house.ago(0), { settings: { fio2Percent: 50 } }),
    });
    const { observationId } = reply.as(Recorded);
    expect((await stayOnBoard(stayId)).check?.settings.fio2Percent).toBe(50);
    const items = await house.recordOf(stayId);
    expect(items.find((fact) => fact.observationId === wrong.observationId)).toMatchObject({
      amendedBy: observationId,
      body: { settings: { fio2Percent: 80 } },
    });
    expect(items.find((fact) => fact.observationId === observationId)?.amends).toEqual({
      observationId: wrong.observationId,
      reason: 'typed 80 for 50',
      as: 'corrected',
    });
  });

  it('is made by nobody but the author and the charge therapist', async () => {
    const stayId = await stayInBed(1);
    const { observationId } = await house.record(stayId, 'checks', aCheck(house.ago(0)));
    const strike = { as: 'struck', reason: 'wrong patient' };
    expect((await amend('therapist2', observationId, strike)).status).toBe(403);
    expect((await amend('charge', observationId, strike)).status).toBe(201);
    // Struck out, it no longer counts, and it is not struck twice.
    expect((await stayOnBoard(stayId)).check?.observationId).not.toBe(observationId);
    const again = await amend('charge', observationId, strike);
    expect(again.status).toBe(409);
    expect(again.problem.detail).toContain('Person charge');
  });

  it('is made of the newest amendment, not of what was amended already', async () => {
    const stayId = await stayInBed(1);
    const body = aCheck(house.ago(0), { settings: { fio2Percent: 60 } });
    const { observationId } = await house.record(stayId, 'checks', aCheck(house.ago(0)));
    const first = (
      await amend('therapist', observationId, { as: 'corrected', reason: 'typed wrong', body })
    ).as(Recorded);
    const late = await amend('therapist', observationId, { as: 'corrected', reason: 'typed wrong', body });
    expect(late.status).toBe(409);
    expect(late.problem.errors?.[0]?.message).toContain(first.observationId);
    const second = await amend('therapist', first.observationId, {
      as: 'corrected',
      reason: 'wrong again',
      body: aCheck(house.ago(0), { settings: { fio2Percent: 70 } }),
    });
    expect(second.status).toBe(201);
    expect((await stayOnBoard(stayId)).check?.settings.fio2Percent).toBe(70);
  });
});

describe('an airway', () => {
  it('is aged from its placement until its first check, and is gone after an extubation', async () => {
    const stayId = await stayInBed(2);
    await house.record(stayId, 'airways', anAirway(house.ago(300)));
    expect(await stayOnBoard(stayId)).toMatchObject({
      device: { sizeMm: 7.5 },
      airway: { depthCm: 22, cuffCmH2O: null },
    });
    const found = { observedAt: house.ago(30), depthCm: 24, cuffCmH2O: 26, cuffMethod: 'manometer' };
    await house.record(stayId, 'airway-checks', found);
    const stay = await stayOnBoard(stayId);
    expect(stay.airway).toMatchObject({ cuffCmH2O: 26, observedAt: house.ago(30) });
    expect(flagIds(stay)).toContain('depth-moved');

    const out = { observedAt: house.ago(5), kind: 'extubated-planned', toSupport: 'hfnc' };
    await house.record(stayId, 'happenings', out);
    const after = await stayOnBoard(stayId);
    expect(after).toMatchObject({
      device: null,
      airway: null,
      support: { id: 'hfnc', sinceAt: house.ago(5) },
    });
    expect(after.check?.changedSinceAt).toBe(house.ago(5));
  });
});
