import type { BedStay } from '@windrow/ventilation/contract/board';
import { Trial } from '@windrow/ventilation/contract/readiness';
import { SCREEN_ANSWER_KEYS } from '@windrow/ventilation/readiness/screen-answers';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { aCheck } from '../support/entries.ts';
import { type House, openHouse } from '../support/house.ts';
import { listOf } from '../support/shapes.ts';

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

const MET = Object.fromEntries(SCREEN_ANSWER_KEYS.map((key) => [key, true]));
const aSpontaneousCheck = (observedAt: string) => ({
  observedAt,
  mode: 'psv',
  settings: { psCmH2O: 8, peepCmH2O: 5, fio2Percent: 30 },
  readings: { vtExhaledMl: 420, rateTotalPerMin: 18, spo2Percent: 97 },
  limits: { apnoeaS: 20, lowVtMl: 200 },
});

async function stayIn(index: number, who = 'therapist'): Promise<BedStay> {
  const stay = (await house.board(house.alder, who)).beds[index]?.stay;
  if (!stay) throw new Error(`bed ${index} is empty`);
  return stay;
}
const happens = (stayId: string, body: object) => house.record(stayId, 'happenings', body);
const trials = async (stayId: string, who = 'therapist') =>
  (await house.as(who).get(`/api/stays/${stayId}/trials`)).as(listOf(Trial)).items;
const flagIds = ({ flags }: BedStay) => flags.map(({ id }) => id);

describe('a screen recorded at the bedside', () => {
  it('that is met puts "Ready to try" on the board of the unit and of its display', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    await house.record(stayId, 'checks', aSpontaneousCheck(house.ago(30)));
    expect(flagIds(await stayIn(0))).not.toContain('ready-to-try');
    const { observationId } = await happens(stayId, {
      observedAt: house.ago(0),
      kind: 'screened',
      screen: MET,
    });
    const stay = await stayIn(0);
    expect(stay.screen).toMatchObject({ observationId, answers: MET, recordedByInitials: 'TH' });
    expect(flagIds(stay)).toContain('ready-to-try');
    expect(flagIds(await stayIn(0, 'display'))).toContain('ready-to-try');
  });

  it('with one item not met, or not answered, does not', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 1));
    await house.record(stayId, 'checks', aSpontaneousCheck(house.ago(30)));
    for (const screen of [{ ...MET, coughAdequate: false }, { coughAdequate: true }]) {
      await happens(stayId, { observedAt: house.ago(0), kind: 'screened', screen });
      expect(flagIds(await stayIn(1))).not.toContain('ready-to-try');
    }
  });

  it('is no longer on the board a day later, and its flag neither', async () => {
    house.later(24 * 60);
    const stay = await stayIn(0);
    expect(stay.screen).toBeNull();
    expect(flagIds(stay)).not.toContain('trial-due');
    house.later(-24 * 60);
    expect((await stayIn(0)).screen).not.toBeNull();
  });
});

describe('a breathing trial', () => {
  it('runs on the board from its start, with method and length, and is gone from it at its end', async () => {
    const { stayId } = await stayIn(0);
    await happens(stayId, {
      observedAt: house.ago(0),
      kind: 'trial-started',
      method: 't-piece',
      plannedMinutes: 30,
    });
    expect(await stayIn(0)).toMatchObject({
      trial: { startedAt: house.ago(0), method: 't-piece', plannedMinutes: 30 },
      lastTrial: null,
    });
    expect(flagIds(await stayIn(0))).not.toContain('ready-to-try');
    house.later(22);
    await happens(stayId, { observedAt: house.ago(0), kind: 'trial-failed', criteria: ['rate', 'effort'] });
    const stay = await stayIn(0);
    expect(stay).toMatchObject({
      trial: null,
      lastTrial: { startedAt: house.ago(22), endedAt: house.ago(0), outcome: 'failed' },
    });
    // The screen has had its trial.
    expect(flagIds(stay)).not.toContain('ready-to-try');
    expect(await trials(stayId)).toMatchObject([
      { outcome: 'failed', minutes: 22, method: 't-piece', criteria: ['rate', 'effort'] },
    ]);
  });

  it('struck out is no trial', async () => {
    const { stayId } = await stayIn(1);
    const { observationId } = await happens(stayId, { observedAt: house.ago(0), kind: 'trial-started' });
    expect(await trials(stayId)).toHaveLength(1);
    await house
      .as('therapist')
      .post(`/api/observations/${observationId}/amendments`, { as: 'struck', reason: 'wrong bed' });
    expect(await trials(stayId)).toEqual([]);
    expect((await stayIn(1)).trial).toBeNull();
  });

  it('that nobody ended is ended by an extubation', async () => {
    const { stayId } = await stayIn(1);
    await happens(stayId, { observedAt: house.ago(40), kind: 'trial-started' });
    await happens(stayId, { observedAt: house.ago(5), kind: 'extubated-planned', toSupport: 'hfnc' });
    expect(await stayIn(1)).toMatchObject({ trial: null, screen: null });
    expect(await trials(stayId)).toMatchObject([{ outcome: 'ended', minutes: 35 }]);
  });

  it.each([
    ['a failed trial without a criterion or a reason', { kind: 'trial-failed' }, 'detail'],
    ['a criterion that is not published', { kind: 'trial-failed', criteria: ['looks-bad'] }, 'criteria.0'],
    ['a criterion named twice', { kind: 'trial-failed', criteria: ['rate', 'rate'] }, 'criteria'],
    ['an empty list of criteria', { kind: 'trial-failed', criteria: [] }, 'criteria'],
    ['a method with anything but a start', { kind: 'trial-passed', method: 'cpap' }, 'method'],
    ['minutes with a start', { kind: 'trial-started', minutes: 30 }, 'minutes'],
    ['a plan of a minute', { kind: 'trial-started', plannedMinutes: 1 }, 'plannedMinutes'],
    ['a screen without an answer', { kind: 'screened', screen: {} }, 'screen'],
    ['a screen that is none', { kind: 'screened' }, 'screen'],
    ['a screen of something unknown', { kind: 'screened', screen: { smiles: true } }, 'screen'],
  ])('refuses %s, and stores nothing', async (_, body, path) => {
    const { stayId } = await stayIn(0);
    const before = (await house.recordOf(stayId)).length;
    const reply = await house
      .as('therapist')
      .post(`/api/stays/${stayId}/happenings`, { observedAt: house.ago(0), ...body });
    expect(reply.status).toBe(400);
    expect(reply.problem.errors?.map((error) => error.path)).toContain(path);
    expect(await house.recordOf(stayId)).toHaveLength(before);
  });

  it('takes the entries of before: a start without a method, a failure in words', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 2));
    await house.record(stayId, 'checks', aCheck(house.ago(60)));
    await happens(stayId, { observedAt: house.ago(50), kind: 'trial-started' });
    await happens(stayId, { observedAt: house.ago(30), kind: 'trial-failed', detail: 'tired' });
    expect(await trials(stayId)).toMatchObject([{ outcome: 'failed', detail: 'tired', criteria: [] }]);
  });
});
