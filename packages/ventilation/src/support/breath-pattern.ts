import { type Control, type SupportId, supportEntry } from './catalogue.ts';

export type BreathPattern = `${'VC' | 'PC'}-${'CMV' | 'IMV' | 'CSV'}`;

/** What is controlled within a breath. Where neither is set for it, pressure is what the ventilator holds. */
const CONTROLLED: Record<Exclude<Control, 'oscillation'>, 'VC' | 'PC'> = {
  volume: 'VC',
  pressure: 'PC',
  'adaptive-pressure': 'PC',
  none: 'PC',
};

/**
 * The ventilatory pattern of a mode in the published taxonomy: what is controlled, and the sequence of breaths.
 * Null for what gives no breaths, and for oscillation, which the taxonomy leaves out.
 *
 * @source Chatburn RL, El-Khatib M, Mireles-Cabodevila E, Respir Care 2014;59:1747–63.
 */
export function breathPattern(id: SupportId): BreathPattern | null {
  const { control, sequence } = supportEntry(id);
  if (sequence === null || sequence === 'oscillation' || control === 'oscillation') return null;
  return `${CONTROLLED[control]}-${sequence}`;
}
