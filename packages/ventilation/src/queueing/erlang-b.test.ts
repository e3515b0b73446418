import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { erlangB } from './erlang-b.ts';
import { offeredForBlocking } from './offered-for-blocking.ts';
import { serversForBlocking } from './servers-for-blocking.ts';

const servers = fc.integer({ min: 1, max: 120 });
/** From 1 erlang, so that no chance here is too small for a number to hold. */
const load = fc.double({ min: 1, max: 100, noNaN: true });
const level = fc.double({ min: 1e-6, max: 0.9, noNaN: true });

/** The definition: the last term of a Poisson series over its sum, each term scaled by the last one. */
function byDefinition(count: number, offered: number): number {
  let term = 1;
  let sum = 1;
  for (let n = count; n >= 1; n -= 1) {
    term *= n / offered;
    sum += term;
  }
  return 1 / sum;
}

describe('erlangB', () => {
  it('is the last Poisson term over the sum of all', () => {
    fc.assert(
      fc.property(servers, load, (count, offeredErlangs) => {
        const expected = byDefinition(count, offeredErlangs);
        const relative = erlangB({ servers: count, offeredErlangs }) / expected - 1;
        expect(Math.abs(relative)).toBeLessThan(1e-11);
      }),
    );
  });

  it('falls with each server and grows with the load', () => {
    fc.assert(
      fc.property(servers, load, (count, offeredErlangs) => {
        const blocking = erlangB({ servers: count, offeredErlangs });
        expect(erlangB({ servers: count + 1, offeredErlangs })).toBeLessThan(blocking);
        expect(erlangB({ servers: count, offeredErlangs: offeredErlangs * 1.01 })).toBeGreaterThan(blocking);
      }),
    );
  });

  it('turns everyone away without a server, and no one without a load', () => {
    expect(erlangB({ servers: 0, offeredErlangs: 3 })).toBe(1);
    expect(erlangB({ servers: 4, offeredErlangs: 0 })).toBe(0);
  });

  it('holds for a whole region', () => {
    expect(erlangB({ servers: 5000, offeredErlangs: 5000 })).toBeCloseTo(byDefinition(5000, 5000), 12);
  });
});

describe('offeredForBlocking', () => {
  it('undoes erlangB', () => {
    fc.assert(
      fc.property(servers, level, (count, blocking) => {
        const offeredErlangs = offeredForBlocking({ servers: count, blocking });
        expect(erlangB({ servers: count, offeredErlangs }) / blocking).toBeCloseTo(1, 9);
      }),
    );
  });
});

describe('serversForBlocking', () => {
  it('is the fewest servers at or below the level', () => {
    fc.assert(
      fc.property(load, level, (offeredErlangs, blocking) => {
        const fewest = serversForBlocking({ offeredErlangs, blocking });
        expect(erlangB({ servers: fewest, offeredErlangs })).toBeLessThanOrEqual(blocking);
        expect(erlangB({ servers: fewest - 1, offeredErlangs })).toBeGreaterThan(blocking);
      }),
    );
  });

  it('needs none when all may be turned away', () => {
    expect(serversForBlocking({ offeredErlangs: 3, blocking: 1 })).toBe(0);
  });
});
