import {
  Capacity,
  NEXT_STATES,
  VENTILATOR_STATES,
  Ventilator,
  VentilatorMoved,
  type VentilatorState,
} from '@windrow/ventilation/contract/fleet';
import { Shift } from '@windrow/ventilation/contract/shifts';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { aCheck } from '../support/entries.ts';
import { type House, type HouseUnit, openHouse } from '../support/house.ts';
import { listOf } from '../support/shapes.ts';
import { stored } from '../support/stored.ts';

let house: House;

async function capacity(who = 'therapist'): Promise<Capacity> {
  return (await house.as(who).get('/api/capacity')).as(Capacity);
}

async function countsOf(unit: HouseUnit) {
  const found = (await capacity()).units.find(({ unitId }) => unitId === unit.unitId);
  if (!found) throw new Error('the unit is not counted');
  return found;
}

const adultIcu = async () => (await capacity()).classes.find((each) => each.class === 'adult-icu')?.counts;
const move = (who: string, ventilatorId: string, body: object) =>
  house.as(who).post(`/api/ventilators/${ventilatorId}/moves`, body);
const movesOf = async (ventilatorId: string, query = '') =>
  (await house.as('therapist').get(`/api/ventilators/${ventilatorId}/moves${query}`)).as(
    listOf(VentilatorMoved),
  );

describe('a machine', () => {
  beforeEach(async () => {
    house = await openHouse();
  });
  afterEach(() => house.close());

  it('is new in cleaning, and is ready only when somebody who manages the fleet says so', async () => {
    const entry = {
      assetNumber: 'V-1',
      model: 'Model T',
      class: 'transport',
      homeUnitId: house.alder.unitId,
    };
    const machine = (await house.as('biomedical').post('/api/ventilators', entry)).as(Ventilator);
    expect(machine).toMatchObject({
      state: 'cleaning',
      version: 1,
      place: { unitId: house.alder.unitId, bedId: null },
    });
    expect((await move('therapist', machine.ventilatorId, { state: 'ready' })).status).toBe(403);
    expect((await move('biomedical', machine.ventilatorId, { state: 'ready' })).as(Ventilator).version).toBe(
      2,
    );
  });

  it('taken into use stands at its bed on the board, and comes back to its unit for cleaning', async () => {
    const { ventilatorId } = await house.readyMachine('V-1');
    const bedId = house.bed(house.alder, 2);
    await move('therapist', ventilatorId, { state: 'in-use', bedId, observedAt: house.ago(10) });
    const [, , bed] = (await house.board(house.alder)).beds;
    expect(bed?.ventilator).toEqual({ ventilatorId, assetNumber: 'V-1', model: 'Model T' });
    expect(await house.machine('V-1')).toMatchObject({
      state: 'in-use',
      place: { bedId, bedLabel: '03' },
      sinceAt: house.ago(10),
    });
    await move('therapist', ventilatorId, { state: 'cleaning', note: 'wiped' });
    expect(await house.machine('V-1')).toMatchObject({
      state: 'cleaning',
      place: { unitId: house.alder.unitId, bedId: null },
    });
    expect((await house.board(house.alder)).beds[2]?.ventilator).toBeNull();
    const { items } = await movesOf(ventilatorId);
    expect(items.map(({ from, to, movedBy }) => [from, to, movedBy])).toEqual([
      ['in-use', 'cleaning', 'Person therapist'],
      ['ready', 'in-use', 'Person therapist'],
      ['cleaning', 'ready', 'Person biomedical'],
    ]);
  });

  it('stands at one bed, and a bed has one machine, even when two are brought in one moment', async () => {
    const machines = [await house.readyMachine('V-1'), await house.readyMachine('V-2')];
    const bedId = house.bed(house.alder, 0);
    const brought = await Promise.all(
      machines.map(({ ventilatorId }) => move('therapist', ventilatorId, { state: 'in-use', bedId })),
    );
    expect(brought.map(({ status }) => status).sort()).toEqual([201, 409]);
    const refused = brought.find(({ status }) => status === 409);
    expect(refused?.problem.errors?.[0]).toMatchObject({
      path: 'bedId',
      message: expect.stringMatching(/has V-[12] in use; return that one first/),
    });
    const winner = machines[brought.findIndex(({ status }) => status === 201)];
    const again = await move('therapist', winner?.ventilatorId ?? '', {
      state: 'in-use',
      bedId: house.bed(house.alder, 1),
    });
    expect(again.status).toBe(409);
  });

  it('moves are listed page by page, newest first', async () => {
    const { ventilatorId } = await house.readyMachine('V-1');
    for (const state of ['held', 'cleaning', 'ready', 'on-loan'])
      await move('biomedical', ventilatorId, { state });
    const first = await movesOf(ventilatorId, '?limit=3');
    const second = await movesOf(ventilatorId, `?limit=3&cursor=${first.nextCursor}`);
    expect([...first.items, ...second.items].map(({ to }) => to)).toEqual([
      'on-loan',
      'ready',
      'cleaning',
      'held',
      'ready',
    ]);
    expect(second.nextCursor).toBeNull();
  });

  it('on loan stands in no unit, and is counted by none as ready', async () => {
    const { ventilatorId } = await house.readyMachine('V-1');
    expect((await countsOf(house.alder)).ventilatorsReady).toBe(1);
    const lent = (await move('supervisor', ventilatorId, { state: 'on-loan', words: 'Saint Brannock' })).as(
      Ventilator,
    );
    expect(lent.place).toEqual({ unitId: null, bedId: null, bedLabel: null, words: 'Saint Brannock' });
    expect((await countsOf(house.alder)).ventilatorsReady).toBe(0);
  });
});

describe('the moves that a state allows', () => {
  const states = Object.keys(VENTILATOR_STATES) as VentilatorState[];
  /** How a machine gets from ready to each state. */
  const WAY: Record<VentilatorState, VentilatorState[]> = {
    ready: [],
    'in-use': ['in-use'],
    cleaning: ['cleaning'],
    held: ['held'],
    'on-loan': ['on-loan'],
    retired: ['retired'],
  };
  let number = 0;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());

  const body = (state: VentilatorState, bed: number) => ({
    state,
    ...(state === 'in-use' ? { bedId: house.bed(house.alder, bed) } : {}),
  });

  it.each(states)('from %s are made, and every other is refused with what is accepted', async (from) => {
    for (const to of states) {
      number += 1;
      const { ventilatorId } = await house.readyMachine(`V-${number}`);
      for (const state of WAY[from])
        expect((await move('biomedical', ventilatorId, body(state, 0))).status).toBe(201);
      const before = await stored(house.db);
      const reply = await move('biomedical', ventilatorId, body(to, 1));
      if (NEXT_STATES[from].includes(to)) expect(reply.status, `${from} → ${to}`).toBe(201);
      else {
        expect(reply.status, `${from} → ${to}`).toBe(409);
        for (const next of NEXT_STATES[from]) expect(reply.problem.detail).toContain(VENTILATOR_STATES[next]);
        expect(reply.problem.errors?.[0]?.path).toBe('state');
        expect(await stored(house.db)).toEqual(before);
      }
      // Off the bed again for the next one.
      if ((await house.machine(`V-${number}`))?.state === 'in-use')
        await move('biomedical', ventilatorId, { state: 'cleaning' });
    }
  });
});

describe('capacity', () => {
  beforeEach(async () => {
    house = await openHouse();
  });
  afterEach(() => house.close());

  it('counts a machine out of ready and into use when it is taken to a bed', async () => {
    const { ventilatorId } = await house.readyMachine('V-1');
    await house.readyMachine('V-2', house.birch.unitId);
    expect(await adultIcu()).toEqual({ inUse: 0, ready: 2, cleaning: 0, held: 0, onLoan: 0 });
    expect(await countsOf(house.alder)).toMatchObject({ ventilatorsReady: 1 });
    expect((await house.board(house.alder)).fleet.ready).toBe(1);
    await move('therapist', ventilatorId, { state: 'in-use', bedId: house.bed(house.alder, 0) });
    expect(await adultIcu()).toEqual({ inUse: 1, ready: 1, cleaning: 0, held: 0, onLoan: 0 });
    expect(await countsOf(house.alder)).toMatchObject({ ventilatorsReady: 0 });
    expect(await countsOf(house.birch)).toMatchObject({ ventilatorsReady: 1 });
    expect((await house.board(house.alder)).fleet.ready).toBe(0);
    await move('therapist', ventilatorId, { state: 'cleaning' });
    expect(await adultIcu()).toEqual({ inUse: 0, ready: 1, cleaning: 1, held: 0, onLoan: 0 });
  });

  it('counts beds, and what the patients in them breathe with', async () => {
    const modes = [
      aCheck(house.ago(5)),
      { observedAt: house.ago(5), mode: 'niv-cpap', settings: { cpapCmH2O: 8, fio2Percent: 40 } },
      null,
    ];
    for (const [n, check] of modes.entries()) {
      const { stayId } = await house.admit(house.bed(house.alder, n));
      if (check) await house.record(stayId, 'checks', check);
    }
    await house.as('administrator').patch(`/api/beds/${house.bed(house.alder, 3)}`, { isOpen: false });
    expect(await countsOf(house.alder)).toMatchObject({
      beds: { open: 3, closed: 1, occupied: 3, free: 0 },
      support: { invasive: 1, mask: 1, highFlow: 0, other: 0, unknown: 1 },
      unassigned: 3,
      withoutMachine: 2,
      checksOverdue: 0,
      oldestCheckAt: house.ago(5),
    });
    expect(await countsOf(house.birch)).toMatchObject({
      beds: { open: 2, closed: 0, occupied: 0, free: 2 },
      oldestCheckAt: null,
    });
  });

  it('counts a check overdue from the minute that it is, and still when its values are withdrawn', async () => {
    const { stayId } = await house.admit(house.bed(house.alder, 0));
    await house.record(stayId, 'checks', aCheck(house.ago(239)));
    expect((await countsOf(house.alder)).checksOverdue).toBe(0);
    house.later(1);
    expect((await countsOf(house.alder)).checksOverdue).toBe(1);
    house.later(600);
    expect(await countsOf(house.alder)).toMatchObject({
      checksOverdue: 1,
      oldestCheckAt: house.ago(840),
      // As on the wall: what only a withdrawn check speaks of is not known any more.
      support: { invasive: 0, unknown: 1 },
    });
  });

  it('counts a bed as assigned for as long as its shift runs', async () => {
    await house.admit(house.bed(house.alder, 0));
    const made = await house.as('charge').post(`/api/units/${house.alder.unitId}/shifts`, {
      name: 'Day',
      startsAt: house.ago(60),
      endsAt: house.ago(-60),
      people: [{ personId: house.personId('therapist'), minutesAvailable: 120 }],
    });
    const { shiftId } = made.as(Shift);
    const places = [{ bedId: house.bed(house.alder, 0), personId: house.personId('therapist') }];
    await house
      .as('charge')
      .put(`/api/shifts/${shiftId}/assignment`, { places, publish: true }, { version: 0 });
    expect((await countsOf(house.alder)).unassigned).toBe(0);
    house.later(60);
    expect((await countsOf(house.alder)).unassigned).toBe(1);
  });

  it('names nobody', async () => {
    await house.admit(house.bed(house.alder, 0));
    const { text } = await house.as('biomedical').get('/api/capacity');
    expect(text).not.toMatch(/Varga|Ilse|stayId|personId/);
  });
});
