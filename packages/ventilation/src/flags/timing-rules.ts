import type { BedCheck } from '../contract/board.ts';
import { READING_FIELDS, SETTING_FIELDS } from '../entry/fields.ts';
import { formatNumber } from '../format/number.ts';
import { airwayResistance } from '../mechanics/airway-resistance.ts';
import { breathTiming } from '../mechanics/breath-timing.ts';
import { timeConstant } from '../mechanics/time-constant.ts';
import { chip, type FlagRule, input, isAbove, told } from './rule.ts';

const SECONDS = { unit: 's', decimals: 1 } as const;
const TIME_CONSTANTS_TO_EMPTY = 3;
/** cmH2O/(L/s); beyond it the flow or the pressures were mistyped, and no time constant follows. */
const LARGEST_RESISTANCE = 500;

export const TIMING_RULES: readonly FlagRule[] = [
  {
    id: 'rate-above-set',
    from: ['check'],
    source:
      'common practice: the patient asks for much more than is given; each unit sets its own difference',
    find: ({ check, thresholds }) => {
      const total = check?.readings.rateTotalPerMin;
      const set = check?.settings.rateSetPerMin;
      if (total === undefined || set === undefined || total < set + thresholds.rateAboveSetPerMin)
        return null;
      const field = READING_FIELDS.rateTotalPerMin;
      const [totalWords, setWords] = [formatNumber(total, field), formatNumber(set, field)];
      return {
        level: 'note',
        short: chip(`Rate ${totalWords}, set ${setWords}`, `Rate ${totalWords}`),
        sentence: `The total rate of ${totalWords}\u00a0/min is ${formatNumber(thresholds.rateAboveSetPerMin, field)} or more above the set ${setWords}.`,
        inputs: [
          input('Rate total', total, field),
          input('Rate set', set, SETTING_FIELDS.rateSetPerMin),
          input('Difference', thresholds.rateAboveSetPerMin, field),
        ],
      };
    },
  },
  {
    id: 'expiratory-time-short',
    from: ['check'],
    source: 'after three time constants 95 % of a breath is out (1 − e⁻³); common practice',
    find: ({ check }) => {
      const emptying = check && emptyingOf(check);
      if (!emptying || !isAbove(emptying.neededS, emptying.expiratoryTimeS)) return null;
      const { expiratoryTimeS, timeConstantS, neededS } = emptying;
      const words = told(expiratoryTimeS, neededS, SECONDS);
      return {
        level: 'note',
        short: chip(`Te ${words} s short`, `Te ${words} s`),
        sentence: `${words}\u00a0s are left to breathe out, less than three time constants (${told(neededS, expiratoryTimeS, SECONDS)}\u00a0s): gas may be trapped.`,
        inputs: [
          input('Expiratory time', expiratoryTimeS, SECONDS),
          input('Time constant', timeConstantS, { unit: 's', decimals: 2 }),
          input('Needed', neededS, SECONDS),
        ],
      };
    },
  },
];

/**
 * How long the lungs take to empty and how long they have, with the numbers that made it. Resistance can be told
 * apart from compliance only in volume control with a constant flow that is known.
 */
export function emptyingOf({ mode, settings, readings, derived }: BedCheck) {
  const { peakCmH2O, plateauCmH2O, rateTotalPerMin: ratePerMin } = readings;
  const { inspiratoryFlowLMin } = settings;
  const complianceMlCmH2O = derived.staticComplianceMlCmH2O;
  if (mode !== 'ac-vc' || inspiratoryFlowLMin === undefined || complianceMlCmH2O === null) return null;
  if (peakCmH2O === undefined || plateauCmH2O === undefined || plateauCmH2O > peakCmH2O) return null;
  if (ratePerMin === undefined || ratePerMin < 1) return null;
  const inspiratoryTimeS = settings.inspiratoryTimeS ?? flowTimeS(settings.vtSetMl, inspiratoryFlowLMin);
  // A time that fills the whole cycle is a slip of entry: nothing can be said of the rest.
  if (inspiratoryTimeS === null || inspiratoryTimeS < 0.05 || inspiratoryTimeS >= 60 / ratePerMin)
    return null;

  const timing = { ratePerMin, inspiratoryTimeS };
  const pressures = { peakCmH2O, plateauCmH2O, inspiratoryFlowLMin };
  const resistanceCmH2OPerLS = airwayResistance(pressures);
  if (resistanceCmH2OPerLS > LARGEST_RESISTANCE) return null;
  const lungs = { complianceMlCmH2O, resistanceCmH2OPerLS };
  const timeConstantS = timeConstant(lungs);
  const { expiratoryTimeS } = breathTiming(timing);
  return {
    timeConstantS,
    expiratoryTimeS,
    neededS: TIME_CONSTANTS_TO_EMPTY * timeConstantS,
    madeFrom: { timing, pressures, lungs },
  };
}

/** How long a constant flow takes to give the set volume. */
function flowTimeS(vtSetMl: number | undefined, flowLMin: number): number | null {
  return vtSetMl === undefined ? null : (vtSetMl / 1000 / flowLMin) * 60;
}
