import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { rateForTarget } from './rate-for-target.ts';

const emptying = { inspiratoryTimeS: 0.9, neededS: 1.5 };
const co2 = { ratePerMin: 18, paco2MmHg: 60, targetPaco2MmHg: 45 };

describe('rateForTarget', () => {
  it('gives the rate, whole, and the time that it leaves to breathe out', () => {
    expect(rateForTarget({ ...co2, emptying })).toEqual({
      expectedPerMin: 24,
      setPerMin: 24,
      isAboveCeiling: false,
      expiration: { givenS: 60 / 24 - 0.9, neededS: 1.5, isShort: false },
      highestPerMin: 25,
      paco2AtHighestMmHg: null,
    });
  });

  it('says so when gas would be trapped, and when the ceiling is passed', () => {
    expect(rateForTarget({ ...co2, targetPaco2MmHg: 40, emptying })).toMatchObject({
      setPerMin: 27,
      expiration: { isShort: true },
      paco2AtHighestMmHg: (18 * 60) / 25,
    });
    expect(rateForTarget({ ...co2, paco2MmHg: 70, targetPaco2MmHg: 36, emptying: null })).toMatchObject({
      setPerMin: 35,
      isAboveCeiling: false,
    });
    expect(rateForTarget({ ...co2, paco2MmHg: 72, targetPaco2MmHg: 36, emptying: null })).toMatchObject({
      setPerMin: 36,
      isAboveCeiling: true,
      expiration: null,
      highestPerMin: 35,
      paco2AtHighestMmHg: (18 * 72) / 35,
    });
  });

  it('never calls a rate safe above the highest that it names', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 5, max: 60 }),
        fc.double({ min: 0.3, max: 2, noNaN: true }),
        fc.double({ min: 0.2, max: 6, noNaN: true }),
        (ratePerMin, inspiratoryTimeS, neededS) => {
          const { setPerMin, expiration, highestPerMin } = rateForTarget({
            ratePerMin,
            paco2MmHg: 40,
            targetPaco2MmHg: 40,
            emptying: { inspiratoryTimeS, neededS },
          });
          if (expiration?.isShort) expect(setPerMin).toBeGreaterThan(highestPerMin);
          else if (setPerMin <= 35) expect(setPerMin).toBeLessThanOrEqual(highestPerMin);
        },
      ),
    );
  });
});
