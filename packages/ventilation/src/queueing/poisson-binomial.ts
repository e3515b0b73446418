import { requireNumber } from '../units/require-number.ts';
import { requireList } from '../units/require-word.ts';

/**
 * How many of several independent events with unequal chances come true: the whole distribution. With it,
 * patients who may each be off the ventilator by an hour become a distribution of free machines.
 *
 * @title How many of several chances come true
 * @formula `P(k) = P(k) × (1 − p) + P(k − 1) × p`, for one event after the other.
 * @valid while no event makes another more likely.
 *
 * @param input.probabilities list of each event’s chance, probabilities from 0 to 1; may be empty.
 * @returns list of the probabilities of exactly 0, 1, … n events.
 * @throws RangeError on missing, non-finite or impossible input, naming the place in the list.
 * @example { "probabilities": [0.2, 0.5, 0.9] }
 *
 * @source definition; computed by convolution.
 */
export function poissonBinomial({ probabilities }: { probabilities: readonly number[] }): number[] {
  requireList('probabilities', probabilities);
  return probabilities.reduce(
    (pmf, probability, at) => {
      requireNumber(`probabilities[${at}]`, probability, [0, 1]);
      return withOneMore(pmf, probability);
    },
    [1],
  );
}

function withOneMore(pmf: readonly number[], probability: number): number[] {
  return [...pmf, 0].map((stays, count) => stays * (1 - probability) + (pmf[count - 1] ?? 0) * probability);
}
