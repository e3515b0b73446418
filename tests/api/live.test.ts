import { BEAT_EVERY_MS } from '@windrow/ventilation/contract/live';
import { Assignment, Shift } from '@windrow/ventilation/contract/shifts';
import { DEFAULT_POLICY } from '@windrow/ventilation/policy/policy';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { Caller } from '../support/caller.ts';
import { aCheck, aGas, anAdmission } from '../support/entries.ts';
import { type House, openHouse } from '../support/house.ts';
import { type Listener, listen } from '../support/listening.ts';
import { Moved, Placed } from '../support/shapes.ts';

let house: House;
let screens: Listener[];
beforeEach(async () => {
  house = await openHouse();
  screens = [];
});
afterEach(async () => {
  for (const screen of screens) screen.close();
  await house.close();
});

async function open(who: string, options: Parameters<typeof listen>[1] = {}): Promise<Listener> {
  const screen = await listen(house.as(who), options);
  screen.forget();
  screens.push(screen);
  return screen;
}

describe('the live link is refused', () => {
  it('to nobody’s session', async () => {
    await expect(listen(house.anybody())).rejects.toThrow('not signed in');
    await expect(listen(new Caller(house.server.url, 'windrow=made-up'))).rejects.toThrow('not signed in');
  });

  it.each([
    ['another origin', { origin: 'https://elsewhere.example' }],
    ['an origin that hides itself', { origin: 'null' }],
    ['our host at another port', { origin: 'http://127.0.0.1:1' }],
    ['another site that sends no origin', { site: 'cross-site' }],
  ])('to %s, with a good session', async (_, options) => {
    await expect(listen(house.as('therapist'), options)).rejects.toThrow();
  });

  it('and is given to our own page', async () => {
    const screen = await listen(house.as('therapist'), { origin: house.server.url, site: 'same-origin' });
    screen.close();
  });

  it('over polling: there is the websocket and nothing else', async () => {
    const response = await fetch(`${house.server.url}/socket.io/?EIO=4&transport=polling`, {
      headers: { cookie: house.as('therapist').cookieHeader },
    });
    expect(response.status).toBe(400);
    await response.text();
  });
});

describe('a beat', () => {
  it('comes at once with each unit’s revision, then every five seconds', { timeout: 15_000 }, async () => {
    const therapist = await listen(house.as('therapist'));
    const supervisor = await listen(house.as('supervisor'));
    screens.push(therapist, supervisor);
    const { revision } = await house.board(house.alder);
    const units = (heard: Listener) => new Set(heard.heard.beats.map(({ unitId }) => unitId));
    await supervisor.until(({ beats }) => beats.length >= 2);
    expect(therapist.heard.beats).toEqual([
      {
        serverTime: house.ago(0),
        version: 'test',
        unitId: house.alder.unitId,
        revision,
        ventilatorsReady: 0,
      },
    ]);
    expect(units(supervisor)).toEqual(new Set([house.alder.unitId, house.birch.unitId]));

    therapist.forget();
    const waits: number[] = [];
    let last = performance.now();
    for (const n of [1, 2]) {
      await therapist.until(({ beats }) => beats.length >= n, 2 * BEAT_EVERY_MS);
      waits.push(performance.now() - last);
      last = performance.now();
    }
    // The first wait begins anywhere between two beats; the second is one whole.
    expect(waits[1]).toBeGreaterThan(BEAT_EVERY_MS * 0.5);
    expect(waits[1]).toBeLessThan(BEAT_EVERY_MS * 2);
    expect(units(therapist)).toEqual(new Set([house.alder.unitId]));
  });

  it('comes to those who hear no unit too, so that they know the link lives', async () => {
    const screen = await listen(house.as('biomedical'));
    screens.push(screen);
    expect(screen.heard.beats).toMatchObject([{ unitId: null }]);
  });
});

describe('a changed bed', () => {
  it('is told with the unit’s next revision, as the board then has it', async () => {
    const screen = await open('therapist');
    const { revision: before } = await house.board(house.alder);
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    for (let n = 0; n < 5; n += 1) {
      await house.record(stayId, 'checks', aCheck(house.ago(10 - n)));
      await house.record(stayId, 'gases', aGas(house.ago(10 - n)));
    }
    const { beds } = await screen.until((heard) => heard.beds.length >= 11);
    expect(beds.map(({ revision }) => revision)).toEqual(
      Array.from({ length: 11 }, (_, n) => before + 1 + n),
    );
    const board = await house.board(house.alder);
    expect(board.revision).toBe(before + 11);
    expect(beds.at(-1)).toEqual({ revision: board.revision, unitId: house.alder.unitId, bed: board.beds[0] });
  });

  it('is told in the order of the revisions when many write at once', async () => {
    const screen = await open('therapist');
    const { revision: before } = await house.board(house.alder);
    const stays = await Promise.all([0, 1, 2].map((n) => house.admit(house.bed(house.alder, n))));
    await Promise.all(
      stays.flatMap(({ stayId }) =>
        [1, 2, 3].map((n) => house.record(stayId, 'checks', aCheck(house.ago(n)))),
      ),
    );
    const { beds } = await screen.until((heard) => heard.beds.length >= 12);
    expect(beds.map(({ revision }) => revision)).toEqual(
      Array.from({ length: 12 }, (_, n) => before + 1 + n),
    );
  });

  it('is told to nobody of another unit', async () => {
    const alder = await open('therapist');
    const birch = await open('birch-therapist');
    const { stayId } = await house.admit(house.bed(house.birch, 0));
    await house.record(stayId, 'checks', aCheck(house.ago(1)), 'birch-therapist');
    const ofAlder = await house.admit(house.bed(house.alder, 0));
    await birch.until(({ beds }) => beds.length >= 2);
    const { beds } = await alder.until((heard) => heard.beds.length >= 1);
    expect(beds.map(({ bed }) => bed.stay?.stayId)).toEqual([ofAlder.stayId]);
    expect(new Set(birch.heard.beds.map(({ unitId }) => unitId))).toEqual(new Set([house.birch.unitId]));
  });

  it('is told without its withdrawn values', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const screen = await open('therapist');
    await house.record(stayId, 'checks', aCheck(house.ago(490)));
    const { beds, raw } = await screen.until((heard) => heard.beds.length >= 1);
    expect(beds[0]?.bed.stay).toMatchObject({ check: null, withdrawn: { check: house.ago(490) } });
    expect(raw.join()).not.toContain('vtSetMl');
  });

  it('is told after the commit: whoever asks at once reads at least that revision', async () => {
    const screen = await open('therapist');
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    await screen.until(({ beds }) => beds.length >= 1);
    for (let n = 0; n < 10; n += 1) {
      const told = screen.until(({ beds }) => beds.length >= n + 2);
      const recording = house.record(stayId, 'checks', aCheck(house.ago(10 - n)));
      const { beds } = await told;
      const board = await house.board(house.alder);
      expect(board.revision).toBeGreaterThanOrEqual(beds.at(-1)?.revision ?? Number.POSITIVE_INFINITY);
      await recording;
    }
  });

  it('that is not stored is not told, even when the last step of the write fails', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const screen = await open('therapist');
    const { revision } = await house.board(house.alder);
    const therapist = house.as('therapist');
    await therapist.post('/api/stays', anAdmission(house.bed(house.alder, 0), house.ago(1)));
    await therapist.post(
      `/api/stays/${stayId}/checks`,
      aCheck(house.ago(1), { settings: { fio2Percent: 5 } }),
    );
    await house.db.raw(
      "CREATE TRIGGER fails BEFORE INSERT ON idempotency_keys BEGIN SELECT RAISE(ABORT, 'made to fail'); END",
    );
    const failed = await therapist.post(`/api/stays/${stayId}/checks`, aCheck(house.ago(2)));
    expect(failed.status).toBe(500);
    expect((await house.board(house.alder)).revision).toBe(revision);
    expect((await house.recordOf(stayId)).filter(({ kind }) => kind === 'check')).toEqual([]);

    await house.db.raw('DROP TRIGGER fails');
    const { observationId } = await house.record(stayId, 'checks', aCheck(house.ago(3)));
    const { beds } = await screen.until((heard) => heard.beds.length >= 1);
    expect(beds.map(({ bed }) => bed.stay?.check?.observationId)).toEqual([observationId]);
    expect(beds[0]?.revision).toBe(revision + 1);
  });

  it('is told once, however often its write is sent again', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const screen = await open('therapist');
    const key = crypto.randomUUID();
    const entry = aCheck(house.ago(1));
    for (const _ of [1, 2, 3])
      await house.as('therapist').post(`/api/stays/${stayId}/checks`, entry, { key });
    await house.record(stayId, 'gases', aGas(house.ago(1)));
    const { beds } = await screen.until((heard) => heard.beds.some(({ bed }) => bed.stay?.gas));
    expect(beds).toHaveLength(2);
  });
});

describe('a transfer to another unit', () => {
  it('tells each unit its own bed, under its own revision', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const [alder, birch] = [await open('therapist'), await open('birch-therapist')];
    const before = [await house.board(house.alder), await house.board(house.birch, 'birch-therapist')];
    const move = { bedId: house.bed(house.birch, 1), observedAt: house.ago(0) };
    const reply = await house.as('supervisor').post(`/api/stays/${stayId}/transfer`, move);
    expect(reply.as(Moved).beds).toHaveLength(2);
    await birch.until(({ beds }) => beds.length >= 1);
    await alder.until(({ beds }) => beds.length >= 1);
    expect(alder.heard.beds).toMatchObject([
      { revision: (before[0]?.revision ?? 0) + 1, bed: { bedId: house.bed(house.alder, 0), stay: null } },
    ]);
    expect(birch.heard.beds).toMatchObject([
      {
        revision: (before[1]?.revision ?? 0) + 1,
        bed: { bedId: house.bed(house.birch, 1), stay: { stayId } },
      },
    ]);
  });
});

describe('what is read by request', () => {
  const makeShift = async () => {
    const reply = await house.as('charge').post(`/api/units/${house.alder.unitId}/shifts`, {
      name: 'Day',
      startsAt: house.ago(60),
      endsAt: house.ago(-600),
      people: [{ personId: house.personId('therapist'), minutesAvailable: 600 }],
    });
    return reply.as(Shift).shiftId;
  };

  it('a shift and its published assignment are told to the unit, with each bed that they change', async () => {
    const [staff, wall, birch] = [
      await open('therapist'),
      await open('display'),
      await open('birch-therapist'),
    ];
    const shiftId = await makeShift();
    await staff.until(({ changed }) => changed.length >= 1);
    const places = [0, 2].map((n) => ({
      bedId: house.bed(house.alder, n),
      personId: house.personId('therapist'),
    }));
    const put = (publish: boolean, version: number) =>
      house.as('charge').put(`/api/shifts/${shiftId}/assignment`, { places, publish }, { version });
    expect((await put(false, 0)).as(Assignment)).toMatchObject({ version: 1, publishedVersion: null });
    expect((await put(true, 1)).as(Assignment)).toMatchObject({ version: 2, publishedVersion: 2 });
    for (const screen of [staff, wall]) {
      const { changed, beds } = await screen.until((heard) => heard.changed.length >= 3);
      expect(changed).toEqual(Array(3).fill({ topic: 'shifts', unitId: house.alder.unitId }));
      // A draft shows on no bed; published, it shows on the two that it gives to somebody.
      expect(beds.map(({ bed }) => bed.bedId)).toEqual(places.map(({ bedId }) => bedId));
      expect(beds.every(({ bed }) => bed.assignments[0]?.initials === 'TH')).toBe(true);
    }
    expect(birch.heard.changed).toEqual([]);
  });

  it('a move of a machine is told to everybody, and to its bed’s unit as a changed bed', async () => {
    const everybody = ['therapist', 'birch-therapist', 'display', 'biomedical', 'administrator'];
    const listeners = await Promise.all(everybody.map((who) => open(who)));
    const { ventilatorId } = await house.readyMachine('V-1');
    const path = `/api/ventilators/${ventilatorId}/moves`;
    await house.as('therapist').post(path, { state: 'in-use', bedId: house.bed(house.alder, 1) });
    for (const screen of listeners) await screen.until(({ changed }) => changed.length >= 3);
    expect(listeners[0]?.heard.changed.every(({ topic }) => topic === 'fleet')).toBe(true);
    expect(listeners[0]?.heard.beds).toMatchObject([{ bed: { ventilator: { assetNumber: 'V-1' } } }]);
    expect(listeners[1]?.heard.beds).toEqual([]);
  });

  it('a policy is told to the unit, after every bed that is shown by it', async () => {
    const screen = await open('display');
    const body = { policy: DEFAULT_POLICY, reason: 'as it was' };
    await house.as('charge').put(`/api/units/${house.alder.unitId}/policy`, body, { version: 1 });
    const { raw, beds } = await screen.until(({ changed }) => changed.length >= 1);
    expect(beds).toHaveLength(4);
    expect(raw.at(-1)).toContain('"policy"');
  });

  it('a unit that is added is heard from then on by those who may, on screens that were open before', async () => {
    const [supervisor, therapist] = [await open('supervisor'), await open('therapist')];
    const cedar = await house.addUnit('Cedar', 1);
    await supervisor.until(({ changed }) => changed.some(({ topic }) => topic === 'units'));
    await supervisor.until(
      ({ beats }) => beats.some(({ unitId }) => unitId === cedar.unitId),
      BEAT_EVERY_MS * 2,
    );
    const admission = anAdmission(house.bed(cedar, 0), house.ago(1));
    const { stay } = (await house.as('supervisor').post('/api/stays', admission)).as(Placed);
    const { beds } = await supervisor.until((heard) => heard.beds.some(({ bed }) => bed.stay !== null));
    expect(beds.at(-1)).toMatchObject({ unitId: cedar.unitId, bed: { stay: { stayId: stay.stayId } } });
    expect(therapist.heard.beds).toEqual([]);
  });
});

describe('an open screen', () => {
  it('that sends anything changes nothing: writes have their own way', async () => {
    const screen = await open('therapist');
    const { revision } = await house.board(house.alder);
    for (const event of ['bed', 'beat', 'write', 'join']) screen.say(event, { unitId: house.birch.unitId });
    await house.admit(house.bed(house.birch, 0));
    await house.readyMachine('V-1');
    const { beds } = await screen.until(({ changed }) => changed.length >= 1);
    expect(beds).toEqual([]);
    expect((await house.board(house.alder)).revision).toBe(revision);
  });

  it('that cannot be let in leaves the server standing', async () => {
    // Renewing this session needs a write that fails in another way than a full disk does.
    await house.db('sessions').update({ expires_at: new Date(Date.now() + 3_600_000).toISOString() });
    await house.db.raw(
      "CREATE TRIGGER fails BEFORE UPDATE ON sessions BEGIN SELECT RAISE(ABORT, 'made to fail'); END",
    );
    await expect(listen(house.as('therapist'))).rejects.toThrow();
    await house.db.raw('DROP TRIGGER fails');
    screens.push(await listen(house.as('therapist')));
  });
});
