import { requireNumbers } from '../units/require-number.ts';

/**
 * Gas moved each minute.
 *
 * @title Minute ventilation
 * @formula `ratePerMin × tidalVolumeMl ÷ 1000`.
 * @valid with the exhaled volume and the total rate, where all breaths are alike.
 *
 * @param input.ratePerMin total breaths, /min (0 to 200).
 * @param input.tidalVolumeMl exhaled tidal volume, mL (1 to 3000).
 * @returns L/min.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source definition.
 */
export function minuteVentilation({
  ratePerMin,
  tidalVolumeMl,
}: {
  ratePerMin: number;
  tidalVolumeMl: number;
}): number {
  requireNumbers({ ratePerMin, tidalVolumeMl });
  return (ratePerMin * tidalVolumeMl) / 1000;
}
