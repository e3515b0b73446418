/** How the record's own words are said, by the key that they stand under. */
const WORDS: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  site: { arterial: 'Arterial', venous: 'Venous', capillary: 'Capillary' },
  kind: {
    'oral-tube': 'oral tube',
    'nasal-tube': 'nasal tube',
    tracheostomy: 'tracheostomy',
    'laryngeal-mask': 'laryngeal mask',
  },
  depthMark: { lip: 'at lip', teeth: 'at teeth', nostril: 'at nostril', flange: 'at flange' },
  cuffMethod: {
    manometer: 'cuff by manometer',
    'minimal-leak': 'cuff by minimal leak',
    automatic: 'cuff held automatically',
  },
  position: { left: 'at the left', centre: 'at the centre', right: 'at the right' },
  interface: {
    'full-face': 'full-face mask',
    oronasal: 'mask over nose and mouth',
    nasal: 'nose mask',
    helmet: 'helmet',
  },
  sign: {
    antimicrobial: 'Antimicrobial given',
    extracorporeal: 'Day on extracorporeal support',
    // The number has its own name.
    temperature: '',
    'white-cells': '',
  },
  method: { 'pressure-support': 'pressure support', 't-piece': 'T-piece', cpap: 'CPAP' },
  event: { admitted: 'Admitted', transferred: 'Transferred to another bed', left: 'Stay ended' },
  outcome: { ward: 'to a ward', 'other-hospital': 'to another hospital', home: 'home', died: 'died' },
};

/** The word as said; as stored where it is not known here; nothing where nothing was recorded. */
export function saidAs(key: string, word: unknown): string {
  return typeof word === 'string' ? (WORDS[key]?.[word] ?? word) : '';
}
