import type { Flag } from '@windrow/ventilation/contract/board';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { aCheck, aGas } from '../support/entries.ts';
import { type House, openHouse } from '../support/house.ts';
import { Recorded } from '../support/shapes.ts';
import { stored } from '../support/stored.ts';

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

const FLAG = 'limit-missing-low-vt';
const NOTE = 'set on the ventilator, forgotten in the check';

/** Pressure control, with a high pressure limit written down and no limit of volume. */
function unguarded(observedAt: string, vtExhaledMl: number) {
  return {
    ...aCheck(observedAt),
    mode: 'ac-pc',
    settings: { pInspCmH2O: 14, rateSetPerMin: 18, peepCmH2O: 10, fio2Percent: 45 },
    readings: { vtExhaledMl, rateTotalPerMin: 18 },
  };
}

async function flagOf(stayId: string, flagId = FLAG, who = 'therapist'): Promise<Flag> {
  const { beds } = await house.board(house.alder, who);
  const flag = beds.find(({ stay }) => stay?.stayId === stayId)?.stay?.flags.find(({ id }) => id === flagId);
  if (!flag) throw new Error(`${flagId} is not raised`);
  return flag;
}

const say = (stayId: string, over: object = {}, who = 'therapist') =>
  house
    .as(who)
    .post(`/api/stays/${stayId}/acknowledgements`, { observedAt: house.ago(0), note: NOTE, ...over });

async function acknowledge(stayId: string, flagId = FLAG) {
  const { fingerprint } = await flagOf(stayId, flagId);
  return (await say(stayId, { flagId, fingerprint })).as(Recorded);
}

async function checked(bed: number, vtExhaledMl = 410): Promise<string> {
  const { stayId } = await house.admit(house.bed(house.alder, bed));
  await house.record(stayId, 'checks', unguarded(house.ago(10), vtExhaledMl));
  return stayId;
}

describe('a flag that somebody has acknowledged', () => {
  let stayId: string;

  it('says who, when and why, takes one revision, and is still a flag', async () => {
    stayId = await checked(0);
    expect(await flagOf(stayId)).toMatchObject({ level: 'attention', acknowledged: null });
    const { revision: before } = await house.board(house.alder);
    const { revision, bed } = await acknowledge(stayId);
    expect(revision).toBe(before + 1);
    const said = { by: 'TH', at: house.ago(0), note: NOTE };
    expect((await flagOf(stayId)).acknowledged).toEqual(said);
    expect(bed?.stay?.flags.find(({ id }) => id === FLAG)?.acknowledged).toEqual(said);
  });

  it('is told to a display without the note', async () => {
    expect((await flagOf(stayId, FLAG, 'display')).acknowledged).toMatchObject({ by: 'TH', note: null });
  });

  it('stands in the record with the words of that moment', async () => {
    const entry = (await house.recordOf(stayId)).find(({ kind }) => kind === 'acknowledgement');
    expect(entry?.body).toMatchObject({ flagId: FLAG, note: NOTE, short: 'Vt limit missing' });
  });

  it('stays so after a check that found the same, and is raised again by one that did not', async () => {
    house.later(60);
    await house.record(stayId, 'checks', unguarded(house.ago(1), 410));
    expect((await flagOf(stayId)).acknowledged).not.toBeNull();
    house.later(60);
    await house.record(stayId, 'checks', unguarded(house.ago(1), 370));
    expect((await flagOf(stayId)).acknowledged).toBeNull();
  });

  it('is not quieted by the old note when the values come back', async () => {
    house.later(60);
    await house.record(stayId, 'checks', unguarded(house.ago(1), 410));
    expect((await flagOf(stayId)).acknowledged).toBeNull();
  });

  it('is raised again by a limit of the unit that changes', async () => {
    await house.record(stayId, 'gases', aGas(house.ago(1), { ph: 7.2 }));
    await acknowledge(stayId, 'ph-low');
    const { policy, version } = await house.policyOf(house.alder);
    const change = {
      policy: { ...policy, thresholds: { ...policy.thresholds, phLow: 7.3 } },
      reason: 'trial',
    };
    await house.as('charge').ask('PUT', `/api/units/${house.alder.unitId}/policy`, { body: change, version });
    expect((await flagOf(stayId, 'ph-low')).acknowledged).toBeNull();
  });

  it('was not acknowledged in a look back to the time before', async () => {
    const { beds } = await house.board(house.alder, 'therapist', `?at=${house.ago(185)}`);
    expect(beds.flatMap(({ stay }) => stay?.flags ?? []).every((flag) => flag.acknowledged === null)).toBe(
      true,
    );
  });
});

describe('an acknowledgement is refused', () => {
  const refused = async (reply: Awaited<ReturnType<typeof say>>, status: number, path: string) => {
    expect(reply.status).toBe(status);
    expect(reply.problem.errors?.map((error) => error.path)).toContain(path);
  };

  it('where the flag now rests on other values, with its present sentence', async () => {
    const stayId = await checked(1);
    const { fingerprint } = await flagOf(stayId);
    await house.record(stayId, 'checks', unguarded(house.ago(0), 300));
    const before = await stored(house.db);
    const reply = await say(stayId, { flagId: FLAG, fingerprint });
    await refused(reply, 409, 'fingerprint');
    expect(reply.problem.detail).toContain('low exhaled Vt limit');
    expect(await stored(house.db)).toEqual(before);
  });

  it('where there is no such flag, or it is withdrawn with its check', async () => {
    const stayId = await checked(2);
    const { fingerprint } = await flagOf(stayId);
    await refused(await say(stayId, { flagId: 'plateau-high', fingerprint }), 409, 'flagId');
    house.later(481);
    await refused(await say(stayId, { flagId: FLAG, fingerprint }), 409, 'flagId');
  });

  it('without a note of at least 3 letters, from the future, and for a stay that has ended', async () => {
    const stayId = await checked(3);
    const { fingerprint } = await flagOf(stayId);
    const whole = { flagId: FLAG, fingerprint };
    await refused(await say(stayId, { ...whole, note: ' ok ' }), 400, 'note');
    await refused(await say(stayId, { ...whole, observedAt: house.ago(-5) }), 400, 'observedAt');
    await house.as('therapist').post(`/api/stays/${stayId}/discharge`, {
      outcome: 'ward',
      observedAt: house.ago(0),
    });
    await refused(await say(stayId, whole), 409, 'stayId');
  });

  it('to whoever may not record', async () => {
    const stayId = await checked(3);
    const { fingerprint } = await flagOf(stayId);
    for (const who of ['supervisor', 'clinician', 'display', 'birch-therapist'])
      expect((await say(stayId, { flagId: FLAG, fingerprint }, who)).status).toBe(403);
  });

  it('where somebody wants to amend one', async () => {
    const stayId = (await house.board(house.alder)).beds[0]?.stay?.stayId ?? '';
    await house.record(stayId, 'checks', unguarded(house.ago(0), 405));
    const { observationId } = await acknowledge(stayId);
    const reply = await house
      .as('charge')
      .post(`/api/observations/${observationId}/amendments`, { as: 'struck', reason: 'not meant' });
    expect(reply.status).toBe(409);
    expect(reply.problem.detail).toContain('not amended');
  });
});
