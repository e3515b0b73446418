import { CATHETERS_FR, suctionCatheter } from '../airway/suction-catheter.ts';
import { AIRWAY_FIELDS } from '../entry/fields.ts';
import { formatNumber, formatWithUnit } from '../format/number.ts';
import { chip, type FlagRule, input, isAbove, limitInWords, told, toldWithUnit } from './rule.ts';

const CUFF = AIRWAY_FIELDS.cuffCmH2O;
const DEPTH = AIRWAY_FIELDS.depthCm;
const FRENCH = { unit: 'Fr', decimals: 0 } as const;

/** What lies ready at an adult bed; a tube that takes no more than less is worth saying. */
const USUAL_CATHETER_FR = 10;

export const AIRWAY_RULES: readonly FlagRule[] = [
  {
    id: 'cuff-out-of-band',
    from: ['airway'],
    source: 'common practice: 20 to 30 cmH2O, below the pressure that stops the flow in the tracheal wall',
    find: ({ device, airway, thresholds }) => {
      const value = airway?.cuffCmH2O ?? null;
      if (!device?.cuffed || value === null) return null;
      const { cuffLowCmH2O: low, cuffHighCmH2O: high } = thresholds;
      if (value >= low && value <= high) return null;
      const limit = value < low ? low : high;
      return {
        level: 'attention',
        short: chip(`Cuff ${told(value, limit, CUFF)}`),
        sentence: `Cuff pressure is ${toldWithUnit(value, limit, CUFF)}, outside ${formatNumber(low, CUFF)} to ${limitInWords(high, CUFF)}.`,
        inputs: [input('Cuff', value, CUFF), input('Lowest', low, CUFF), input('Highest', high, CUFF)],
      };
    },
  },
  {
    id: 'depth-moved',
    from: ['airway'],
    source:
      "common practice: compare with the depth at which the tube was secured; the limit is the unit's own",
    find: ({ device, airway, thresholds }) => {
      const depth = airway?.depthCm ?? null;
      const secured = device?.depthCm ?? null;
      if (depth === null || secured === null) return null;
      const moved = depth - secured;
      if (isAbove(thresholds.depthMovedCm, Math.abs(moved))) return null;
      const sign = moved > 0 ? '+' : '\u2212';
      return {
        level: 'attention',
        short: chip(`Depth ${sign}${formatNumber(Math.abs(moved), DEPTH)} cm`),
        sentence: `The tube is at ${formatWithUnit(depth, DEPTH)} and was secured at ${formatWithUnit(secured, DEPTH)}: moved by ${formatWithUnit(thresholds.depthMovedCm, DEPTH)} or more.`,
        inputs: [
          input('Depth', depth, DEPTH),
          input('Secured at', secured, DEPTH),
          input('Limit', thresholds.depthMovedCm, DEPTH),
        ],
      };
    },
  },
  {
    id: 'suction-catheter-small',
    from: ['airway'],
    source: 'AARC clinical practice guideline on endotracheal suctioning, Respir Care 2010;55:758–64',
    find: ({ device, airway, thresholds }) => {
      if (!device || !airway) return null;
      const { suctionMaxPercent: atMostPercent } = thresholds;
      const { atMostFr, catheterFr } = suctionCatheter({
        tubeInternalDiameterMm: device.sizeMm,
        atMostPercent,
      });
      const size = catheterFr ?? CATHETERS_FR[0];
      if (size >= USUAL_CATHETER_FR) return null;
      return {
        level: 'note',
        short: chip(`Suction to ${size} Fr`),
        sentence: `A tube of ${formatWithUnit(device.sizeMm, AIRWAY_FIELDS.sizeMm)} takes a suction catheter of at most ${size}\u00a0Fr, ${atMostPercent}\u00a0% of its inner diameter by the unit's rule.`,
        inputs: [
          input('Tube', device.sizeMm, AIRWAY_FIELDS.sizeMm),
          input('Share of the diameter', atMostPercent, { unit: '%', decimals: 0 }),
          input('Catheter at most', atMostFr, { ...FRENCH, decimals: 1 }),
        ],
      };
    },
  },
];
