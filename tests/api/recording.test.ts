import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { aCheck, aGas, anAdmission, anAirway } from '../support/entries.ts';
import { type House, openHouse } from '../support/house.ts';

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

async function admit(bed = 0) {
  const reply = await house.as('therapist').post('/api/stays', anAdmission(house.alder.bedIds[bed]!, house.ago(600)));
  expect(reply.status).toBe(201);
  return reply.body.stay.stayId as string;
}

const board = async (who = 'therapist') => (await house.as(who).get(`/api/units/${house.alder.unitId}/board`)).body;
const bedOf = async (stayId: string, who = 'therapist') => (await board(who)).beds.find((bed: any) => bed.stay?.stayId === stayId);

describe('a check recorded at the bedside', () => {
  it('stands on the board with what follows from it, and the unit takes one revision', async () => {
    const stayId = await admit(0);
    const before = (await board()).revision;
    const reply = await house.as('therapist').post(`/api/stays/${stayId}/checks`, aCheck(house.ago(5), { readings: { vtExhaledMl: 500 } }));
    expect(reply.status).toBe(201);
    expect(reply.body.revision).toBe(before + 1);

    const { stay } = await bedOf(stayId);
    expect(stay.support).toMatchObject({ id: 'ac-vc', shortName: 'AC/VC' });
    expect(stay.check.settings.peepCmH2O).toBe(10);
    // Woman of 165 cm: 45.5 + 2.3 × (165 ÷ 2.54 − 60) = 56.91 kg.
    expect(stay.check.derived.vtPerKgMl).toBeCloseTo(500 / 56.91, 2);
    expect(stay.check.derived.drivingPressureCmH2O).toBe(14);
    expect(stay.flags.map((flag: any) => flag.id)).toContain('vt-per-kg-high');
  });

  it('sent twice under one key is stored once and answered with the first result', async () => {
    const stayId = await admit(1);
    const key = crypto.randomUUID();
    const entry = aCheck(house.ago(1));
    const [first, second] = [
      await house.as('therapist').post(`/api/stays/${stayId}/checks`, entry, { key }),
      await house.as('therapist').post(`/api/stays/${stayId}/checks`, entry, { key }),
    ];
    expect(second.status).toBe(201);
    expect(second.body).toEqual(first.body);
    const record = (await house.as('therapist').get(`/api/stays/${stayId}/record`)).body.items;
    expect(record.filter((fact: any) => fact.kind === 'check')).toHaveLength(1);
  });

  it('marks a gas that was drawn before the settings were changed, with the time of the change', async () => {
    const stayId = await admit(2);
    const post = (path: string, body: object) => house.as('therapist').post(`/api/stays/${stayId}/${path}`, body);
    await post('checks', aCheck(house.ago(120)));
    await post('gases', aGas(house.ago(100)));
    expect((await bedOf(stayId)).stay.gas.changedSinceAt).toBeNull();
    await post('checks', aCheck(house.ago(60), { settings: { peepCmH2O: 12 } }));
    expect((await bedOf(stayId)).stay.gas.changedSinceAt).toBe(house.ago(60));
  });

  it('is amended with a reason: the correction counts, and the first value stays in the record', async () => {
    const stayId = (await board()).beds[0].stay.stayId;
    const wrong = await house.as('therapist').post(`/api/stays/${stayId}/checks`, aCheck(house.ago(0), { settings: { fio2Percent: 80 } }));
    const reply = await house.as('therapist').post(`/api/observations/${wrong.body.observationId}/amendments`, {
      as: 'corrected', reason: 'typed 80 for 50', body: aCheck(house.ago(0), { settings: { fio2Percent: 50 } }),
    });
    expect(reply.status).toBe(201);
    expect((await bedOf(stayId)).stay.check.settings.fio2Percent).toBe(50);
    const items = (await house.as('therapist').get(`/api/stays/${stayId}/record`)).body.items;
    expect(items.find((fact: any) => fact.observationId === wrong.body.observationId)).toMatchObject({
      amendedBy: reply.body.observationId, body: { settings: { fio2Percent: 80 } },
    });
  });

  it('is amended by nobody but its author and the charge therapist', async () => {
    const stayId = (await board()).beds[1].stay.stayId;
    const { observationId } = (await house.as('therapist').post(`/api/stays/${stayId}/checks`, aCheck(house.ago(0)))).body;
    const strike = { as: 'struck', reason: 'wrong patient' };
    expect((await house.as('therapist2').post(`/api/observations/${observationId}/amendments`, strike)).status).toBe(403);
    expect((await house.as('charge').post(`/api/observations/${observationId}/amendments`, strike)).status).toBe(201);
    // Struck out, it no longer counts, and it is not struck twice.
    expect((await bedOf(stayId)).stay.check.observationId).not.toBe(observationId);
    expect((await house.as('charge').post(`/api/observations/${observationId}/amendments`, strike)).status).toBe(409);
  });
});

describe('an airway', () => {
  it('is aged from its placement until its first check, and is gone after an extubation', async () => {
    const stayId = (await board()).beds[2].stay.stayId;
    const post = (path: string, body: object) => house.as('therapist').post(`/api/stays/${stayId}/${path}`, body);
    await post('airways', anAirway(house.ago(300)));
    expect((await bedOf(stayId)).stay).toMatchObject({ device: { sizeMm: 7.5 }, airway: { depthCm: 22, cuffCmH2O: null } });
    await post('airway-checks', { observedAt: house.ago(30), depthCm: 24, cuffCmH2O: 26, cuffMethod: 'manometer' });
    const { stay } = await bedOf(stayId);
    expect(stay.airway).toMatchObject({ cuffCmH2O: 26, observedAt: house.ago(30) });
    expect(stay.flags.map((flag: any) => flag.id)).toContain('depth-moved');
    await post('happenings', { observedAt: house.ago(10), kind: 'extubated-planned', toSupport: 'hfnc' });
    const after = (await bedOf(stayId)).stay;
    expect(after).toMatchObject({ device: null, airway: null, support: { id: 'hfnc', sinceAt: house.ago(10) } });
    expect(after.check.changedSinceAt).toBe(house.ago(10));
  });
});
