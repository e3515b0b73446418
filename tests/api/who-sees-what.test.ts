import { Bed, Unit } from '@windrow/ventilation/contract/board';
import { Ventilator } from '@windrow/ventilation/contract/fleet';
import { AuditEntry } from '@windrow/ventilation/contract/setup';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { routes } from '../../apps/server/src/http/routes.ts';
import { aCheck, aGas } from '../support/entries.ts';
import { openHouse } from '../support/house.ts';
import { listen } from '../support/listening.ts';
import { listOf, Recorded } from '../support/shapes.ts';
import { storedBesidesAsking } from '../support/stored.ts';
import { PROBES } from './permissions/probes.ts';
import { CLINICAL, IDENTITY, openScene, type Scene, WRITTEN } from './permissions/scene.ts';

let scene: Scene;
beforeAll(async () => {
  scene = await openScene(await openHouse());
});
afterAll(() => scene.house.close());

function requireNoneOf(words: readonly string[], text: string, where: string): void {
  for (const word of words) expect(text.includes(word), `${word} stands in ${where}`).toBe(false);
}

describe('a display', () => {
  const boardPath = () => `/api/units/${scene.alder.unitId}/board`;

  it('is sent the board without who the patient is and without what was written about them', async () => {
    for (const query of ['', '?audience=display', '?audience=staff', `?at=${scene.house.ago(0)}`]) {
      const { text, status } = await scene.inAlder.display.get(`${boardPath()}${query}`);
      expect(status).toBe(200);
      expect(text).toContain('"vtSetMl"');
      requireNoneOf([...IDENTITY, ...WRITTEN], text, `the board of a display with ${query || 'no query'}`);
    }
  });

  it('opened by staff is sent no more than any display', async () => {
    const { text } = await scene.inAlder.therapist.get(`${boardPath()}?audience=display`);
    expect(text).toContain('"vtSetMl"');
    requireNoneOf([...IDENTITY, ...WRITTEN], text, 'the board of a wall that a therapist opened');
  });

  it('is told of a changed bed without who the patient is', async () => {
    const screens = await Promise.all([
      listen(scene.inAlder.display),
      listen(scene.inAlder.display, { audience: 'staff' }),
      listen(scene.inAlder.therapist, { audience: 'display' }),
    ]);
    const { stayId } = scene.alder;
    await scene.inAlder.therapist.post(`/api/stays/${stayId}/checks`, aCheck(scene.house.ago(1)));
    for (const screen of screens) {
      const { raw } = await screen.until(({ beds }) => beds.length > 0);
      expect(raw.join()).toContain('"vtSetMl"');
      requireNoneOf([...IDENTITY, ...WRITTEN], raw.join(), 'what a display was told');
      screen.close();
    }
  });
});

describe.each(['biomedical', 'administrator'] as const)('a %s', (role) => {
  it('finds no patient and nothing clinical at any address that is read', async () => {
    const reads = routes.filter(({ method }) => method === 'get');
    for (const { path } of reads) {
      for (const place of [scene.alder, scene.birch]) {
        const caller = scene.inHospital[role];
        const probe = await PROBES[`GET ${path}`]?.({ scene, place, caller, number: 0 });
        const { text } = await caller.get(probe?.path ?? '');
        requireNoneOf([...IDENTITY, ...WRITTEN], text, path);
        if (path !== '/api/openapi.json') requireNoneOf(CLINICAL, text, path);
      }
    }
  });

  it('is told of no bed', async () => {
    const screen = await listen(scene.inHospital[role], { audience: 'staff' });
    const { stayId } = scene.alder;
    await scene.inAlder.therapist.post(`/api/stays/${stayId}/gases`, aGas(scene.house.ago(1)));
    // Machines are everybody's news, so this one ends the wait.
    await scene.house.readyMachine(`V-told-${role}`);
    const { raw, beds } = await screen.until(({ changed }) => changed.some(({ topic }) => topic === 'fleet'));
    expect(beds).toEqual([]);
    requireNoneOf([...IDENTITY, ...WRITTEN, ...CLINICAL], raw.join(), 'what was told');
    screen.close();
  });
});

describe('what comes back from a write', () => {
  it('tells an administrator who opens a bed nothing of the patient in it', async () => {
    const bed = await scene.inHospital.administrator.patch(`/api/beds/${scene.alder.takenBedId}`, {
      isOpen: true,
    });
    expect(bed.as(Bed)).toMatchObject({ bedId: scene.alder.takenBedId, isOpen: true });
    requireNoneOf([...IDENTITY, ...WRITTEN, ...CLINICAL], bed.text, 'the opened bed');
    // The others still see the patient.
    const board = await scene.house.board(scene.alder, 'charge');
    expect(board.beds.find(({ bedId }) => bedId === scene.alder.takenBedId)?.stay?.stayId).toBe(
      scene.alder.stayId,
    );
  });

  it('tells a biomedical technician who brings a machine nothing of the patient at the bed', async () => {
    const { ventilatorId } = await scene.house.readyMachine('V-brought');
    const path = `/api/ventilators/${ventilatorId}/moves`;
    const moved = await scene.inHospital.biomedical.post(path, {
      state: 'in-use',
      bedId: scene.alder.takenBedId,
    });
    expect(moved.as(Ventilator).place.bedId).toBe(scene.alder.takenBedId);
    requireNoneOf([...IDENTITY, ...WRITTEN, ...CLINICAL], moved.text, 'the moved machine');
    await scene.inHospital.biomedical.post(path, { state: 'cleaning' });
  });
});

describe('the authority over a thing', () => {
  async function requireRefused(ask: () => Promise<{ status: number }>): Promise<void> {
    const before = await storedBesidesAsking(scene.house.db);
    expect((await ask()).status).toBe(403);
    expect(await storedBesidesAsking(scene.house.db)).toEqual(before);
  }

  it('lets a therapist amend no fact that somebody else recorded, and a charge therapist any of the unit', async () => {
    const { inAlder, alder, birch, house } = scene;
    const strike = { as: 'struck', reason: 'wrong patient' };
    const check = await inAlder.charge.post(`/api/stays/${alder.stayId}/checks`, aCheck(house.ago(3)));
    const path = (id: string) => `/api/observations/${id}/amendments`;
    const { observationId } = check.as(Recorded);
    await requireRefused(() => inAlder.therapist.post(path(observationId), strike));
    await requireRefused(() => inAlder.charge.post(path(birch.observationId), strike));
    expect((await house.as('charge').post(path(observationId), strike)).status).toBe(201);
  });

  it('moves no stay into a unit where the role is not held', async () => {
    const { inAlder, alder, birch, house } = scene;
    const move = { bedId: birch.freeBedId, observedAt: house.ago(0) };
    await requireRefused(() => inAlder.charge.post(`/api/stays/${alder.stayId}/transfer`, move));
    await requireRefused(() => inAlder.therapist.post(`/api/stays/${alder.stayId}/transfer`, move));
  });

  it('takes no machine from a bed of a unit where the role is not held, whatever unit the move names', async () => {
    const { inAlder, inHospital, alder, birch, house } = scene;
    const { ventilatorId } = await house.readyMachine('V-foreign', birch.unitId);
    const path = `/api/ventilators/${ventilatorId}/moves`;
    await inHospital.biomedical.post(path, { state: 'in-use', bedId: birch.takenBedId });
    for (const caller of [inAlder.therapist, inAlder.charge, inAlder.supervisor, inAlder.biomedical]) {
      await requireRefused(() => caller.post(path, { state: 'cleaning' }));
      await requireRefused(() => caller.post(path, { state: 'cleaning', unitId: alder.unitId }));
      await requireRefused(() => caller.post(path, { state: 'held', unitId: alder.unitId }));
    }
    expect((await house.as('birch-therapist').post(path, { state: 'cleaning' })).status).toBe(201);
  });

  it('lets bedside staff use and return machines, and make no other move', async () => {
    const { inAlder, alder, house } = scene;
    const { ventilatorId } = await house.readyMachine('V-bedside');
    const path = `/api/ventilators/${ventilatorId}/moves`;
    for (const state of ['held', 'on-loan', 'cleaning', 'retired']) {
      await requireRefused(() => inAlder.therapist.post(path, { state }));
      await requireRefused(() => inAlder.charge.post(path, { state }));
    }
    expect((await inAlder.therapist.post(path, { state: 'in-use', bedId: alder.freeBedId })).status).toBe(
      201,
    );
    await requireRefused(() => inAlder.therapist.post(path, { state: 'held' }));
    expect((await inAlder.charge.post(path, { state: 'cleaning' })).status).toBe(201);
    await requireRefused(() => inAlder.charge.post(path, { state: 'ready' }));
  });

  it('lists to each the units that they may open', async () => {
    const names = async (who: keyof Scene['inAlder'], from: Scene['inAlder']) =>
      (await from[who].get('/api/units')).as(listOf(Unit)).items.map(({ name }) => name);
    for (const role of [
      'therapist',
      'charge',
      'supervisor',
      'clinician',
      'administrator',
      'display',
    ] as const) {
      expect(await names(role, scene.inAlder)).toEqual(['Alder']);
      expect(await names(role, scene.inHospital)).toEqual(['Alder', 'Birch']);
    }
    expect(await names('biomedical', scene.inAlder)).toEqual([]);
  });
});

describe('the audit trail', () => {
  const acts = async (caller: Scene['inAlder']['charge']) =>
    (await caller.get('/api/audit?limit=200')).as(listOf(AuditEntry)).items;

  it('shows a therapist their own acts only', async () => {
    const { personId } = scene.house;
    const items = await acts(scene.inAlder.therapist);
    expect(items.length).toBeGreaterThan(0);
    expect(new Set(items.map((item) => item.personId))).toEqual(new Set([personId('therapist-of-alder')]));
  });

  it.each(['charge', 'administrator'] as const)(
    'shows a %s of one unit what was done in it, and not in others',
    async (role) => {
      const items = await acts(scene.inAlder[role]);
      const mine = scene.house.personId(`${role}-of-alder`);
      const others = items.filter((item) => item.personId !== mine);
      expect(others.length).toBeGreaterThan(0);
      expect(new Set(others.map(({ unitId }) => unitId))).toEqual(new Set([scene.alder.unitId]));
    },
  );

  it('shows an administrator of the hospital every act, refusals among them', async () => {
    await scene.inAlder.clinician.get('/api/people');
    const items = await acts(scene.inHospital.administrator);
    expect(items[0]).toMatchObject({
      act: 'GET /api/people',
      outcome: 'refused',
      displayName: 'Person clinician-of-alder',
    });
    expect(new Set(items.map(({ unitId }) => unitId))).toContain(scene.birch.unitId);
  });
});
