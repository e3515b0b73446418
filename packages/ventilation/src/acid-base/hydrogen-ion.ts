import { requireNumbers } from '../units/require-number.ts';

/**
 * Hydrogen-ion concentration for a pH.
 *
 * @title Hydrogen ion
 * @formula `10^(9 − pH)`.
 * @valid for any pH.
 *
 * @param input.ph pH (6.5 to 8).
 * @returns nmol/L.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source definition.
 */
export function hydrogenIon({ ph }: { ph: number }): number {
  requireNumbers({ ph });
  return 10 ** (9 - ph);
}
