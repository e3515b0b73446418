import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Bed, BedStay } from '../contract/board.ts';
import { DEFAULT_POLICY } from '../policy/policy.ts';
import { SUPPORT_CATALOGUE, type SupportId } from '../support/catalogue.ts';
import { bedMinutes } from './bed-minutes.ts';

const TUBE: BedStay['device'] = {
  observationId: 'd1',
  placedAt: '2026-03-05T00:00:00Z',
  kind: 'oral-tube',
  sizeMm: 7.5,
  depthCm: 22,
  depthMark: 'lip',
  cuffed: true,
  subglotticPort: true,
};

function bed(stay: Partial<BedStay> | null): Bed {
  return {
    bedId: 'b1',
    unitId: 'u1',
    label: '01',
    row: 1,
    column: 1,
    isOpen: true,
    revision: 1,
    assignments: [],
    ventilator: null,
    stay: stay && {
      stayId: 's1',
      version: 1,
      admittedAt: '2026-03-05T00:00:00Z',
      patient: null,
      predictedBodyWeightKg: null,
      difficultAirway: false,
      precautions: null,
      careLimits: null,
      orders: { checkEveryMinutes: null, gasEveryMinutes: null },
      support: null,
      proneSinceAt: null,
      away: null,
      trial: null,
      lastTrial: null,
      screen: null,
      check: null,
      device: null,
      airway: null,
      gas: null,
      flags: [],
      ladder: DEFAULT_POLICY.freshness,
      plateauLimitCmH2O: 30,
      withdrawn: { check: null, airway: null, gas: null },
      ...stay,
    },
  };
}

function on(id: SupportId): BedStay['support'] {
  return { id, shortName: id, sinceAt: '2026-03-05T00:00:00Z' };
}

function minutes(stay: Partial<BedStay> | null, shiftMinutes = 720) {
  return bedMinutes({ bed: bed(stay), policy: DEFAULT_POLICY, shiftMinutes });
}

describe('bedMinutes', () => {
  it('asks nothing of an empty bed', () => {
    expect(minutes(null)).toEqual({ total: 0, parts: [] });
  });

  it('makes a tubed, ventilated bed of checks, airway care and inhaled treatments', () => {
    expect(minutes({ support: on('ac-vc'), device: TUBE })).toEqual({
      total: 86,
      parts: [
        { task: 'check', times: 3, minutes: 36 },
        { task: 'airwayCare', times: 2, minutes: 30 },
        { task: 'inhaledTreatment', times: 2, minutes: 20 },
      ],
    });
  });

  it('makes a mask of checks, inhaled treatments and mask care', () => {
    expect(minutes({ support: on('niv-st') }).parts.map(({ task }) => task)).toEqual([
      'check',
      'inhaledTreatment',
      'maskCare',
    ]);
  });

  it('makes high flow and oxygen of oxygen rounds, and airway care where a device stays in', () => {
    expect(minutes({ support: on('hfnc') })).toEqual({
      total: 16,
      parts: [{ task: 'oxygenRound', times: 2, minutes: 16 }],
    });
    expect(minutes({ support: on('trach-collar'), device: TUBE }).parts.map(({ task }) => task)).toEqual([
      'airwayCare',
      'oxygenRound',
    ]);
  });

  it('asks nothing for room air', () => {
    expect(minutes({ support: on('room-air') }).total).toBe(0);
  });

  it('counts checks as often as ordered where that is closer than the unit, never further apart', () => {
    const orders = (checkEveryMinutes: number) => ({
      support: on('psv'),
      orders: { checkEveryMinutes, gasEveryMinutes: null },
    });
    expect(minutes(orders(120)).parts[0]).toEqual({ task: 'check', times: 6, minutes: 72 });
    expect(minutes(orders(480)).parts[0]).toEqual({ task: 'check', times: 3, minutes: 36 });
  });

  it('counts ordered checks off the ventilator too', () => {
    const stay = { support: on('hfnc'), orders: { checkEveryMinutes: 240, gasEveryMinutes: null } };
    expect(minutes(stay).parts[0]).toEqual({ task: 'check', times: 3, minutes: 36 });
  });

  it('plans checks where no support is recorded yet', () => {
    expect(minutes({ support: null }).parts).toEqual([{ task: 'check', times: 3, minutes: 36 }]);
  });

  it('counts an interval that has begun as a whole visit', () => {
    expect(minutes({ support: on('psv') }, 241).parts[0]?.times).toBe(2);
    expect(minutes({ support: on('psv') }, 240).parts[0]?.times).toBe(1);
  });

  it('leaves out a task that the unit prices at nothing', () => {
    const policy = {
      ...DEFAULT_POLICY,
      tasks: { ...DEFAULT_POLICY.tasks, check: { minutes: 0, everyMinutes: 240 } },
    };
    expect(
      bedMinutes({ bed: bed({ support: on('cpap') }), policy, shiftMinutes: 720 }).parts.map(
        ({ task }) => task,
      ),
    ).toEqual(['inhaledTreatment']);
  });

  it('never gets lighter by a closer order or a longer shift, and its parts add up', () => {
    const supports = SUPPORT_CATALOGUE.map(({ id }) => id);
    fc.assert(
      fc.property(
        fc.constantFrom(...supports),
        fc.integer({ min: 15, max: 1440 }),
        fc.integer({ min: 60, max: 1440 }),
        (id, every, shift) => {
          const plain = minutes({ support: on(id) }, shift);
          const ordered = minutes(
            { support: on(id), orders: { checkEveryMinutes: every, gasEveryMinutes: null } },
            shift,
          );
          expect(ordered.total).toBeGreaterThanOrEqual(plain.total);
          expect(minutes({ support: on(id) }, shift + 60).total).toBeGreaterThanOrEqual(plain.total);
          expect(ordered.parts.reduce((sum, part) => sum + part.minutes, 0)).toBe(ordered.total);
        },
      ),
    );
  });
});
