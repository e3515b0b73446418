import { supportEntry } from '../support/catalogue.ts';
import {
  chip,
  type Finding,
  type FlagFacts,
  type FlagRule,
  input,
  isAbove,
  limitInWords,
  told,
} from './rule.ts';

const PER_KG = { unit: 'mL/kg', decimals: 1 } as const;
const GUIDELINE =
  'ARDS Network, N Engl J Med 2000;342:1301–8; ATS/ESICM/SCCM guideline 2017: 4 to 8 mL/kg of predicted body weight';

export const VOLUME_RULES: readonly FlagRule[] = [
  {
    id: 'vt-per-kg-high',
    from: ['check'],
    source: GUIDELINE,
    find: (facts) => aboveLimit({ facts, level: 'attention', limit: facts.thresholds.vtPerKgHighMl }),
  },
  {
    id: 'vt-per-kg-above',
    from: ['check'],
    source: `${GUIDELINE}. The lower step is the unit's own`,
    find: (facts) => {
      const value = facts.check?.derived.vtPerKgMl ?? null;
      if (value === null || isAbove(value, facts.thresholds.vtPerKgHighMl)) return null;
      return givesTheBreath(facts)
        ? aboveLimit({ facts, level: 'note', limit: facts.thresholds.vtPerKgNoteMl })
        : null;
    },
  },
];

/** Whether somebody chose this volume. What a patient draws in alone is no choice to be noted below the limit. */
function givesTheBreath({ check }: FlagFacts): boolean {
  if (!check) return false;
  const { kind, sequence } = supportEntry(check.mode);
  return kind === 'invasive' && (sequence === 'CMV' || sequence === 'IMV');
}

function aboveLimit({
  facts,
  level,
  limit,
}: {
  facts: FlagFacts;
  level: Finding['level'];
  limit: number;
}): Finding | null {
  const value = facts.check?.derived.vtPerKgMl ?? null;
  if (value === null || !isAbove(value, limit)) return null;
  const words = told(value, limit, PER_KG);
  return {
    level,
    short: chip(`Vt ${words} mL/kg`, `Vt ${words}`),
    sentence: `Tidal volume is ${words}\u00a0mL/kg of predicted body weight, above ${limitInWords(limit, PER_KG)}.`,
    inputs: [input('Vt per kg', value, PER_KG), input('Limit', limit, PER_KG)],
  };
}
