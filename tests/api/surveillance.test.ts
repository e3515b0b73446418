import { Surveillance } from '@windrow/ventilation/contract/surveillance';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { aCheck, anAirway } from '../support/entries.ts';
import { type House, openHouse } from '../support/house.ts';

const DAY_MIN = 1440;

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

/** A stay with one check at 08:00 of each day, the last of them today. Returns the ids of its checks. */
async function ventilated(bed: number, peeps: readonly number[]) {
  const { stayId } = await house.admit(house.bed(house.alder, bed));
  const ids: string[] = [];
  for (const [at, peepCmH2O] of peeps.entries()) {
    const observedAt = house.ago((peeps.length - 1 - at) * DAY_MIN);
    ids.push(
      (await house.record(stayId, 'checks', aCheck(observedAt, { settings: { peepCmH2O } }))).observationId,
    );
  }
  return { stayId, ids };
}

async function surveillanceOf(stayId: string, who = 'therapist'): Promise<Surveillance> {
  return (await house.as(who).get(`/api/stays/${stayId}/surveillance`)).as(Surveillance);
}

const sign = (stayId: string, entry: object) =>
  house.as('therapist').post(`/api/stays/${stayId}/infection-signs`, { observedAt: house.ago(0), ...entry });

describe('the surveillance of a stay', () => {
  it('shows an event of the checks with its days, window, period and reasons, and what is missing', async () => {
    const { stayId } = await ventilated(0, [5, 5, 8, 9]);
    const seen = await surveillanceOf(stayId);

    expect(seen).toMatchObject({
      timeZone: 'Europe/London',
      chartingIntervalMinutes: 240,
      today: '2026-03-05',
    });
    expect(seen.edition.name).toContain('CDC NHSN');
    expect(seen.dayTable.map(({ day, minPeep }) => [day, minPeep])).toEqual([
      ['2026-03-02', 5],
      ['2026-03-03', 5],
      ['2026-03-04', 8],
      ['2026-03-05', 9],
    ]);
    expect(seen.events).toMatchObject([
      { onset: '2026-03-04', by: ['peep'], ventilationDay: 3, isFirm: false, infection: { ivac: false } },
    ]);
    expect(seen.events[0]?.why.join(' ')).toContain('is 3 above the first baseline day’s 5');
    expect(seen.events[0]?.infection.missing).toHaveLength(2);
  });

  it('follows a correction and a strike, and keeps to what holds', async () => {
    const { stayId, ids } = await ventilated(1, [5, 5, 8, 8]);
    expect((await surveillanceOf(stayId)).events).toHaveLength(1);
    const amend = (body: object) =>
      house.as('therapist').post(`/api/observations/${ids[2]}/amendments`, body);
    const corrected = aCheck(house.ago(DAY_MIN), { settings: { peepCmH2O: 6 } });
    expect((await amend({ as: 'corrected', reason: 'misread', body: corrected })).status).toBe(201);
    expect((await surveillanceOf(stayId)).events).toEqual([]);
    expect((await surveillanceOf(stayId)).dayTable[2]?.minPeep).toBe(6);
  });

  it('ends with the extubation, and does not grow on a mask', async () => {
    const { stayId } = await ventilated(2, [5, 5]);
    await house.record(stayId, 'airways', anAirway(house.ago(DAY_MIN + 60)));
    house.later(30);
    await house.record(stayId, 'happenings', {
      observedAt: house.ago(0),
      kind: 'extubated-planned',
      toSupport: 'niv-st',
    });
    house.later(2 * DAY_MIN);
    expect((await surveillanceOf(stayId)).dayTable.map(({ day }) => day)).toEqual([
      '2026-03-04',
      '2026-03-05',
    ]);
  });
});

describe('signs of infection', () => {
  it('entered by hand make the second tier, stand in the record, and count no more once struck', async () => {
    const { stayId } = await ventilated(3, [5, 5, 8, 8, 8, 8]);
    // Without an airway, checks from five days back would be taken for slips.
    await house.record(stayId, 'airways', anAirway(house.ago(5 * DAY_MIN)));
    const [event] = (await surveillanceOf(stayId)).events;
    const onset = event?.onset ?? '';
    const dayAfter = (days: number) =>
      new Date(Date.parse(onset) + days * 86_400_000).toISOString().slice(0, 10);

    const fever = await sign(stayId, {
      sign: 'temperature',
      temperatureC: 38.6,
      observedAt: `${onset}T10:00:00Z`,
    });
    expect(fever.status).toBe(201);
    for (const [at, agent] of ['Meropenem', 'meropenem', 'MEROPENEM', 'meropenem'].entries())
      expect((await sign(stayId, { sign: 'antimicrobial', agent, day: dayAfter(at) })).status).toBe(201);

    const seen = await surveillanceOf(stayId);
    expect(seen.entered.antimicrobialDays).toEqual([
      { agent: 'Meropenem', days: [0, 1, 2, 3].map(dayAfter) },
    ]);
    expect(seen.events[0]?.infection).toMatchObject({ ivac: true, longestRun: 4, missing: [] });

    const [newest] = (await house.recordOf(stayId)).filter(({ kind }) => kind === 'infection-sign');
    const strike = { as: 'struck', reason: 'not given' };
    const reply = await house
      .as('therapist')
      .post(`/api/observations/${newest?.observationId}/amendments`, strike);
    expect(reply.status).toBe(201);
    expect((await surveillanceOf(stayId)).events[0]?.infection.ivac).toBe(false);
  });

  it('leave out a day that is entered as one on extracorporeal support', async () => {
    const stayId = (await house.board(house.alder)).beds[3]?.stay?.stayId ?? '';
    const { events } = await surveillanceOf(stayId);
    await sign(stayId, { sign: 'extracorporeal', day: events[0]?.onset });
    const seen = await surveillanceOf(stayId);
    expect(seen.events).toEqual([]);
    expect(seen.dayTable.filter(({ excluded }) => excluded === 'extracorporeal')).toHaveLength(1);
  });

  it.each([
    [{ sign: 'temperature', temperatureC: 46 }, 'temperatureC', '25 to 45 °C'],
    [{ sign: 'white-cells', whiteCellsPerMm3: -1 }, 'whiteCellsPerMm3', '0 to 500000 /mm3'],
    [{ sign: 'antimicrobial', agent: ' ', day: '2026-03-04' }, 'agent', 'name of the agent'],
    [{ sign: 'antimicrobial', agent: 'meropenem', day: '2026-13-04' }, 'day', 'must be a day'],
    [{ sign: 'extracorporeal', day: '2031-01-01' }, 'day', 'not after it'],
    [{ sign: 'antimicrobial', agent: 'meropenem', day: '2006-03-04' }, 'day', 'in the year before'],
    [{ sign: 'antimicrobial', agent: 'meropenem' }, 'day', 'must be a day'],
    [{ sign: 'extracorporeal', day: '2026-03-04', observedAt: 'yesterday' }, 'observedAt', 'ISO 8601'],
  ])('refuse %j at its field, and store nothing', async (entry, path, words) => {
    const stayId = (await house.board(house.alder)).beds[3]?.stay?.stayId ?? '';
    const before = (await house.recordOf(stayId)).length;
    const reply = await sign(stayId, entry);
    expect(reply.status).toBe(400);
    expect(reply.problem.errors).toMatchObject([{ path, message: expect.stringContaining(words) }]);
    expect(await house.recordOf(stayId)).toHaveLength(before);
  });
});

describe('a check with a slip in its date', () => {
  it.each(['2006-03-04T08:00:00Z', '2025-03-04T08:00:00Z', '2026-02-20T08:00:00Z'])(
    'of %s does not stretch the day table',
    async (observedAt) => {
      const stayId = (await house.board(house.alder)).beds[1]?.stay?.stayId ?? '';
      const before = (await surveillanceOf(stayId)).dayTable.length;
      await house.record(stayId, 'checks', aCheck(observedAt));
      expect((await surveillanceOf(stayId)).dayTable).toHaveLength(before);
    },
  );
});

describe('who sees it', () => {
  it('is whoever sees people of the unit, also after the stay has ended', async () => {
    const stayId = (await house.board(house.alder)).beds[0]?.stay?.stayId ?? '';
    const before = await surveillanceOf(stayId, 'clinician');
    await house
      .as('charge')
      .post(`/api/stays/${stayId}/discharge`, { outcome: 'ward', observedAt: house.ago(0) });
    const after = await surveillanceOf(stayId, 'clinician');
    expect(after.leftAt).toBe(house.ago(0));
    expect(after.dayTable.map(({ day }) => day)).toEqual(before.dayTable.map(({ day }) => day));
    for (const stranger of ['display', 'birch-therapist', 'biomedical'])
      expect((await house.as(stranger).get(`/api/stays/${stayId}/surveillance`)).status).toBe(403);
  });
});
