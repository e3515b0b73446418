import { requireNumber } from '../units/require-number.ts';
import { requireWord } from '../units/require-word.ts';

/** Litres of gas from one litre, or one pound, of liquid oxygen. */
const GAS_LITRES = { litres: 860, pounds: 344 } as const;

/**
 * Gas that a quantity of liquid oxygen becomes.
 *
 * @title Gas from liquid oxygen
 * @formula `860 × litres` or `344 × pounds`.
 * @valid at room temperature and sea level, without what boils off.
 *
 * @param input.kind measure of the liquid: 'litres' or 'pounds'.
 * @param input.amount how many of them (0 to 1000000).
 * @returns L of gas.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source common practice; 860.6 and 344.24 as usually rounded.
 */
export function liquidOxygenGas({ kind, amount }: { kind: 'litres' | 'pounds'; amount: number }): number {
  requireWord('kind', kind, Object.keys(GAS_LITRES));
  requireNumber('amount', amount, [0, 1_000_000]);
  return GAS_LITRES[kind] * amount;
}
