import type { BedStay } from '@windrow/ventilation/contract/board';
import { PolicyVersion } from '@windrow/ventilation/contract/setup';
import { DEFAULT_POLICY, type Policy } from '@windrow/ventilation/policy/policy';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { rebuildAllBeds } from '../../apps/server/src/services/rebuild-all-beds.ts';
import { aCheck } from '../support/entries.ts';
import { type House, openHouse } from '../support/house.ts';

let house: House;
let stayId: string;
beforeEach(async () => {
  house = await openHouse();
  stayId = (await house.admit(house.bed(house.alder, 0))).stayId;
  await house.record(
    stayId,
    'checks',
    aCheck(house.ago(100), { readings: { plateauCmH2O: 28, vtExhaledMl: 375 } }),
  );
});
afterEach(() => house.close());

const set = (
  change: Partial<Policy>,
  {
    version,
    who = 'charge',
    reason = 'agreed on Tuesday',
  }: { version: number; who?: string; reason?: string },
) =>
  house
    .as(who)
    .put(
      `/api/units/${house.alder.unitId}/policy`,
      { policy: { ...DEFAULT_POLICY, ...change }, reason },
      { version },
    );
const shown = async (): Promise<BedStay | null | undefined> => (await house.board(house.alder)).beds[0]?.stay;
const tighter = { ...DEFAULT_POLICY.freshness, check: { dueFrom: 30, overdueFrom: 60, withdrawFrom: 90 } };

describe('a policy', () => {
  it('begins with the published defaults', async () => {
    expect(await house.policyOf(house.alder)).toMatchObject({
      version: 1,
      policy: DEFAULT_POLICY,
      reason: 'default policy',
      changedBy: 'Rana Oduya',
    });
  });

  it('changed, has the next version with who changed it, when and why', async () => {
    house.later(5);
    const reply = (await set({ nightFrom: '21:00' }, { version: 1 })).as(PolicyVersion);
    expect(reply).toMatchObject({
      version: 2,
      changedBy: 'Person charge',
      changedAt: house.ago(0),
      reason: 'agreed on Tuesday',
    });
    expect(await house.policyOf(house.alder)).toEqual(reply);
    expect((await house.board(house.alder)).unit.nightFrom).toBe('21:00');
    expect((await house.policyOf(house.birch)).version).toBe(1);
  });

  it('changed, shows every bed by the new ages at once', async () => {
    expect(await shown()).toMatchObject({
      check: { observedAt: house.ago(100) },
      ladder: { check: { withdrawFrom: 480 } },
    });
    await set({ freshness: tighter }, { version: 1 });
    expect(await shown()).toMatchObject({
      check: null,
      withdrawn: { check: house.ago(100) },
      ladder: { check: tighter.check },
      flags: [],
    });
    await set({}, { version: 2 });
    expect(await shown()).toMatchObject({
      check: { observedAt: house.ago(100) },
      withdrawn: { check: null },
    });
  });

  it('changed, flags every bed by the new thresholds at once', async () => {
    const ids = async () => (await shown())?.flags.map(({ id }) => id) ?? [];
    expect(await ids()).not.toContain('plateau-high');
    const thresholds = { ...DEFAULT_POLICY.thresholds, plateauHighCmH2O: 25 };
    await set({ thresholds }, { version: 1 });
    expect(await ids()).toContain('plateau-high');
    expect((await shown())?.plateauLimitCmH2O).toBe(25);
  });

  it('changed, leaves rows that the facts give again', async () => {
    await set({ freshness: tighter }, { version: 1 });
    expect(await rebuildAllBeds(house.db, { now: house.ago(0) })).toEqual({ beds: 6, differed: [] });
  });

  it('changed, leaves a look back as the board was before', async () => {
    const before = house.ago(0);
    house.later(1);
    await set({ freshness: tighter }, { version: 1 });
    const { beds } = await house.board(house.alder, 'therapist', `?at=${before}`);
    expect(beds[0]?.stay).toMatchObject({
      check: { observedAt: house.ago(101) },
      ladder: { check: { withdrawFrom: 480 } },
    });
  });

  it('changed by two at once is changed by one', async () => {
    const replies = await Promise.all([
      set({ nightFrom: '21:00' }, { version: 1 }),
      set({ nightFrom: '22:00' }, { version: 1, who: 'administrator' }),
    ]);
    expect(replies.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect((await house.policyOf(house.alder)).version).toBe(2);
  });
});
