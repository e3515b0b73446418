import { type Below, bandBelow } from '../units/band.ts';
import { requireNumbers } from '../units/require-number.ts';
import { requireBoolean } from '../units/require-word.ts';

const POINTS: readonly Below<number>[] = [
  { below: 100, is: 4 },
  { below: 200, is: 3 },
  { below: 300, is: 2 },
  { below: 400, is: 1 },
  { below: Number.POSITIVE_INFINITY, is: 0 },
];

/** Without ventilatory support the score stops here. */
const MOST_UNSUPPORTED = 2;

/**
 * Respiratory part of the SOFA score.
 *
 * @title Respiratory SOFA
 * @formula P/F `< 400` 1, `< 300` 2, and with support `< 200` 3, `< 100` 4.
 * @valid for an arterial sample; 3 and 4 points only with ventilatory support.
 *
 * @param input.pfMmHg PaO2/FiO2, mmHg (1 to 4000).
 * @param input.supported whether the patient has ventilatory support.
 * @returns points, 0–4.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Vincent JL et al., Intensive Care Med 1996;22:707–10.
 */
export function respiratorySofa({ pfMmHg, supported }: { pfMmHg: number; supported: boolean }): number {
  requireNumbers({ pfMmHg });
  requireBoolean('supported', supported);
  const points = bandBelow(POINTS, pfMmHg);
  return supported ? points : Math.min(points, MOST_UNSUPPORTED);
}
