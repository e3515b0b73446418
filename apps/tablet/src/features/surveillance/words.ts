import type { SurveillanceMark } from '@windrow/ventilation/contract/surveillance';

export const PARAMETER_WORDS: Readonly<Record<SurveillanceMark['parameter'], string>> = {
  peep: 'PEEP',
  fio2: 'FiO2',
};

export const MARK_WORDS: Readonly<Record<SurveillanceMark['kind'], string>> = {
  baseline: 'baseline',
  onset: 'event onset',
  worse: 'second worse day',
  repeat: 'within 14 days',
  'one-day': 'one day only',
};

/** "PEEP and FiO2". */
export function byInWords(by: readonly SurveillanceMark['parameter'][]): string {
  return by.map((parameter) => PARAMETER_WORDS[parameter]).join(' and ');
}
