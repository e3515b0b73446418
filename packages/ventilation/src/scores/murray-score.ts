import { type Below, bandBelow } from '../units/band.ts';
import { requireNumbers, requireWholeNumber } from '../units/require-number.ts';

const REST = Number.POSITIVE_INFINITY;

const PF_POINTS: readonly Below<number>[] = [
  { below: 100, is: 4 },
  { below: 175, is: 3 },
  { below: 225, is: 2 },
  { below: 300, is: 1 },
  { below: REST, is: 0 },
];

/** Printed for whole numbers (≤ 5, 6–8, 9–11, 12–14, ≥ 15). */
const PEEP_POINTS: readonly Below<number>[] = [
  { below: 6, is: 0 },
  { below: 9, is: 1 },
  { below: 12, is: 2 },
  { below: 15, is: 3 },
  { below: REST, is: 4 },
];

const COMPLIANCE_POINTS: readonly Below<number>[] = [
  { below: 20, is: 4 },
  { below: 40, is: 3 },
  { below: 60, is: 2 },
  { below: 80, is: 1 },
  { below: REST, is: 0 },
];

/**
 * The mean of up to four parts of 0–4 points each. Above 2.5 is severe.
 *
 * @title Lung injury score (Murray)
 * @formula quadrants 0–4; P/F `≥ 300` 0, `225` 1, `175` 2, `100` 3, below 4; PEEP `≤ 5` 0, `6–8` 1, `9–11` 2,
 *   `12–14` 3, `≥ 15` 4; compliance `≥ 80` 0, `60` 1, `40` 2, `20` 3, below 4; the sum over the number of
 *   parts.
 * @valid where at least the film, P/F and PEEP are known.
 *
 * @param input.quadrants quadrants with consolidation on the film, count (0 to 4), whole.
 * @param input.pfMmHg PaO2/FiO2, mmHg (1 to 4000).
 * @param input.peepCmH2O PEEP, cmH2O (0 to 120).
 * @param input.complianceMlCmH2O static compliance, mL/cmH2O (0.1 to 500); may be left out, or `null`, and is
 *   then no part of the mean.
 * @returns points, 0–4.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Murray JF et al., Am Rev Respir Dis 1988;138:720–3.
 */
export function murrayScore({
  quadrants,
  pfMmHg,
  peepCmH2O,
  complianceMlCmH2O = null,
}: {
  quadrants: number;
  pfMmHg: number;
  peepCmH2O: number;
  complianceMlCmH2O?: number | null;
}): number {
  requireWholeNumber('quadrants', quadrants, [0, 4]);
  requireNumbers({ pfMmHg, peepCmH2O });
  const parts = [quadrants, bandBelow(PF_POINTS, pfMmHg), bandBelow(PEEP_POINTS, peepCmH2O)];
  if (complianceMlCmH2O !== null) {
    requireNumbers({ complianceMlCmH2O });
    parts.push(bandBelow(COMPLIANCE_POINTS, complianceMlCmH2O));
  }
  return parts.reduce((sum, points) => sum + points, 0) / parts.length;
}
