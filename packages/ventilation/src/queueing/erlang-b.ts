import { requireNumber, requireWholeNumber } from '../units/require-number.ts';

/**
 * Chance that an arrival finds every bed or machine taken and is turned away.
 *
 * @title Chance of being turned away (Erlang B)
 * @formula `B(0) = 1; B(n) = A × B(n − 1) ÷ (n + A × B(n − 1))`.
 * @valid for random arrivals that do not wait; of the stays only their mean counts. Small units break the
 *   model.
 *
 * @param input.servers beds or machines, count (0 to 10000), whole.
 * @param input.offeredErlangs arrivals per day times mean stay in days, erlangs (0 to 10000).
 * @returns probability, 0–1.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Erlang AK 1917, in the usual recursion.
 */
export function erlangB({ servers, offeredErlangs }: { servers: number; offeredErlangs: number }): number {
  requireWholeNumber('servers', servers, [0, 10_000]);
  requireNumber('offeredErlangs', offeredErlangs, [0, 10_000]);
  let blocking = 1;
  for (let n = 1; n <= servers; n += 1) blocking = nextBlocking({ blocking, n, offeredErlangs });
  return blocking;
}

/** Blocking with `n` servers, from the blocking with one less. */
export function nextBlocking({
  blocking,
  n,
  offeredErlangs,
}: {
  blocking: number;
  n: number;
  offeredErlangs: number;
}): number {
  const carriedOn = offeredErlangs * blocking;
  return carriedOn / (n + carriedOn);
}
