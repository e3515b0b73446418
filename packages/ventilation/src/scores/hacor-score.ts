import { type Below, bandBelow, bandUpTo, type UpTo } from '../units/band.ts';
import { requireNumbers, requireWholeNumber } from '../units/require-number.ts';

const REST = Number.POSITIVE_INFINITY;

const HEART_RATE_POINTS: readonly UpTo<number>[] = [
  { upTo: 120, is: 0 },
  { upTo: REST, is: 1 },
];

const PH_POINTS: readonly Below<number>[] = [
  { below: 7.25, is: 4 },
  { below: 7.3, is: 3 },
  { below: 7.35, is: 2 },
  { below: REST, is: 0 },
];

const COMA_POINTS: readonly UpTo<number>[] = [
  { upTo: 10, is: 10 },
  { upTo: 12, is: 5 },
  { upTo: 14, is: 2 },
  { upTo: 15, is: 0 },
];

const PF_POINTS: readonly UpTo<number>[] = [
  { upTo: 100, is: 6 },
  { upTo: 125, is: 5 },
  { upTo: 150, is: 4 },
  { upTo: 175, is: 3 },
  { upTo: 200, is: 2 },
  { upTo: REST, is: 0 },
];

const RATE_POINTS: readonly UpTo<number>[] = [
  { upTo: 30, is: 0 },
  { upTo: 35, is: 1 },
  { upTo: 40, is: 2 },
  { upTo: 45, is: 3 },
  { upTo: REST, is: 4 },
];

/**
 * Who will fail a mask: heart rate, acidosis, consciousness, oxygenation and rate, summed. Above 5 after an
 * hour of mask ventilation is high risk.
 *
 * @title HACOR score
 * @formula heart rate `≤ 120` 0, above 1; pH `≥ 7.35` 0, `7.30–7.34` 2, `7.25–7.29` 3, below 4; coma scale `15`
 *   0, `13–14` 2, `11–12` 5, `≤ 10` 10; P/F `> 200` 0, `176–200` 2, `151–175` 3, `126–150` 4, `101–125` 5, `≤
 *   100` 6; rate `≤ 30` 0, `31–35` 1, `36–40` 2, `41–45` 3, above 4.
 * @valid for adults on mask ventilation. Bands are printed for whole numbers; a value between two bands counts
 *   with the next.
 *
 * @param input.heartRatePerMin heart rate, /min (0 to 350).
 * @param input.ph arterial pH (6.5 to 8).
 * @param input.glasgowComaScale points of the coma scale (3 to 15), whole.
 * @param input.pfMmHg PaO2/FiO2, mmHg (1 to 4000).
 * @param input.ratePerMin breaths, /min (0 to 200).
 * @returns points, 0–25.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Duan J et al., Intensive Care Med 2017;43:192–9.
 */
export function hacorScore({
  heartRatePerMin,
  ph,
  glasgowComaScale,
  pfMmHg,
  ratePerMin,
}: {
  heartRatePerMin: number;
  ph: number;
  glasgowComaScale: number;
  pfMmHg: number;
  ratePerMin: number;
}): number {
  requireNumbers({ heartRatePerMin, ph, pfMmHg, ratePerMin });
  requireWholeNumber('glasgowComaScale', glasgowComaScale, [3, 15]);
  return (
    bandUpTo(HEART_RATE_POINTS, heartRatePerMin) +
    bandBelow(PH_POINTS, ph) +
    bandUpTo(COMA_POINTS, glasgowComaScale) +
    bandUpTo(PF_POINTS, pfMmHg) +
    bandUpTo(RATE_POINTS, ratePerMin)
  );
}
