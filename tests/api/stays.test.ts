import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { aCheck, aGas, anAdmission, aPatient } from '../support/entries.ts';
import { type House, openHouse } from '../support/house.ts';
import { Moved, Placed, RecordPage } from '../support/shapes.ts';
import { stored } from '../support/stored.ts';

let house: House;
beforeEach(async () => {
  house = await openHouse();
});
afterEach(() => house.close());

const bedOf = async (index: number) => (await house.board(house.alder)).beds[index];
const correct = (who: string, stayId: string, change: object, version: number) =>
  house.as(who).patch(`/api/stays/${stayId}`, change, { version });

describe('an admission', () => {
  it('puts the patient on the board with nothing recorded yet', async () => {
    const patient = aPatient();
    const { stayId } = await house.admit(house.bed(house.alder, 0), { patient });
    const bed = await bedOf(0);
    expect(bed?.stay).toMatchObject({
      stayId,
      version: 1,
      admittedAt: house.ago(600),
      patient,
      support: null,
      check: null,
      gas: null,
      airway: null,
      flags: [],
      withdrawn: { check: null, airway: null, gas: null },
    });
    expect(bed?.stay?.predictedBodyWeightKg).toBeCloseTo(56.91, 2);
  });

  it('without sex or height gives no weight, and nothing is judged per kg', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0), {
      patient: aPatient({ heightCm: null }),
    });
    await house.record(stayId, 'checks', aCheck(house.ago(1), { readings: { vtExhaledMl: 900 } }));
    const stay = (await bedOf(0))?.stay;
    expect(stay?.predictedBodyWeightKg).toBeNull();
    expect(stay?.check?.derived.vtPerKgMl).toBeNull();
    expect(stay?.flags.map(({ id }) => id)).not.toContain('vt-per-kg-high');
  });

  it('of two into one bed in one moment is one', async () => {
    const admit = () =>
      house.as('therapist').post('/api/stays', anAdmission(house.bed(house.alder, 0), house.ago(1)));
    const replies = await Promise.all([admit(), admit(), admit()]);
    expect(replies.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
    expect((await stored(house.db)).stays).toBe(1);
  });

  it('of one patient to two beds in one moment is one, in two units too', async () => {
    const patient = aPatient();
    const admit = (bedId: string) =>
      house.as('supervisor').post('/api/stays', anAdmission(bedId, house.ago(1), { patient }));
    const beds = [house.bed(house.alder, 0), house.bed(house.alder, 1), house.bed(house.birch, 0)];
    const replies = await Promise.all(beds.map(admit));
    expect(replies.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
    expect((await stored(house.db)).stays).toBe(1);
  });

  it('to a closed bed is refused', async () => {
    const bedId = house.bed(house.alder, 0);
    await house.as('administrator').patch(`/api/beds/${bedId}`, { isOpen: false });
    const before = await stored(house.db);
    const reply = await house.as('therapist').post('/api/stays', anAdmission(bedId, house.ago(1)));
    expect(reply.status).toBe(409);
    expect(reply.problem.errors).toEqual([
      { path: 'bedId', message: 'is closed; only an open bed takes a patient' },
    ]);
    expect(await stored(house.db)).toEqual(before);
  });

  it('of a patient who left is a new stay, and the old record stays with the old one', async () => {
    const patient = aPatient();
    const first = await house.admit(house.bed(house.alder, 0), { patient });
    await house.record(first.stayId, 'checks', aCheck(house.ago(60)));
    await house
      .as('therapist')
      .post(`/api/stays/${first.stayId}/discharge`, { outcome: 'ward', observedAt: house.ago(30) });
    const second = await house
      .as('therapist')
      .post('/api/stays', anAdmission(house.bed(house.alder, 0), house.ago(10), { patient }));
    expect(second.as(Placed).bed.stay?.check).toBeNull();
    expect((await house.recordOf(first.stayId)).map(({ kind }) => kind)).toEqual([
      'place',
      'check',
      'place',
      'details',
    ]);
  });
});

describe('a correction', () => {
  it('counts from now on, is one version more, and leaves the earlier words in the record', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0), { precautions: 'contact' });
    await house.record(stayId, 'checks', aCheck(house.ago(1), { readings: { vtExhaledMl: 500 } }));
    const reply = await correct(
      'therapist',
      stayId,
      { patient: aPatient({ heightCm: 180 }), precautions: null },
      1,
    );
    const { stay, bed } = reply.as(Placed);
    expect(stay).toMatchObject({ version: 2, details: { precautions: null, patient: { heightCm: 180 } } });
    expect(bed.stay?.check?.derived.vtPerKgMl).toBeCloseTo(500 / (45.5 + 2.3 * (180 / 2.54 - 60)), 3);
    const details = (await house.recordOf(stayId)).filter(({ kind }) => kind === 'details');
    expect(details.map(({ body }) => body.precautions)).toEqual([null, 'contact']);
  });

  it('counts even where the admission was entered a minute ahead of the server', async () => {
    const admission = anAdmission(house.bed(house.alder, 0), house.ago(-1), { precautions: 'contact' });
    const { stay } = (await house.as('therapist').post('/api/stays', admission)).as(Placed);
    const { bed } = (await correct('therapist', stay.stayId, { precautions: 'airborne' }, 1)).as(Placed);
    expect(bed.stay?.precautions).toBe('airborne');
  });

  it('to the number of another present patient is refused', async () => {
    const other = aPatient();
    await house.admit(house.bed(house.alder, 1), { patient: other });
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const before = await stored(house.db);
    const reply = await correct('therapist', stayId, { patient: other }, 1);
    expect(reply.status).toBe(409);
    expect(reply.problem.errors?.[0]?.path).toBe('patient.hospitalNumber');
    expect(await stored(house.db)).toEqual(before);
  });

  it('of two people at once is one first and one second, who is told', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const replies = await Promise.all([
      correct('therapist', stayId, { difficultAirway: true }, 1),
      correct('charge', stayId, { precautions: 'contact' }, 1),
    ]);
    expect(replies.map(({ status }) => status).sort()).toEqual([200, 409]);
    const late = replies.find(({ status }) => status === 409);
    expect(late?.problem.detail).toMatch(/Person (therapist|charge) changed it at 2026-03-05T08:00:00\.000Z/);
  });

  it('orders a tighter ladder for this stay, and never a looser one', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const orders = { checkEveryMinutes: 120, gasEveryMinutes: 2880 };
    const { bed } = (await correct('therapist', stayId, { orders }, 1)).as(Placed);
    expect(bed.stay?.ladder).toEqual({
      check: { dueFrom: 105, overdueFrom: 120, withdrawFrom: 240 },
      airway: { dueFrom: 420, overdueFrom: 480, withdrawFrom: 960 },
      gas: { dueFrom: 1440, overdueFrom: 1440, withdrawFrom: 1440 },
    });
  });
});

describe('a transfer', () => {
  const move = (stayId: string, bedId: string, who = 'supervisor') =>
    house.as(who).post(`/api/stays/${stayId}/transfer`, { bedId, observedAt: house.ago(0) });

  it('takes the record and the machine along, and leaves the bed empty', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const { observationId } = await house.record(stayId, 'checks', aCheck(house.ago(5)));
    const machine = await house.readyMachine('V-1');
    const moves = `/api/ventilators/${machine.ventilatorId}/moves`;
    await house.as('therapist').post(moves, { state: 'in-use', bedId: house.bed(house.alder, 0) });
    const { stay, beds } = (await move(stayId, house.bed(house.birch, 1))).as(Moved);
    expect(stay).toMatchObject({ version: 2, bedId: house.bed(house.birch, 1), unitId: house.birch.unitId });
    expect(beds).toMatchObject([
      { bedId: house.bed(house.alder, 0), stay: null, ventilator: null },
      {
        bedId: house.bed(house.birch, 1),
        stay: { stayId, admittedAt: house.ago(600), check: { observationId } },
        ventilator: { assetNumber: 'V-1' },
      },
    ]);
    expect(await house.board(house.birch, 'birch-therapist')).toMatchObject({
      beds: [{ stay: null }, { stay: { stayId } }],
    });
  });

  it('leaves the authority with the new unit', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    await move(stayId, house.bed(house.birch, 0));
    const record = (who: string) => house.as(who).post(`/api/stays/${stayId}/checks`, aCheck(house.ago(0)));
    expect((await record('therapist')).status).toBe(403);
    expect((await house.as('therapist').get(`/api/stays/${stayId}/record`)).status).toBe(403);
    expect((await record('birch-therapist')).status).toBe(201);
  });

  it('by the new unit’s policy has the new unit’s ages', async () => {
    const { policy } = await house.policyOf(house.birch);
    const freshness = { ...policy.freshness, check: { dueFrom: 10, overdueFrom: 20, withdrawFrom: 30 } };
    await house
      .as('administrator')
      .put(
        `/api/units/${house.birch.unitId}/policy`,
        { policy: { ...policy, freshness }, reason: 'tighter' },
        { version: 1 },
      );
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    await house.record(stayId, 'checks', aCheck(house.ago(25)));
    const { beds } = (await move(stayId, house.bed(house.birch, 0))).as(Moved);
    expect(beds[1]?.stay).toMatchObject({
      ladder: { check: freshness.check },
      check: { observedAt: house.ago(25) },
    });
    house.later(5);
    expect((await house.board(house.birch, 'birch-therapist')).beds[0]?.stay).toMatchObject({
      check: null,
      withdrawn: { check: house.ago(30) },
    });
  });

  it('to a bed that has a machine in use leaves both machines where they are', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    for (const [n, name] of [
      [0, 'V-1'],
      [1, 'V-2'],
    ] as const) {
      const { ventilatorId } = await house.readyMachine(name);
      await house.as('therapist').post(`/api/ventilators/${ventilatorId}/moves`, {
        state: 'in-use',
        bedId: house.bed(house.alder, n),
      });
    }
    const { beds } = (await move(stayId, house.bed(house.alder, 1))).as(Moved);
    expect(beds.map(({ ventilator }) => ventilator?.assetNumber)).toEqual(['V-1', 'V-2']);
  });

  it('to a taken or a closed bed is refused, and nothing moves', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    await house.admit(house.bed(house.alder, 1));
    await house.as('administrator').patch(`/api/beds/${house.bed(house.alder, 2)}`, { isOpen: false });
    const before = await stored(house.db);
    for (const index of [1, 2]) expect((await move(stayId, house.bed(house.alder, index))).status).toBe(409);
    expect(await stored(house.db)).toEqual(before);
    expect((await bedOf(0))?.stay?.stayId).toBe(stayId);
  });

  it('of two patients who change beds in one moment loses neither', async () => {
    const [one, other] = [
      await house.admit(house.bed(house.alder, 0)),
      await house.admit(house.bed(house.alder, 1)),
    ];
    const replies = await Promise.all([
      move(one.stayId, house.bed(house.alder, 2)),
      move(other.stayId, house.bed(house.alder, 2)),
    ]);
    expect(replies.map(({ status }) => status).sort()).toEqual([200, 409]);
    const { beds } = await house.board(house.alder);
    expect(beds.flatMap(({ stay }) => stay?.stayId ?? []).sort()).toEqual([one.stayId, other.stayId].sort());
  });
});

describe('a discharge', () => {
  it('empties the bed, keeps the record, and sends the machine to be cleaned', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    await house.record(stayId, 'checks', aCheck(house.ago(5)));
    const { ventilatorId } = await house.readyMachine('V-1');
    await house
      .as('therapist')
      .post(`/api/ventilators/${ventilatorId}/moves`, { state: 'in-use', bedId: house.bed(house.alder, 0) });
    const out = { outcome: 'home', observedAt: house.ago(1) };
    const { stay, bed } = (await house.as('therapist').post(`/api/stays/${stayId}/discharge`, out)).as(
      Placed,
    );
    expect(stay).toMatchObject({ bedId: null, leftAt: house.ago(1), outcome: 'home', version: 2 });
    expect(bed).toMatchObject({ stay: null, ventilator: null, isOpen: true });
    expect(await house.machine('V-1')).toMatchObject({
      state: 'cleaning',
      place: { unitId: house.alder.unitId, bedId: null },
      sinceAt: house.ago(1),
    });
    expect((await house.recordOf(stayId)).map(({ kind }) => kind)).toEqual([
      'place',
      'check',
      'place',
      'details',
    ]);
    // The bed takes the next patient at once.
    expect(
      (await house.as('therapist').post('/api/stays', anAdmission(house.bed(house.alder, 0), house.ago(0))))
        .status,
    ).toBe(201);
  });

  it('sent again under its key is answered as the first time', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const key = crypto.randomUUID();
    const send = () =>
      house
        .as('therapist')
        .post(`/api/stays/${stayId}/discharge`, { outcome: 'ward', observedAt: house.ago(1) }, { key });
    const first = await send();
    const before = await stored(house.db);
    expect((await send()).text).toBe(first.text);
    expect(await stored(house.db)).toEqual(before);
  });

  it('does not keep a fact of the stay from being amended, which no bed shows', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    const { observationId } = await house.record(stayId, 'checks', aCheck(house.ago(5)));
    await house
      .as('therapist')
      .post(`/api/stays/${stayId}/discharge`, { outcome: 'ward', observedAt: house.ago(1) });
    const { revision } = await house.board(house.alder);
    const reply = await house
      .as('therapist')
      .post(`/api/observations/${observationId}/amendments`, { as: 'struck', reason: 'wrong patient' });
    expect(reply.body).toMatchObject({ revision: null, bed: null });
    expect((await house.board(house.alder)).revision).toBe(revision);
  });
});

describe('the record of a stay', () => {
  it('pages through every fact once, newest first, ties and all', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    for (let n = 0; n < 7; n += 1) {
      // Three facts of one minute, and one recorded late about an earlier one.
      await house.record(stayId, 'checks', aCheck(house.ago(n < 3 ? 60 : 60 + n)));
      await house.record(stayId, 'gases', aGas(house.ago(60)));
    }
    const seen: string[] = [];
    let cursor: string | null = null;
    do {
      const query: string = cursor ? `&cursor=${encodeURIComponent(cursor)}` : '';
      const page = (await house.as('therapist').get(`/api/stays/${stayId}/record?limit=3${query}`)).as(
        RecordPage,
      );
      expect(page.items.length).toBeLessThanOrEqual(3);
      seen.push(...page.items.map(({ observationId }) => observationId));
      cursor = page.nextCursor;
    } while (cursor !== null);
    const whole = await house.recordOf(stayId);
    expect(seen).toEqual(whole.map(({ observationId }) => observationId));
    expect(new Set(seen).size).toBe(16);
    const times = whole.map(({ observedAt }) => observedAt);
    expect(times).toEqual([...times].sort().reverse());
  });
});
