import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { poissonBinomial } from './poisson-binomial.ts';

const chance = fc.double({ min: 0, max: 1, noNaN: true });

/** Every way in which the events can come out, one by one. */
function byEveryOutcome(probabilities: readonly number[]): number[] {
  const pmf = Array.from({ length: probabilities.length + 1 }, () => 0);
  for (let outcome = 0; outcome < 2 ** probabilities.length; outcome += 1) {
    const came = probabilities.map((_, at) => Math.floor(outcome / 2 ** at) % 2 === 1);
    const likelihood = probabilities.reduce((product, p, at) => product * (came[at] ? p : 1 - p), 1);
    const count = came.filter(Boolean).length;
    pmf[count] = Number(pmf[count]) + likelihood;
  }
  return pmf;
}

describe('poissonBinomial', () => {
  it('agrees with going through every outcome', () => {
    fc.assert(
      fc.property(fc.array(chance, { maxLength: 9 }), (probabilities) => {
        const expected = byEveryOutcome(probabilities);
        poissonBinomial({ probabilities }).forEach((value, count) => {
          expect(value).toBeCloseTo(Number(expected[count]), 12);
        });
      }),
    );
  });

  it('sums to one and has the mean and the variance of its parts', () => {
    fc.assert(
      fc.property(fc.array(chance, { maxLength: 60 }), (probabilities) => {
        const pmf = poissonBinomial({ probabilities });
        const moment = (of: (count: number) => number) =>
          pmf.reduce((sum, p, count) => sum + p * of(count), 0);
        const mean = probabilities.reduce((sum, p) => sum + p, 0);
        const variance = probabilities.reduce((sum, p) => sum + p * (1 - p), 0);
        expect(pmf).toHaveLength(probabilities.length + 1);
        expect(moment(() => 1)).toBeCloseTo(1, 10);
        expect(moment((count) => count)).toBeCloseTo(mean, 8);
        expect(moment((count) => (count - mean) ** 2)).toBeCloseTo(variance, 8);
      }),
    );
  });

  it('collapses to the binomial when the chances are equal', () => {
    const pmf = poissonBinomial({ probabilities: [0.5, 0.5, 0.5, 0.5] });

    expect(pmf).toEqual([1, 4, 6, 4, 1].map((ways) => ways / 16));
  });

  it('is certain of no event when there is none to come', () => {
    expect(poissonBinomial({ probabilities: [] })).toEqual([1]);
  });
});
