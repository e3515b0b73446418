import { requireNumber, requireWholeNumber } from '../units/require-number.ts';
import { nextBlocking } from './erlang-b.ts';

/**
 * The load that a number of beds or machines can take at a chance of being turned away.
 *
 * @title Load for a chance of being turned away
 * @formula the largest A with `B(servers, A) ≤ blocking` (Erlang B turned round, by halving an interval until
 *   it can be halved no more).
 * @valid for random arrivals that do not wait; of the stays only their mean counts. Small units break the
 *   model.
 *
 * @param input.servers beds or machines, count (1 to 10000), whole.
 * @param input.blocking accepted chance of being turned away, probability (1e-12 to 0.999).
 * @returns erlangs.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Erlang AK 1917, in the usual recursion.
 */
export function offeredForBlocking({ servers, blocking }: { servers: number; blocking: number }): number {
  requireWholeNumber('servers', servers, [1, 10_000]);
  requireNumber('blocking', blocking, [1e-12, 0.999]);
  let low = 0;
  // Each server can carry at most one erlang, so the load that is lost grows past any share of the whole.
  let high = servers / (1 - blocking);
  for (let middle = high / 2; middle > low && middle < high; middle = (low + high) / 2) {
    if (blockingWith(servers, middle) > blocking) high = middle;
    else low = middle;
  }
  return low;
}

function blockingWith(servers: number, offeredErlangs: number): number {
  let blocking = 1;
  for (let n = 1; n <= servers; n += 1) blocking = nextBlocking({ blocking, n, offeredErlangs });
  return blocking;
}
