import type { BedStay } from '@windrow/ventilation/contract/board';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { aCheck, aGas, anAirway } from '../support/entries.ts';
import { type House, openHouse } from '../support/house.ts';

let house: House;
let stayId: string;
beforeEach(async () => {
  house = await openHouse();
  stayId = (await house.admit(house.bed(house.alder, 0))).stayId;
});
afterEach(() => house.close());

async function stay(): Promise<BedStay> {
  const bed = (await house.board(house.alder)).beds.find((one) => one.stay?.stayId === stayId);
  if (!bed?.stay) throw new Error('the stay is not on the board');
  return bed.stay;
}

describe('an airway check of the position alone', () => {
  it('takes neither cuff nor depth away, and makes neither of them young', async () => {
    await house.record(stayId, 'airways', anAirway(house.ago(600)));
    await house.record(stayId, 'airway-checks', { observedAt: house.ago(300), cuffCmH2O: 12, depthCm: 25 });
    await house.record(stayId, 'airway-checks', { observedAt: house.ago(10), position: 'left' });
    const { airway, flags } = await stay();
    expect(airway).toMatchObject({
      cuffCmH2O: 12,
      depthCm: 25,
      position: 'left',
      observedAt: house.ago(300),
    });
    expect(flags.map(({ id }) => id)).toEqual(expect.arrayContaining(['cuff-out-of-band', 'depth-moved']));
  });

  it('ages the group by the older of cuff and depth', async () => {
    await house.record(stayId, 'airways', anAirway(house.ago(600)));
    await house.record(stayId, 'airway-checks', { observedAt: house.ago(200), depthCm: 22 });
    await house.record(stayId, 'airway-checks', { observedAt: house.ago(20), cuffCmH2O: 25 });
    expect((await stay()).airway?.observedAt).toBe(house.ago(200));
  });
});

describe('a gas with its own oxygen and PEEP', () => {
  it('is before a change when the next check is set otherwise than it was drawn', async () => {
    await house.record(
      stayId,
      'checks',
      aCheck(house.ago(120), { settings: { fio2Percent: 40, peepCmH2O: 8 } }),
    );
    await house.record(stayId, 'gases', aGas(house.ago(90), { fio2Percent: 100, peepCmH2O: 16 }));
    expect((await stay()).gas?.changedSinceAt).toBeNull();
    await house.record(
      stayId,
      'checks',
      aCheck(house.ago(60), { settings: { fio2Percent: 40, peepCmH2O: 8 } }),
    );
    expect((await stay()).gas?.changedSinceAt).toBe(house.ago(60));
  });

  it('is not before a change when it was drawn on what the next check finds', async () => {
    await house.record(stayId, 'checks', aCheck(house.ago(120), { settings: { fio2Percent: 40 } }));
    await house.record(stayId, 'gases', aGas(house.ago(90), { fio2Percent: 60 }));
    await house.record(stayId, 'checks', aCheck(house.ago(60), { settings: { fio2Percent: 60 } }));
    expect((await stay()).gas?.changedSinceAt).toBeNull();
  });

  it('is held against no minute volume of a support that the patient has left', async () => {
    await house.record(stayId, 'checks', aCheck(house.ago(120), { readings: { minuteVolumeLMin: 9 } }));
    await house.record(stayId, 'gases', aGas(house.ago(100)));
    expect((await stay()).gas?.ventilatoryRatio).toBeGreaterThan(0);
    await house.record(stayId, 'happenings', {
      observedAt: house.ago(60),
      kind: 'extubated-planned',
      toSupport: 'hfnc',
    });
    await house.record(stayId, 'gases', aGas(house.ago(30)));
    expect((await stay()).gas?.ventilatoryRatio).toBeNull();
  });
});

it('a breathing trial ends with the extubation, whatever was written of its outcome', async () => {
  await house.record(stayId, 'happenings', { observedAt: house.ago(60), kind: 'trial-started' });
  expect((await stay()).trial).not.toBeNull();
  await house.record(stayId, 'happenings', {
    observedAt: house.ago(20),
    kind: 'extubated-planned',
    toSupport: 'hfnc',
  });
  expect((await stay()).trial).toBeNull();
});
