import { requireNumbers } from '../units/require-number.ts';
import { rateForTargetPaco2 } from './rate-for-target-paco2.ts';

/** @source ARDS Network protocol card: set rate at most 35 /min. */
export const RATE_CEILING_PER_MIN = 35;
const SECONDS_PER_MINUTE = 60;

export type RateForTarget = {
  /** As the equation gives it, and whole, as it can be set. */
  expectedPerMin: number;
  setPerMin: number;
  isAboveCeiling: boolean;
  /** Time to breathe out at that rate against what the lungs need; null where either is not known. */
  expiration: { givenS: number; neededS: number; isShort: boolean } | null;
  /** The highest whole rate, up to the ceiling, that still leaves the lungs time to empty where that is known. */
  highestPerMin: number;
  /** What PaCO2 is expected at that rate, mmHg: where the target asks for more than the rate can give. */
  paco2AtHighestMmHg: number | null;
};

/**
 * The rate that would bring PaCO2 to a target, with the ladder of caution: is it above the ceiling, and does it
 * leave three time constants to breathe out. It assumes that tidal volume, dead-space fraction and CO2 production
 * stay as they are, that the patient takes the set rate, and that a breath goes in as fast as now.
 *
 * @param input.ratePerMin present total rate, /min (0 to 200).
 * @param input.paco2MmHg present arterial CO2 pressure, mmHg (5 to 250).
 * @param input.targetPaco2MmHg wanted arterial CO2 pressure, mmHg (5 to 250).
 * @param input.emptying inspiratory time and three time constants, s, where they are known.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source common practice, from the alveolar ventilation equation; ceiling: ARDS Network protocol card.
 */
export function rateForTarget({
  emptying,
  ...co2
}: {
  ratePerMin: number;
  paco2MmHg: number;
  targetPaco2MmHg: number;
  emptying: { inspiratoryTimeS: number; neededS: number } | null;
}): RateForTarget {
  requireNumbers(co2);
  const expectedPerMin = rateForTargetPaco2(co2);
  const setPerMin = Math.round(expectedPerMin);
  const highestPerMin = emptying ? highestWith(emptying) : RATE_CEILING_PER_MIN;
  return {
    expectedPerMin,
    setPerMin,
    isAboveCeiling: setPerMin > RATE_CEILING_PER_MIN,
    expiration: emptying && setPerMin >= 1 ? expirationAt(setPerMin, emptying) : null,
    highestPerMin,
    paco2AtHighestMmHg:
      setPerMin > highestPerMin && highestPerMin >= 1
        ? (co2.ratePerMin * co2.paco2MmHg) / highestPerMin
        : null,
  };
}

function expirationAt(
  ratePerMin: number,
  { inspiratoryTimeS, neededS }: { inspiratoryTimeS: number; neededS: number },
) {
  const givenS = Math.max(0, SECONDS_PER_MINUTE / ratePerMin - inspiratoryTimeS);
  return { givenS, neededS, isShort: neededS - givenS > 1e-9 };
}

function highestWith({ inspiratoryTimeS, neededS }: { inspiratoryTimeS: number; neededS: number }): number {
  const whole = Math.floor(SECONDS_PER_MINUTE / (inspiratoryTimeS + neededS) + 1e-9);
  return Math.min(RATE_CEILING_PER_MIN, whole);
}
