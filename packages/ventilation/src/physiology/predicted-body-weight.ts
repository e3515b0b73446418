import { requireNumber } from '../units/require-number.ts';
import { requireWord } from '../units/require-word.ts';

const CM_PER_INCH = 2.54;
const KG_PER_INCH = 2.3;
const SIXTY_INCHES_CM = 60 * CM_PER_INCH;

/** Below its range each formula falls towards zero and stops meaning a body. */
const FORMS = {
  male: { atSixtyInchesKg: 50, heightCm: [100, 250] },
  female: { atSixtyInchesKg: 45.5, heightCm: [105, 250] },
} as const;

/**
 * Body weight predicted from height and sex, by which a tidal volume is judged: lung size follows height, not
 * weight.
 *
 * @title Predicted body weight
 * @formula `50 (male) or 45.5 (female) + 2.3 ÷ 2.54 × (heightCm − 152.4)`, the inch form of the published
 *   bedside chart; the often printed 0.91 per cm is up to 0.2 kg higher in tall adults.
 * @valid for adults; fitted from 152 cm up, and the chart extends it to 140 cm.
 *
 * @param input.sex sex, as used for lung size: 'male' or 'female'.
 * @param input.heightCm height, cm (100 to 250); from 105 for women, where the weight stays above zero.
 * @returns kg, always above zero.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source ARDS Network, N Engl J Med 2000;342:1301–8, after Devine 1974.
 */
export function predictedBodyWeight({ sex, heightCm }: { sex: 'male' | 'female'; heightCm: number }): number {
  requireWord('sex', sex, Object.keys(FORMS));
  const form = FORMS[sex];
  requireNumber('heightCm', heightCm, form.heightCm);
  return form.atSixtyInchesKg + (KG_PER_INCH / CM_PER_INCH) * (heightCm - SIXTY_INCHES_CM);
}
