import { formatNumber } from '../format/number.ts';
import { type AcidBaseReading, USUAL } from './acid-base-reading.ts';

const PH = { decimals: 2, keepsZeros: true } as const;
const WHOLE = { decimals: 0 } as const;
const TENTH = { decimals: 1 } as const;

const STAGES = {
  acute: 'as in the first hours',
  chronic: 'as after days',
  between: 'between that of the first hours and that of days',
  either: 'too small a change to tell hours from days',
} as const;

/** A reading as a person says it, sentence by sentence: what pH is, what is primary, and whether the rest fits. */
export function acidBaseInWords(reading: AcidBaseReading): string[] {
  const { consistency } = reading;
  if (consistency?.consistent === false) {
    return [
      `pH, PCO2 and bicarbonate cannot belong to one sample: with these two, pH would be ${formatNumber(consistency.expectedPh, PH)}. One of the three was mistyped, so nothing is read from them.`,
    ];
  }
  if (!reading.isReadable) {
    return [
      `pH and PCO2 would need a bicarbonate of ${formatNumber(reading.bicarbonateMmolL, TENTH)} mmol/L, which blood does not have. One of the two was mistyped, so nothing is read from them.`,
    ];
  }
  return [phInWords(reading), primaryInWords(reading), ...compensationInWords(reading)];
}

function phInWords({ ph }: AcidBaseReading): string {
  if (ph === 'usual')
    return `pH is in its usual range, ${USUAL.ph.map((end) => end.toFixed(2)).join(' to ')}.`;
  return ph === 'acidaemia' ? 'Acidaemia.' : 'Alkalaemia.';
}

function primaryInWords({ ph, primary }: AcidBaseReading): string {
  const [first, second] = primary;
  if (!first) {
    return ph === 'usual'
      ? 'No disorder: PaCO2 and bicarbonate do not move it.'
      : 'PaCO2 and bicarbonate lie in their usual ranges, so no disorder can be named.';
  }
  if (second) return `${capital(first)} and ${second} together.`;
  const hidden = ph === 'usual' ? ' Compensation alone seldom brings pH back, so look for a second one.' : '';
  return `${capital(first)}.${hidden}`;
}

function compensationInWords({ compensation, second }: AcidBaseReading): string[] {
  if (!compensation) return [];
  const { of, unit, low, high, actual, stage, verdict } = compensation;
  const digits = of === 'PaCO2' && verdict === 'within' ? WHOLE : TENTH;
  const band = `${formatNumber(low, digits)} to ${formatNumber(high, digits)} ${unit}`;
  const is = `${capital(of)} expected ${band}, found ${formatNumber(actual, digits)}`;
  if (second) return [`${is}: ${verdict === 'above' ? 'above it' : 'below it'}, so ${second} as well.`];
  return [`${is}: as expected${stage ? `, ${STAGES[stage]}` : ''}.`];
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
