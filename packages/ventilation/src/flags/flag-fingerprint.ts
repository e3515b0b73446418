import type { Flag } from '../contract/board.ts';

/**
 * What a flag rests on, as one word: its rule, its inputs with their thresholds, and the facts that are no
 * numbers (the mode, which limit is off). Two flags with the same fingerprint say the same of the same values,
 * whichever check or gas they were read from; where a value, a limit or a fact differs, so does this.
 *
 * It is made of values and not of the ids of observations: a new check that found everything as it was must
 * not bring back a flag that somebody has looked at.
 */
export function flagFingerprint({
  id,
  inputs,
  facts = [],
}: Pick<Flag, 'id' | 'inputs'> & { facts?: readonly string[] | undefined }): string {
  const values = inputs.map(({ label, value }) => `${label}=${withoutNoise(value)}`);
  return [id, ...values, ...facts].join('|');
}

/** A derived value may differ in its last bits from one machine to another; no measurement does. */
function withoutNoise(value: number): number {
  return Number(value.toPrecision(12));
}
