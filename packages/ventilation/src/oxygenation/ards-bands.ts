import type { UpTo } from '../units/band.ts';

export type ArdsClass = 'none' | 'mild' | 'moderate' | 'severe';

/** PEEP below which neither definition grades an intubated patient, cmH2O. */
export const LEAST_PEEP_CMH2O = 5;

/** P/F in mmHg. @source Berlin definition 2012, kept by the global definition 2024. */
export const PF_BANDS: readonly UpTo<ArdsClass>[] = [
  { upTo: 100, is: 'severe' },
  { upTo: 200, is: 'moderate' },
  { upTo: 300, is: 'mild' },
  { upTo: Number.POSITIVE_INFINITY, is: 'none' },
];

/** S/F, at an SpO2 up to 97 %. @source global definition 2024. */
export const SF_BANDS: readonly UpTo<ArdsClass>[] = [
  { upTo: 148, is: 'severe' },
  { upTo: 235, is: 'moderate' },
  { upTo: 315, is: 'mild' },
  { upTo: Number.POSITIVE_INFINITY, is: 'none' },
];
