import { bandUpTo } from '../units/band.ts';
import { requireNumbers } from '../units/require-number.ts';
import { requireBoolean, requireWord } from '../units/require-word.ts';
import { type ArdsClass, LEAST_PEEP_CMH2O, PF_BANDS, SF_BANDS } from './ards-bands.ts';
import { sfRatio } from './sf-ratio.ts';

const LEAST_FLOW_L_MIN = 30;

type Support = 'invasive' | 'mask' | 'high-flow' | 'none';
type Oxygenation =
  | { pfMmHg: number; spo2Percent?: number; fio2?: number }
  | { pfMmHg?: undefined; spo2Percent: number; fio2: number };
type Strength = { peepCmH2O?: number; flowLMin?: number };

/** Whether the support is strong enough for its oxygenation to be judged. */
const JUDGED = {
  // Most settings have a PEEP; the definition's own table names no minimum for the intubated.
  invasive: ({ peepCmH2O = LEAST_PEEP_CMH2O }: Strength) => peepCmH2O >= LEAST_PEEP_CMH2O,
  mask: ({ peepCmH2O = 0 }: Strength) => peepCmH2O >= LEAST_PEEP_CMH2O,
  'high-flow': ({ flowLMin = 0 }: Strength) => flowLMin >= LEAST_FLOW_L_MIN,
  none: () => false,
} as const satisfies Record<Support, (strength: Strength) => boolean>;

/**
 * The oxygenation part of the global definition of ARDS of 2023. Onset, opacities and origin are for people to
 * judge.
 *
 * @title ARDS class, global definition
 * @formula intubated: P/F `≤ 100` severe, `≤ 200` moderate, `≤ 300` mild, or S/F `≤ 148`, `≤ 235`, `≤ 315`; not
 *   intubated: one class, at P/F `≤ 300` or S/F `≤ 315`; P/F decides when both are given.
 * @valid intubated at a PEEP of at least 5 cmH2O; else on high flow of at least 30 L/min or a mask with at
 *   least 5 cmH2O. Where resources are limited no PEEP and no flow is asked for. S/F only up to an SpO2 of 97
 *   %.
 *
 * @param input.pfMmHg PaO2/FiO2, mmHg (1 to 4000); may be left out when the next two are given.
 * @param input.spo2Percent pulse oximeter saturation, % (20 to 100), valid up to 97; may be left out when P/F
 *   is given.
 * @param input.fio2 inspired oxygen, fraction (0.21 to 1), not a percentage; may be left out when P/F is given.
 * @param input.support support: 'invasive', 'mask', 'high-flow' or 'none'.
 * @param input.peepCmH2O PEEP or CPAP, cmH2O (0 to 120); may be left out, but not for a mask to count.
 * @param input.flowLMin high-flow rate, L/min (0 to 300); may be left out, but not for high flow to count.
 * @param input.resourceLimited whether resources are limited, which waives PEEP and flow; false unless given.
 * @returns class: 'none', 'mild', 'moderate', 'severe', or 'non-intubated' without a grade; `null` where the
 *   definition cannot be applied: support too weak or unknown, or SpO2 above 97 %.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source Matthay MA et al., Am J Respir Crit Care Med 2024;209:37–47 (read in a secondary page; the minimum
 *   PEEP of the intubated not compared with the print).
 */
export function globalArdsClass({
  support,
  peepCmH2O,
  flowLMin,
  resourceLimited = false,
  ...oxygenation
}: Oxygenation & Strength & { support: Support; resourceLimited?: boolean }):
  | ArdsClass
  | 'non-intubated'
  | null {
  requireWord('support', support, Object.keys(JUDGED));
  requireBoolean('resourceLimited', resourceLimited);
  if (peepCmH2O !== undefined) requireNumbers({ peepCmH2O });
  if (flowLMin !== undefined) requireNumbers({ flowLMin });

  const grade = gradeOf(oxygenation);
  const judged = resourceLimited || JUDGED[support]({ peepCmH2O, flowLMin });
  if (grade === null || !judged) return null;
  return support === 'invasive' || grade === 'none' ? grade : 'non-intubated';
}

function gradeOf({ pfMmHg, ...saturation }: Oxygenation): ArdsClass | null {
  if (pfMmHg !== undefined) {
    requireNumbers({ pfMmHg });
    return bandUpTo(PF_BANDS, pfMmHg);
  }
  const { spo2Percent, fio2 } = saturation;
  if (spo2Percent === undefined) {
    throw new RangeError(
      'pfMmHg must be a number from 1 to 4000, or spo2Percent and fio2 be given, not undefined',
    );
  }
  if (fio2 === undefined) throw new RangeError('fio2 must be a number from 0.21 to 1, not undefined');
  const ratio = sfRatio({ spo2Percent, fio2 });
  return ratio === null ? null : bandUpTo(SF_BANDS, ratio);
}
