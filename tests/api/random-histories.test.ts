import { shownBed } from '@windrow/ventilation/board/shown-bed';
import type { Bed, Board, FactGroup } from '@windrow/ventilation/contract/board';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { boardRows } from '../../apps/server/src/queries/board-rows.ts';
import { rebuildAllBeds } from '../../apps/server/src/services/rebuild-all-beds.ts';
import type { Caller } from '../support/caller.ts';
import { type House, openHouse } from '../support/house.ts';
import { type Fact, LivedHouse, type LivedStay } from '../support/lived-house.ts';
import { history, type Step } from '../support/random-history.ts';

const GROUPS = ['check', 'airway', 'gas'] as const satisfies readonly FactGroup[];

let house: House;
let charge: Caller;
let runs = 0;
beforeAll(async () => {
  house = await openHouse();
  charge = await house.addPerson('charge-of-all', [{ role: 'charge', unitId: null }]);
});
afterAll(() => house.close());

/** Lives a history from its first step to its last, and asks after each whether `holds`. */
async function live(
  steps: Step[],
  holds: (lived: LivedHouse, n: number) => Promise<void> = async () => {},
): Promise<LivedHouse> {
  runs += 1;
  const lived = await LivedHouse.open(house, charge, `Run ${runs} `);
  for (const [n, step] of steps.entries()) {
    await lived.live(step);
    await holds(lived, n);
  }
  return lived;
}

/** Some ten seconds each at most: the histories are as many as fit, and at least as many as always fit. */
const bounds = { numRuns: 25, interruptAfterTimeLimit: 9_000, markInterruptAsFailure: false };

/** When a group of a stay is withdrawn, reckoned here anew from the unit's ages and the stay's orders. */
function withdrawFrom(lived: LivedHouse, { bedId, orders }: LivedStay, group: FactGroup): number {
  const { withdrawFrom: byUnit } = lived.unitOf(bedId ?? '').policy.freshness[group];
  const ordered =
    group === 'check' ? orders.checkEveryMinutes : group === 'gas' ? orders.gasEveryMinutes : null;
  return ordered === null ? byUnit : Math.min(byUnit, 2 * ordered);
}

function requireNothingTooOld(lived: LivedHouse, bed: Bed, at: string): void {
  const stay = lived.stays.find(({ stayId }) => stayId === bed.stay?.stayId);
  if (!bed.stay || !stay) return;
  for (const group of GROUPS) {
    const fact = bed.stay[group];
    if (fact) {
      const age = (Date.parse(at) - Date.parse(fact.observedAt)) / 60_000;
      expect(age, `${group} of ${bed.label} at ${at}`).toBeLessThan(withdrawFrom(lived, stay, group));
      expect(bed.stay.withdrawn[group]).toBeNull();
    } else
      expect(
        bed.stay.flags.filter(({ from }) => from.includes(group)),
        `flags from a withdrawn ${group}`,
      ).toEqual([]);
  }
}

const newest = (facts: Fact[]): Fact | undefined =>
  facts
    .filter(({ stands }) => stands)
    .sort((one, other) =>
      one.observedAt === other.observedAt
        ? other.order - one.order
        : one.observedAt < other.observedAt
          ? 1
          : -1,
    )[0];

/** The beds of a board without the numbers of the live sequence. */
const pictures = ({ beds }: Board) => beds.map(({ revision: _revision, ...bed }) => bed);

describe('through any history of a unit', () => {
  it('the board never shows a value past its withdrawal, then or at any later time', {
    timeout: 30_000,
  }, async () => {
    const waits = fc.array(fc.integer({ min: 1, max: 700 }), { minLength: 1, maxLength: 5 });
    await fc.assert(
      fc.asyncProperty(history, waits, async (steps, minutes) => {
        const check = async (lived: LivedHouse) => {
          for (const unit of lived.units) {
            for (const bed of (await lived.board(unit)).beds) requireNothingTooOld(lived, bed, lived.now);
            for (const row of await boardRows(house.db, unit.unitId)) {
              for (const now of [lived.now, house.clock.now.getTime()])
                requireNothingTooOld(lived, shownBed({ bed: row, now }).bed, lived.now);
            }
          }
        };
        const lived = await live(steps, check);
        for (const wait of minutes) {
          house.later(wait);
          await check(lived);
        }
      }),
      bounds,
    );
  });

  it('the board shows the newest fact that stands, and what the patient breathes with by it', {
    timeout: 30_000,
  }, async () => {
    await fc.assert(
      fc.asyncProperty(history, async (steps) => {
        await live(steps, async (lived) => {
          for (const unit of lived.units) {
            for (const row of await boardRows(house.db, unit.unitId)) {
              const stay = lived.stays.find(({ bedId }) => bedId === row.bedId);
              expect(row.stay?.stayId).toBe(stay?.stayId);
              if (!stay) continue;
              const of = (path: string) =>
                newest(stay.facts.filter((fact) => fact.path === path))?.observationId;
              expect(row.stay?.check?.observationId).toBe(of('checks'));
              expect(row.stay?.gas?.observationId).toBe(of('gases'));
              expect(row.stay?.support?.id).toBe(
                newest(stay.facts.filter(({ support }) => support !== null))?.support ?? undefined,
              );
              expect(row.stay?.admittedAt).toBe(stay.admittedAt);
              expect(row.stay?.version).toBe(stay.version);
            }
          }
        });
      }),
      bounds,
    );
  });

  it('a look back is the board as it was, and the rows are what the facts give', {
    timeout: 30_000,
  }, async () => {
    await fc.assert(
      fc.asyncProperty(history, async (steps) => {
        const lived = await live(steps, async (now, n) => {
          if (n % 4 === 0) await now.photograph();
        });
        house.later(60);
        for (const { at, board } of lived.snapshots) {
          const back = await lived.board(board.unit, `?at=${at}`);
          expect(pictures(back)).toEqual(pictures(board));
        }
        const { differed } = await rebuildAllBeds(house.db, { now: lived.now });
        expect(differed).toEqual([]);
      }),
      bounds,
    );
  });

  it('the revisions that are told are consecutive, and end at the board’s', { timeout: 30_000 }, async () => {
    await fc.assert(
      fc.asyncProperty(history, async (steps) => {
        const lived = await live(steps);
        for (const unit of lived.units) {
          const told = lived.told
            .filter(({ unitId }) => unitId === unit.unitId)
            .map(({ revision }) => revision);
          const first = unit.bedIds.length + 1;
          expect(told).toEqual(Array.from({ length: told.length }, (_, n) => first + n));
          const board = await lived.board(unit);
          expect(board.revision).toBe(told.at(-1) ?? unit.bedIds.length);
          expect(Math.max(...board.beds.map(({ revision }) => revision))).toBe(board.revision);
        }
      }),
      bounds,
    );
  });
});
