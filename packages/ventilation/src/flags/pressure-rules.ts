import { madeEffort, wasPassive } from '../board/passive-breath.ts';
import { READING_FIELDS, SETTING_FIELDS } from '../entry/fields.ts';
import { chip, type FlagRule, input, isAbove, limitInWords, told, toldWithUnit } from './rule.ts';

const PRESSURE = { unit: 'cmH2O', decimals: 0 } as const;
const POWER = { unit: 'J/min', decimals: 1 } as const;

export const PRESSURE_RULES: readonly FlagRule[] = [
  {
    id: 'plateau-high',
    from: ['check'],
    source: 'ARDS Network, N Engl J Med 2000;342:1301–8: plateau at most 30 cmH2O',
    find: ({ check, thresholds }) => {
      const value = check?.readings.plateauCmH2O;
      const limit = thresholds.plateauHighCmH2O;
      if (!check || value === undefined || !wasPassive(check) || !isAbove(value, limit)) return null;
      return {
        level: 'attention',
        short: chip(`Plateau ${told(value, limit, PRESSURE)}`),
        sentence: `Plateau pressure is ${toldWithUnit(value, limit, PRESSURE)}, above ${limitInWords(limit, PRESSURE)}.`,
        inputs: [input('Plateau', value, PRESSURE), input('Limit', limit, PRESSURE)],
      };
    },
  },
  {
    id: 'driving-pressure-high',
    from: ['check'],
    source: 'Amato MBP et al., N Engl J Med 2015;372:747–55; 15 cmH2O as the adherence limit in use since',
    find: ({ check, thresholds }) => {
      const value = check?.derived.drivingPressureCmH2O ?? null;
      const limit = thresholds.drivingPressureHighCmH2O;
      if (value === null || !isAbove(value, limit)) return null;
      return {
        level: 'attention',
        short: chip(`Driving P ${told(value, limit, PRESSURE)}`),
        sentence: `Driving pressure (plateau less total PEEP) is ${toldWithUnit(value, limit, PRESSURE)}, above ${limitInWords(limit, PRESSURE)}.`,
        inputs: [input('Driving pressure', value, PRESSURE), input('Limit', limit, PRESSURE)],
      };
    },
  },
  {
    id: 'mechanical-power-high',
    from: ['check'],
    source:
      'Serpa Neto A et al., Intensive Care Med 2018;44:1914–22: risk rises above 17 J/min; a trend, not a limit',
    find: ({ check, thresholds }) => {
      const value = check?.derived.mechanicalPowerJMin ?? null;
      const limit = thresholds.mechanicalPowerHighJMin;
      if (value === null || !isAbove(value, limit)) return null;
      const words = told(value, limit, POWER);
      return {
        level: 'note',
        short: chip(`Power ${words} J/min`, `${words} J/min`),
        sentence: `Mechanical power is ${words}\u00a0J/min, above ${limitInWords(limit, POWER)}: watch its trend.`,
        inputs: [input('Mechanical power', value, POWER), input('Limit', limit, POWER)],
      };
    },
  },
  {
    id: 'intrinsic-peep',
    from: ['check'],
    source: 'common practice; each unit sets its own limit',
    find: ({ check, thresholds }) => {
      const value = check?.readings.intrinsicPeepCmH2O;
      const limit = thresholds.intrinsicPeepHighCmH2O;
      if (!check || value === undefined || madeEffort(check) || value < limit) return null;
      const field = READING_FIELDS.intrinsicPeepCmH2O;
      return {
        level: 'attention',
        short: chip(`iPEEP ${told(value, limit, field)}`),
        sentence: `Intrinsic PEEP is ${toldWithUnit(value, limit, field)}; from ${limitInWords(limit, field)} on, look for time to breathe out.`,
        inputs: [input('Intrinsic PEEP', value, field), input('Limit', limit, field)],
      };
    },
  },
  {
    id: 'fio2-high',
    from: ['check'],
    source: 'common practice: oxygen above 60 % for long does harm of its own; each unit sets its own limit',
    find: ({ check, thresholds }) => {
      const value = check?.settings.fio2Percent;
      const limit = thresholds.fio2HighPercent;
      if (value === undefined || value < limit) return null;
      const field = SETTING_FIELDS.fio2Percent;
      return {
        level: 'note',
        short: chip(`FiO2 ${told(value, limit, field)} %`),
        sentence: `Inspired oxygen is ${toldWithUnit(value, limit, field)}, at or above ${limitInWords(limit, field)}.`,
        inputs: [input('FiO2', value, field), input('Limit', limit, field)],
      };
    },
  },
];
