import { requireNumber } from '../units/require-number.ts';
import { nextBlocking } from './erlang-b.ts';

/**
 * The fewest beds or machines that keep the chance of being turned away at or below a level.
 *
 * @title Beds for a chance of being turned away
 * @formula the smallest n with `B(n) ≤ blocking` (Erlang B turned round).
 * @valid for random arrivals that do not wait; of the stays only their mean counts. Small units break the
 *   model.
 *
 * @param input.offeredErlangs arrivals per day times mean stay in days, erlangs (0 to 10000).
 * @param input.blocking accepted chance of being turned away, probability (1e-12 to 1).
 * @returns count, whole.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Erlang AK 1917, in the usual recursion.
 */
export function serversForBlocking({
  offeredErlangs,
  blocking,
}: {
  offeredErlangs: number;
  blocking: number;
}): number {
  requireNumber('offeredErlangs', offeredErlangs, [0, 10_000]);
  requireNumber('blocking', blocking, [1e-12, 1]);
  let servers = 0;
  for (let reached = 1; reached > blocking; ) {
    servers += 1;
    reached = nextBlocking({ blocking: reached, n: servers, offeredErlangs });
  }
  return servers;
}
