import { requireNumbers, shown } from '../units/require-number.ts';

const SECONDS_PER_MINUTE = 60;

export type BreathTiming = {
  /** From one breath to the next, s. */
  cycleS: number;
  expiratoryTimeS: number;
  /** E in "1:E". */
  expiratoryPerInspiratory: number;
};

/**
 * How a breath divides into breathing in and breathing out.
 *
 * @title Breath timing
 * @formula `cycle = 60 ÷ rate`, `expiratory = cycle − inspiratory`, `E per I = expiratory ÷ inspiratory`.
 * @valid for the rate that the patient really has: the total rate, or the set rate when nobody triggers.
 *
 * @param input.ratePerMin breaths, /min (1 to 200).
 * @param input.inspiratoryTimeS inspiratory time, s (0.05 to 60), shorter than the cycle.
 * @returns record: `cycleS` from one breath to the next, s; `expiratoryTimeS` time to breathe out, s;
 *   `expiratoryPerInspiratory` E in 1:E.
 * @throws RangeError on missing, non-finite or impossible input; also when no time is left to breathe out.
 *
 * @source definition.
 */
export function breathTiming({
  ratePerMin,
  inspiratoryTimeS,
}: {
  ratePerMin: number;
  inspiratoryTimeS: number;
}): BreathTiming {
  requireNumbers({ ratePerMin, inspiratoryTimeS }, { ratePerMin: [1, 200] });
  const cycleS = SECONDS_PER_MINUTE / ratePerMin;
  const expiratoryTimeS = cycleS - inspiratoryTimeS;
  if (expiratoryTimeS <= 0) {
    throw new RangeError(
      `inspiratoryTimeS must be from 0.05 to below ${cycleS} at ${ratePerMin}/min, not ${shown(inspiratoryTimeS)}`,
    );
  }
  return { cycleS, expiratoryTimeS, expiratoryPerInspiratory: expiratoryTimeS / inspiratoryTimeS };
}
