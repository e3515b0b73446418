import { requireNumbers } from '../units/require-number.ts';

/**
 * Rate over tidal volume in litres: fast small breaths predict a failed trial. The published cut-off is 105.
 *
 * @title Rapid shallow breathing index
 * @formula `ratePerMin ÷ (tidalVolumeMl ÷ 1000)`.
 * @valid for about a minute of unsupported spontaneous breathing.
 *
 * @param input.ratePerMin spontaneous rate, /min (1 to 200); no breath is refused, for its index would look
 *   good.
 * @param input.tidalVolumeMl spontaneous tidal volume, mL (1 to 3000).
 * @returns /min/L, breaths per minute for each litre.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Yang KL, Tobin MJ, N Engl J Med 1991;324:1445–50.
 */
export function rapidShallowBreathingIndex({
  ratePerMin,
  tidalVolumeMl,
}: {
  ratePerMin: number;
  tidalVolumeMl: number;
}): number {
  requireNumbers({ ratePerMin, tidalVolumeMl }, { ratePerMin: [1, 200] });
  return (ratePerMin * 1000) / tidalVolumeMl;
}
