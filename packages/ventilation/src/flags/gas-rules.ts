import { gasConsistency } from '../acid-base/gas-consistency.ts';
import { GAS_FIELDS } from '../entry/fields.ts';
import { formatNumber } from '../format/number.ts';
import { chip, type FlagRule, input, limitInWords, told } from './rule.ts';

const PF = { unit: 'mmHg', decimals: 0 } as const;
const PH = GAS_FIELDS.ph;

export const GAS_RULES: readonly FlagRule[] = [
  {
    id: 'pf-low',
    from: ['gas'],
    source:
      'ARDS Definition Task Force, JAMA 2012;307:2526–33 (100); ESICM guideline 2023 (150, for turning prone)',
    find: ({ gas, thresholds }) => {
      const value = gas?.pfMmHg ?? null;
      if (value === null) return null;
      const isLow = value < thresholds.pfLowMmHg;
      if (!isLow && value >= thresholds.pfModerateMmHg) return null;
      const limit = isLow ? thresholds.pfLowMmHg : thresholds.pfModerateMmHg;
      const words = told(value, limit, PF);
      return {
        level: isLow ? 'attention' : 'note',
        short: chip(`P/F ${words}`),
        sentence: `P/F is ${words}\u00a0mmHg, below ${limitInWords(limit, PF)}.`,
        inputs: [input('P/F', value, PF), input('Limit', limit, PF)],
      };
    },
  },
  {
    id: 'ph-low',
    from: ['gas'],
    source: 'common practice; each unit sets its own limit (the ARDS Network protocol acts from 7.30 down)',
    find: ({ gas, thresholds }) => {
      const value = gas?.values.ph;
      const limit = thresholds.phLow;
      if (!gas || value === undefined || value >= limit) return null;
      const words = told(value, limit, PH);
      return {
        level: 'attention',
        short: chip(`pH ${words}`),
        // A venous sample lies some hundredths lower, so the site belongs to the sentence.
        sentence: `pH is ${words} (${gas.site}), below ${limitInWords(limit, PH)}.`,
        inputs: [input('pH', value, PH), input('Limit', limit, PH)],
        facts: [gas.site],
      };
    },
  },
  {
    id: 'gas-inconsistent',
    from: ['gas'],
    source: 'Henderson–Hasselbalch equation, pK 6.1, within 0.04 of pH',
    find: ({ gas }) => {
      const { ph, pco2MmHg, bicarbonateMmolL } = gas?.values ?? {};
      if (ph === undefined || pco2MmHg === undefined || bicarbonateMmolL === undefined) return null;
      const { expectedPh, consistent } = gasConsistency({ ph, paco2MmHg: pco2MmHg, bicarbonateMmolL });
      if (consistent) return null;
      return {
        level: 'attention',
        short: 'Gas: check entry',
        sentence: `pH ${formatNumber(ph, PH)} does not fit the PCO2 and HCO3 of the same gas, from which ${formatNumber(expectedPh, PH)} would follow: one of the three may be mistyped.`,
        inputs: [
          input('pH', ph, PH),
          input('PCO2', pco2MmHg, GAS_FIELDS.pco2MmHg),
          input('HCO3', bicarbonateMmolL, GAS_FIELDS.bicarbonateMmolL),
          input('Expected pH', expectedPh, PH),
        ],
      };
    },
  },
];
