import type {
  AIRWAY_KINDS,
  CUFF_METHODS,
  DEPTH_MARKS,
  GAS_SITES,
  MASK_INTERFACES,
  TUBE_POSITIONS,
} from '@windrow/ventilation/contract/observations';

type Said<Words extends readonly string[]> = Readonly<Record<Words[number], string>>;

/** How the record's words are said on a screen. */
export const AIRWAY_KIND_WORDS: Said<typeof AIRWAY_KINDS> = {
  'oral-tube': 'Oral tube',
  'nasal-tube': 'Nasal tube',
  tracheostomy: 'Tracheostomy',
  'laryngeal-mask': 'Laryngeal mask',
};
export const DEPTH_MARK_WORDS: Said<typeof DEPTH_MARKS> = {
  lip: 'Lip',
  teeth: 'Teeth',
  nostril: 'Nostril',
  flange: 'Flange',
};
export const CUFF_METHOD_WORDS: Said<typeof CUFF_METHODS> = {
  manometer: 'Manometer',
  'minimal-leak': 'Minimal leak',
  automatic: 'Automatic',
};
export const POSITION_WORDS: Said<typeof TUBE_POSITIONS> = { left: 'Left', centre: 'Centre', right: 'Right' };
export const SITE_WORDS: Said<typeof GAS_SITES> = {
  arterial: 'Arterial',
  venous: 'Venous',
  capillary: 'Capillary',
};
export const MASK_WORDS: Said<typeof MASK_INTERFACES> = {
  'full-face': 'Full face',
  oronasal: 'Nose and mouth',
  nasal: 'Nose',
  helmet: 'Helmet',
};

/** A stored word as said, or as stored where it is not one of these. */
export function said(words: Readonly<Record<string, string>>, word: string): string {
  return words[word] ?? word;
}
